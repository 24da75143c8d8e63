import fc from 'fast-check';
import { type BarJob, solveBars, verifyBars } from '../../../shared/layout/bars';

const runs = process.env.SCANTLING_LONG ? 2000 : 120;

const small = fc.record({
  stock: fc.array(
    fc.record({
      length: fc.integer({ min: 30, max: 120 }),
      quantity: fc.option(fc.integer({ min: 0, max: 3 }), { nil: null }),
      cost: fc.integer({ min: 0, max: 40 }),
    }),
    { minLength: 1, maxLength: 3 },
  ),
  items: fc.array(
    fc.record({
      length: fc.integer({ min: 5, max: 70 }),
      quantity: fc.integer({ min: 1, max: 2 }),
    }),
    { minLength: 1, maxLength: 4 },
  ),
  kerf: fc.integer({ min: 0, max: 5 }),
  trim: fc.record({ start: fc.integer({ min: 0, max: 8 }), end: fc.integer({ min: 0, max: 8 }) }),
});

/** Every way there is: the next piece onto each open bar and onto each kind of new one. Null when not all can be cut. */
function exhaustive(job: BarJob): number | null {
  const pieces = job.items.flatMap((i) => Array.from({ length: i.quantity }, () => i.length));
  const room = (length: number) => length - job.trim.start - job.trim.end + job.kerf;
  let best: number | null = null;
  const walk = (i: number, open: { stock: number; left: number }[], cost: number): void => {
    if (best !== null && cost >= best) return;
    const piece = pieces[i];
    if (piece === undefined) {
      best = cost;
      return;
    }
    const need = piece + job.kerf;
    open.forEach((bar, at) => {
      if (bar.left < need) return;
      walk(
        i + 1,
        open.map((b, k) => (k === at ? { ...b, left: b.left - need } : b)),
        cost,
      );
    });
    job.stock.forEach((stock, at) => {
      const used = open.filter((bar) => bar.stock === at).length;
      if (used >= (stock.quantity ?? Infinity) || room(stock.length) < need) return;
      const left = room(stock.length) - need;
      walk(i + 1, [...open, { stock: at, left }], cost + (stock.cost ?? 0));
    });
  };
  walk(0, [], 0);
  return best;
}

describe('bars, whatever the job', () => {
  it('can be sawn, and costs no less than it proves and no more than every way there is', () => {
    let [optimal, all] = [0, 0];
    fc.assert(
      fc.property(small, (job) => {
        const answer = solveBars(job);
        expect(verifyBars(job, answer)).toEqual([]);
        const truth = exhaustive(job);
        if (truth === null) {
          expect(answer.leftOut.length).toBeGreaterThan(0);
          return;
        }
        if (answer.leftOut.length > 0) return;
        all += 1;
        if (answer.cost === truth) optimal += 1;
        expect(answer.cost).toBeGreaterThanOrEqual(truth);
        expect(answer.lowerBound).toBeLessThanOrEqual(truth);
        if (answer.proven) expect(answer.cost).toBe(truth);
      }),
      { numRuns: runs },
    );
    expect(optimal / all).toBeGreaterThan(0.97);
  });

  it('is never dearer with a part fewer, a thinner kerf or more stock, where both are proven', () => {
    fc.assert(
      fc.property(small, (job) => {
        const before = solveBars(job);
        if (!before.proven) return;
        const [, ...fewer] = job.items;
        const easier: BarJob[] = [
          { ...job, items: fewer },
          { ...job, kerf: Math.max(0, job.kerf - 1) },
          {
            ...job,
            stock: job.stock.map((s) => ({ ...s, quantity: s.quantity && s.quantity + 1 })),
          },
        ];
        for (const easy of easier) {
          const after = solveBars(easy);
          if (after.leftOut.length <= before.leftOut.length)
            expect(after.lowerBound).toBeLessThanOrEqual(before.cost);
        }
      }),
      { numRuns: runs },
    );
  });

  it('gives the same answer twice, and costs the same in whatever order the parts are listed', () => {
    fc.assert(
      fc.property(small, (job) => {
        const answer = solveBars(job);
        expect(solveBars(job)).toEqual(answer);
        const turned = solveBars({ ...job, items: [...job.items].reverse() });
        expect([turned.cost, turned.lowerBound]).toEqual([answer.cost, answer.lowerBound]);
      }),
      { numRuns: runs },
    );
  });
});
