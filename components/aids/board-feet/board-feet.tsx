import { Path, Rect } from 'react-native-svg';
import { boardFeetAid, type BoardFeetResult } from '../../../shared/aids/board-feet/board-feet';
import { colour, line } from '../../ui/tokens';
import { Label, Sheet } from '../drawing';
import { defineScreen, type DrawingProps } from '../screen';
import { plain } from '../show';

type Board = { thickness: number; width: number; length: number; count: number };
type Props = DrawingProps<{ boards: Board[] }, BoardFeetResult>;

/** The boards of the pile laid beside each other, in proportion, each with its board feet. */
function Drawing({ input, result, show }: Props) {
  const boards = input.boards.slice(0, 5);
  const scale = 250 / Math.max(...boards.map(({ length }) => length));
  const room = 160 / boards.length;
  return (
    <Sheet>
      {boards.map((board, i) => {
        const h = Math.max(8, Math.min(room - 20, board.width * scale));
        const [y, w] = [14 + i * room, Math.max(12, board.length * scale)];
        return (
          <Rect
            key={i}
            x={20}
            y={y}
            width={w}
            height={h}
            fill={colour.sheet}
            stroke={colour.ink}
            strokeWidth={line.medium}
          />
        );
      })}
      {boards.map((board, i) => {
        const h = Math.max(8, Math.min(room - 20, board.width * scale));
        return (
          <Label key={i} x={20} y={14 + i * room + h + 14} anchor="start" blue>
            {`${board.count} × ${show.text(board.length)}: ${plain(result.rows[i]?.exact ?? 0, 2)} bd ft`}
          </Label>
        );
      })}
      {input.boards.length > 5 ? (
        <Path d="M290 170H310" stroke={colour.ink} strokeWidth={line.thick} strokeDasharray="2 5" />
      ) : null}
    </Sheet>
  );
}

export const boardFeetScreen = defineScreen({
  aid: boardFeetAid,
  start: {
    mm: {
      'boards.0.thickness': '1 1/4 in',
      'boards.0.width': '7 in',
      'boards.0.length': '10 ft',
      'boards.0.count': '1',
    },
    in: {
      'boards.0.thickness': '1 1/4',
      'boards.0.width': '7',
      'boards.0.length': '10 ft',
      'boards.0.count': '1',
    },
  },
  parts: () => [
    {
      key: 'boards',
      kind: 'rows',
      noun: 'Board',
      columns: [
        { key: 'thickness', label: 'Thickness, nominal', kind: 'length', help: 'As 5/4 in' },
        { key: 'width', label: 'Width, nominal', kind: 'length' },
        { key: 'length', label: 'Length', kind: 'length', help: 'As 10 ft' },
        { key: 'count', label: 'How many', kind: 'number' },
      ],
    },
    { key: 'price', label: 'Price of a board foot', kind: 'number', optional: true },
  ],
  says: ({ result }) => ({
    kind: 'holds',
    say: `${plain(result.exact, 2)} board feet.`,
    why: `A hardwood yard that tallies whole feet of surface counts ${plain(result.tally, 2)}.${result.rows.some(({ onTheHalf }) => onTheHalf) ? ' A board falls on the half: the tally may come out lower.' : ''}${result.rows.some(({ countedAsInch }) => countedAsInch) ? ' Under 1 in counts as 1 in.' : ''}`,
    rows: [
      { label: 'Exact, by nominal size', figure: plain(result.exact, 4), note: 'board feet' },
      { label: 'Hardwood tally', figure: plain(result.tally, 2), note: 'board feet' },
      { label: 'Volume', figure: `${plain(result.cubicMetres, 4)} m³`, note: 'By the sizes given' },
      ...(result.price
        ? [
            { label: 'Price, exact', figure: plain(result.price.exact, 2) },
            { label: 'Price, by the tally', figure: plain(result.price.tally, 2) },
          ]
        : []),
    ],
  }),
  drawing: (props) => <Drawing {...props} />,
});
