import falkenauer from '../../data/layout/1d-falkenauer-four.json';
import workshop from '../../data/layout/1d-workshop-kerf.json';
import {
  barInstanceSchema,
  barJobOf,
  type BarJob,
  solveBarInstance,
  solveBars,
  unitsUp,
  verifyBars,
} from '../../../shared/layout/bars';

describe('published and own instances', () => {
  // Own set with proven optima; Falkenauer, J. Heuristics 2 (1996) 5-30, optima proven there or since (source in the file).
  const rows = [...workshop.instances, ...falkenauer.instances].map(
    (row) => [row.name, row] as const,
  );
  it.each(rows)('%s in the fewest bars, proven, and it can be sawn', (_, row) => {
    const job = barJobOf(barInstanceSchema.parse(row));
    const answer = solveBars(job);
    expect(verifyBars(job, answer)).toEqual([]);
    expect(answer).toMatchObject({
      cost: row.best,
      lowerBound: row.best,
      proven: true,
      leftOut: [],
    });
  });
});

describe('pieces on one bar, by the formula n = ⌊(L + k)/(p + k)⌋', () => {
  // Arithmetic; the four rows are worked by hand, in mm.
  it.each([
    [2440, 400, 3.2, 6, 20.8],
    [2438.4, 304.8, 3.175, 7, 282.575],
    [2440, 600, 3, 4, 28],
    [1000, 100, 0, 10, 0],
  ])('%d mm in pieces of %d with kerf %d: %d and %d left', (bar, piece, kerf, count, left) => {
    const [first] = solveBarInstance({
      kerf,
      bins: [{ length: bar }],
      items: [{ length: piece, qty: count }],
    }).sheets;
    expect(first?.placements).toHaveLength(count);
    expect(first?.offcuts.map((o) => o.w)).toEqual(left > 0 ? [left] : []);
    const more = solveBarInstance({
      kerf,
      bins: [{ length: bar }],
      items: [{ length: piece, qty: count + 1 }],
    });
    expect(more).toMatchObject({ lowerBound: 2, proven: true });
  });
});

const job = (over: Partial<BarJob>): BarJob => ({
  stock: [{ length: 1000, quantity: null }],
  items: [{ length: 1000, quantity: 1 }],
  kerf: 3,
  trim: { start: 0, end: 0 },
  ...over,
});

describe('to the unit', () => {
  it('cuts a part as long as the bar, and none a unit longer', () => {
    expect(solveBars(job({})).bars).toHaveLength(1);
    const long = solveBars(job({ items: [{ length: 1001, quantity: 2 }] }));
    expect(long.bars).toEqual([]);
    expect(long.leftOut).toEqual([{ item: 0, quantity: 2, because: 'too-long' }]);
  });
  it('cuts two that make the length less a kerf from one bar; one unit more takes another', () => {
    const two = (b: number) =>
      job({
        items: [
          { length: 500, quantity: 1 },
          { length: b, quantity: 1 },
        ],
      });
    expect(solveBars(two(497)).bars).toHaveLength(1);
    expect(solveBars(two(498)).bars).toHaveLength(2);
  });
  it('takes trims off both ends first; the kerf of the last cut may lie in the end', () => {
    const trimmed = { trim: { start: 10, end: 20 } };
    const fits = job({ ...trimmed, items: [{ length: 970, quantity: 1 }] });
    const answer = solveBars(fits);
    expect(answer.bars[0]?.placements).toEqual([{ item: 0, x: 10, length: 970 }]);
    expect(verifyBars(fits, answer)).toEqual([]);
    expect(
      solveBars(job({ ...trimmed, items: [{ length: 971, quantity: 1 }] })).leftOut,
    ).toHaveLength(1);
  });
  it('rounds parts up and stock down', () => {
    expect(unitsUp(100.0001)).toBe(160_001);
    const tight = { bins: [{ length: 100 }], items: [{ length: 100.0004, qty: 1 }] };
    expect(solveBarInstance(tight).leftOut).toHaveLength(1);
  });
});

describe('prices, several lengths, stock that runs out', () => {
  it('takes what is in the shop before buying', () => {
    const answer = solveBars(
      job({
        stock: [
          { length: 2400, quantity: null, cost: 900 },
          { length: 700, quantity: 1, cost: 0 },
        ],
        items: [{ length: 600, quantity: 4 }],
      }),
    );
    expect(answer).toMatchObject({ cost: 900, proven: true, measure: 'cost' });
    expect(answer.bars.map((bar) => bar.stock).sort()).toEqual([0, 1]);
  });
  it('lays out what it can when the stock is used up, and names the rest', () => {
    const short = job({
      stock: [{ length: 1000, quantity: 2 }],
      items: [
        { length: 600, quantity: 3 },
        { length: 300, quantity: 2 },
      ],
    });
    const answer = solveBars(short);
    expect(verifyBars(short, answer)).toEqual([]);
    expect(answer.leftOut).toEqual([{ item: 0, quantity: 1, because: 'stock-used-up' }]);
    expect(answer.proven).toBe(false);
  });
  it('refuses a kerf or a length that is none', () => {
    expect(() => solveBars(job({ kerf: -1 }))).toThrow('kerf');
    expect(() => solveBars(job({ items: [{ length: Number.NaN, quantity: 1 }] }))).toThrow(
      'length',
    );
    expect(() => solveBarInstance({ kerf: -1, bins: [], items: [] })).toThrow();
  });
  it('has an answer for no stock and for ten thousand parts', () => {
    expect(solveBars(job({ stock: [] })).leftOut).toHaveLength(1);
    const items = Array.from({ length: 2000 }, (_, i) => ({ length: 100 + i, quantity: 5 }));
    const many = job({ stock: [{ length: 30_000, quantity: null }], items });
    const answer = solveBars(many);
    expect(verifyBars(many, answer)).toEqual([]);
    expect(answer.cost - answer.lowerBound).toBeLessThanOrEqual(4);
  });
});
