import { Line, Rect } from 'react-native-svg';
import { noiseDoseAid, type NoiseDoseResult } from '../../../shared/aids/noise-dose/noise-dose';
import { colour, line } from '../../ui/tokens';
import { Label, Sheet } from '../drawing';
import { defineScreen, type AidSays, type DrawingProps } from '../screen';
import { plain, spanWords } from '../show';

/** Both doses as bars against a full day. */
function Drawing({ result }: DrawingProps<unknown, NoiseDoseResult>) {
  const most = Math.max(120, result.niosh.dose, result.osha.dose);
  const width = (dose: number) => (200 * dose) / most;
  const bars = [
    ['NIOSH', result.niosh.dose, 40],
    ['OSHA', result.osha.dose, 104],
  ] as const;
  return (
    <Sheet>
      {bars.map(([name, dose, y]) => (
        <Rect
          key={name}
          x={64}
          y={y}
          width={Math.max(1, width(dose))}
          height={30}
          fill={colour.sheet}
          stroke={colour.ink}
          strokeWidth={line.medium}
        />
      ))}
      {bars.map(([name, , y]) => (
        <Label key={name} x={56} y={y + 20} anchor="end">
          {name}
        </Label>
      ))}
      {bars.map(([name, dose, y]) => (
        <Label key={name} x={70 + width(dose)} y={y + 20} anchor="start" blue>
          {`${plain(dose, 0)} %`}
        </Label>
      ))}
      <Line
        x1={64 + width(100)}
        y1={24}
        x2={64 + width(100)}
        y2={150}
        stroke={colour.blue}
        strokeWidth={line.thick}
      />
      <Label x={64 + width(100)} y={168}>
        a full day
      </Label>
    </Sheet>
  );
}

const verdicts: Record<NoiseDoseResult['verdict'], Pick<AidSays, 'kind'> & { words: string }> = {
  over: {
    kind: 'fails',
    words:
      'More than a safe day by NIOSH: ears covered at every one of these machines, or less of them.',
  },
  near: { kind: 'risk', words: 'Within the meter’s error of a full day: cover your ears.' },
  under: {
    kind: 'holds',
    words: 'Under a full day by NIOSH. Ears covered all the same at 85 dBA and over.',
  },
};

export const noiseDoseScreen = defineScreen({
  aid: noiseDoseAid,
  start: (() => {
    const both = {
      'day.count': '2',
      'day.0.name': 'Planer',
      'day.0.level': '100',
      'day.0.minutes': '15',
      'day.1.name': 'Table saw',
      'day.1.level': '95',
      'day.1.minutes': '40',
    };
    return { mm: both, in: both };
  })(),
  parts: () => [
    {
      key: 'day',
      kind: 'rows',
      noun: 'Machine',
      columns: [
        { key: 'name', label: 'Name', kind: 'words', optional: true },
        {
          key: 'level',
          label: 'Level at the ear',
          kind: 'number',
          unit: 'dBA',
          help: 'Measured, or from its manual',
        },
        { key: 'minutes', label: 'Time at it', kind: 'number', unit: 'min' },
      ],
    },
    {
      key: 'uncertainty',
      label: 'Levels, either way',
      kind: 'number',
      unit: 'dB',
      optional: true,
      help: '2 when left out',
    },
  ],
  says: ({ result }) => {
    const { kind, words } = verdicts[result.verdict];
    const average = (x: number | null) => (x === null ? 'none' : `${plain(x, 1)} dBA`);
    return {
      kind: result.tooLoud ? 'fails' : kind,
      say: result.tooLoud
        ? 'Too loud for any time without ear protection.'
        : `${plain(result.niosh.dose, 0)} % of a day’s noise.`,
      why: `${words}${result.action ? ' OSHA’s action level is reached as well.' : ''} Catch the dust of the same machines.`,
      rows: [
        {
          label: 'NIOSH dose, the advice',
          figure: `${plain(result.niosh.dose, 0)} %`,
          note: `${plain(result.niosh.low, 0)} to ${plain(result.niosh.high, 0)} % with the levels’ error`,
        },
        { label: 'NIOSH over eight hours', figure: average(result.niosh.average) },
        {
          label: 'OSHA dose, for comparison',
          figure: `${plain(result.osha.dose, 0)} %`,
          note: 'US employers; not a safe line for ears',
        },
        { label: 'OSHA over eight hours', figure: average(result.osha.average) },
        ...result.rows.map((row, i) => ({
          label: `${row.name || `Machine ${i + 1}`}: a full day is`,
          figure: spanWords(row.niosh),
          note: `OSHA ${spanWords(row.osha)}; yours ${spanWords(row.minutes)}`,
        })),
      ],
    };
  },
  drawing: (props) => <Drawing {...props} />,
});
