import { type Pattern, type Problem } from './problem';

/**
 * Every way of cutting a bar that a packing within `gap` of the relaxation may use: the duals promise no more than a bar costs,
 * and what a pattern leaves of that promise adds up to the gap. Null when there are more than `most` of them.
 */
export function patternsWithin(
  problem: Problem,
  duals: ArrayLike<number>,
  price: (bin: number) => number,
  gap: number,
  most: number,
): Pattern[] | null {
  const found: Pattern[] = [];
  const rated = problem.kinds
    .map(({ size, demand }, kind) => ({ kind, size, demand, value: duals[kind] ?? 0 }))
    .sort((a, b) => b.value / b.size - a.value / a.size || b.size - a.size);
  const reach = (from: number, room: number): number => {
    let [sum, left] = [0, room];
    for (let i = from; i < rated.length && left > 0; i += 1) {
      const r = rated[i];
      if (!r || r.value <= 0) break;
      const take = Math.min(r.demand, left / r.size);
      sum += take * r.value;
      left -= take * r.size;
    }
    return sum;
  };
  let steps = 0;
  const now: Pattern['counts'] = [];
  const walk = (bin: number, i: number, room: number, lack: number): boolean => {
    steps += 1;
    if (found.length > most || steps > 60 * most) return false;
    if (lack > reach(i, room)) return true;
    const r = rated[i];
    if (!r) {
      if (now.length > 0) found.push({ bin, counts: now.map(([kind, n]) => [kind, n]) });
      return true;
    }
    for (let take = Math.min(r.demand, Math.floor(room / r.size)); take >= 0; take -= 1) {
      if (take > 0) now.push([r.kind, take]);
      const whole = walk(bin, i + 1, room - take * r.size, lack - take * r.value);
      if (take > 0) now.pop();
      if (!whole) return false;
    }
    return true;
  };
  const whole = problem.bins.every((bin, at) => walk(at, 0, bin.capacity, price(at) - gap - 1e-7));
  return whole && found.length <= most ? found : null;
}
