import { Rect } from 'react-native-svg';
import {
  dressedSizeAid,
  type DressedSizeResult,
} from '../../../shared/aids/dressed-size/dressed-size';
import {
  hardwoodQuarters,
  softwoodThickness,
  softwoodWidth,
} from '../../../shared/trade/lumber.data';
import { colour, line } from '../../ui/tokens';
import { Dim, Sheet } from '../drawing';
import { defineScreen, type DrawingProps } from '../screen';

/** The nominal section dashed, what is left of it drawn. */
function Drawing({ result, show }: DrawingProps<unknown, DressedSizeResult>) {
  const width = result.nominal.width ?? result.nominal.thickness * 4;
  const scale = Math.min(220 / width, 110 / result.nominal.thickness);
  const [w, h] = [width * scale, result.nominal.thickness * scale];
  const [dw, dh] = [(result.width ?? width) * scale, result.thickness * scale];
  const [x, y] = [40, 40];
  return (
    <Sheet>
      <Rect
        x={x}
        y={y}
        width={w}
        height={h}
        fill="none"
        stroke={colour.ink}
        strokeWidth={line.thin}
        strokeDasharray="6 3"
      />
      <Rect
        x={x + (w - dw) / 2}
        y={y + (h - dh) / 2}
        width={dw}
        height={dh}
        fill={colour.sheet}
        stroke={colour.ink}
        strokeWidth={line.medium}
      />
      <Dim
        x1={x + w + 10}
        y1={y + (h - dh) / 2}
        x2={x + w + 10}
        y2={y + (h + dh) / 2}
        text={show.text(result.thickness)}
        side="right"
      />
      {result.width === null ? null : (
        <Dim
          x1={x + (w - dw) / 2}
          y1={y - 10}
          x2={x + (w + dw) / 2}
          y2={y - 10}
          text={show.text(result.width)}
        />
      )}
    </Sheet>
  );
}

const fraction = (inches: number) => {
  const whole = Math.floor(inches);
  const quarters = Math.round((inches - whole) * 4);
  const rest = ['', '1/4', '1/2', '3/4'][quarters] ?? '';
  return `${[whole || '', rest].filter(Boolean).join(' ')} in`;
};
const nominals = (rows: readonly { nominal: number }[]) =>
  rows.map(({ nominal }) => ({ value: String(nominal), label: fraction(nominal) }));

const start = {
  kind: 'softwood',
  thickness: '2',
  width: '4',
  state: 'dry',
  quarter: '4/4',
  surfaced: 's2s',
};

export const dressedSizeScreen = defineScreen({
  aid: dressedSizeAid,
  start: { mm: start, in: start },
  parts: (values) => [
    {
      key: 'kind',
      label: 'Wood',
      kind: 'choice',
      options: [
        { value: 'softwood', label: 'Softwood' },
        { value: 'hardwood', label: 'Hardwood' },
      ],
    },
    ...(values.kind === 'hardwood'
      ? [
          {
            key: 'quarter',
            label: 'Quarters',
            kind: 'choice' as const,
            options: hardwoodQuarters.map(({ quarter }) => ({ value: quarter, label: quarter })),
          },
          {
            key: 'surfaced',
            label: 'Surfaced',
            kind: 'choice' as const,
            options: [
              { value: 'rough', label: 'Rough' },
              { value: 's1s', label: 'One side' },
              { value: 's2s', label: 'Two sides' },
            ],
          },
        ]
      : [
          {
            key: 'thickness',
            label: 'Thickness, nominal',
            kind: 'choice' as const,
            figures: true,
            options: nominals(softwoodThickness),
          },
          {
            key: 'width',
            label: 'Width, nominal',
            kind: 'choice' as const,
            figures: true,
            options: nominals(softwoodWidth),
          },
          {
            key: 'state',
            label: 'Dressed',
            kind: 'choice' as const,
            options: [
              { value: 'dry', label: 'Dry, up to 19 %' },
              { value: 'green', label: 'Green' },
            ],
          },
        ]),
  ],
  says: ({ input, result, show }) => ({
    kind: 'holds',
    say:
      result.width === null
        ? `At least ${show.text(result.thickness)} thick.`
        : `At least ${show.text(result.thickness)} by ${show.text(result.width)}.`,
    why: `${input.kind === 'hardwood' ? 'Hardwood comes in random widths; kiln-dried rough 4/4 and 5/4 may be 1/16 in under. ' : ''}Measure the board you have before anything is cut to it.`,
    rows: [
      { label: 'Thickness', figure: show.length(result.thickness), mm: result.thickness },
      ...(result.width === null
        ? []
        : [{ label: 'Width', figure: show.length(result.width), mm: result.width }]),
      { label: 'Nominal thickness', figure: show.length(result.nominal.thickness) },
    ],
  }),
  drawing: (props) => <Drawing {...props} />,
});
