/** How often each kind is taken, and what that is worth. */
export interface Fill {
  value: number;
  counts: [kind: number, count: number][];
}

interface Taken {
  kind: number;
  count: number;
  size: number;
  value: number;
}

/** Bounded kinds as single pieces of 1, 2, 4 … of them. */
function split(
  values: ArrayLike<number>,
  sizes: readonly number[],
  limits: ArrayLike<number>,
  capacity: number,
): Taken[] {
  const pieces: Taken[] = [];
  sizes.forEach((size, kind) => {
    const value = values[kind] ?? 0;
    if (value <= 0) return;
    let rest = Math.min(limits[kind] ?? 0, Math.floor(capacity / size));
    for (let count = 1; rest > 0; count *= 2) {
      const take = Math.min(count, rest);
      pieces.push({ kind, count: take, size: take * size, value: take * value });
      rest -= take;
    }
  });
  return pieces;
}

/** Rooms a table may have before branching takes over. */
const roomLimit = 400_000;

/**
 * The most valuable filling of bars of several capacities with bounded kinds: a table over the capacity where it is
 * small enough, else branching by value per length. Exact, unless branching runs out of its nodes (`exact` false, and
 * then `value` is at least the true one while `counts` may be worth less).
 */
export class Knapsack {
  private best = new Float64Array(0);
  private taken = new Uint8Array(0);
  constructor(
    private readonly sizes: readonly number[],
    private readonly capacities: readonly number[],
    private readonly nodes = 200_000,
  ) {}

  fill(values: ArrayLike<number>, limits: ArrayLike<number>): { fills: Fill[]; exact: boolean } {
    const top = Math.max(0, ...this.capacities);
    const pieces = split(values, this.sizes, limits, top);
    if (pieces.length * (top + 1) <= roomLimit)
      return { fills: this.table(pieces, top), exact: true };
    let exact = true;
    const fills = this.capacities.map((capacity) => {
      const found = branch(values, this.sizes, limits, capacity, this.nodes);
      exact &&= found.exact;
      return found;
    });
    if (exact || pieces.length * (top + 1) > 40 * roomLimit) return { fills, exact };
    return { fills: this.table(pieces, top), exact: true };
  }

  private table(pieces: readonly Taken[], top: number): Fill[] {
    const wide = top + 1;
    if (this.best.length < wide) this.best = new Float64Array(wide);
    if (this.taken.length < wide * pieces.length) this.taken = new Uint8Array(wide * pieces.length);
    const { best, taken } = this;
    best.fill(0, 0, wide);
    taken.fill(0, 0, wide * pieces.length);
    pieces.forEach(({ size, value }, row) => {
      const offset = row * wide;
      for (let room = top; room >= size; room -= 1) {
        const now = (best[room - size] ?? 0) + value;
        if (now > (best[room] ?? 0)) {
          best[room] = now;
          taken[offset + room] = 1;
        }
      }
    });
    return this.capacities.map((capacity) => {
      const counts = new Map<number, number>();
      let room = capacity;
      for (let row = pieces.length - 1; row >= 0; row -= 1) {
        const piece = pieces[row];
        if (!piece || taken[row * wide + room] === 0) continue;
        counts.set(piece.kind, (counts.get(piece.kind) ?? 0) + piece.count);
        room -= piece.size;
      }
      return { value: best[capacity] ?? 0, counts: [...counts] };
    });
  }
}

interface Rated {
  kind: number;
  size: number;
  value: number;
  limit: number;
}

/** Depth first over kinds by value per length, cut off by what the rest of the length could be worth. */
function branch(
  values: ArrayLike<number>,
  sizes: readonly number[],
  limits: ArrayLike<number>,
  capacity: number,
  nodeLimit: number,
): Fill & { exact: boolean } {
  const rated: Rated[] = sizes
    .map((size, kind) => ({ kind, size, value: values[kind] ?? 0, limit: limits[kind] ?? 0 }))
    .filter((r) => r.value > 0 && r.limit > 0 && r.size <= capacity)
    .sort((a, b) => b.value / b.size - a.value / a.size || b.size - a.size);
  const smallest = rated.map(() => Infinity);
  for (let i = rated.length - 1; i >= 0; i -= 1)
    smallest[i] = Math.min(rated[i]?.size ?? Infinity, smallest[i + 1] ?? Infinity);
  const now: number[] = rated.map(() => 0);
  let [best, bestCounts, nodes] = [0, [...now], 0];
  const most = (from: number, room: number): number => {
    let [sum, left] = [0, room];
    for (let i = from; i < rated.length && left > 0; i += 1) {
      const r = rated[i];
      if (!r) break;
      const take = Math.min(r.limit, left / r.size);
      sum += take * r.value;
      left -= take * r.size;
    }
    return sum;
  };
  const walk = (i: number, room: number, value: number): void => {
    nodes += 1;
    if (value > best) [best, bestCounts] = [value, [...now]];
    const r = rated[i];
    if (!r || room < (smallest[i] ?? 0) || nodes > nodeLimit) return;
    if (value + most(i, room) <= best * (1 + 1e-12)) return;
    for (let take = Math.min(r.limit, Math.floor(room / r.size)); take >= 0; take -= 1) {
      now[i] = take;
      walk(i + 1, room - take * r.size, value + take * r.value);
    }
    now[i] = 0;
  };
  walk(0, capacity, 0);
  const exact = nodes <= nodeLimit;
  const counts = rated.flatMap(({ kind }, i): [number, number][] => {
    const count = bestCounts[i] ?? 0;
    return count > 0 ? [[kind, count]] : [];
  });
  return { value: exact ? best : most(0, capacity), counts, exact };
}
