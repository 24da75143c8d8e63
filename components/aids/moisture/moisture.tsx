import { Line, Path, Rect } from 'react-native-svg';
import { moistureAid, type MoistureResult } from '../../../shared/aids/moisture/moisture';
import { equilibriumMoisture } from '../../../shared/trade/moisture';
import { colour, line } from '../../ui/tokens';
import { Label, Sheet } from '../drawing';
import { defineScreen, type DrawingProps } from '../screen';
import { plain } from '../show';

type Props = DrawingProps<{ celsius: number; humidity: number }, MoistureResult>;

const plot = { left: 40, right: 304, top: 16, bottom: 156, most: 25 } as const;
const x = (h: number) => plot.left + ((plot.right - plot.left) * h) / 100;
const y = (m: number) =>
  plot.bottom - ((plot.bottom - plot.top) * Math.min(m, plot.most)) / plot.most;

/** Moisture over humidity at this temperature, the room marked. */
function Drawing({ input, result }: Props) {
  const curve = Array.from({ length: 46 }, (_, i) => 5 + 2 * i)
    .map((h, i) => `${i ? 'L' : 'M'}${x(h)} ${y(equilibriumMoisture(input.celsius, h))}`)
    .join('');
  const [px, py] = [x(input.humidity), y(result.moisture)];
  return (
    <Sheet>
      <Rect
        x={plot.left}
        y={y(result.high)}
        width={plot.right - plot.left}
        height={y(result.low) - y(result.high)}
        fill={colour.sheet}
      />
      <Path
        d={`M${plot.left} ${plot.top}V${plot.bottom}H${plot.right}`}
        stroke={colour.ink}
        strokeWidth={line.medium}
        fill="none"
      />
      <Path d={curve} stroke={colour.ink} strokeWidth={line.medium} fill="none" />
      <Line
        x1={px}
        y1={plot.bottom}
        x2={px}
        y2={py}
        stroke={colour.blue}
        strokeWidth={line.medium}
      />
      <Line x1={plot.left} y1={py} x2={px} y2={py} stroke={colour.blue} strokeWidth={line.medium} />
      <Rect x={px - 4} y={py - 4} width={8} height={8} fill={colour.blue} />
      {[0, 10, 20].map((m) => (
        <Label key={m} x={plot.left - 6} y={y(m) + 4} anchor="end">
          {String(m)}
        </Label>
      ))}
      {[0, 50, 100].map((h) => (
        <Label key={h} x={x(h)} y={plot.bottom + 16}>
          {String(h)}
        </Label>
      ))}
      <Label x={172} y={186}>
        humidity, %
      </Label>
      <Label x={plot.left + 6} y={plot.top + 8} anchor="start">
        wood moisture, %
      </Label>
    </Sheet>
  );
}

export const moistureScreen = defineScreen({
  aid: moistureAid,
  start: { mm: { celsius: '20', humidity: '50' }, in: { celsius: '68', humidity: '50' } },
  parts: () => [
    { key: 'celsius', label: 'Temperature', kind: 'temperature' },
    { key: 'humidity', label: 'Relative humidity', kind: 'number', unit: '%' },
    {
      key: 'humidityUncertainty',
      label: 'Your hygrometer, either way',
      kind: 'number',
      unit: '%',
      optional: true,
      help: '3 when left out (common practice)',
    },
  ],
  says: ({ result }) => ({
    kind: 'holds',
    say: `Wood comes to ${plain(result.moisture, 1)} % here.`,
    why: `Between ${plain(result.low, 1)} and ${plain(result.high, 1)} %. It takes weeks; thick boards longer.`,
    rows: [
      { label: 'Moisture content', figure: `${plain(result.moisture, 1)} %` },
      {
        label: 'Uncertainty',
        figure: `±${plain(result.uncertainty, 1)} %`,
        note: 'The handbook’s data and your hygrometer together',
      },
    ],
  }),
  drawing: (props) => <Drawing {...props} />,
});
