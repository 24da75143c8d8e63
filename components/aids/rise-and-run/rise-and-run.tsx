import { Path } from 'react-native-svg';
import {
  riseAndRunAid,
  type RiseAndRunResult,
} from '../../../shared/aids/rise-and-run/rise-and-run';
import { colour, line } from '../../ui/tokens';
import { Dim, Label, Sheet } from '../drawing';
import { defineScreen, type DrawingProps } from '../screen';
import { plain } from '../show';

type Props = DrawingProps<{ rise: number; run: number }, RiseAndRunResult>;

/** The triangle in its true proportions, as large as the sheet takes. */
function Drawing({ input, result, show }: Props) {
  const rise = Math.abs(input.rise);
  const scale = Math.min(220 / input.run, 130 / Math.max(rise, 1e-9));
  const [w, h] = [Math.max(input.run * scale, 2), rise * scale];
  const [x, y] = [30, 160];
  return (
    <Sheet>
      <Path
        d={`M${x} ${y}H${x + w}V${y - h}Z`}
        fill={colour.sheet}
        stroke={colour.ink}
        strokeWidth={line.medium}
      />
      <Dim x1={x} y1={y + 10} x2={x + w} y2={y + 10} text={show.text(input.run)} side="below" />
      <Dim x1={x + w + 10} y1={y} x2={x + w + 10} y2={y - h} text={show.text(rise)} side="right" />
      <Label x={x + w / 2} y={Math.max(16, y - h - 8)} blue>
        {`${plain(Math.abs(result.angle), 3)}°`}
      </Label>
    </Sheet>
  );
}

export const riseAndRunScreen = defineScreen({
  aid: riseAndRunAid,
  start: { mm: { rise: '15', run: '500' }, in: { rise: '3/4', run: '24' } },
  parts: () => [
    { key: 'rise', label: 'Rise', kind: 'length' },
    { key: 'run', label: 'Run', kind: 'length' },
    {
      key: 'uncertainty',
      label: 'Each reading, either way',
      kind: 'length',
      optional: true,
      help: '0.25 mm when left out',
    },
  ],
  says: ({ result, show }) => ({
    kind: 'holds',
    say: `${plain(result.angle, 3)}° from the run.`,
    why: `Give or take ${plain(result.uncertainty, 3)}°. A scale that counts from the other side shows ${plain(result.complement, 3)}°.`,
    rows: [
      { label: 'Angle from the run', figure: `${plain(result.angle, 3)}°` },
      { label: 'Angle from the rise', figure: `${plain(result.complement, 3)}°` },
      { label: 'Uncertainty', figure: `±${plain(result.uncertainty, 3)}°` },
      { label: 'Along the slope', figure: show.length(result.slope), mm: result.slope },
      {
        label: 'Slope',
        figure: result.oneIn === null ? 'level' : `1 in ${plain(result.oneIn, 2)}`,
      },
    ],
  }),
  drawing: (props) => <Drawing {...props} />,
});
