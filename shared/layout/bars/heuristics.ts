import { Knapsack } from './knapsack';
import { betterThan, type Packing, type Pattern, type Problem } from './problem';

/** What is still to be cut and what is still there. */
export interface Rest {
  demand: number[];
  bins: number[];
}

export const wholeOf = (problem: Problem): Rest => ({
  demand: problem.kinds.map((kind) => kind.demand),
  bins: problem.bins.map((bin) => bin.quantity),
});

type FillRule = (rest: Rest) => Pattern[];

/** The largest that still goes on, as often as it goes: first fit decreasing, bar by bar. */
const largestFirst =
  (problem: Problem): FillRule =>
  ({ demand }) =>
    problem.bins.map((bin, at) => {
      let room = bin.capacity;
      const counts: Pattern['counts'] = [];
      problem.kinds.forEach(({ size }, kind) => {
        const take = Math.min(demand[kind] ?? 0, Math.floor(room / size));
        if (take <= 0) return;
        counts.push([kind, take]);
        room -= take * size;
      });
      return { bin: at, counts };
    });

/** The largest piece left, and beside it what fills the bar best. */
function fullest(problem: Problem): FillRule {
  const sizes = problem.kinds.map((kind) => kind.size);
  return ({ demand }) =>
    problem.bins.map((bin, at) => {
      const first = problem.kinds.findIndex(
        ({ size }, kind) => (demand[kind] ?? 0) > 0 && size <= bin.capacity,
      );
      const size = sizes[first];
      if (size === undefined) return { bin: at, counts: [] };
      const left = demand.map((count, kind) => (kind === first ? count - 1 : count));
      const sack = new Knapsack(sizes, [bin.capacity - size], 3000);
      const counts = new Map(sack.fill(sizes, left).fills[0]?.counts ?? []);
      counts.set(first, (counts.get(first) ?? 0) + 1);
      return { bin: at, counts: [...counts].sort((a, b) => a[0] - b[0]) };
    });
}

const lengthIn = (problem: Problem, pattern: Pattern): number =>
  pattern.counts.reduce((sum, [kind, n]) => sum + n * (problem.kinds[kind]?.size ?? 0), 0);

/** The bar that costs least for the length cut from it; where one takes all that is left, the cheapest such. */
function choose(problem: Problem, rest: Rest, patterns: Pattern[]): Pattern | null {
  const whole = rest.demand.reduce((sum, n, kind) => sum + n * (problem.kinds[kind]?.size ?? 0), 0);
  let best: { pattern: Pattern; ends: boolean; rate: number } | null = null;
  for (const pattern of patterns) {
    const used = lengthIn(problem, pattern);
    if (used === 0 || (rest.bins[pattern.bin] ?? 0) <= 0) continue;
    const cost = problem.bins[pattern.bin]?.cost ?? 0;
    const ends = used === whole;
    const rate = ends ? cost : cost / used;
    if (!best || (ends && !best.ends) || (ends === best.ends && rate < best.rate))
      best = { pattern, ends, rate };
  }
  return best?.pattern ?? null;
}

/** Takes a pattern off what is left, `times` times. */
export function take(rest: Rest, pattern: Pattern, times: number): void {
  for (const [kind, count] of pattern.counts)
    rest.demand[kind] = Math.max(0, (rest.demand[kind] ?? 0) - count * times);
  rest.bins[pattern.bin] = (rest.bins[pattern.bin] ?? 0) - times;
}

function barByBar(problem: Problem, start: Rest, rule: FillRule): Packing {
  const rest = { demand: [...start.demand], bins: [...start.bins] };
  const packing: Packing = { patterns: [], cost: 0, missing: [] };
  for (;;) {
    const pattern = choose(problem, rest, rule(rest));
    if (!pattern) break;
    const often = pattern.counts.map(([kind, n]) => Math.floor((rest.demand[kind] ?? 0) / n));
    const times = Math.max(1, Math.min(rest.bins[pattern.bin] ?? 0, ...often));
    take(rest, pattern, times);
    packing.patterns.push({ pattern, times });
    packing.cost += times * (problem.bins[pattern.bin]?.cost ?? 0);
  }
  packing.missing = rest.demand;
  return packing;
}

/** Whatever is left, packed by simple rules; the better of two. */
export function quickPacking(problem: Problem, rest: Rest, thorough = true): Packing {
  const simple = barByBar(problem, rest, largestFirst(problem));
  if (!thorough) return simple;
  const full = barByBar(problem, rest, fullest(problem));
  return betterThan(full, simple) ? full : simple;
}
