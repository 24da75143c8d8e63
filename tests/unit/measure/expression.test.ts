import {
  evaluate,
  exact,
  expectKind,
  FaultError,
  kindPowers,
  parseCheck,
  parseExpression,
  Rational,
  type KindScope,
} from '../../../shared/measure';

const scope: KindScope = {
  powers: (name) =>
    ['slot_width', 'panel', 'depth'].includes(name)
      ? kindPowers('length')
      : name === 'slope'
        ? kindPowers('angle')
        : undefined,
  names: () => ['slot_width', 'panel', 'depth', 'slope'],
  unit: 'mm',
};
const values: Record<string, string> = {
  slot_width: '19.05',
  panel: '12',
  depth: '6',
  slope: '30',
};

function run(text: string) {
  const read = parseExpression(text);
  if (!read.ok) return read.fault;
  try {
    expectKind(read.node, kindPowers('length'), scope);
  } catch (error) {
    if (error instanceof FaultError) return error.fault;
    throw error;
  }
  const value = evaluate(read.node, (name) => exact(Rational.decimal(values[name] ?? '0')));
  return value.ok ? value.value : value.fault;
}

const worked: [string, string][] = [
  ['slot_width + 2 mm', '421/20'],
  ['3/4 in', '381/20'],
  ['panel - 1-1/2 in', '-261/10'],
  ['5\' 3-1/2" - 3 1/2 in', '1524'],
  ['(panel + depth) * 2', '36'],
  ['12 in-3 in', '1143/5'],
  ['5\'-3" + 1 mm', '8006/5'],
  ['panel * 3/4', '9'],
  ['slot_width / 3', '127/20'],
  ['min(panel, depth) + max(1 mm, 1/16 in)', '607/80'],
  ['round(slot_width, 0.5 mm)', '19'],
  ['ceil(slot_width, 1/16 in)', '381/20'],
  ['floor(slot_width, 2 mm)', '18'],
  ['abs(depth - panel)', '6'],
  ['made(panel) - 1 mm', '11'],
  ['-panel^2 / -2 mm', '72'],
  ['2^-1 * panel', '6'],
  ['½ * panel', '6'],
];
const wrong: [string, string, number, RegExp][] = [
  ['slot_width + 2', 'kind', 13, /^2 mm\?$/],
  ['slot_widht + 2 mm', 'unknown-symbol', 0, /slot_width/],
  ['panel * depth', 'kind', 0, /kind/],
  ['panel + panel * depth', 'kind', 8, /one kind/],
  ['panel / (depth - depth)', 'kind', 0, /./],
  ['panel * (depth / (depth - depth))', 'division-by-zero', 18, /./],
  ['sin(30) * panel', 'kind', 4, /30 deg/],
  ['rond(panel, 1 mm)', 'unknown-function', 0, /round/],
  ['panel + ', 'syntax', 8, /figure/],
  ['(panel', 'syntax', 0, /Close/],
  ['panel)', 'syntax', 5, /out/],
  ['panel depth', 'syntax', 6, /between/],
  ['12 mn', 'unknown-unit', 3, /Did you mean/],
  ['panel < depth', 'comparison', 6, /./],
  ['3/0 in', 'literal', 2, /./],
  ['min + 1 mm', 'reserved', 0, /./],
  ['sqrt(depth * depth - panel * panel)', 'domain', 0, /order/],
  ['', 'empty', 0, /./],
  ['panel ** 2', 'syntax', 7, /figure/],
  ['asin(2) * 1 mm / 1 deg', 'domain', 0, /./],
  ['round(panel)', 'arguments', 0, /1 mm/],
  ['made(panel + 1 mm)', 'arguments', 5, /symbol/],
];

describe('Expressions', () => {
  test.each(worked)('%s is %s mm', (text, mm) => {
    const value = run(text);
    expect('q' in value ? value.q?.toString() : value).toBe(mm);
  });

  test('trigonometry takes and gives angles', () => {
    const value = run('panel * sin(slope) + depth * cos(60 deg) + asin(0.5) / 1 deg * 0.1 mm');
    expect('x' in value ? value.x : value).toBeCloseTo(12, 9);
  });

  test.each(wrong)('%j is refused as %s at column %i', (text, code, at, cure) => {
    const fault = run(text);
    expect(fault).toMatchObject({ code, at });
    expect('cure' in fault ? fault.cure : '').toMatch(cure);
  });

  test.each([
    ['10,000 characters', 'a+'.repeat(5000), 'too-long'],
    ['5,000 brackets', `${'('.repeat(5000)}1${')'.repeat(5000)}`, 'too-long'],
    ['900 brackets', `${'('.repeat(900)}1${')'.repeat(900)}`, 'too-deep'],
    ['900 open functions', 'abs('.repeat(499), 'too-deep'],
  ])('%s give an error in milliseconds', (_, text, code) => {
    const start = performance.now();
    const read = parseExpression(text);
    expect(performance.now() - start).toBeLessThan(50);
    expect(!read.ok && read.fault.code).toBe(code);
  });

  test('a long flat expression is read without trouble', () => {
    expect(parseExpression(`${'-'.repeat(1990)}panel`).ok).toBe(true);
    expect(parseExpression(`2${'^2'.repeat(900)}`).ok).toBe(true);
    expect(run(`panel${'+depth'.repeat(300)}`)).toMatchObject({ x: 1812 });
  });

  test.each([
    ['panel < slot_width', '<', 2],
    ['panel ≤ slot_width', '<=', 2],
    ['panel = slot_width within 0.2 mm', '=', 3],
    ['between(panel, 11 mm, 13 mm)', 'between', 3],
    ['fit(panel, slot_width, 0.1 mm, 0.3 mm)', 'fit', 4],
  ])('reads the check %s', (text, op, count) => {
    const read = parseCheck(text);
    expect(read.ok && [read.node.op, read.node.args.length]).toEqual([op, count]);
  });

  test.each([
    ['panel', 'comparison', 5],
    ['panel = depth', 'comparison', 6],
    ['fit(panel, depth)', 'arguments', 0],
    ['panel < ', 'syntax', 8],
  ])('refuses the check %s', (text, code, at) => {
    const read = parseCheck(text);
    expect(!read.ok && read.fault).toMatchObject({ code, at });
  });
});
