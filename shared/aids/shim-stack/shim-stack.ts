import { z } from 'zod';
import { defineAid } from '../aid';
import { refused, type Outcome } from '../outcome';

export const shimPiece = z.object({
  name: z.string().max(60).default(''),
  /** As measured, mm. */
  thickness: z.number().positive().max(50),
  /** How many of it lie about. */
  count: z.number().int().min(1).max(100).default(1),
});
export type ShimPiece = z.output<typeof shimPiece>;

export const shimStackInput = z.object({
  /** Thickness wanted, mm. */
  wanted: z.number().positive().max(50),
  /** How far off the stack may be, mm. */
  tolerance: z.number().min(0).max(5).default(0.02),
  pieces: z.array(shimPiece).min(1).max(60),
  most: z.number().int().min(1).max(20).default(6),
});

export interface ShimStackResult {
  /** What is stacked; empty when nothing comes within the tolerance. */
  stack: { name: string; thickness: number; count: number }[];
  pieces: number;
  total: number;
  /** The stack less what is wanted, mm. */
  off: number;
  within: boolean;
}

/** Worked out in whole micrometres: finer than any gauge that measures a shim. */
const micro = (mm: number) => Math.round(mm * 1000);

interface Bundle {
  piece: number;
  count: number;
  size: number;
}

/** Every count up to a piece's own as a sum of bundles of 1, 2, 4 …: each bundle is then in the stack or not. */
function bundled(pieces: readonly ShimPiece[]): Bundle[] {
  return pieces.flatMap(({ thickness, count }, piece) => {
    const bundles: Bundle[] = [];
    for (let left = count, n = 1; left > 0; left -= n, n = Math.min(2 * n, left))
      bundles.push({ piece, count: n, size: n * micro(thickness) });
    return bundles;
  });
}

/**
 * Fewest pieces for every total up to `most` micrometres, exactly: a table over totals, one bundle after the other (0–1
 * knapsack with pieces as the cost). Gives for every total the fewest pieces and, for each bundle, whether it was used.
 */
function fewest(bundles: readonly Bundle[], most: number) {
  const none = 255;
  const pieces = new Uint8Array(most + 1).fill(none);
  pieces[0] = 0;
  const used = bundles.map(({ size, count }) => {
    const marks = new Uint8Array(most + 1);
    for (let total = most; total >= size; total -= 1) {
      const before = pieces[total - size] ?? none;
      if (before !== none && before + count < (pieces[total] ?? none)) {
        pieces[total] = before + count;
        marks[total] = 1;
      }
    }
    return marks;
  });
  return { pieces, used, none };
}

/** The fewest pieces within the tolerance; of those the nearest. Without one, the nearest there is within the limit. */
export function workShimStack(input: z.output<typeof shimStackInput>): Outcome<ShimStackResult> {
  const { tolerance, most, pieces } = input;
  const wanted = micro(input.wanted);
  if (wanted < 1)
    return refused('wanted', 'Thinner than a micrometre.', 'Check the unit of the thickness.');
  const thin = pieces.findIndex((p) => micro(p.thickness) < 1);
  if (thin >= 0)
    return refused(
      `pieces.${thin}`,
      'This piece is thinner than a micrometre.',
      'Measure it again.',
    );
  const bundles = bundled(pieces);
  const all = bundles.reduce((sum, b) => sum + b.size, 0);
  const highest = Math.min(all, Math.max(2 * wanted, wanted + micro(tolerance)));
  const table = fewest(bundles, highest);
  const band = micro(tolerance);
  let best = -1;
  const off = (total: number) => Math.abs(total - wanted);
  const count = (total: number) => table.pieces[total] ?? table.none;
  for (let total = 1; total <= highest; total += 1) {
    if (count(total) > most) continue;
    const within = off(total) <= band;
    const bestWithin = best >= 0 && off(best) <= band;
    const better =
      best < 0 ||
      (within && !bestWithin) ||
      (within === bestWithin &&
        (within
          ? count(total) < count(best) || (count(total) === count(best) && off(total) < off(best))
          : off(total) < off(best)));
    if (better) best = total;
  }
  if (best < 0)
    return refused(
      'pieces',
      'Not even one of these pieces is thin enough.',
      'Add thinner ones: foil, paper, feeler leaves.',
    );
  return { ok: true, result: stackOf(input, bundles, table.used, best) };
}

function stackOf(
  input: z.output<typeof shimStackInput>,
  bundles: readonly Bundle[],
  used: readonly Uint8Array[],
  total: number,
): ShimStackResult {
  const counts = new Map<number, number>();
  let left = total;
  for (let i = bundles.length - 1; i >= 0; i -= 1) {
    const bundle = bundles[i];
    if (!bundle || !used[i]?.[left]) continue;
    counts.set(bundle.piece, (counts.get(bundle.piece) ?? 0) + bundle.count);
    left -= bundle.size;
  }
  const stack = [...counts].flatMap(([piece, count]) => {
    const found = input.pieces[piece];
    return found ? [{ name: found.name, thickness: found.thickness, count }] : [];
  });
  const off = (total - micro(input.wanted)) / 1000;
  return {
    stack: stack.sort((a, b) => b.thickness - a.thickness),
    pieces: stack.reduce((sum, s) => sum + s.count, 0),
    total: total / 1000,
    off,
    within: Math.abs(off) <= input.tolerance + 1e-9,
  };
}

export const shimStackAid = defineAid({
  id: 'shim-stack',
  title: 'Shim and spacer stack',
  what: 'The fewest pieces from what lies about that make a wanted thickness.',
  sources:
    'Exact search over what was measured; no table. Measure every piece once, clean and flat.',
  example: {
    wanted: 0.37,
    pieces: [
      { name: 'feeler leaf', thickness: 0.05 },
      { name: 'feeler leaf', thickness: 0.1 },
      { name: 'playing card', thickness: 0.29, count: 52 },
    ],
  },
  input: shimStackInput,
  work: workShimStack,
});
