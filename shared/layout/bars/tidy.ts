import { type Packing, type Problem } from './problem';

interface Board {
  bin: number;
  pieces: number[];
  room: number;
}

/** Bars one by one, with pieces the patterns cut too many left off. */
export function boardsOf(problem: Problem, packing: Packing): Board[] {
  const left = problem.kinds.map((kind, i) => kind.demand - (packing.missing[i] ?? 0));
  const boards: Board[] = [];
  for (const { pattern, times } of packing.patterns)
    for (let n = 0; n < times; n += 1) {
      const pieces: number[] = [];
      let room = problem.bins[pattern.bin]?.capacity ?? 0;
      for (const [kind, count] of pattern.counts)
        for (let c = 0; c < count && (left[kind] ?? 0) > 0; c += 1) {
          pieces.push(kind);
          left[kind] = (left[kind] ?? 0) - 1;
          room -= problem.kinds[kind]?.size ?? 0;
        }
      if (pieces.length > 0) boards.push({ bin: pattern.bin, pieces, room });
    }
  return boards;
}

/** What a change of one board's room by `gain` and the other's by `-gain` does to the sum of squares. */
const gainOf = (a: Board, b: Board, gain: number): number =>
  (a.room + gain) ** 2 + (b.room - gain) ** 2 - a.room ** 2 - b.room ** 2;

/** Moves one piece, or swaps two, where that makes one leftover longer at the cost of a shorter one. */
function improve(problem: Problem, from: Board, to: Board): boolean {
  const size = (kind: number | undefined) => problem.kinds[kind ?? -1]?.size ?? 0;
  for (let i = 0; i < from.pieces.length; i += 1) {
    const out = size(from.pieces[i]);
    for (let j = -1; j < to.pieces.length; j += 1) {
      const back = j < 0 ? 0 : size(to.pieces[j]);
      const gain = out - back;
      if (gain <= 0 || gain > to.room || gainOf(from, to, gain) <= 0) continue;
      const [moved] = from.pieces.splice(i, 1);
      const returned = j < 0 ? [] : to.pieces.splice(j, 1);
      if (moved !== undefined) to.pieces.push(moved);
      from.pieces.push(...returned);
      from.room += gain;
      to.room -= gain;
      return true;
    }
  }
  return false;
}

/** Same bars, fewer and longer leftovers: useful offcuts instead of many short ends. */
export function gatherOffcuts(problem: Problem, boards: Board[], rounds = 200): Board[] {
  if (boards.length > 400) return boards;
  for (let round = 0; round < rounds; round += 1) {
    const order = [...boards].sort((a, b) => b.room - a.room);
    const better = order.some((from) =>
      order.some((to) => to !== from && from.room >= to.room && improve(problem, from, to)),
    );
    if (!better) break;
  }
  return boards.filter((board) => board.pieces.length > 0);
}
