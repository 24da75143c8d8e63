import { Rational } from '../../../shared/measure';
import {
  createModel,
  describeCheck,
  describeCoarse,
  describeReading,
  formatParts,
  judgeReading,
} from '../../../shared/plan/model';
import { idOf, planOf, pm, readingsOf } from './plan';

const mm = { system: 'mm', instrument: 'tape', grid: 16 } as const;

/** An invented box: opening taken, panel cut to it, a groove and a tongue. */
const box = () =>
  planOf(
    [
      {
        symbol: 'opening',
        origin: 'taken',
        expression: '300 mm',
        tolerance: pm('1'),
        sense: 'inside',
      },
      {
        symbol: 'panel',
        origin: 'derived',
        expression: 'made(opening) - 2 mm',
        tolerance: pm('0.5'),
      },
      { symbol: 'groove', expression: '6.2 mm', tolerance: pm('0.1'), sense: 'inside' },
      { symbol: 'tongue', expression: '6 mm', tolerance: pm('0.05') },
      { symbol: 'half', origin: 'derived', expression: 'panel / 2' },
    ],
    [
      { expression: 'panel < opening' },
      { expression: 'fit(tongue, groove, 0.1 mm, 0.3 mm)' },
      { expression: '', answeredBy: ['trial'], asked: 'bench' },
    ],
    [{ length: 'panel', width: 'half', thickness: 'groove - 0.2 mm' }],
  );

describe('The model', () => {
  test('values, bands, parts and checks at design', () => {
    const model = createModel(box());
    expect(model.dimensions.get(idOf(1, 1))).toMatchObject({
      tolerance: 0.5,
      standIn: false,
      error: null,
    });
    expect(model.parts.get(idOf(3, 0))?.width.value?.exact?.toString()).toBe('149');
    expect(model.checks.get(idOf(2, 0))).toMatchObject({
      verdict: 'holds',
      margin: 2,
      worstMargin: 0.5,
    });
    const fit = model.checks.get(idOf(2, 1));
    expect(fit).toMatchObject({ verdict: 'at-risk', fit: { word: 'running' } });
    expect(fit?.worstMargin).toBeCloseTo(-0.05, 9);
    expect(fit?.advice[0]).toMatchObject({ do: 'hold', dimensionId: idOf(1, 2) });
    expect(fit && describeCheck(model, fit, mm)).toMatch(
      /^At risk: 0.1 mm to spare, 0.05 mm short.*Hold the groove to ±0.05 mm/,
    );
    const part = model.parts.get(idOf(3, 0));
    expect(part && formatParts(part, mm)).toBe('298 mm × 149 mm × 6 mm');
    expect(model.usedBy(idOf(1, 1)).dimensions).toEqual([idOf(1, 4)]);
    expect(model.evaluate('groove + 1/2 in').value?.exact?.toString()).toBe('189/10');
  });

  test('the share is the normal one, three sigma to the tolerance', () => {
    const plan = planOf(
      [{ symbol: 'a', expression: '10 mm', tolerance: pm('3') }],
      [{ expression: 'a <= 11 mm' }, { expression: 'a <= 12 mm' }, { expression: 'a <= 10 mm' }],
    );
    const shares = [0, 1, 2].map((n) => createModel(plan).checks.get(idOf(2, n))?.share);
    // Standard normal table: Φ(1) = 0.8413, Φ(2) = 0.9772, Φ(0) = 0.5.
    expect(shares.map((s) => s?.toFixed(4))).toEqual(['0.8413', '0.9772', '0.5000']);
  });

  test('readings replace stand-ins, are as made elsewhere, and change the checks', () => {
    const plan = box();
    const bench = createModel(plan, readingsOf({}));
    expect(bench.checks.get(idOf(2, 0))).toMatchObject({
      verdict: 'needs-a-reading',
      advice: [{ do: 'read', dimensionId: idOf(1, 0) }],
    });
    const read = bench.update(plan, readingsOf({ 0: ['305', '1527/5'], 2: ['121/20'] }));
    expect(read.dimensions.get(idOf(1, 0))).toMatchObject({
      standIn: false,
      value: { x: 305.2, worst: expect.closeTo(0.2, 9) as number },
    });
    expect(read.dimensions.get(idOf(1, 1))?.value?.exact?.toString()).toBe('1516/5');
    expect(read.dimensions.get(idOf(1, 2))?.value?.x).toBe(6.2);
    expect(read.checks.get(idOf(2, 1))).toMatchObject({ verdict: 'fails' });
    const failing = read.checks.get(idOf(2, 1));
    expect(failing?.advice).toContainEqual({
      do: 'move',
      dimensionId: idOf(1, 3),
      by: expect.closeTo(-0.05, 6) as number,
    });
    expect(read.checks.get(idOf(2, 2))?.advice).toEqual([{ do: 'try' }]);
    const tried = read.update(plan, {
      readings: new Map(),
      trials: new Map([[idOf(2, 2), { result: 'fits' as const }]]),
    });
    expect(tried.checks.get(idOf(2, 2))).toMatchObject({ verdict: 'holds', answeredBy: 'trial' });
  });

  test.each([
    ['min', '6'],
    ['max', '63/10'],
    ['mean', '123/20'],
  ] as const)('of several readings the %s counts', (counts, value) => {
    const plan = planOf([{ symbol: 'a', origin: 'taken', expression: '6 mm', counts }]);
    const state = createModel(plan, readingsOf({ 0: ['6', '63/10'] })).dimensions.get(idOf(1, 0));
    expect(state?.readings?.value.toString()).toBe(value);
    expect(state?.readings?.spread).toBeCloseTo(0.3, 12);
    expect(state?.value?.worst).toBeCloseTo(0.15, 12);
  });

  test('a must check within one uncertainty is too close to call, a should one is not', () => {
    const plan = planOf(
      [{ symbol: 'a', origin: 'taken', expression: '6 mm' }],
      [
        { expression: 'a <= 6.5 mm' },
        { expression: 'a <= 6.5 mm', level: 'should' },
        { expression: 'a <= 9 mm' },
      ],
    );
    const model = createModel(plan, readingsOf({ 0: ['6'] }, 'tape'));
    expect([0, 1, 2].map((n) => model.checks.get(idOf(2, n))?.verdict)).toEqual([
      'too-close',
      'at-risk',
      'holds',
    ]);
  });

  test.each([
    ['outside', '10.9', 'over', 'work', '0.4 mm over: one more pass.'],
    [
      'outside',
      '9.1',
      'under',
      'cannot',
      '0.4 mm under: cannot be put back; what it meets can be made to suit.',
    ],
    [
      'inside',
      '10.9',
      'over',
      'cannot',
      '0.4 mm over: cannot be put back; what goes in can be made to suit.',
    ],
    ['inside', '9.1', 'under', 'work', '0.4 mm under: open it up a little.'],
    ['place', '10.9', 'over', 'move', '0.4 mm over: move it while it is not fixed.'],
    ['setting', '9.1', 'under', 'set', '0.4 mm under: set it again.'],
    ['outside', '10.5', 'inside', 'none', 'Inside the band.'],
  ] as const)('%s read %s is %s: %s', (sense, figure, verdict, cure, words) => {
    const plan = planOf([{ symbol: 'a', expression: '10 mm', tolerance: pm('0.5'), sense }]);
    const state = createModel(plan).dimensions.get(idOf(1, 0))!;
    const judged = judgeReading(state, Rational.decimal(figure), 'calipers');
    expect(judged).toMatchObject({ verdict, cure, coarse: null });
    expect(describeReading(judged, mm)).toBe(words);
    expect(describeCoarse(judgeReading(state, Rational.decimal(figure), 'tape'), mm)).toMatch(
      /reads to ±1 mm.*calipers/,
    );
  });

  test('angles are judged and said in degrees', () => {
    const plan = planOf(
      [
        {
          symbol: 'bevel',
          kind: 'angle',
          expression: '45',
          tolerance: pm('0.5'),
          sense: 'setting',
        },
        { symbol: 'rise', origin: 'derived', expression: '100 mm * tan(bevel)' },
      ],
      [{ expression: 'bevel <= 45.2 deg' }],
    );
    const model = createModel(plan);
    expect(model.dimensions.get(idOf(1, 1))?.value?.x).toBeCloseTo(100, 9);
    const state = model.dimensions.get(idOf(1, 0))!;
    const judged = judgeReading(state, Rational.of(46), 'angle-gauge');
    expect(describeReading(judged, mm)).toBe('0.5° over: set it again.');
    const check = model.checks.get(idOf(2, 0))!;
    expect(describeCheck(model, check, mm)).toMatch(/^At risk: 0.2° to spare, 0.3° short/);
  });

  test('a change recomputes what depends on it and keeps the rest', () => {
    const plan = box();
    const model = createModel(plan);
    const dimensions = plan.dimensions.map((d) =>
      d.symbol === 'groove' ? { ...d, expression: '6.5 mm' } : d,
    );
    const next = model.update({ ...plan, dimensions });
    expect(next.dimensions.get(idOf(1, 1))).toBe(model.dimensions.get(idOf(1, 1)));
    expect(next.checks.get(idOf(2, 0))).toBe(model.checks.get(idOf(2, 0)));
    expect(next.checks.get(idOf(2, 1))?.verdict).toBe('fails');
    const renamed = plan.dimensions.map((d) =>
      d.symbol === 'groove' ? { ...d, symbol: 'slot' } : d,
    );
    const broken = model.update({ ...plan, dimensions: renamed });
    expect(broken.checks.get(idOf(2, 1))?.error).toMatchObject({ code: 'unknown-symbol' });
    expect(broken.update(plan).checks.get(idOf(2, 1))?.verdict).toBe('at-risk');
  });
});

describe('Faults in a plan', () => {
  test('a loop of 500 is spelled out in milliseconds; what hangs on it says so', () => {
    const ring = Array.from({ length: 500 }, (_, i) => ({
      symbol: `r${i}`,
      origin: 'derived' as const,
      expression: `r${(i + 1) % 500} + 1 mm`,
    }));
    const plan = planOf([...ring, { symbol: 'user', origin: 'derived', expression: 'r7 * 2' }]);
    const start = performance.now();
    const model = createModel(plan);
    expect(performance.now() - start).toBeLessThan(200);
    const error = model.dimensions.get(idOf(1, 3))?.error;
    expect(error).toMatchObject({ code: 'loop' });
    expect(error?.loop?.length).toBe(501);
    expect([error?.loop?.[0], error?.loop?.[1], error?.loop?.[500]]).toEqual(['r3', 'r4', 'r3']);
    expect(model.dimensions.get(idOf(1, 500))?.error).toMatchObject({ code: 'input' });
  });

  test('a chain of 10,000 is worked out without recursion', () => {
    const chain = Array.from({ length: 10_000 }, (_, i) => ({
      symbol: `c${i}`,
      origin: i === 0 ? ('given' as const) : ('derived' as const),
      expression: i === 0 ? '1 mm' : `c${i - 1} + 1 mm`,
    }));
    expect(createModel(planOf(chain)).dimensions.get(idOf(1, 9999))?.value?.x).toBe(10_000);
  });

  test.each([
    [{ symbol: 'a', expression: 'b + 2', origin: 'derived' }, 'expression', 'kind'],
    [{ symbol: 'a', expression: 'bb', origin: 'derived' }, 'expression', 'unknown-symbol'],
    [{ symbol: 'a', expression: 'a', origin: 'derived' }, 'expression', 'loop'],
    [{ symbol: 'a', expression: '3/0' }, 'expression', 'literal'],
    [{ symbol: 'min', expression: '3' }, 'symbol', 'reserved'],
    [{ symbol: 'b', expression: '3' }, null, null],
    [{ symbol: 'a', expression: '5 mm', tolerance: pm('b *') }, 'tolerance', 'syntax'],
    [
      { symbol: 'a', expression: '5000 mm', tolerance: { form: 'iso2768', class: 'm' } },
      'tolerance',
      'domain',
    ],
    [{ symbol: 'a', expression: '' }, 'expression', 'empty'],
    [{ symbol: 'a', expression: '-5 mm' }, 'expression', 'negative'],
  ] as const)('%j', (dimension, where, code) => {
    const model = createModel(planOf([dimension, { symbol: 'b', expression: '4 mm' }]));
    expect(model.dimensions.get(idOf(1, 0))?.error?.code ?? null).toBe(code);
    expect(model.dimensions.get(idOf(1, 0))?.error?.in ?? null).toBe(where);
    const second = model.dimensions.get(idOf(1, 1))?.error?.code ?? null;
    expect(second).toBe(dimension.symbol === 'b' ? 'duplicate' : null);
  });
});
