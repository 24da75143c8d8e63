import fc from 'fast-check';
import {
  screwHolesInput,
  shankOf,
  workScrewHoles,
} from '../../../shared/aids/screw-holes/screw-holes';
import { screwLengthInput, workScrewLength } from '../../../shared/aids/screw-length/screw-length';
import { drillAtLeast, drillsOf, nearestDrill } from '../../../shared/trade/drills';
import { woodScrews } from '../../../shared/trade/screws.data';
import { finite, worked } from './worked';

const inch = 25.4;
const holes = (input: object) => worked(workScrewHoles(screwHolesInput.parse(input)));
const sixtyFourths = (mm: number) => (mm / inch) * 64;

describe('pilot and clearance of US screws, to the nearest 1/64', () => {
  // Computed with root = 2/3 D and the Wood Handbook's 70 and 90 % (from memory): pilots and clearance in 64ths.
  it.each([
    [4, 0.0747, 0.0523, 0.0672, 3, 4, 8],
    [6, 0.092, 0.0644, 0.0828, 4, 5, 9],
    [8, 0.1093, 0.0765, 0.0984, 5, 6, 11],
    [10, 0.1267, 0.0887, 0.114, 6, 7, 13],
    [12, 0.144, 0.1008, 0.1296, 6, 8, 14],
    [14, 0.1613, 0.1129, 0.1452, 7, 9, 16],
  ])('No. %i', (gauge, root, softSize, hardSize, soft, hard, clear) => {
    const s = holes({ series: 'us', gauge, wood: 'soft' });
    const h = holes({ series: 'us', gauge, wood: 'hard' });
    expect(s.root / inch).toBeCloseTo(root, 3);
    expect(s.pilot.wanted / inch).toBeCloseTo(softSize, 3);
    expect(h.pilot.wanted / inch).toBeCloseTo(hardSize, 3);
    expect(sixtyFourths(s.pilot.drill!.mm)).toBeCloseTo(soft, 6);
    expect(sixtyFourths(h.pilot.drill!.mm)).toBeCloseTo(hard, 6);
    expect(sixtyFourths(s.clearance.drill!.mm)).toBeCloseTo(clear, 6);
    expect(s.countersink.angle).toBe(82);
  });
});

describe('British and American series apart', () => {
  // US D = 0.060 + 0.013 N (ASME B18.6.1, read twice removed); British 0.066 at No. 1 + 0.014 (read in a text).
  it.each([
    [8, 0.164, 0.164],
    [4, 0.112, 0.108],
    [12, 0.216, 0.22],
  ])('No. %i: %f and %f in', (gauge, us, british) => {
    expect(worked(shankOf({ series: 'us', gauge })) / inch).toBeCloseTo(us, 6);
    expect(worked(shankOf({ series: 'british', gauge })) / inch).toBeCloseTo(british, 6);
  });

  it.each([8, 10])(
    'British rule of thumb for No. %i: clearance in 64ths is N + 3 (read)',
    (gauge) => {
      const { clearance } = holes({ series: 'british', gauge, wood: 'soft' });
      expect(sixtyFourths(clearance.drill!.mm)).toBeCloseTo(gauge + 3, 6);
    },
  );
});

// Computed from a cone: 0.332 in over 0.177 in, 82° → 0.0892 in; 8 over 4 mm, 90° → 2.0 mm.
it('sinks heads by the series’ own angle', () => {
  const us = holes({
    series: 'us',
    gauge: 8,
    wood: 'soft',
    head: 0.332 * inch,
    drills: [0.177 * inch],
  });
  expect(us.countersink.depth / inch).toBeCloseTo(0.0892, 4);
  const metric = holes({ series: 'metric', gauge: 4, wood: 'soft', head: 8, drills: [4] });
  expect(metric.countersink.angle).toBe(90);
  expect(metric.countersink.depth).toBeCloseTo(2, 9);
});

it('trade chart and handbook differ and are named (85 and 100 %, read twice removed)', () => {
  const by = (rule: string, wood: string) =>
    holes({ series: 'us', gauge: 8, wood, rule }).pilot.wanted / inch;
  expect(by('trade-chart', 'soft')).toBeCloseTo(0.0929, 4);
  expect(by('trade-chart', 'hard')).toBeCloseTo(0.1093, 4);
  expect(by('wood-handbook', 'hard')).toBeCloseTo(0.0984, 4);
});

describe('drills on hand', () => {
  it('names none rather than one that is far off', () => {
    const r = holes({ series: 'us', gauge: 8, wood: 'soft', drills: [6, 10] });
    expect(r.pilot.drill).toBeNull();
    expect(r.clearance.drill).toBeNull();
  });

  it('has the whole fraction series generated, in lowest terms', () => {
    const names = drillsOf('fraction').map(({ name }) => name);
    expect(names).toHaveLength(64);
    expect(names).toEqual(expect.arrayContaining(['7/64 in', '1/4 in', '1 in', '63/64 in']));
    expect(drillsOf('fraction').find(({ name }) => name === '7/64 in')!.mm).toBeCloseTo(
      2.778125,
      9,
    );
  });

  // ASME B94.11M, two open tables agree: letter E is 1/4 in; numbers fall as they rise.
  it('keeps numbers and letters in their order', () => {
    expect(drillsOf('letter').find(({ name }) => name === 'E')!.mm).toBeCloseTo(6.35, 9);
    const numbers = drillsOf('number').map(({ name }) => Number(name.slice(4)));
    expect(numbers).toEqual([...numbers].sort((a, b) => b - a));
    expect(drillsOf('metric')).toHaveLength(150);
  });

  it('nearest is as near as any, at least is never under', () => {
    const hundredths = fc.integer({ min: 50, max: 2000 }).map((n) => n / 100);
    const set = fc.array(hundredths, {
      minLength: 1,
      maxLength: 30,
    });
    fc.assert(
      fc.property(set, hundredths, (sizes, wanted) => {
        const drills = sizes.map((mm) => ({ name: '', mm }));
        const best = Math.min(...sizes.map((mm) => Math.abs(mm - wanted)));
        expect(Math.abs(nearestDrill(wanted, drills)!.mm - wanted)).toBeCloseTo(best, 8);
        const over = sizes.filter((mm) => mm >= wanted);
        const found = drillAtLeast(wanted, drills);
        if (over.length > 0) expect(found!.mm).toBeCloseTo(Math.min(...over), 8);
      }),
    );
  });
});

describe('any screw that is made', () => {
  const screw = fc.record({
    series: fc.constantFrom('us' as const, 'british' as const),
    gauge: fc.constantFrom(...woodScrews.map(({ number }) => number).filter((n) => n > 0)),
    wood: fc.constantFrom('soft' as const, 'hard' as const),
    drillSeries: fc.constantFrom('fraction' as const, 'metric' as const),
  });
  it('has pilot < root < shank ≤ clearance < head, and hardwood wants the larger pilot', () => {
    fc.assert(
      fc.property(screw, (input) => {
        const r = holes(input);
        expect(r.pilot.wanted).toBeLessThan(r.root);
        expect(r.root).toBeLessThan(r.shank);
        expect(r.clearance.drill!.mm).toBeGreaterThanOrEqual(r.shank - 1e-6);
        expect(r.head).toBeGreaterThan(r.shank);
        expect(holes({ ...input, wood: 'hard' }).pilot.wanted).toBeGreaterThanOrEqual(
          r.pilot.wanted,
        );
        expect(finite(r)).toBe(true);
      }),
    );
  });
});

it.each([
  ['a number that is not made', { series: 'us', gauge: 11 }],
  ['half a number', { series: 'us', gauge: 8.5 }],
  ['British No. 0', { series: 'british', gauge: 0 }],
  ['a metric screw of 40 mm', { series: 'metric', gauge: 40 }],
  ['a root thicker than the shank', { series: 'us', gauge: 8, root: 5 }],
  ['a head narrower than the shank', { series: 'us', gauge: 8, head: 3 }],
])('refuses %s', (_, input) => {
  expect(workScrewHoles(screwHolesInput.parse({ wood: 'soft', ...input }))).toMatchObject({
    ok: false,
  });
});

describe('the longest screw for a stack', () => {
  const length = (input: object) => worked(workScrewLength(screwLengthInput.parse(input)));

  it('3/4 in through, 3/4 in into, No. 8: 1 1/4 in, half an inch of bite (computed)', () => {
    const t = 0.75 * inch;
    const r = length({ series: 'us', gauge: 8, through: [t], into: t });
    expect(r.length).toBeCloseTo(1.25 * inch, 9);
    expect(r.bite).toBeCloseTo(0.5 * inch, 9);
    expect(r.left).toBeCloseTo(0.25 * inch, 9);
    // 12.7 / 4.1656 = 3.05 diameters; less half a millimetre it is under three (common practice).
    expect(r.biteDiameters).toBeCloseTo(3.049, 3);
    expect(r.enough).toBe(false);
    // Two thirds threaded (US, from memory): 21.17 mm, of which 12.7 bite.
    expect(r.threadAbove).toBeCloseTo(8.467, 3);
  });

  const stack = fc.record({
    series: fc.constantFrom('us' as const, 'metric' as const),
    gauge: fc.constantFrom(4, 5, 6),
    through: fc.array(fc.double({ min: 3, max: 40, noNaN: true }), { minLength: 1, maxLength: 4 }),
    into: fc.double({ min: 3, max: 100, noNaN: true }),
    sunk: fc.double({ min: 0, max: 2.9, noNaN: true }),
  });
  it('never comes through, always reaches, or refuses', () => {
    fc.assert(
      fc.property(stack, (input) => {
        const outcome = workScrewLength(screwLengthInput.parse(input));
        if (!outcome.ok) return expect(outcome.reason).not.toBe('');
        const r = outcome.result;
        expect(r.left).toBeGreaterThanOrEqual(3.5 - 1e-9);
        expect(r.bite).toBeGreaterThan(0);
        expect(r.bite + r.left).toBeCloseTo(input.into, 6);
        expect(finite(r)).toBe(true);
        const deeper = length({ ...input, into: input.into + 10 });
        return expect(deeper.length).toBeGreaterThanOrEqual(r.length);
      }),
    );
  });

  it.each([
    ['a stack too thin for any length', { through: [3], into: 3, left: 3 }],
    ['a head sunk through the piece', { through: [10], into: 30, sunk: 12 }],
    ['lengths that do not reach', { through: [40], into: 20, lengths: [30] }],
  ])('refuses %s', (_, input) => {
    const parsed = screwLengthInput.parse({ series: 'us', gauge: 8, ...input });
    expect(workScrewLength(parsed)).toMatchObject({ ok: false });
  });
});
