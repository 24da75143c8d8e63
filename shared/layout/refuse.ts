import { type Problem } from './problem';
import { sawSheet } from './saw';
import { type Job } from './types';

/** Strikes out the ways in which the machine could not even cut a kind alone; kinds with none left are given up. */
export function refuse(job: Job, problem: Problem): void {
  for (let t = 0; t < problem.kinds; t++) {
    let left = 0;
    const [w, h] = [
      problem.w[t]! * problem.unit - job.kerf,
      problem.h[t]! * problem.unit - job.kerf,
    ];
    for (let b = 0; b < problem.bins; b++) {
      const at = t * problem.bins + b;
      for (const way of [1, 2]) {
        if ((problem.fits[at]! & way) === 0) continue;
        const plan = { w: way === 1 ? w : h, h: way === 1 ? h : w, item: 0 };
        if (sawSheet(plan, b, job.sheets[b]!, job.kerf, job.options) === null)
          problem.fits[at]! &= ~way;
      }
      left |= problem.fits[at]!;
    }
    if (left !== 0) continue;
    problem.demand[t] = 0;
    problem.refused.push(...problem.members[t]!.map((member) => member.item));
  }
}
