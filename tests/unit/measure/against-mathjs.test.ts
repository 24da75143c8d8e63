import { create, all, type MathNode } from 'mathjs';
import { evaluate, parseExpression, type Lookup } from '../../../shared/measure';

/**
 * Values and slopes of random expressions against mathjs, a general-purpose library (its own parser and
 * derivative; central differences where it cannot differentiate). The seed is printed; set SEED to repeat.
 */
if (!all) throw new Error('mathjs has no functions.');
const math = create(all);
const seed = Number(process.env.SEED ?? Date.now() % 1_000_000);
const count = process.env.SCANTLING_LONG ? 10_000 : 500;

function random(start: number): () => number {
  let state = start >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = Math.imul(state ^ (state >>> 15), state | 1);
    t = (t + Math.imul(t ^ (t >>> 7), t | 61)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

const next = random(seed);
const pick = <T>(from: readonly T[]): T => from[Math.floor(next() * from.length)]!;
const figure = () => pick(['2', '3.5', '0.25', '7', '1.5', '.75', '12']);

/** The same expression twice: ours, and mathjs's with angles in degrees spelled out. */
function grow(depth: number): [ours: string, theirs: string] {
  if (depth === 0 || next() < 0.15) {
    const leaf = next() < 0.7 ? pick(['a', 'b', 'c']) : figure();
    return [leaf, leaf];
  }
  const [p, q] = grow(depth - 1);
  const [r, s] = grow(depth - 1);
  const shapes: (() => [string, string])[] = [
    () => [`(${p} + ${r})`, `(${q} + ${s})`],
    () => [`(${p} - ${r})`, `(${q} - ${s})`],
    () => [`${p} * ${r}`, `${q} * ${s}`],
    () => [`(${p}) / (${r})`, `(${q}) / (${s})`],
    () => [`-${p}`, `-${q}`],
    () => [`(${p})^2`, `(${q})^2`],
    // The exponent stays within one: 2 to the 70 degrees is beyond what either can tell.
    () => [`2^-sin((${p}) * 1 deg)`, `2^-sin((${q}) * pi / 180)`],
    () => [`sqrt(abs(${p}) + 1)`, `sqrt(abs(${q}) + 1)`],
    () => [`sin((${p}) * 1 deg)`, `sin((${q}) * pi / 180)`],
    () => [`cos((${p}) * 1 deg)`, `cos((${q}) * pi / 180)`],
    () => [`tan((${p}) * 1 deg)`, `tan((${q}) * pi / 180)`],
    () => [
      `asin(sin((${p}) * 1 deg) / 2) / 1 deg`,
      `(asin(sin((${q}) * pi / 180) / 2) * 180 / pi)`,
    ],
    () => [`atan2(${p}, abs(${r}) + 1) / 1 deg`, `(atan2(${q}, abs(${s}) + 1) * 180 / pi)`],
    () => [`hypot(${p}, ${r}, 1)`, `sqrt((${q})^2 + (${s})^2 + 1)`],
    () => [`min(${p}, ${r})`, `min(${q}, ${s})`],
    () => [`max(${p}, ${r})`, `max(${q}, ${s})`],
  ];
  return pick(shapes)();
}

const names = ['a', 'b', 'c'] as const;
type Point = Record<(typeof names)[number], number>;

function ours(text: string, at: Point) {
  const read = parseExpression(text);
  if (!read.ok) throw new Error(`${text}: ${read.fault.message}`);
  const lookup: Lookup = (symbol) => {
    const i = names.findIndex((name) => name === symbol);
    const g = names.map((_, k) => (k === i ? 1 : 0));
    return { x: at[names[i]!], q: null, g };
  };
  return evaluate(read.node, lookup);
}

function slope(tree: MathNode, text: string, name: (typeof names)[number], at: Point): number {
  if (!/min|max|atan2/.test(text)) {
    const exact = Number(math.derivative(tree, name, { simplify: false }).evaluate({ ...at }));
    if (Number.isFinite(exact)) return exact;
  }
  const code = tree.compile();
  const h = 1e-5 * Math.max(1, Math.abs(at[name]));
  const value = (x: number) => Number(code.evaluate({ ...at, [name]: x }));
  return (value(at[name] + h) - value(at[name] - h)) / (2 * h);
}

const near = (a: number, b: number, share: number) =>
  Math.abs(a - b) <= share * Math.max(1, Math.abs(a), Math.abs(b));

test(`${count} random expressions agree with mathjs (seed ${seed})`, () => {
  let compared = 0;
  const wrong: string[] = [];
  for (let i = 0; i < count; i += 1) {
    const [text, theirs] = grow(3);
    const at = { a: next() * 8 + 0.3, b: next() * -5 - 0.1, c: next() * 20 + 1 };
    const tree = math.parse(theirs);
    const raw: unknown = tree.evaluate({ ...at });
    const mine = ours(text, at);
    if (!mine.ok || typeof raw !== 'number' || !Number.isFinite(raw) || Math.abs(raw) > 1e9)
      continue;
    compared += 1;
    const { x, g } = mine.value;
    if (!near(x, raw, 1e-9)) wrong.push(`${text} at ${JSON.stringify(at)}: ${x}, mathjs ${raw}`);
    names.forEach((name, k) => {
      const expected = slope(tree, theirs, name, at);
      const found = g?.[k] ?? 0;
      if (Math.abs(expected) < 1e5 && !near(found, expected, 2e-4))
        wrong.push(`d ${text} / d${name} at ${JSON.stringify(at)}: ${found}, mathjs ${expected}`);
    });
  }
  console.info(`seed ${seed}: ${compared} of ${count} compared`);
  expect(wrong).toEqual([]);
  expect(compared).toBeGreaterThan(count * 0.8);
}, 120_000);
