import { Path, Rect } from 'react-native-svg';
import { panelGapAid, type PanelGapResult } from '../../../shared/aids/panel-gap/panel-gap';
import { colour, line } from '../../ui/tokens';
import { Dim, Label, Sheet } from '../drawing';
import { defineScreen, type DrawingProps } from '../screen';
import { woodParts } from '../woods';

type Props = DrawingProps<{ opening: number; groove: number }, PanelGapResult>;

/** One stile with its groove in section and the panel's edge in it: wettest, now, driest, at their true proportions. */
function Drawing({ input, result, show }: Props) {
  const depth = 110;
  const scale = depth / input.groove;
  const bottom = 70;
  const edge = (gap: number) => bottom + Math.max(0, gap) * scale;
  return (
    <Sheet>
      <Path
        d={`M20 30H${bottom + depth}V66H${bottom}V124H${bottom + depth}V160H20Z`}
        fill={colour.sheet}
        stroke={colour.ink}
        strokeWidth={line.medium}
      />
      <Rect
        x={edge(result.gapNow)}
        y={70}
        width={310 - edge(result.gapNow)}
        height={50}
        fill={colour.film}
        stroke={colour.ink}
        strokeWidth={line.medium}
      />
      <Path
        d={`M${edge(result.gapWettest)} 70V120M${edge(result.gapDriest)} 70V120`}
        stroke={colour.blue}
        strokeWidth={line.medium}
        strokeDasharray="5 3"
      />
      <Dim x1={bottom} y1={22} x2={bottom + depth} y2={22} text={show.text(input.groove)} />
      <Dim
        x1={bottom}
        y1={174}
        x2={edge(result.gapNow)}
        y2={174}
        text={`gap ${show.text(result.gapNow)}`}
        side="right"
      />
      <Label x={258} y={100}>
        panel
      </Label>
      <Label x={44} y={100}>
        stile
      </Label>
    </Sheet>
  );
}

const start = { wood: 'cherry', cut: 'flat', now: '8', driest: '6', wettest: '12' };

export const panelGapScreen = defineScreen({
  aid: panelGapAid,
  start: {
    mm: { ...start, opening: '400', groove: '10' },
    in: { ...start, opening: '16', groove: '3/8' },
  },
  parts: (values) => [
    ...woodParts(values),
    {
      key: 'opening',
      label: 'Groove bottom to groove bottom',
      kind: 'length',
      help: 'Across the grain',
    },
    { key: 'groove', label: 'Depth of each groove', kind: 'length' },
    { key: 'now', label: 'Moisture of the panel now', kind: 'number', unit: '%' },
    { key: 'driest', label: 'Driest of the year', kind: 'number', unit: '%' },
    {
      key: 'wettest',
      label: 'Wettest of the year',
      kind: 'number',
      unit: '%',
      help: 'The aid for moisture content gives both',
    },
  ],
  says: ({ result, show }) => ({
    kind: 'holds',
    say: `Cut the panel ${show.text(result.width)} wide.`,
    why: `Now ${show.text(result.gapNow)} stays free at each groove bottom. In the driest season ${show.text(result.cover)} still stands in each groove. Glue it nowhere but in the middle.`,
    rows: [
      { label: 'Width of the panel', figure: show.length(result.width), mm: result.width },
      { label: 'Gap at each side now', figure: show.length(result.gapNow), mm: result.gapNow },
      { label: 'Gap in the wettest season', figure: show.length(result.gapWettest) },
      { label: 'Gap in the driest season', figure: show.length(result.gapDriest) },
      { label: 'In the groove in the driest season', figure: show.length(result.cover) },
      {
        label: 'Uncertainty of the whole width',
        figure: show.length(result.uncertainty),
        note: 'Kept free',
      },
    ],
  }),
  drawing: (props) => <Drawing {...props} />,
});
