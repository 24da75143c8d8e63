import { Line, Path, Rect } from 'react-native-svg';
import {
  screwLengthAid,
  type ScrewLengthResult,
} from '../../../shared/aids/screw-length/screw-length';
import { colour, line } from '../../ui/tokens';
import { Dim, Label, Sheet } from '../drawing';
import { defineScreen, type DrawingProps } from '../screen';
import { plain } from '../show';
import { screwParts } from '../screws-fields';

type Props = DrawingProps<{ through: number[]; into: number; sunk: number }, ScrewLengthResult>;

/** The stack in section with the screw in it, heights in proportion. */
function Drawing({ input, result, show }: Props) {
  const above = input.through.reduce((sum, t) => sum + t, 0);
  const scale = 154 / (above + input.into);
  const top = 18;
  const joints = input.through.map((_, i) =>
    input.through.slice(0, i + 1).reduce((s, t) => s + t, 0),
  );
  const head = top + input.sunk * scale;
  const point = head + result.length * scale;
  const joint = top + above * scale;
  return (
    <Sheet>
      <Rect
        x={24}
        y={top}
        width={180}
        height={154}
        fill={colour.sheet}
        stroke={colour.ink}
        strokeWidth={line.medium}
      />
      {joints.map((at) => (
        <Line
          key={at}
          x1={24}
          y1={top + at * scale}
          x2={204}
          y2={top + at * scale}
          stroke={colour.ink}
          strokeWidth={line.medium}
        />
      ))}
      <Path
        d={`M98 ${head}H130L118 ${head + 9}V${point - 6}L114 ${point}L110 ${point - 6}V${head + 9}Z`}
        fill={colour.film}
        stroke={colour.ink}
        strokeWidth={line.medium}
      />
      <Dim x1={216} y1={head} x2={216} y2={point} text={show.text(result.length)} side="right" />
      <Dim x1={80} y1={joint} x2={80} y2={point} text={show.text(result.bite)} side="left" />
      <Label x={240} y={186}>
        {`${show.text(result.left)} left`}
      </Label>
    </Sheet>
  );
}

export const screwLengthScreen = defineScreen({
  aid: screwLengthAid,
  start: {
    mm: { series: 'metric', gauge: '4', through: '18', into: '30', sunk: '0' },
    in: { series: 'us', gauge: '8', through: '3/4', into: '1 1/2', sunk: '0' },
  },
  parts: (values) => [
    ...screwParts(values),
    {
      key: 'through',
      label: 'Goes through',
      kind: 'lengths',
      help: 'From the head down, apart by commas',
    },
    { key: 'into', label: 'Bites into', kind: 'length' },
    { key: 'sunk', label: 'Head under the surface', kind: 'length' },
    {
      key: 'left',
      label: 'Wood left at the point',
      kind: 'length',
      optional: true,
      help: '3 mm when left out (common practice)',
    },
    {
      key: 'uncertainty',
      label: 'Thicknesses, either way',
      kind: 'length',
      optional: true,
      help: '0.5 mm when left out',
    },
    {
      key: 'lengths',
      label: 'Lengths on hand',
      kind: 'lengths',
      optional: true,
      help: 'Left out: those usually sold',
    },
  ],
  says: ({ result, show }) => ({
    kind: result.enough ? 'holds' : 'risk',
    say: `${show.text(result.length)} is the longest that stays inside.`,
    why: result.enough
      ? `It bites ${plain(result.biteDiameters, 1)} diameters.`
      : `It bites ${plain(result.biteDiameters, 1)} diameters; three are usual, and the uncertainty comes off. A thinner screw or more of them.`,
    rows: [
      { label: 'Length', figure: show.length(result.length), mm: result.length },
      { label: 'Bite', figure: show.length(result.bite), mm: result.bite },
      { label: 'Point to the far face', figure: show.length(result.left) },
      { label: 'Limit before choosing', figure: show.length(result.limit) },
      {
        label: 'Thread in the upper pieces',
        figure: show.length(result.threadAbove),
        note: 'A clearance hole there lets the joint close',
      },
    ],
  }),
  drawing: (props) => <Drawing {...props} />,
});
