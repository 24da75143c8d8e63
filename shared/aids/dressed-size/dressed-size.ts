import { z } from 'zod';
import { hardwoodQuarters, softwoodThickness, softwoodWidth } from '../../trade/lumber.data';
import { defineAid } from '../aid';
import { refused, type Outcome } from '../outcome';

const inch = 25.4;

export const dressedSizeInput = z.discriminatedUnion('kind', [
  z.object({
    kind: z.literal('softwood'),
    /** Nominal, inches. */
    thickness: z.number().positive().max(100),
    width: z.number().positive().max(100),
    state: z.enum(['dry', 'green']),
  }),
  z.object({
    kind: z.literal('hardwood'),
    quarter: z.string().max(8),
    surfaced: z.enum(['rough', 's1s', 's2s']),
  }),
]);

export interface DressedSizeResult {
  /** What it is at least, mm. */
  thickness: number;
  /** Hardwood comes in random widths: none there. */
  width: number | null;
  /** What the name says, mm. */
  nominal: { thickness: number; width: number | null };
}

type Input = z.output<typeof dressedSizeInput>;

function softwood(input: Extract<Input, { kind: 'softwood' }>): Outcome<DressedSizeResult> {
  const at = (rows: typeof softwoodWidth, nominal: number) =>
    rows.find((row) => Math.abs(row.nominal - nominal) < 1e-9)?.[input.state];
  const thickness = at(softwoodThickness, input.thickness);
  const width = at(softwoodWidth, input.width);
  if (thickness === undefined)
    return refused(
      'thickness',
      'PS 20 has nominal thicknesses 3/4 to 4 in by its own steps.',
      'Give the nominal figure, as 2 of a 2 × 4.',
    );
  if (width === undefined)
    return refused(
      'width',
      'PS 20 has nominal widths 2 to 12, 14 and 16 in.',
      'Give the nominal figure, as 4 of a 2 × 4.',
    );
  return {
    ok: true,
    result: {
      thickness: thickness * inch,
      width: width * inch,
      nominal: { thickness: input.thickness * inch, width: input.width * inch },
    },
  };
}

function hardwood(input: Extract<Input, { kind: 'hardwood' }>): Outcome<DressedSizeResult> {
  const row = hardwoodQuarters.find(({ quarter }) => quarter === input.quarter);
  const thickness = row?.[input.surfaced];
  if (!row)
    return refused('quarter', 'The hardwood rules have no such quarter.', 'Use 4/4, 5/4, 8/4 …');
  if (thickness === undefined)
    return refused(
      'surfaced',
      'The sources give no surfaced-one-side figure for this quarter.',
      'Measure it, or take it surfaced two sides.',
    );
  return {
    ok: true,
    result: {
      thickness: thickness * inch,
      width: null,
      nominal: { thickness: row.rough * inch, width: null },
    },
  };
}

/** The least dressed size behind a nominal one: softwood by PS 20, hardwood by the NHLA rules. */
export const workDressedSize = (input: Input): Outcome<DressedSizeResult> =>
  input.kind === 'softwood' ? softwood(input) : hardwood(input);

/** The aid "Nominal to dressed". */
export const dressedSizeAid = defineAid({
  id: 'dressed-size',
  title: 'Nominal to dressed',
  what: 'What a nominal size measures at least, softwood and hardwood.',
  sources:
    'Softwood PS 20, hardwood NHLA rules, both by transcriptions; 10/4 from memory. Measure the board you have.',
  example: { kind: 'softwood', thickness: 2, width: 4, state: 'dry' },
  input: dressedSizeInput,
  work: workDressedSize,
});
