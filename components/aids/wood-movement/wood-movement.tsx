import { Path, Rect } from 'react-native-svg';
import {
  woodMovementAid,
  type WoodMovementResult,
} from '../../../shared/aids/wood-movement/wood-movement';
import { colour, line } from '../../ui/tokens';
import { Dim, Label, Sheet } from '../drawing';
import { defineScreen, type DrawingProps } from '../screen';
import { plain } from '../show';
import { woodParts } from '../woods';

type Props = DrawingProps<{ width: number; cut: 'flat' | 'quarter' }, WoodMovementResult>;

/** The end of the board with its rings, now and later; the change drawn eight times larger. */
function Drawing({ input, result, show }: Props) {
  const now = 240;
  const shift = Math.max(-80, Math.min(40, (result.change / input.width) * now * 8));
  const rings = Array.from({ length: 6 }, (_, i) => {
    const at = 44 + i * 42;
    return input.cut === 'flat'
      ? `M${at} 100Q${at + 20} ${62 + 3 * i} ${at + 40} 100`
      : `M${at + 12} 60V100`;
  }).join('');
  return (
    <Sheet>
      <Rect
        x={40}
        y={60}
        width={now}
        height={40}
        fill={colour.sheet}
        stroke={colour.ink}
        strokeWidth={line.medium}
      />
      <Path d={rings} stroke={colour.ink3} strokeWidth={line.thin} fill="none" />
      <Rect
        x={40}
        y={112}
        width={now + shift}
        height={40}
        fill="none"
        stroke={colour.blue}
        strokeWidth={line.medium}
        strokeDasharray="6 3"
      />
      <Dim x1={40} y1={44} x2={40 + now} y2={44} text={`${show.text(input.width)} now`} />
      <Dim
        x1={40}
        y1={166}
        x2={40 + now + shift}
        y2={166}
        text={`${show.text(result.after)} later`}
        side="below"
      />
      <Label x={160} y={136} blue>
        {show.signed(result.change).text}
      </Label>
    </Sheet>
  );
}

export const woodMovementScreen = defineScreen({
  aid: woodMovementAid,
  start: {
    mm: { wood: 'cherry', cut: 'flat', width: '300', from: '8', to: '12' },
    in: { wood: 'cherry', cut: 'flat', width: '12', from: '8', to: '12' },
  },
  parts: (values) => [
    ...woodParts(values),
    { key: 'width', label: 'Width across the grain', kind: 'length' },
    { key: 'from', label: 'Moisture now', kind: 'number', unit: '%' },
    { key: 'to', label: 'Moisture later', kind: 'number', unit: '%' },
    {
      key: 'moistureUncertainty',
      label: 'How sure, either way',
      kind: 'number',
      unit: '%',
      optional: true,
      help: '1 when left out',
    },
  ],
  says: ({ result, show }) => {
    const size = show.text(Math.abs(result.change));
    return {
      kind: Math.abs(result.change) > result.uncertainty ? 'holds' : 'close',
      say:
        result.change > 0
          ? `It grows ${size}.`
          : result.change < 0
            ? `It shrinks ${size}.`
            : 'It stays as it is.',
      why: `Give or take ${show.text(result.uncertainty)}: the rule’s own 5 % and the moisture readings. Along the grain next to nothing.`,
      rows: [
        { label: 'Change', figure: show.signed(result.change) },
        { label: 'Uncertainty, either way', figure: show.length(result.uncertainty) },
        { label: 'Width afterwards', figure: show.length(result.after), mm: result.after },
        {
          label: 'Coefficient',
          figure: plain(result.coefficient, 5),
          note: 'Per percent of moisture',
        },
      ],
    };
  },
  drawing: (props) => <Drawing {...props} />,
});
