import { Circle, G, Line, Rect } from 'react-native-svg';
import { sawDepthAid, type SawDepthResult } from '../../../shared/aids/saw-depth/saw-depth';
import { colour, line } from '../../ui/tokens';
import { Dim, Label, Sheet } from '../drawing';
import { defineScreen, type AidSays, type DrawingProps } from '../screen';

type Props = DrawingProps<
  { diameter: number; arborBelow: number; base: number; bevel: number; stock?: number },
  SawDepthResult
>;

/** The blade from the side over table, base and stock, in true proportions. */
function Drawing({ input, result, show }: Props) {
  const scale = 150 / Math.max(input.diameter, 1);
  const table = 118;
  const [cx, r] = [140, (input.diameter / 2) * scale];
  const drop = (input.arborBelow + result.full - result.upright) * scale;
  const base = input.base * scale;
  const stock = (input.stock ?? 0) * scale;
  const top = table - result.upright * scale;
  return (
    <Sheet>
      <Circle
        cx={cx}
        cy={table + drop}
        r={r}
        fill="none"
        stroke={colour.ink}
        strokeWidth={line.medium}
        strokeDasharray="10 3"
      />
      <Rect
        x={16}
        y={table}
        width={250}
        height={7}
        fill={colour.sheet}
        stroke={colour.ink}
        strokeWidth={line.medium}
      />
      {base > 0 ? (
        <Rect
          x={28}
          y={table - base}
          width={226}
          height={base}
          fill={colour.sheet}
          stroke={colour.ink}
          strokeWidth={line.thin}
        />
      ) : null}
      {stock > 0 ? (
        <G>
          <Rect
            x={60}
            y={table - base - stock}
            width={160}
            height={stock}
            fill="none"
            stroke={colour.ink}
            strokeWidth={line.medium}
          />
          <Label x={76} y={table - base - stock / 2 + 4} anchor="start">
            stock
          </Label>
        </G>
      ) : null}
      <Line x1={cx} y1={top} x2={270} y2={top} stroke={colour.blue} strokeWidth={line.thin} />
      <Dim
        x1={262}
        y1={table - base}
        x2={262}
        y2={top}
        text={show.text(result.left)}
        side="right"
      />
      <Label x={20} y={table + 22} anchor="start">
        table
      </Label>
    </Sheet>
  );
}

const verdicts: Record<
  'through' | 'near' | 'short' | 'none',
  Pick<AidSays, 'kind'> & { words: string }
> = {
  through: { kind: 'holds', words: 'It cuts through the stock.' },
  near: { kind: 'close', words: 'Too near to tell: measure finer or cut a scrap first.' },
  short: {
    kind: 'fails',
    words:
      'It does not cut through. Thinner base, larger blade the machine allows, or another way.',
  },
  none: { kind: 'holds', words: '' },
};

export const sawDepthScreen = defineScreen({
  aid: sawDepthAid,
  start: {
    mm: { diameter: '254', arborBelow: '50', base: '18', bevel: '0', stock: '40' },
    in: { diameter: '10', arborBelow: '2', base: '3/4', bevel: '0', stock: '1 1/2' },
  },
  parts: () => [
    { key: 'diameter', label: 'Blade', kind: 'length', help: 'Across, unplugged' },
    {
      key: 'arborBelow',
      label: 'Arbor below the table',
      kind: 'length',
      help: 'Its centre, blade at full height',
    },
    { key: 'base', label: 'Base under the work', kind: 'length', help: '0 on the bare table' },
    { key: 'bevel', label: 'Tilt from upright', kind: 'number', unit: '°' },
    { key: 'stock', label: 'Stock', kind: 'length', optional: true },
    {
      key: 'uncertainty',
      label: 'All measures, either way',
      kind: 'length',
      optional: true,
      help: '0.5 mm when left out',
    },
  ],
  says: ({ result, show }) => {
    const { kind, words } = verdicts[result.verdict ?? 'none'];
    return {
      kind,
      say: `${show.text(result.left)} of cut is left.`,
      why: `${words} Give or take ${show.text(result.uncertainty)}.`.trim(),
      rows: [
        { label: 'Left above the base', figure: show.length(result.left), mm: result.left },
        { label: 'Above the table at this tilt', figure: show.length(result.upright) },
        { label: 'Above the table, upright', figure: show.length(result.full) },
        { label: 'Blade’s length at the table', figure: show.length(result.chordAtTable) },
        {
          label: 'Blade’s length at the base’s face',
          figure: show.length(result.chordAtBase),
          note: 'The slot it makes, at full height',
        },
      ],
    };
  },
  drawing: (props) => <Drawing {...props} />,
});
