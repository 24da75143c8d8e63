import { z } from 'zod';
import { leastBite } from '../../trade/shop.data';
import { defineAid } from '../aid';
import { refused, type Outcome } from '../outcome';
import { screwFields, shankOf } from '../screw-holes/screw-holes';

const inch = 25.4;

/** Lengths usually sold, mm. Common practice, no source; the box says what there is. */
export const soldLengths = {
  inch: [
    0.25, 0.375, 0.5, 0.625, 0.75, 0.875, 1, 1.25, 1.5, 1.75, 2, 2.25, 2.5, 2.75, 3, 3.5, 4,
  ].map((x) => x * inch),
  metric: [10, 12, 16, 20, 25, 30, 35, 40, 45, 50, 60, 70, 80, 90, 100, 120],
} as const;

export const screwLengthInput = z.object({
  ...screwFields,
  /** What the screw goes through, from the head down, mm. */
  through: z.array(z.number().positive().max(500)).min(1).max(10),
  /** What it bites into, mm. */
  into: z.number().positive().max(500),
  /** How far the head sits under the surface, mm. */
  sunk: z.number().min(0).max(100).default(0),
  /** Wood that stays between the point and the far face, mm. Common practice, no source. */
  left: z.number().min(0).max(100).default(3),
  /** How sure the thicknesses are, together, mm. */
  uncertainty: z.number().min(0).max(20).default(0.5),
  /** Lengths on hand, mm; none: those usually sold. */
  lengths: z.array(z.number().positive().max(1_000)).max(100).default([]),
});

export interface ScrewLengthResult {
  /** The longest that may be used, before a length is chosen, mm. */
  limit: number;
  length: number;
  bite: number;
  /** In diameters. */
  biteDiameters: number;
  /** Point to far face, mm. */
  left: number;
  /** Threaded length of the screw and how much of it stands in the upper pieces, mm. */
  thread: number;
  threadAbove: number;
  /** The bite is long enough to count on (common practice: three diameters). */
  enough: boolean;
}

/** Share of a screw that is threaded: two thirds (US, from memory), 0.6 (British text, read). */
export const threadShare = { us: 2 / 3, british: 0.6, metric: 0.6 } as const;

/** The longest screw for a stack that does not come through, and how much of it bites. */
export function workScrewLength(
  input: z.output<typeof screwLengthInput>,
): Outcome<ScrewLengthResult> {
  const shank = shankOf(input);
  if (!shank.ok) return shank;
  const { into, sunk, uncertainty } = input;
  const above = input.through.reduce((sum, t) => sum + t, 0);
  if (sunk >= above)
    return refused('sunk', 'The head would sink through the pieces it holds.', 'Sink it less.');
  const limit = above + into - sunk - input.left - uncertainty;
  const lengths =
    input.lengths.length > 0
      ? input.lengths
      : soldLengths[input.series === 'metric' ? 'metric' : 'inch'];
  const fitting = lengths.filter((length) => length <= limit + 1e-9);
  const length = fitting.length > 0 ? Math.max(...fitting) : null;
  if (length === null)
    return refused(
      'lengths',
      'Every length on hand would come through or nearly.',
      'Use a shorter screw, sink it less, or join this another way.',
    );
  const bite = sunk + length - above;
  if (bite <= 0)
    return refused(
      'into',
      'The longest screw that stays inside does not reach the second piece.',
      'Counterbore deeper, or take a length between.',
    );
  const thread = length * threadShare[input.series];
  return {
    ok: true,
    result: {
      limit,
      length,
      bite,
      biteDiameters: bite / shank.result,
      left: above + into - sunk - length,
      thread,
      threadAbove: Math.max(0, thread - bite),
      enough: bite - uncertainty >= leastBite * shank.result - 1e-9,
    },
  };
}

/** The aid "Length of a screw". */
export const screwLengthAid = defineAid({
  id: 'screw-length',
  title: 'Length of a screw',
  what: 'The longest screw for a stack that does not come through, and its bite.',
  sources:
    'Arithmetic; threaded share two thirds (US, from memory) or 0.6 (British text); bite of three diameters and 3 mm left: common practice, no source.',
  example: { series: 'us', gauge: 8, through: [19.05], into: 38.1 },
  input: screwLengthInput,
  work: workScrewLength,
});
