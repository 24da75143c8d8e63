import { kindLimit, Relaxation } from './columns';
import { dive } from './dive';
import { quickPacking, wholeOf } from './heuristics';
import { answerOf } from './saw';
import { betterThan, missingOf, type Packing, type Problem, problemOf } from './problem';
import { type BarAnswer, type BarJob, type BarOptions } from './types';

/** All the length there is to cut, at the best rate on sale, free bars first: a bound without any programme. */
function lengthBound(problem: Problem): number {
  let rest = problem.kinds.reduce((sum, kind) => sum + kind.size * kind.demand, 0);
  const rate = (bin: Problem['bins'][number]) => bin.cost / bin.capacity;
  let cost = 0;
  for (const bin of [...problem.bins].sort((a, b) => rate(a) - rate(b))) {
    const used = Math.min(rest, bin.capacity * bin.quantity);
    cost += used * rate(bin);
    rest -= used;
  }
  return Math.ceil(cost / problem.grain - 1e-9 * (1 + cost / problem.grain)) * problem.grain;
}

const mostDives = 60;

/** Turns tried one after another: none, then each early depth with the second and third choice. */
const turnOf = (n: number) =>
  n === 0 ? { at: -1, choice: 0 } : { at: Math.floor((n - 1) / 2), choice: 1 + ((n - 1) % 2) };

function faultOf(job: BarJob): string | null {
  const whole = (n: number) => Number.isSafeInteger(n) && n >= 0;
  if (!whole(job.kerf)) return 'The kerf must be a whole number of units, 0 or more.';
  if (!whole(job.trim.start) || !whole(job.trim.end)) return 'The trim must be 0 or more.';
  if (job.stock.some((s) => !whole(s.length) || (s.quantity !== null && !whole(s.quantity))))
    return 'A length of stock must be above 0.';
  if (job.items.some((i) => !whole(i.length) || i.length === 0 || !whole(i.quantity)))
    return 'A length to cut must be above 0.';
  return null;
}

/**
 * Lays pieces out on bars: every piece that fits, at the least cost found, with what nobody can do better than.
 * The same job and effort give the same answer. Throws a RangeError on lengths that are none.
 */
export function solveBars(job: BarJob, options: BarOptions = {}): BarAnswer {
  const fault = faultOf(job);
  if (fault) throw new RangeError(fault);
  const problem = problemOf(job);
  const whole = wholeOf(problem);
  let best: Packing = quickPacking(problem, whole);
  let bound = lengthBound(problem);
  const done = () => missingOf(best) === 0 && best.cost <= bound;
  const tell = () => options.onBetter?.(answerOf(job, problem, best, bound));
  if (done() || problem.kinds.length > kindLimit || options.effort === 0)
    return answerOf(job, problem, best, bound);
  tell();
  const relaxation = new Relaxation(problem, whole);
  for (const { pattern } of best.patterns) relaxation.add(pattern);
  if (!relaxation.solve(whole)) return answerOf(job, problem, best, bound);
  bound = Math.max(bound, relaxation.bound());
  const root = relaxation.save();
  const effort = 1e6 * (options.effort ?? 1500);
  const may = () => relaxation.work() < effort && !options.stop?.();
  for (let n = 0; n < mostDives && !done() && may(); n += 1) {
    relaxation.restore(root);
    if (n === 1) relaxation.close(bound, 1500);
    if (n === 3 && !relaxation.closed) relaxation.close(bound, 6000);
    const found = dive(problem, relaxation, whole, turnOf(n), best, may);
    if (!found || !betterThan(found, best)) continue;
    best = found;
    tell();
  }
  return answerOf(job, problem, best, bound);
}
