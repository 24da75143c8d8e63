import fc from 'fast-check';
import { builtDemoPlans } from '../../../server/demo';
import { compareRevisions, type Change } from '../../../shared/plan/compare';
import { movedIds } from '../../../shared/plan/compare/order';
import { planDocumentSchema, type PlanDocument } from '../../../shared/plan/document';
import { renameSymbol } from '../../../shared/plan/rename';
import { planOf, pm, idOf } from '../model/plan';

const runs = (n: number) => ({ numRuns: process.env.SCANTLING_LONG ? n * 20 : n });
const demo = builtDemoPlans().map((d) => planDocumentSchema.parse(d.built.document));
const loud = (changes: Change[]) =>
  changes.filter((c) => c.fields.some((f) => !f.quiet) || c.figures.length);
const keys = (changes: Change[]) => changes.map((c) => `${c.how} ${c.key}`);

describe('revisions compared by meaning', () => {
  it.each(demo.map((d) => [d.title, d] as const))(
    'finds nothing between %s and itself',
    (_, plan) => {
      expect(compareRevisions(plan, plan).changes).toEqual([]);
      expect(compareRevisions(plan, structuredClone(plan)).changes).toEqual([]);
    },
  );

  it.each(demo.map((d) => [d.title, d] as const))(
    'is silent on the order of lists, on spelling and on a new symbol in %s',
    (_, plan) => {
      const spelt = (e: string) => (/^[\d"]/.test(e) ? e : `( ${e} )`);
      const turned: PlanDocument = {
        ...plan,
        dimensions: [...plan.dimensions]
          .reverse()
          .map((d) => ({ ...d, expression: spelt(d.expression) })),
        parts: [...plan.parts].reverse(),
        checks: [...plan.checks].reverse(),
        steps: plan.steps.map((s) => ({ ...s, holds: [...s.holds].reverse() })),
      };
      expect(compareRevisions(plan, turned).changes).toEqual([]);
      const symbol = plan.dimensions[0]?.symbol ?? '';
      const renamed = renameSymbol(plan, symbol, 'quite_another');
      const { changes } = compareRevisions(plan, renamed);
      expect(keys(changes)).toEqual([`changed dimension/${plan.dimensions[0]?.id ?? ''}`]);
      expect(loud(changes)).toEqual([]);
    },
  );

  it('says 3/4 in and 19.05 mm are one figure (1 in = 25.4 mm exactly, ISO 80000-3 / the 1959 inch)', () => {
    const a = planOf([{ symbol: 'a', expression: '3/4 in', tolerance: pm('1/64 in') }]);
    const b = planOf([{ symbol: 'a', expression: '19.05 mm', tolerance: pm('0.396875 mm') }]);
    expect(compareRevisions(a, b).changes).toEqual([]);
  });

  it('lists what follows with where it comes from, and a check that turns over', () => {
    const rows = (panel: string) =>
      planOf(
        [
          { symbol: 'panel', expression: panel },
          { symbol: 'inner', origin: 'derived', expression: 'panel - 36 mm' },
          { symbol: 'other', expression: '40 mm' },
        ],
        [{ expression: 'inner < 270 mm' }],
        [{ length: 'inner', width: 'other' }],
      );
    const { changes } = compareRevisions(rows('300 mm'), rows('310 mm'));
    expect(keys(changes)).toEqual([
      `changed dimension/${idOf(1, 0)}`,
      `follows dimension/${idOf(1, 1)}`,
      `follows part/${idOf(3, 0)}`,
      `follows check/${idOf(2, 0)}`,
    ]);
    for (const c of changes.slice(1)) expect(c.because).toEqual([`dimension/${idOf(1, 0)}`]);
    expect(changes[2]?.figures).toEqual([
      {
        of: 'length',
        before: expect.objectContaining({ x: 264 }) as unknown,
        after: expect.objectContaining({ x: 274 }) as unknown,
      },
    ]);
    expect(changes[3]?.verdict).toEqual({ before: 'holds', after: 'fails' });
  });

  it('marks what bears on fingers', () => {
    const plan = demo[0]!;
    const at = plan.steps.findIndex((s) => s.actions.some((a) => a.do === 'cut'));
    const step = plan.steps[at]!;
    const id = idOf(7, 1);
    const with_ = (change: Partial<typeof step>) => ({
      ...plan,
      steps: plan.steps.map((s, i) => (i === at ? { ...s, ...change } : s)),
    });
    const caution = { id, text: 'Stand clear of the line of the blade.', level: 'danger' as const };
    expect(
      compareRevisions(plan, with_({ cautions: [...step.cautions, caution] })).changes,
    ).toMatchObject([{ key: `caution/${id}`, how: 'added', stepId: step.id, safety: true }]);
    const actions = step.actions.map((a) =>
      a.do === 'cut' ? { ...a, exitStop: 'a block, glued' } : a,
    );
    expect(compareRevisions(plan, with_({ actions })).changes.every((c) => c.safety)).toBe(true);
    expect(compareRevisions(plan, with_({ title: 'Another title' })).changes).toMatchObject([
      { key: `step/${step.id}`, safety: false },
    ]);
  });
});

/** The longest increasing subsequence by trying every subset: right by construction, slow. */
function longestKept(places: number[]): number {
  let best = 0;
  for (let mask = 0; mask < 1 << places.length; mask += 1) {
    const kept = places.filter((_, i) => mask & (1 << i));
    if (kept.every((p, i) => i === 0 || p > (kept[i - 1] ?? 0))) best = Math.max(best, kept.length);
  }
  return best;
}

it('moves the fewest steps there are', () => {
  fc.assert(
    fc.property(
      fc.shuffledSubarray(['a', 'b', 'c', 'd', 'e', 'f', 'g'], { minLength: 0 }),
      fc.shuffledSubarray(['a', 'b', 'c', 'd', 'e', 'f', 'g'], { minLength: 0 }),
      (before, after) => {
        const moved = movedIds(before, after);
        const shared = after.filter((id) => before.includes(id));
        expect(moved.size).toBe(
          shared.length - longestKept(shared.map((id) => before.indexOf(id))),
        );
        const still = (list: string[]) =>
          list.filter((id) => shared.includes(id) && !moved.has(id));
        expect(still(before)).toEqual(still(after));
      },
    ),
    runs(200),
  );
});
