import { Circle, Line, Path, Rect } from 'react-native-svg';
import { bladeSpeedAid, type BladeSpeedResult } from '../../../shared/aids/blade-speed/blade-speed';
import { colour, line } from '../../ui/tokens';
import { Dim, Label, Sheet } from '../drawing';
import { defineScreen, type AidSays, type DrawingProps } from '../screen';
import { plain } from '../show';

type Props = DrawingProps<{ diameter: number; rpm: number; marked?: number }, BladeSpeedResult>;

/** The blade with the way its teeth go, and the turns on a line against the mark. */
function Drawing({ input, result, show }: Props) {
  const most = Math.max(input.rpm, input.marked ?? 0) * 1.1;
  const x = (rpm: number) => 150 + (150 * rpm) / most;
  return (
    <Sheet>
      <Circle
        cx={70}
        cy={84}
        r={54}
        fill={colour.sheet}
        stroke={colour.ink}
        strokeWidth={line.medium}
        strokeDasharray="9 3"
      />
      <Circle
        cx={70}
        cy={84}
        r={7}
        fill={colour.film}
        stroke={colour.ink}
        strokeWidth={line.medium}
      />
      <Path
        d="M70 22H104M97 17 104 22 97 27"
        stroke={colour.blue}
        strokeWidth={line.medium}
        fill="none"
      />
      <Label x={112} y={26} anchor="start" blue>
        {`${plain(result.metresPerSecond, 1)} m/s`}
      </Label>
      <Dim x1={16} y1={158} x2={124} y2={158} text={show.text(input.diameter)} side="below" />
      <Line x1={150} y1={110} x2={300} y2={110} stroke={colour.ink} strokeWidth={line.medium} />
      <Rect x={150} y={104} width={x(input.rpm) - 150} height={6} fill={colour.blue} />
      {input.marked === undefined ? null : (
        <>
          <Line
            x1={x(input.marked)}
            y1={92}
            x2={x(input.marked)}
            y2={122}
            stroke={colour.ink}
            strokeWidth={line.thick}
          />
          <Label x={x(input.marked)} y={86} anchor="end">
            {`mark ${input.marked}`}
          </Label>
        </>
      )}
      <Label x={x(input.rpm)} y={138} anchor="end" blue>
        {`${plain(input.rpm, 0)} rpm`}
      </Label>
    </Sheet>
  );
}

function spoken(result: BladeSpeedResult): Pick<AidSays, 'kind' | 'say' | 'why'> {
  if (result.size === 'too-large')
    return {
      kind: 'fails',
      say: 'Do not fit it.',
      why: 'The blade is larger than the machine takes.',
    };
  if (result.verdict === 'over')
    return {
      kind: 'fails',
      say: 'Do not run it.',
      why: `The machine turns ${plain(-(result.margin ?? 0), 0)} rpm over the blade’s mark. Fit a blade marked for this speed.`,
    };
  if (result.size === 'too-small')
    return {
      kind: 'fails',
      say: 'Too small a blade for this saw.',
      why: 'HSE asks for at least 60 % of the largest the machine takes.',
    };
  if (result.verdict === 'no-mark')
    return {
      kind: 'need',
      say: 'Find the greatest speed marked on the blade.',
      why: 'Without a mark nothing can be said, and the blade should not run.',
    };
  return {
    kind: 'holds',
    say: 'Under the mark.',
    why: `${plain(result.margin ?? 0, 0)} rpm to spare. The machine’s manual still decides which blades it takes.`,
  };
}

export const bladeSpeedScreen = defineScreen({
  aid: bladeSpeedAid,
  start: {
    mm: { diameter: '250', rpm: '4500', marked: '7000', largest: '' },
    in: { diameter: '10', rpm: '4000', marked: '7000', largest: '' },
  },
  parts: () => [
    { key: 'diameter', label: 'Blade or bit, across', kind: 'length' },
    {
      key: 'rpm',
      label: 'Machine, without load',
      kind: 'number',
      unit: 'rpm',
      help: 'On its plate',
    },
    {
      key: 'marked',
      label: 'Greatest speed marked',
      kind: 'number',
      unit: 'rpm',
      optional: true,
      help: 'On the blade',
    },
    { key: 'largest', label: 'Largest blade it takes', kind: 'length', optional: true },
  ],
  says: ({ result }) => ({
    ...spoken(result),
    rows: [
      { label: 'Speed of the teeth', figure: `${plain(result.metresPerSecond, 2)} m/s` },
      { label: 'The same', figure: `${plain(result.feetPerMinute, 0)} ft/min` },
    ],
  }),
  drawing: (props) => <Drawing {...props} />,
});
