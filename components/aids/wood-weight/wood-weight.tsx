import { Path, Rect } from 'react-native-svg';
import { woodWeightAid, type WoodWeightResult } from '../../../shared/aids/wood-weight/wood-weight';
import { specificGravity } from '../../../shared/trade/gravity.data';
import { colour, line } from '../../ui/tokens';
import { Dim, Label, Sheet } from '../drawing';
import { defineScreen, type DrawingProps } from '../screen';
import { plain } from '../show';
import { woodOptions } from '../woods';

type Props = DrawingProps<
  { thickness: number; width: number; length: number; count: number },
  WoodWeightResult
>;

/** The piece in an oblique view, in proportion as far as the sheet goes, its weight on it. */
function Drawing({ input, result, show }: Props) {
  const scale = 200 / input.length;
  const h = Math.max(6, Math.min(70, input.thickness * scale));
  const d = Math.max(10, Math.min(46, input.width * scale * 0.5));
  const [x, y] = [30, 74];
  return (
    <Sheet>
      <Path
        d={`M${x} ${y}L${x + d} ${y - d}H${x + 200 + d}L${x + 200} ${y}Z`}
        fill={colour.sheet}
        stroke={colour.ink}
        strokeWidth={line.medium}
      />
      <Path
        d={`M${x + 200} ${y}L${x + 200 + d} ${y - d}V${y - d + h}L${x + 200} ${y + h}Z`}
        fill={colour.sheet}
        stroke={colour.ink}
        strokeWidth={line.medium}
      />
      <Rect
        x={x}
        y={y}
        width={200}
        height={h}
        fill={colour.film}
        stroke={colour.ink}
        strokeWidth={line.medium}
      />
      <Dim
        x1={x}
        y1={y + h + 12}
        x2={x + 200}
        y2={y + h + 12}
        text={show.text(input.length)}
        side="below"
      />
      <Label x={130} y={182} blue>
        {`${input.count} × ${show.mass(result.each)}`}
      </Label>
    </Sheet>
  );
}

const known = woodOptions.filter(({ value }) => value === 'other' || value in specificGravity);

export const woodWeightScreen = defineScreen({
  aid: woodWeightAid,
  start: {
    mm: { wood: 'white oak', thickness: '50', width: '200', length: '2000', count: '1' },
    in: { wood: 'white oak', thickness: '2', width: '8', length: '6 ft', count: '1' },
  },
  parts: (values) => [
    { key: 'wood', label: 'Wood', kind: 'choice', options: known },
    ...(values.wood === 'other'
      ? [
          {
            key: 'gravity',
            label: 'Specific gravity at 12 %',
            kind: 'number' as const,
            help: 'No unit; oak about 0.65',
          },
        ]
      : []),
    {
      key: 'moisture',
      label: 'Moisture',
      kind: 'number',
      unit: '%',
      optional: true,
      help: '12 when left out',
    },
    { key: 'thickness', label: 'Thickness', kind: 'length' },
    { key: 'width', label: 'Width', kind: 'length' },
    { key: 'length', label: 'Length', kind: 'length' },
    { key: 'count', label: 'How many', kind: 'number' },
  ],
  says: ({ result, show }) => ({
    kind: result.twoPeople ? 'risk' : 'holds',
    say: `About ${show.mass(result.all)}.`,
    why: `Give or take ${show.mass(result.uncertainty)}: pieces of one species differ.${result.twoPeople ? ' One piece is for two people.' : ''}`,
    rows: [
      { label: 'Each', figure: show.mass(result.each) },
      { label: 'All', figure: show.mass(result.all) },
      { label: 'Uncertainty, either way', figure: show.mass(result.uncertainty) },
      { label: 'Density', figure: `${plain(result.density, 0)} kg/m³` },
    ],
  }),
  drawing: (props) => <Drawing {...props} />,
});
