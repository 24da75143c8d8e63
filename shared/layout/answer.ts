import { type Problem } from './problem';
import { sawSheet } from './saw';
import { dealer, planOf, type Snapshot } from './snapshot';
import { type Answer, type Job, type LaidSheet, type Unplaced } from './types';

/** A snapshot as an answer in the job's units, every sheet with its cuts. The least used sheet comes last. */
export function answerOf(job: Job, problem: Problem, shot: Snapshot, bound: number): Answer {
  const deal = dealer(problem);
  const order = shot.bins.map((_, i) => i);
  const share = (i: number) => shot.heights[i]! / problem.binH[shot.bins[i]!]!;
  order.sort((a, b) => share(b) - share(a) || a - b);
  const last = order[order.length - 1];
  const sheets = order.map((i): LaidSheet => {
    const bin = shot.bins[i]!;
    const plan = planOf(problem, job.kerf, shot.trees[i]!, deal);
    const strip = i === last && job.options?.offcut !== false;
    const laid = sawSheet(plan, bin, job.sheets[bin]!, job.kerf, job.options, strip);
    if (laid === null) throw new Error('A sheet was laid out that the machine cannot cut.');
    return laid;
  });
  const unplaced = unplacedOf(job, problem, sheets);
  const whole = unplaced.every((missing) => missing.why === 'too-big');
  const lowerBound = whole ? Math.min(bound, shot.cost) : bound;
  const { objective } = problem;
  return {
    sheets,
    cost: shot.cost,
    objective,
    lowerBound,
    proven: whole && bound >= shot.cost,
    unplaced,
  };
}

function unplacedOf(job: Job, problem: Problem, sheets: LaidSheet[]): Unplaced[] {
  const left = job.items.map((item) => Math.max(0, item.qty));
  for (const laid of sheets) for (const p of laid.placements) left[p.item]!--;
  const big = new Set(problem.tooBig.map((missing) => missing.item));
  const machine = new Set(problem.refused);
  return left.flatMap((qty, item): Unplaced[] =>
    qty === 0
      ? []
      : [
          {
            item,
            qty,
            why: big.has(item) ? 'too-big' : machine.has(item) ? 'machine' : 'stock-used-up',
          },
        ],
  );
}
