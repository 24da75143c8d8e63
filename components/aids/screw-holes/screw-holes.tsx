import { Path, Rect } from 'react-native-svg';
import {
  screwHolesAid,
  type HoleDrill,
  type ScrewHolesResult,
} from '../../../shared/aids/screw-holes/screw-holes';
import { colour, line } from '../../ui/tokens';
import { Dim, Label, Sheet } from '../drawing';
import { defineScreen, type AidRow, type DrawingProps } from '../screen';
import { screwParts } from '../screws-fields';
import { type Show } from '../show';

type Props = DrawingProps<{ wood: 'soft' | 'hard' }, ScrewHolesResult>;

/** The holes in section: countersink, clearance through the upper piece, pilot in the lower, widths in proportion. */
function Drawing({ result, show }: Props) {
  const scale = 70 / result.head;
  const half = (mm: number) => (mm * scale) / 2;
  const clear = half(result.clearance.drill?.mm ?? result.shank);
  const pilot = half(result.pilot.drill?.mm ?? result.pilot.wanted);
  const sink = Math.min(50, result.countersink.depth * scale);
  const c = 130;
  const hole = `M${c - half(result.head)} 24L${c - clear} ${24 + sink}V94H${c + clear}V${24 + sink}L${c + half(result.head)} 24Z`;
  return (
    <Sheet>
      <Rect
        x={24}
        y={24}
        width={212}
        height={70}
        fill={colour.sheet}
        stroke={colour.ink}
        strokeWidth={line.medium}
      />
      <Rect
        x={24}
        y={94}
        width={212}
        height={76}
        fill={colour.sheet}
        stroke={colour.ink}
        strokeWidth={line.medium}
      />
      <Path d={hole} fill={colour.film} stroke={colour.ink} strokeWidth={line.medium} />
      <Path
        d={`M${c - pilot} 94V146L${c} 152L${c + pilot} 146V94Z`}
        fill={colour.film}
        stroke={colour.ink}
        strokeWidth={line.medium}
      />
      <Dim x1={c - half(result.head)} y1={18} x2={c + half(result.head)} y2={18} text="" />
      <Label x={c + half(result.head) + 8} y={18} anchor="start" blue>
        {`head ${show.text(result.head)}`}
      </Label>
      <Label x={c + clear + 8} y={84} anchor="start" blue>
        {`clear ${show.text(result.clearance.drill?.mm ?? result.shank)}`}
      </Label>
      <Label x={c + pilot + 8} y={130} anchor="start" blue>
        {`pilot ${show.text(result.pilot.drill?.mm ?? result.pilot.wanted)}`}
      </Label>
    </Sheet>
  );
}

const nameOf = ({ drill }: HoleDrill, show: Show) =>
  drill ? drill.name || show.text(drill.mm) : 'none on hand';

const hole = (label: string, found: HoleDrill, show: Show): AidRow => ({
  label,
  figure: nameOf(found, show),
  note: `Wanted ${show.text(found.wanted)}${found.drill ? `, the drill is ${show.signed(found.off).text || 'the same'}` : ': no drill is near enough'}`,
  ...(found.drill && { mm: found.drill.mm }),
});

const choices = (pairs: readonly (readonly [string, string])[]) =>
  pairs.map(([value, label]) => ({ value, label }));

export const screwHolesScreen = defineScreen({
  aid: screwHolesAid,
  start: {
    mm: {
      series: 'metric',
      gauge: '4',
      wood: 'hard',
      rule: 'wood-handbook',
      drillSeries: 'metric',
    },
    in: { series: 'us', gauge: '8', wood: 'hard', rule: 'wood-handbook', drillSeries: 'fraction' },
  },
  parts: (values) => [
    ...screwParts(values),
    {
      key: 'wood',
      label: 'Wood',
      kind: 'choice',
      options: choices([
        ['soft', 'Softwood'],
        ['hard', 'Hardwood'],
      ]),
    },
    {
      key: 'rule',
      label: 'Rule for the pilot',
      kind: 'choice',
      options: choices([
        ['wood-handbook', 'Wood Handbook, 70 and 90 %'],
        ['trade-chart', 'Trade chart, 85 and 100 %'],
      ]),
      help: 'The rules differ; this one is named in the answer',
    },
    {
      key: 'drills',
      label: 'Drills on hand',
      kind: 'lengths',
      optional: true,
      help: 'Apart by commas; left out: the whole series',
    },
    {
      key: 'drillSeries',
      label: 'Or from the series',
      kind: 'choice',
      options: choices([
        ['fraction', 'Fractions by 64ths'],
        ['metric', 'Metric'],
        ['number', 'Numbers'],
      ]),
    },
    {
      key: 'root',
      label: 'Root of the thread, measured',
      kind: 'length',
      optional: true,
      help: 'Two thirds of the shank when left out',
    },
    { key: 'head', label: 'Head, measured', kind: 'length', optional: true },
  ],
  fromCard: {
    label: 'Take the drills of the shop card',
    take: (card) => (card.drills.trim() ? { drills: card.drills } : null),
  },
  says: ({ input, result, show }) => ({
    kind: result.pilot.drill && result.clearance.drill ? 'holds' : 'need',
    say: `Pilot ${nameOf(result.pilot, show)}, clearance ${nameOf(result.clearance, show)}.`,
    why: `By the ${input.rule === 'wood-handbook' ? 'Wood Handbook' : 'trade chart'}. Countersink ${result.countersink.angle}°, ${show.text(result.countersink.depth)} deep. Try it in a scrap of the same wood.`,
    rows: [
      hole('Pilot, in the lower piece', result.pilot, show),
      hole('Clearance, in the upper piece', result.clearance, show),
      { label: 'Countersink', figure: `${result.countersink.angle}°` },
      {
        label: 'Depth of the countersink',
        figure: show.length(result.countersink.depth),
        mm: result.countersink.depth,
      },
      { label: 'Shank', figure: show.length(result.shank), mm: result.shank },
      { label: 'Root', figure: show.length(result.root) },
      { label: 'Head', figure: show.length(result.head) },
    ],
  }),
  drawing: (props) => <Drawing {...props} />,
});
