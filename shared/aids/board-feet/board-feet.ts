import { z } from 'zod';
import { boardFeet } from '../../layout/buying/board-feet';
import { tally } from '../../trade/lumber';
import { defineAid } from '../aid';
import { refused, type Outcome } from '../outcome';

const inch = 25.4;

export const boardFeetInput = z.object({
  boards: z
    .array(
      z.object({
        /** Nominal sizes, mm. */
        thickness: z.number().positive().max(400),
        width: z.number().positive().max(2_000),
        length: z.number().positive().max(20_000),
        count: z.number().int().min(1).max(10_000).default(1),
      }),
    )
    .min(1)
    .max(100),
  /** Price of one board foot, in whatever money. */
  price: z.number().min(0).max(1_000_000).optional(),
});

export interface BoardFeetResult {
  rows: {
    exact: number;
    tally: number;
    surface: number;
    onTheHalf: boolean;
    countedAsInch: boolean;
  }[];
  /** Board feet by exact nominal size, and as a hardwood yard tallies whole feet of surface. */
  exact: number;
  tally: number;
  cubicMetres: number;
  price?: { exact: number; tally: number };
}

/** Board feet of a pile by its nominal sizes, exact and by the hardwood tally. */
export function workBoardFeet(input: z.output<typeof boardFeetInput>): Outcome<BoardFeetResult> {
  if (input.boards.some(({ width, length }) => width > length * 100))
    return refused(
      'boards',
      'A board is wider than it is long.',
      'Look at width and length again.',
    );
  const rows = input.boards.map(({ thickness, width, length, count }) => {
    const [t, w, l] = [thickness / inch, width / inch, length / inch];
    const one = tally(t, w, l);
    return {
      exact: count * boardFeet(t, w, l / 12),
      tally: count * one.boardFeet,
      surface: one.surface,
      onTheHalf: one.onTheHalf,
      countedAsInch: t < 1 - 1e-9,
    };
  });
  const sum = (pick: (row: (typeof rows)[number]) => number) =>
    rows.reduce((total, row) => total + pick(row), 0);
  const exact = sum((row) => row.exact);
  const tallied = sum((row) => row.tally);
  return {
    ok: true,
    result: {
      rows,
      exact,
      tally: tallied,
      cubicMetres: input.boards.reduce(
        (v, b) => v + (b.thickness * b.width * b.length * b.count) / 1e9,
        0,
      ),
      ...(input.price !== undefined && {
        price: { exact: exact * input.price, tally: tallied * input.price },
      }),
    },
  };
}

/** The aid "Board feet". */
export const boardFeetAid = defineAid({
  id: 'board-feet',
  title: 'Board feet',
  what: 'Board feet of a pile, exact and as a hardwood yard tallies it.',
  sources:
    '1 board foot is 144 cubic inches of nominal size; under 1 in counts as 1 in and the whole-foot tally: PS 20 and NHLA, from memory.',
  example: { boards: [{ thickness: 31.75, width: 177.8, length: 3048 }] },
  input: boardFeetInput,
  work: workBoardFeet,
});
