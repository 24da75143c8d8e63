import { createModel } from '../../../shared/plan/model';
import { idOf, planOf, pm } from './plan';

const valueOf = (plan: ReturnType<typeof planOf>, n: number) => {
  const state = createModel(plan).dimensions.get(idOf(1, n));
  if (!state?.value) throw new Error(state?.error?.message ?? 'no value');
  return state.value;
};

/** Chains of ±tolerances: textbook sums, worked by hand. */
const chains: [string, string[], number, number][] = [
  ['10 parts ±0.1', Array<string>(10).fill('0.1'), 1, 0.316228],
  ['±0.20 ±0.10 ±0.15', ['0.2', '0.1', '0.15'], 0.45, 0.269258],
  ['4 equal ±0.5', Array<string>(4).fill('0.5'), 2, 1],
  ['ISO 2768-m 0.5 0.3 0.3 0.2', ['0.5', '0.3', '0.3', '0.2'], 1.3, 0.685565],
];

describe('Stack-up', () => {
  // Budynas & Nisbett, Shigley's Mechanical Engineering Design, 9th ed., Example 1-3, p. 20; inches.
  const shigley = (d: string) =>
    planOf(
      [
        { symbol: 'a', expression: '1.750', tolerance: pm('0.003') },
        { symbol: 'b', expression: '0.750', tolerance: pm('0.001') },
        { symbol: 'c', expression: '0.120', tolerance: pm('0.005') },
        { symbol: 'dd', expression: d, tolerance: pm('0.001') },
        { symbol: 'w', origin: 'derived', expression: 'a - b - c - dd' },
      ],
      [{ expression: 'w >= 0.003 in' }],
      [],
      'in',
    );

  test("Shigley's gap: mean 0.005, worst 0.010, RSS 0.006 in, interference possible", () => {
    const w = valueOf(shigley('0.875'), 4);
    expect(w.exact?.toString()).toBe('127/1000');
    expect(w.worst / 25.4).toBeCloseTo(0.01, 12);
    expect(w.rss / 25.4).toBeCloseTo(0.006, 12);
    expect([w.low / 25.4, w.high / 25.4].map((x) => Number(x.toFixed(9)))).toEqual([-0.005, 0.015]);
    expect(w.contributors.map((c) => c.symbol)).toEqual(['c', 'a', 'b', 'dd']);
  });

  test('d = 0.867 in guarantees w of at least 0.003 in; 0.875 in does not', () => {
    const check = (d: string) => createModel(shigley(d)).checks.get(idOf(2, 0));
    expect(check('0.875')).toMatchObject({ verdict: 'at-risk' });
    expect(check('0.867')).toMatchObject({ verdict: 'holds' });
    expect(check('0.867')?.worstMargin).toBeCloseTo(0, 9);
    expect(check('0.868')).toMatchObject({ verdict: 'at-risk' });
  });

  test.each(chains)('%s', (_, tolerances, worst, rss) => {
    const n = tolerances.length;
    const plan = planOf([
      ...tolerances.map((t, i) => ({ symbol: `x${i}`, expression: '10 mm', tolerance: pm(t) })),
      {
        symbol: 'y',
        origin: 'derived' as const,
        expression: tolerances.map((_t, i) => `x${i}`).join(' + '),
      },
    ]);
    expect(valueOf(plan, n).worst).toBeCloseTo(worst, 9);
    expect(valueOf(plan, n).rss).toBeCloseTo(rss, 6);
  });

  test('one stop setting adds in line, then the groups by root-sum-square', () => {
    const cut = { expression: '100 mm', tolerance: pm('0.3'), setting: 'stop' };
    const plan = planOf([
      { symbol: 'a', ...cut },
      { symbol: 'b', ...cut },
      { symbol: 'c', expression: '20 mm', tolerance: pm('0.8') },
      { symbol: 'y', origin: 'derived', expression: 'a + b + c' },
    ]);
    expect(valueOf(plan, 3).rss).toBeCloseTo(1, 12);
    expect(valueOf(plan, 3).worst).toBeCloseTo(1.4, 12);
  });

  test('a − a is exactly nothing, and a dimension used twice counts as one', () => {
    const plan = planOf([
      { symbol: 'a', expression: '100 mm', tolerance: pm('0.3') },
      { symbol: 'b', origin: 'derived', expression: 'a + 1 mm' },
      { symbol: 'c', origin: 'derived', expression: 'b - a' },
      { symbol: 'e', origin: 'derived', expression: 'a + b' },
    ]);
    expect(valueOf(plan, 2)).toMatchObject({ x: 1, worst: 0, rss: 0, contributors: [] });
    expect(valueOf(plan, 3).rss).toBeCloseTo(0.6, 12);
  });

  test('unequal tolerances are recentred: +0.2 −0.4 is ±0.3 about −0.1', () => {
    const plan = planOf([
      {
        symbol: 'a',
        expression: '18 mm',
        tolerance: { form: 'unequal', plus: '0.2', minus: '0.4' },
      },
      { symbol: 'b', expression: '10 mm', tolerance: { form: 'limits', low: '9.8', high: '10.6' } },
      { symbol: 'y', origin: 'derived', expression: '2 * a - b' },
    ]);
    const y = valueOf(plan, 2);
    expect([y.x, y.centre, y.low, y.high].map((v) => Number(v.toFixed(9)))).toEqual([
      26, 25.6, 24.6, 26.6,
    ]);
    expect(y.rss).toBeCloseTo(Math.hypot(0.6, 0.4), 12);
  });

  test('where a function bends, the corners count and the wider result is used', () => {
    const plan = planOf([
      { symbol: 'x', expression: '0.1 mm', tolerance: pm('1') },
      { symbol: 'y', origin: 'derived', kind: 'area', expression: 'x * x' },
      { symbol: 'z', origin: 'derived', expression: 'abs(x)' },
      { symbol: 'flat', origin: 'derived', expression: 'hypot(300 mm, 400 mm + x)' },
    ]);
    expect(valueOf(plan, 1).high).toBeCloseTo(1.21, 9);
    expect(valueOf(plan, 2).high).toBeCloseTo(1.1, 9);
    expect(valueOf(plan, 3).worst).toBeCloseTo(0.8, 3);
  });

  test('more than ten contributors that bend get interval bounds, never too narrow', () => {
    const many = Array.from({ length: 12 }, (_, i) => ({
      symbol: `x${i}`,
      expression: '1 mm',
      tolerance: pm('1'),
    }));
    const sum = many.map((d) => d.symbol).join(' + ');
    const plan = planOf([
      ...many,
      { symbol: 'y', origin: 'derived', kind: 'area', expression: `(${sum}) * (${sum})` },
    ]);
    expect(valueOf(plan, 12).high).toBeCloseTo(576, 6);
    expect(valueOf(plan, 12).low).toBeLessThanOrEqual(0);
  });

  test.each([
    ['450 mm', 'm', 0.8],
    ['450 mm', 'c', 2],
    ['30 mm', 'm', 0.2],
    ['30.1 mm', 'm', 0.3],
  ] as const)('%s in class %s of ISO 2768-1 is ±%f', (expression, of, t) => {
    const plan = planOf([{ symbol: 'a', expression, tolerance: { form: 'iso2768', class: of } }]);
    expect(valueOf(plan, 0).worst).toBeCloseTo(t, 9);
  });
});
