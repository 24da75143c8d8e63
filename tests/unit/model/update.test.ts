import fc from 'fast-check';
import { type PlanDocument } from '../../../shared/plan/document';
import { createModel, type PlanModel } from '../../../shared/plan/model';
import { benchPlan } from '../../bench/model-plan';

/** What a model says, without object identities. */
const said = (model: PlanModel) => ({
  dimensions: [...model.dimensions.values()].map((d) => [
    d.id,
    d.value?.x,
    d.value?.worst,
    d.value?.rss,
    d.error?.code,
  ]),
  checks: [...model.checks.values()].map((c) => [c.id, c.verdict, c.worstMargin, c.error?.code]),
  parts: [...model.parts.values()].map((p) => [
    p.id,
    p.width.value?.x,
    p.thickness.value?.x,
    p.width.error?.code,
  ]),
});

const texts = [
  '10 mm',
  'd1 + d5',
  'd7 * 2',
  'd20 - d3',
  'oops',
  '3/0',
  'd12',
  '(',
  'made(d2) + 1 in',
  'hypot(d4, d6)',
];
const edit = fc.record({
  at: fc.nat({ max: 39 }),
  what: fc.constantFrom(
    'expression' as const,
    'symbol' as const,
    'remove' as const,
    'kind' as const,
  ),
  n: fc.nat({ max: texts.length - 1 }),
});

function apply(
  plan: PlanDocument,
  { at, what, n }: { at: number; what: string; n: number },
): PlanDocument {
  const dimensions = plan.dimensions.slice();
  const old = dimensions[at % Math.max(1, dimensions.length)];
  if (!old) return plan;
  const i = dimensions.indexOf(old);
  if (what === 'remove') dimensions.splice(i, 1);
  else if (what === 'symbol') dimensions[i] = { ...old, symbol: `d${n * 7}` };
  else if (what === 'kind') dimensions[i] = { ...old, kind: n % 2 ? 'angle' : 'length' };
  else dimensions[i] = { ...old, origin: 'derived', expression: texts[n] ?? '' };
  return { ...plan, dimensions };
}

test('after any row of edits the updated model says what a fresh one says', () => {
  fc.assert(
    fc.property(fc.array(edit, { minLength: 1, maxLength: 12 }), (edits) => {
      let plan = benchPlan(40);
      let model = createModel(plan);
      for (const one of edits) {
        plan = apply(plan, one);
        model = model.update(plan);
        expect(said(model)).toEqual(said(createModel(plan)));
      }
    }),
    { numRuns: process.env.SCANTLING_LONG ? 500 : 40 },
  );
});
