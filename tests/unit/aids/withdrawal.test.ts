import fc from 'fast-check';
import { create, all } from 'mathjs';
import { withdrawalInput, workWithdrawal } from '../../../shared/aids/withdrawal/withdrawal';
import {
  allowableWithdrawal,
  poundForce,
  ultimateWithdrawal,
} from '../../../shared/trade/withdrawal';
import { finite, worked } from './worked';

if (!all) throw new Error('mathjs has no functions.');
const math = create(all);
const inch = 25.4;
const pounds = (newtons: number) => newtons / poundForce;

describe('check rows, pounds', () => {
  // Computed from the handbook's ultimate form (15 700 G² D L, from memory) and read/computed NDS allowables.
  it.each([
    ['screw G 0.70, No. 8, 1 in', 'screw', 0.7, 0.164, 1, 1261.7, null],
    ['screw G 0.66, No. 8, 1 in (4989 N)', 'screw', 0.66, 0.164, 1, 1121.6, null],
    ['screw G 0.42, No. 8, 1 in', 'screw', 0.42, 0.164, 1, 454.2, 82.4],
    ['nail G 0.51, 0.131, 1.25 in', 'nail', 0.51, 0.131, 1.25, 238.8, 42.0],
    ['nail G 0.50, 0.148, 1.5 in', 'nail', 0.5, 0.148, 1.5, 308.1, null],
  ] as const)('%s', (_, kind, gravity, d, bite, ultimate, allowable) => {
    expect(pounds(ultimateWithdrawal(kind, gravity, d * inch, bite * inch))).toBeCloseTo(
      ultimate,
      1,
    );
    if (allowable !== null)
      expect(pounds(allowableWithdrawal(kind, gravity, d * inch, bite * inch))).toBeCloseTo(
        allowable,
        1,
      );
  });

  it('NDS-type, G 0.45, No. 10: 109.65 lb per inch (an engineering handbook prints 109)', () => {
    expect(pounds(allowableWithdrawal('screw', 0.45, 0.19 * inch, inch))).toBeCloseTo(109.65, 2);
  });

  it('4989 N is 1121.6 lb', () => {
    expect(ultimateWithdrawal('screw', 0.66, 0.164 * inch, inch)).toBeCloseTo(4989, 0);
  });

  it.each([
    [15_700, 108.25],
    [7_850, 54.12],
  ])('%i psi are %f MPa, as mathjs converts them too', (psi, mpa) => {
    expect(math.unit(psi, 'psi').toNumber('MPa')).toBeCloseTo(mpa, 1);
    const ours = ultimateWithdrawal(psi === 15_700 ? 'screw' : 'nail', 1, 1, 1);
    expect(ours / math.unit(psi, 'psi').toNumber('MPa')).toBeCloseTo(1, 6);
  });
});

const fastener = fc.record({
  fastener: fc.constantFrom('screw' as const, 'nail' as const),
  gravity: fc.double({ min: 0.31, max: 0.73, noNaN: true }),
  diameter: fc.double({ min: 1.6, max: 4.8, noNaN: true }),
  bite: fc.double({ min: 30, max: 100, noNaN: true }),
  grain: fc.constant('side' as const),
});

it('keeps ultimate and allowable 5.5 to 5.7 times apart and rises with wood, shank and bite', () => {
  fc.assert(
    fc.property(fastener, (input) => {
      const work = (more: object) =>
        worked(workWithdrawal(withdrawalInput.parse({ ...input, ...more })));
      const r = work({});
      expect(r.ratio).toBeGreaterThan(5.5);
      expect(r.ratio).toBeLessThan(5.7);
      expect(work({ bite: input.bite + 1 }).ultimate).toBeGreaterThan(r.ultimate);
      expect(work({ gravity: 0.73 }).allowable).toBeGreaterThanOrEqual(r.allowable);
      expect(finite(r)).toBe(true);
    }),
  );
});

it.each([
  // Not loaded in withdrawal from end grain (GTR-190, read).
  ['end grain', { grain: 'end' }],
  ['a gravity given as kg/m³', { gravity: 450 }],
  ['balsa', { gravity: 0.16 }],
  ['a bolt', { diameter: 20 }],
  ['five diameters of bite (NDS minimum 6, from memory)', { bite: 20 }],
  // ½ in 1–6 … 3 in 12–20 (GTR-190 ch. 8, from memory).
  ['No. 12 in a screw of half an inch', { number: 12, length: 0.5 * inch }],
  ['No. 4 in a screw of 3 in', { number: 4, length: 3 * inch }],
  ['a screw of 5 in', { number: 14, length: 5 * inch }],
])('refuses %s', (_, change) => {
  const input = {
    fastener: 'screw',
    gravity: 0.5,
    diameter: 4.1656,
    bite: 30,
    grain: 'side',
    ...change,
  };
  expect(workWithdrawal(withdrawalInput.parse(input))).toMatchObject({ ok: false });
});

it('takes a No. 8 of 1 1/2 in, which was tried', () => {
  const input = {
    fastener: 'screw',
    gravity: 0.5,
    diameter: 4.1656,
    bite: 30,
    grain: 'side',
    number: 8,
    length: 1.5 * inch,
  };
  expect(workWithdrawal(withdrawalInput.parse(input))).toMatchObject({ ok: true });
});
