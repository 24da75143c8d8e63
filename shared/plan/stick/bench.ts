import { stickFigures } from './figures';
import { type StickSpan } from './layout';

/** Where a step's number stands inside its stretch of the bench stick, px along; null leaves it out. */
export function benchNumberAt(span: StickSpan, pointer: number | null): number | null {
  const room = stickFigures.benchNumberRoom;
  if (span.to - span.from < room) return null;
  const middle = (span.from + span.to) / 2;
  const apart = stickFigures.benchPointerApart;
  if (pointer === null || Math.abs(pointer - middle) >= apart) return middle;
  const below = { from: pointer + apart / 2, to: span.to };
  const above = { from: span.from, to: pointer - apart / 2 };
  const aside = below.to - below.from >= above.to - above.from ? below : above;
  if (aside.to - aside.from < room) return null;
  const moved = (aside.from + aside.to) / 2;
  if (Math.abs(moved - pointer) >= apart) return moved;
  return aside === below
    ? Math.min(pointer + apart, aside.to - room / 2)
    : Math.max(pointer - apart, aside.from + room / 2);
}
