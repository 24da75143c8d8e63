import { type PlanDocument } from '../../shared/plan/document';
import { createModel } from '../../shared/plan/model';
import { checkSheet } from '../../shared/plan/sheet';
import { benchPlan } from './model-plan';
import { conditions, report, table } from './write-section';

/** Median of `rounds` runs in ms, after some to warm up. */
function median(rounds: number, run: (round: number) => void): number {
  for (let i = 0; i < 5; i += 1) run(i);
  const times = Array.from({ length: rounds }, (_, i) => {
    const start = performance.now();
    run(i + 5);
    return performance.now() - start;
  });
  return times.sort((a, b) => a - b)[Math.floor(rounds / 2)] ?? 0;
}

/** The plan as after one key more in the first dimension's expression. */
function typed(plan: PlanDocument, at: number, round: number): PlanDocument {
  const dimensions = plan.dimensions.slice();
  const old = dimensions[at];
  if (old) dimensions[at] = { ...old, expression: `${30 + (round % 60)}.${round % 10} mm` };
  return { ...plan, dimensions };
}

const ms = (x: number) => x.toFixed(2);

function main(): void {
  const plan = benchPlan(1000);
  // Every round has other figures, so that no expression was seen before.
  const fresh = Array.from({ length: 46 }, (_, i) => benchPlan(1000, i + 2));
  const evaluation = median(41, (round) => createModel(fresh[round] ?? plan));
  const again = Array.from({ length: 46 }, (_, i) => benchPlan(1000, i + 50));
  const sheet = median(41, (round) => {
    const one = again[round] ?? plan;
    checkSheet(one, createModel(one));
  });
  let model = createModel(plan);
  const key = median(201, (round) => {
    model = model.update(typed(model.document, 500, round));
  });
  const widest = median(41, (round) => {
    model = model.update(typed(model.document, 0, round));
  });
  const main = table(
    ['1,000 dimensions, 500 parts, 200 steps, 300 checks', 'median, ms', 'at most, ms'],
    [
      ['full evaluation', ms(evaluation), ''],
      ['full evaluation with the check sheet', ms(sheet), 50],
      ['one key in one dimension', ms(key), 4],
      ['one key in the first dimension', ms(widest), 4],
    ],
  );
  const sizes = [100, 300, 1000, 3000, 10_000];
  const grown = sizes.map((n) => {
    const rounds = n > 5000 ? 5 : 15;
    const plans = Array.from({ length: rounds + 5 }, (_, i) => benchPlan(n, i + 100));
    return { n, t: median(rounds, (round) => createModel(plans[round] ?? plan)) };
  });
  const base = grown[0];
  const rows = grown.map(({ n, t }) => {
    const fair = base ? (base.t * n * Math.log(n)) / (base.n * Math.log(base.n)) : 0;
    return [n, ms(t), ((t / n) * 1000).toFixed(2), (t / fair).toFixed(2)];
  });
  report(
    'model',
    `## The measured model\n\n\`npm run bench:model\`: a plan with given, taken and derived dimensions, one in ten bent, worked out from its document.\n\n${main}\n\nGrowth; below 1 in the last column is slower growth than n log n from 100.\n\n${table(['dimensions', 'full, ms', 'µs per dimension', 'against n log n'], rows)}\n\n${conditions()}`,
  );
}

main();
