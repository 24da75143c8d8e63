import { createModel } from '../../../shared/plan/model';
import { idOf, planOf, pm } from './plan';

/** Worst case and root-sum-square against drawn parts: 100,000 draws in the long run, 20,000 otherwise. */
const draws = process.env.SCANTLING_LONG ? 100_000 : 20_000;

function random(start: number): () => number {
  let state = start;
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return (state + 0.5) / 4294967296;
  };
}

const functions: [string, string, (a: number, b: number, c: number) => number][] = [
  ['a chain', 'a - b - 2 * c', (a, b, c) => a - b - 2 * c],
  ['a diagonal', 'hypot(a, b) - c', (a, b, c) => Math.hypot(a, b) - c],
  ['a slope', 'a * sin(atan2(b, c))', (a, b, c) => (a * b) / Math.hypot(b, c)],
  ['a ratio', 'a * b / c', (a, b, c) => (a * b) / c],
];

describe.each(functions)('%s', (_, expression, f) => {
  const nominal = { a: 120, b: 45, c: 18 };
  const half = { a: 0.5, b: 0.3, c: 0.2 };
  const plan = planOf([
    ...(['a', 'b', 'c'] as const).map((symbol) => ({
      symbol,
      expression: `${nominal[symbol]} mm`,
      tolerance: pm(`${half[symbol]}`),
    })),
    { symbol: 'y', origin: 'derived', expression },
  ]);
  const stack = createModel(plan).dimensions.get(idOf(1, 3))?.value;

  test('no part drawn inside its band leaves the worst case, and the corners reach it', () => {
    const next = random(7);
    let [low, high] = [Infinity, -Infinity];
    for (let i = 0; i < draws; i += 1) {
      const at = (name: 'a' | 'b' | 'c') =>
        nominal[name] + half[name] * (next() < 0.5 ? -1 : 1) * (i % 4 ? next() : 1);
      const y = f(at('a'), at('b'), at('c'));
      [low, high] = [Math.min(low, y), Math.max(high, y)];
    }
    expect(stack?.x).toBeCloseTo(f(nominal.a, nominal.b, nominal.c), 9);
    const worst = stack?.worst ?? 0;
    // A gently bent function may leave its tangent by the 2 % below which corners are not asked.
    expect(low).toBeGreaterThanOrEqual((stack?.low ?? 0) - 0.02 * worst);
    expect(high).toBeLessThanOrEqual((stack?.high ?? 0) + 0.02 * worst);
    expect((high - low) / 2).toBeGreaterThan(0.97 * worst);
  });

  test('the spread of normally made parts, three sigma to the tolerance, is the root-sum-square', () => {
    const next = random(11);
    const normal = () => Math.sqrt(-2 * Math.log(next())) * Math.cos(2 * Math.PI * next());
    let [sum, squares] = [0, 0];
    for (let i = 0; i < draws; i += 1) {
      const y = f(
        nominal.a + (half.a / 3) * normal(),
        nominal.b + (half.b / 3) * normal(),
        nominal.c + (half.c / 3) * normal(),
      );
      sum += y;
      squares += (y - nominal.a) ** 2;
    }
    const mean = sum / draws;
    const variance = squares / draws - (mean - nominal.a) ** 2;
    const rss = stack?.rss ?? 0;
    // A standard deviation from n draws is good to 1/√(2n); four of those.
    expect(Math.abs((3 * Math.sqrt(variance)) / rss - 1)).toBeLessThan(
      4 / Math.sqrt(2 * draws) + 0.002,
    );
  });
});
