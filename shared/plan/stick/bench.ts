import { stickFigures } from './figures';
import { type StickSpan, type StickWait } from './layout';

interface Stretch {
  from: number;
  to: number;
}

const middle = (s: Stretch) => (s.from + s.to) / 2;
const room = (s: Stretch) => s.to - s.from;

/** How far a break's zigzag reaches beyond its gap. */
const zigzag = 5;

/**
 * Where a step's number stands inside its stretch of the bench stick, px along; null leaves it out.
 * It keeps clear of a break and 12 px from the pointer, and wants 15 px of room.
 */
export function benchNumberAt(
  span: StickSpan,
  pointer: number | null,
  waits: readonly StickWait[] = [],
): number | null {
  if (room(span) < stickFigures.benchNumberRoom) return null;
  const clear = roomiest(freeOfBreaks(span, waits));
  if (pointer === null || Math.abs(pointer - middle(clear)) >= stickFigures.benchPointerApart) {
    return room(clear) >= stickFigures.benchNumberRoom ? middle(clear) : null;
  }
  const half = stickFigures.benchNumberRoom / 2;
  const apart = stickFigures.benchPointerApart;
  // Places for the number's middle, not its edges.
  const below = { from: Math.max(pointer + apart, clear.from + half), to: clear.to - half };
  const above = { from: clear.from + half, to: Math.min(pointer - apart, clear.to - half) };
  const aside = room(below) >= room(above) ? below : above;
  return room(aside) >= 0 ? middle(aside) : null;
}

/** What a stretch's breaks leave of it. */
function freeOfBreaks(span: Stretch, waits: readonly StickWait[]): Stretch[] {
  const inside = waits
    .filter((w) => w.at > span.from && w.at < span.to)
    .sort((a, b) => a.at - b.at);
  const free: Stretch[] = [];
  let from = span.from;
  for (const w of inside) {
    free.push({ from, to: w.at - zigzag });
    from = w.at + stickFigures.waitGap + zigzag;
  }
  return [...free, { from, to: span.to }];
}

const roomiest = (stretches: Stretch[]): Stretch =>
  stretches.reduce(
    (best, s) => (room(s) > room(best) ? s : best),
    stretches[0] ?? { from: 0, to: 0 },
  );
