import { Line, Path, Rect } from 'react-native-svg';
import {
  sheetThicknessAid,
  type SheetThicknessResult,
} from '../../../shared/aids/sheet-thickness/sheet-thickness';
import { metricPlywood, plywoodCategories } from '../../../shared/trade/lumber.data';
import { colour, line } from '../../ui/tokens';
import { Label, Sheet } from '../drawing';
import { defineScreen, type AidSays, type DrawingProps } from '../screen';

type Props = DrawingProps<{ measured?: number; uncertainty: number }, SheetThicknessResult>;

/** The band that is allowed on a line of thickness, the sheet in hand on it with its uncertainty. */
function Drawing({ input, result, show }: Props) {
  const span = result.greatest - result.least;
  const [from, to] = [result.least - span, result.greatest + span];
  const x = (mm: number) => 20 + (280 * (Math.max(from, Math.min(to, mm)) - from)) / (to - from);
  return (
    <Sheet>
      <Rect
        x={x(result.least)}
        y={70}
        width={x(result.greatest) - x(result.least)}
        height={36}
        fill={colour.sheet}
        stroke={colour.ink}
        strokeWidth={line.medium}
      />
      <Line x1={20} y1={106} x2={300} y2={106} stroke={colour.ink} strokeWidth={line.medium} />
      <Line
        x1={x(result.nominal)}
        y1={62}
        x2={x(result.nominal)}
        y2={106}
        stroke={colour.ink}
        strokeWidth={line.thin}
        strokeDasharray="5 3"
      />
      <Label x={x(result.least)} y={124}>
        {show.text(result.least)}
      </Label>
      <Label x={x(result.greatest)} y={124}>
        {show.text(result.greatest)}
      </Label>
      {input.measured === undefined ? null : (
        <>
          <Path
            d={`M${x(input.measured)} 92V50M${x(input.measured - input.uncertainty)} 92H${x(input.measured + input.uncertainty)}`}
            stroke={colour.blue}
            strokeWidth={line.thick}
          />
          <Label x={x(input.measured)} y={42} blue>
            {`yours ${show.text(input.measured)}`}
          </Label>
        </>
      )}
    </Sheet>
  );
}

const verdicts: Record<
  'inside' | 'near' | 'outside' | 'none',
  { kind: AidSays['kind']; words: string }
> = {
  inside: {
    kind: 'holds',
    words: 'Yours is inside. Cut grooves to what you measured, not to the label.',
  },
  near: { kind: 'close', words: 'Yours is too near a limit for this instrument.' },
  outside: { kind: 'fails', words: 'Yours is outside: another category, or not of this standard.' },
  none: { kind: 'need', words: 'Measure yours before a groove is cut to it.' },
};

export const sheetThicknessScreen = defineScreen({
  aid: sheetThicknessAid,
  start: {
    mm: { standard: 'en315', category: '18', sanded: 'yes', measured: '17.6' },
    in: { standard: 'ps1', category: '23/32', sanded: '', measured: '0.703' },
  },
  parts: (values) => [
    {
      key: 'standard',
      label: 'Standard',
      kind: 'choice',
      options: [
        { value: 'ps1', label: 'PS 1, inches' },
        { value: 'en315', label: 'EN 315, millimetres' },
      ],
    },
    values.standard === 'ps1'
      ? {
          key: 'category',
          label: 'Category on the stamp',
          kind: 'choice',
          options: plywoodCategories.map(({ category }) => ({ value: category, label: category })),
        }
      : {
          key: 'category',
          label: 'Nominal',
          kind: 'number',
          unit: 'mm',
          help: `Usual: ${metricPlywood.map(({ mm }) => mm).join(' ')}`,
        },
    { key: 'measured', label: 'Yours, measured', kind: 'length', optional: true },
    {
      key: 'uncertainty',
      label: 'Your instrument, either way',
      kind: 'length',
      optional: true,
      help: '0.03 mm when left out',
    },
    { key: 'sanded', label: 'Sanded', kind: 'yes' },
  ],
  says: ({ result, show }) => {
    const { kind, words } = verdicts[result.verdict ?? 'none'];
    return {
      kind,
      say: `${show.text(result.least)} to ${show.text(result.greatest)}.`,
      why: words,
      rows: [
        { label: 'Least', figure: show.length(result.least), mm: result.least },
        { label: 'Greatest', figure: show.length(result.greatest), mm: result.greatest },
        { label: 'Named', figure: show.length(result.nominal) },
      ],
    };
  },
  drawing: (props) => <Drawing {...props} />,
});
