import { Line, Rect } from 'react-native-svg';
import {
  glueWaitAid,
  type GlueWaitResult,
  type Wait,
} from '../../../shared/aids/glue-wait/glue-wait';
import { glueFamilies } from '../../../shared/trade/glue.data';
import { colour, line } from '../../ui/tokens';
import { Label, Sheet } from '../drawing';
import { defineScreen, type AidRow, type DrawingProps } from '../screen';
import { plain, spanWords } from '../show';

const words = ({ low, high }: Wait) =>
  low === high ? spanWords(low) : `${spanWords(low)} to ${spanWords(high)}`;

/** The waits below each other on a scale that crowds the long ones (by tenfold); placeholders dashed. */
function Drawing({ result }: DrawingProps<unknown, GlueWaitResult>) {
  const x = (minutes: number) => 70 + 34 * Math.log10(1 + minutes * 10);
  const bars = [
    ['open', result.open, 30],
    ['clamps', result.clamp, 80],
    ['no load', result.cure, 130],
  ] as const;
  return (
    <Sheet>
      <Line x1={70} y1={16} x2={70} y2={170} stroke={colour.ink} strokeWidth={line.medium} />
      {bars.map(([name, wait, y]) => (
        <Rect
          key={name}
          x={70}
          y={y}
          width={x(wait.high) - 70}
          height={22}
          fill={colour.sheet}
          stroke={wait.from === 'label' ? colour.blue : colour.ink}
          strokeWidth={line.medium}
          strokeDasharray={wait.from === 'label' ? undefined : '6 3'}
        />
      ))}
      {bars.map(([name, , y]) => (
        <Label key={name} x={62} y={y + 16} anchor="end">
          {name}
        </Label>
      ))}
      {bars.map(([name, wait, y]) => (
        <Label key={name} x={74} y={y + 38} anchor="start" blue>
          {`${words(wait)}${wait.from === 'label' ? '' : ', placeholder'}`}
        </Label>
      ))}
    </Sheet>
  );
}

const row = (label: string, wait: Wait): AidRow => ({
  label,
  figure: words(wait),
  note: wait.from === 'label' ? 'By the label' : 'Placeholder: put the label’s figure in',
});

const assemblies = {
  fits: 'Your assembly fits into the open time.',
  'may-not':
    'Your assembly may outlast the open time: have everything ready, or do it in two goes.',
  'too-long': 'Your assembly outlasts the open time: do it in two goes, or use a slower glue.',
} as const;

const start = { family: 'pva-yellow', wood: 'medium', stressed: '' };

export const glueWaitScreen = defineScreen({
  aid: glueWaitAid,
  start: { mm: { ...start, celsius: '20' }, in: { ...start, celsius: '68' } },
  parts: () => [
    {
      key: 'family',
      label: 'Glue',
      kind: 'choice',
      options: glueFamilies.map(({ id, name }) => ({ value: id, label: name })),
    },
    { key: 'celsius', label: 'Shop, wood and glue', kind: 'temperature' },
    { key: 'label.open', label: 'Label: open time', kind: 'number', unit: 'min', optional: true },
    { key: 'label.clamp', label: 'Label: in clamps', kind: 'number', unit: 'min', optional: true },
    {
      key: 'label.cure',
      label: 'Label: no load before',
      kind: 'number',
      unit: 'min',
      optional: true,
    },
    { key: 'label.least', label: 'Label: not colder than', kind: 'temperature', optional: true },
    {
      key: 'assembly',
      label: 'You need to bring it together',
      kind: 'number',
      unit: 'min',
      optional: true,
    },
    {
      key: 'wood',
      label: 'Wood',
      kind: 'choice',
      options: [
        { value: 'soft', label: 'Soft' },
        { value: 'medium', label: 'Medium' },
        { value: 'hard', label: 'Hard' },
      ],
    },
    { key: 'faceLength', label: 'Glued face, length', kind: 'length', optional: true },
    { key: 'faceWidth', label: 'Glued face, width', kind: 'length', optional: true },
    { key: 'stressed', label: 'Sprung, bent or loaded in the clamps', kind: 'yes' },
  ],
  says: ({ result, show }) => {
    const placeholder = [result.open, result.clamp, result.cure].some(
      ({ from }) => from === 'placeholder',
    );
    const [low, high] = result.force ?? [0, 0];
    return {
      kind: result.assembly === 'too-long' ? 'fails' : placeholder ? 'need' : 'holds',
      say: `${words(result.clamp)} in the clamps.`,
      why: [
        result.assembly ? assemblies[result.assembly] : '',
        placeholder ? 'Some figures are placeholders: read the label and put its own in.' : '',
      ]
        .filter(Boolean)
        .join(' '),
      rows: [
        row('Open', result.open),
        row('In the clamps', result.clamp),
        row('No load before', result.cure),
        {
          label: 'Not colder than',
          figure: show.temperature(result.least.celsius),
          note: result.least.from === 'label' ? 'By the label' : 'Placeholder',
        },
        ...(result.force
          ? [
              {
                label: 'Clamp force over the face',
                figure: `${plain(low, 1)} to ${plain(high, 1)} kN`,
                note: 'Pressure by the wood, from a maker’s guide',
              },
            ]
          : []),
        { label: 'Where the placeholders are from', figure: '', note: result.mark },
      ],
    };
  },
  drawing: (props) => <Drawing {...props} />,
});
