import { z } from 'zod';
import { defineAid } from '../aid';
import { refused, type Outcome } from '../outcome';

export const equalSpacingInput = z.object({
  /** Clear opening, mm. */
  opening: z.number().positive().max(100_000),
  /** How many slats, drawers, balusters, and how wide each is, mm; 0 for lines. */
  count: z.number().int().min(1).max(500),
  width: z.number().min(0).max(10_000),
  /** Gaps at both ends, or the first and last flush with the ends. */
  ends: z.enum(['gaps', 'flush']).default('gaps'),
  /** Widest gap allowed, mm. */
  widest: z.number().positive().max(10_000).optional(),
});

export interface EqualSpacingResult {
  gap: number;
  /** From one slat's left edge to the next one's, mm. */
  pitch: number;
  /** Left edge of each slat from the opening's left end, mm: mark these from one end, never from slat to slat. */
  positions: number[];
  /** The fewest slats whose gaps are no wider than allowed; null where no limit is given. */
  fewest: number | null;
}

/** The gap: (W − n·w)/(n + 1) with gaps at the ends, (W − n·w)/(n − 1) flush (elementary arithmetic). */
const gapOf = (opening: number, n: number, width: number, ends: 'gaps' | 'flush') =>
  (opening - n * width) / (ends === 'gaps' ? n + 1 : n - 1);

/** Equal gaps between slats in an opening, with the positions of all from one end, so that errors do not add up. */
export function workEqualSpacing(
  input: z.output<typeof equalSpacingInput>,
): Outcome<EqualSpacingResult> {
  const { opening, count, width, ends, widest } = input;
  if (ends === 'flush' && count === 1)
    return refused('count', 'One slat cannot be flush with both ends.', 'Take two, or gaps.');
  if (count * width > opening)
    return refused(
      'count',
      'So many slats are wider than the opening.',
      'Take fewer or narrower ones.',
    );
  const gap = gapOf(opening, count, width, ends);
  const first = ends === 'gaps' ? gap : 0;
  const pitch = gap + width;
  return {
    ok: true,
    result: {
      gap,
      pitch,
      positions: Array.from({ length: count }, (_, i) => first + i * pitch),
      fewest: widest === undefined ? null : fewestFor(opening, width, ends, widest),
    },
  };
}

function fewestFor(opening: number, width: number, ends: 'gaps' | 'flush', widest: number): number {
  // n gaps-and-slats cover the opening: (W − n·w)/(n ± 1) ≤ g solved for n.
  const exact =
    ends === 'gaps' ? (opening - widest) / (width + widest) : (opening + widest) / (width + widest);
  const n = Math.ceil(exact - 1e-9);
  return Math.max(ends === 'gaps' ? 1 : 2, n);
}

/** The aid that spaces slats, shelves, holes. */
export const equalSpacingAid = defineAid({
  id: 'equal-spacing',
  title: 'Equal spacing',
  what: 'Equal gaps between slats, drawers or holes, and where each begins from one end.',
  sources: 'Elementary arithmetic.',
  example: { opening: 1000, count: 7, width: 60 },
  input: equalSpacingInput,
  work: workEqualSpacing,
});
