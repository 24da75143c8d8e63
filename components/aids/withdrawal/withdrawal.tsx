import { Line, Path, Rect } from 'react-native-svg';
import { withdrawalAid, type WithdrawalResult } from '../../../shared/aids/withdrawal/withdrawal';
import { colour, line } from '../../ui/tokens';
import { Dim, Label, Sheet } from '../drawing';
import { defineScreen, type DrawingProps } from '../screen';
import { plain } from '../show';

type Props = DrawingProps<{ bite: number; diameter: number }, WithdrawalResult>;

/** The fastener in side grain with its bite, and the two loads as bars that cannot be taken for each other. */
function Drawing({ input, result, show }: Props) {
  const bite = Math.min(120, Math.max(30, input.bite * 2));
  const half = Math.min(14, Math.max(3, input.diameter * 2));
  const bar = 120;
  return (
    <Sheet>
      <Rect
        x={20}
        y={40}
        width={130}
        height={134}
        fill={colour.sheet}
        stroke={colour.ink}
        strokeWidth={line.medium}
      />
      {[64, 92, 120, 148].map((y) => (
        <Line key={y} x1={26} y1={y} x2={144} y2={y} stroke={colour.ink3} strokeWidth={line.thin} />
      ))}
      <Path
        d={`M${85 - half} 20H${85 + half}V${40 + bite - 6}L85 ${40 + bite}L${85 - half} ${40 + bite - 6}Z`}
        fill={colour.film}
        stroke={colour.ink}
        strokeWidth={line.medium}
      />
      <Path
        d="M85 18V4M80 9 85 3 90 9"
        stroke={colour.blue}
        strokeWidth={line.medium}
        fill="none"
      />
      <Dim x1={130} y1={40} x2={130} y2={40 + bite} text="" />
      <Label x={158} y={40 + bite / 2} anchor="start" blue>
        {show.text(input.bite)}
      </Label>
      <Label x={180} y={104} anchor="start">
        breaks at
      </Label>
      <Rect
        x={180}
        y={110}
        width={bar}
        height={10}
        fill="none"
        stroke={colour.ink}
        strokeWidth={line.medium}
      />
      <Label x={180} y={142} anchor="start" blue>
        to count on
      </Label>
      <Rect x={180} y={148} width={bar / result.ratio} height={10} fill={colour.blue} />
    </Sheet>
  );
}

export const withdrawalScreen = defineScreen({
  aid: withdrawalAid,
  start: {
    mm: { fastener: 'screw', gravity: '0.5', diameter: '4.2', bite: '30', grain: 'side' },
    in: { fastener: 'screw', gravity: '0.5', diameter: '0.164', bite: '1 1/4', grain: 'side' },
  },
  parts: (values) => [
    {
      key: 'fastener',
      label: 'Fastener',
      kind: 'choice',
      options: [
        { value: 'screw', label: 'Wood screw' },
        { value: 'nail', label: 'Common nail' },
      ],
    },
    {
      key: 'grain',
      label: 'Driven into',
      kind: 'choice',
      options: [
        { value: 'side', label: 'Side grain' },
        { value: 'end', label: 'End grain' },
      ],
    },
    {
      key: 'gravity',
      label: 'Specific gravity of the wood',
      kind: 'number',
      help: 'Oven-dry; 0.42 soft, 0.50 fir, 0.66 hard maple (from memory)',
    },
    { key: 'diameter', label: 'Shank', kind: 'length' },
    { key: 'bite', label: 'Bite', kind: 'length', help: 'Thread, or nail, in the main piece' },
    ...(values.fastener === 'screw'
      ? [
          { key: 'number', label: 'American number', kind: 'number' as const, optional: true },
          {
            key: 'length',
            label: 'Length of the screw',
            kind: 'length' as const,
            optional: true,
            help: 'With its number: whether such a screw was tried',
          },
        ]
      : []),
  ],
  says: ({ result, show }) => ({
    kind: 'risk',
    say: `Count on ${show.force(result.allowable)}, no more.`,
    why: `An allowable reference, before the code’s own factors for time, wet and heat. On average it comes out at ${show.force(result.ultimate)}: that figure is no load to hang anything by.`,
    rows: [
      {
        label: 'Allowable reference',
        figure: show.force(result.allowable),
        note: 'What a design starts from',
      },
      {
        label: 'Ultimate, on average',
        figure: show.force(result.ultimate),
        note: 'Where it pulls out',
      },
      { label: 'One is of the other', figure: `${plain(result.ratio, 1)} times` },
    ],
  }),
  drawing: (props) => <Drawing {...props} />,
});
