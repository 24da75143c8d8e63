import fc from 'fast-check';
import { mendOf } from '../../../shared/plan/advice';
import { type PlanDocument } from '../../../shared/plan/document';
import { createModel } from '../../../shared/plan/model';
import { idOf, planOf, pm } from '../model/plan';

const rounds = process.env.SCANTLING_LONG === '1' ? 2000 : 100;

/** The plan with a mend made. */
const mended = (
  plan: PlanDocument,
  mend: NonNullable<ReturnType<typeof mendOf>>,
): PlanDocument => ({
  ...plan,
  dimensions: plan.dimensions.map((d) => (d.id === mend.dimension.id ? mend.dimension : d)),
});

const only = <T>(map: ReadonlyMap<string, T>): T => {
  const [first] = map.values();
  if (!first) throw new Error('nothing there');
  return first;
};

describe('advice made a change of the draft', () => {
  test('moves a figure to the next mark that is enough, in the units of the plan', () => {
    const plan = planOf(
      [
        { symbol: 'tongue', expression: '6.33 mm' },
        { symbol: 'groove', expression: '6.2 mm', sense: 'inside' },
      ],
      [{ expression: 'tongue <= groove' }],
    );
    const model = createModel(plan);
    const labels = only(model.checks).advice.map(
      (a) => mendOf(model, only(model.checks).id, a)?.label,
    );
    expect(labels.sort()).toEqual(['Make groove 6.4 mm', 'Make tongue 6.2 mm']);
  });

  test('inches move by 64ths', () => {
    const plan: PlanDocument = {
      ...planOf(
        [
          { symbol: 'shelf', expression: '12 1/10 in' },
          { symbol: 'opening', origin: 'taken', expression: '12 in', sense: 'inside' },
        ],
        [{ expression: 'shelf <= opening' }],
      ),
      units: 'in',
    };
    const model = createModel(plan);
    expect(
      only(model.checks).advice.map((a) => mendOf(model, only(model.checks).id, a)?.label ?? null),
    ).toEqual(expect.arrayContaining(['Make shelf 12 in', null]));
  });

  test('a derived dimension gets the difference at its end; a reading is left alone', () => {
    const plan = planOf(
      [
        { symbol: 'opening', origin: 'taken', expression: '300 mm', sense: 'inside' },
        { symbol: 'panel', origin: 'derived', expression: 'opening + 1 mm' },
      ],
      [{ expression: 'panel <= opening - 1 mm' }],
    );
    const model = createModel(plan);
    const check = only(model.checks).id;
    const move = { do: 'move', dimensionId: idOf(1, 1), by: -2 } as const;
    expect(mendOf(model, check, move)).toMatchObject({
      label: 'Make panel 2 mm smaller',
      dimension: { expression: 'opening + 1 mm - 2 mm' },
    });
    expect(mendOf(model, check, { ...move, dimensionId: idOf(1, 0) })).toBeNull();
    expect(mendOf(model, check, { do: 'try' })).toBeNull();
  });

  test('whatever fails holds at its figures once any one mend is made', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 100, max: 90_000 }),
        fc.integer({ min: 1, max: 3000 }),
        fc.constantFrom('mm' as const, 'in' as const),
        fc.constantFrom('a + b <= c', 'c >= 2 * a + b', 'a < b + c', 'a / 2 + b = c within 0.5 mm'),
        (base, off, units, expression) => {
          const plan: PlanDocument = {
            ...planOf(
              [
                { symbol: 'a', expression: `${base / 100} mm` },
                { symbol: 'b', expression: `${off / 50} mm` },
                { symbol: 'c', expression: `${base / 150} mm` },
              ],
              [{ expression }],
            ),
            units,
          };
          const model = createModel(plan);
          const state = only(model.checks);
          for (const advice of state.verdict === 'fails' ? state.advice : []) {
            const mend = mendOf(model, state.id, advice);
            // Only a mark that is coarser than the band can step over it.
            if (!mend && !expression.includes('within')) throw new Error('nothing offered');
            if (!mend) continue;
            expect([mend.label, only(createModel(mended(plan, mend)).checks).verdict]).not.toEqual([
              mend.label,
              'fails',
            ]);
          }
        },
      ),
      { numRuns: rounds },
    );
  });

  test('what is at risk holds once a tolerance is held as advised', () => {
    fc.assert(
      fc.property(fc.integer({ min: 5, max: 60 }), fc.integer({ min: 5, max: 60 }), (p, q) => {
        const plan = planOf(
          [
            { symbol: 'tongue', expression: '6 mm', tolerance: pm(String(p / 100)) },
            { symbol: 'groove', expression: '6.3 mm', tolerance: pm(String(q / 100)) },
          ],
          [{ expression: 'tongue < groove' }],
        );
        const model = createModel(plan);
        const state = only(model.checks);
        if (state.verdict !== 'at-risk') return;
        for (const advice of state.advice) {
          const mend = mendOf(model, state.id, advice);
          // Nothing can be set tighter than a hundredth.
          if (advice.do === 'hold' && advice.tolerance > 0.0101) expect(mend).not.toBeNull();
          if (mend) expect(only(createModel(mended(plan, mend)).checks).verdict).toBe('holds');
        }
      }),
      { numRuns: rounds },
    );
  });
});
