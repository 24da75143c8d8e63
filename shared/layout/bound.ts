import { type Dual, dualsOf } from './dual';
import { type Problem } from './problem';

/** Work a bound may take: pairs of functions × kinds. */
const work = 3e6;

interface Pair {
  fx: Dual;
  fy: Dual;
}

/** Least a kind takes up under a pair, whichever way it may lie; with the mean of both ways where sheets are square. */
function loadOf(problem: Problem, { fx, fy }: Pair, square: boolean, ways: Uint8Array): number {
  const { kinds, demand } = problem;
  // The second half of the images belongs to the heights.
  let load = 0;
  for (let t = 0; t < kinds; t++) {
    const straight = fx.of[t]! * fy.of[kinds + t]!;
    const across = fx.of[kinds + t]! * fy.of[t]!;
    const way = ways[t]!;
    load +=
      demand[t]! *
      (square
        ? (straight + across) / 2
        : way === 1
          ? straight
          : way === 2
            ? across
            : Math.min(straight, across));
  }
  return load;
}

/** Least cost of sheets with that much room in all; limited stock by the best ratio first, part of a sheet counted in part. */
function coverCost(problem: Problem, room: Float64Array, load: number): number {
  const order = Array.from({ length: problem.bins }, (_, b) => b)
    .filter((b) => room[b]! > 0 && problem.qty[b]! > 0)
    .sort((a, b) => problem.cost[a]! / room[a]! - problem.cost[b]! / room[b]!);
  let [left, cost] = [load * (1 - 1e-12), 0];
  for (const b of order) {
    const count = Math.min(problem.qty[b]!, left / room[b]!);
    cost += count * problem.cost[b]!;
    left -= count * room[b]!;
    if (left <= 0) break;
  }
  return cost;
}

const gcd = (a: number, b: number): number => (b === 0 ? a : gcd(b, a % b));

/** The least sum of sheet costs that is not below `cost`: 0 sheets at least, limited stock kept. */
export function attainable(problem: Problem, cost: number): number {
  const unit = problem.cost.reduce(gcd, 0);
  if (unit === 0) return 0;
  const from = Math.ceil(cost / unit - 1e-7);
  const largest = Math.max(...problem.cost) / unit;
  const size = from + largest + 1;
  if (problem.bins < 2 || size > 2e6) return from * unit;
  // Fewest sheets of the last bin used, as long as its stock lasts.
  const reach = new Uint8Array(size);
  reach[0] = 1;
  for (let b = 0; b < problem.bins; b++) {
    const step = problem.cost[b]! / unit;
    if (step === 0 || problem.qty[b]! === 0) continue;
    const used = new Int32Array(size);
    for (let c = step; c < size; c++)
      if (reach[c] === 0 && reach[c - step] === 1 && used[c - step]! < problem.qty[b]!) {
        reach[c] = 1;
        used[c] = used[c - step]! + 1;
      }
  }
  for (let c = from; c < size; c++) if (reach[c] === 1) return c * unit;
  return from * unit;
}

function waysByKind(problem: Problem): Uint8Array {
  const ways = new Uint8Array(problem.kinds);
  for (let t = 0; t < problem.kinds; t++)
    for (let b = 0; b < problem.bins; b++)
      if (problem.qty[b]! > 0) ways[t]! |= problem.fits[t * problem.bins + b]!;
  return ways;
}

/** A cost nobody can be below, for the parts that fit; by dual feasible functions in both directions. */
export function lowerBound(problem: Problem): number {
  const { kinds, bins, w, h, binW, binH } = problem;
  if (kinds === 0) return 0;
  const both = new Int32Array(2 * kinds);
  both.set(w);
  both.set(h, kinds);
  const most = Math.max(4, Math.min(60, Math.floor(Math.sqrt(work / kinds) / 2.5)));
  const [W, H] = [Math.max(...binW), Math.max(...binH)];
  const square = bins === 1 && W === H;
  const ways = waysByKind(problem);
  const turns = ways.some((way) => way !== 1);
  const inX = turns ? both : Int32Array.from([...w, ...w]);
  const inY = turns ? both : Int32Array.from([...h, ...h]);
  const xs = dualsOf({ parts: inX, sheets: binW, whole: W }, most);
  const ys = dualsOf({ parts: inY, sheets: binH, whole: H }, most);
  let best = 0;
  const room = new Float64Array(bins);
  const allTurn = square && ways.every((way) => way === 3);
  for (const fx of xs)
    for (const fy of ys) {
      for (let b = 0; b < bins; b++) room[b] = fx.room[b]! * fy.room[b]!;
      const load = loadOf(problem, { fx, fy }, allTurn, ways);
      best = Math.max(best, coverCost(problem, room, load));
    }
  return attainable(problem, best);
}
