import fc from 'fast-check';
import {
  displayLength,
  fromExact,
  gradeTolerance,
  angularTolerance,
  parseLength,
  Rational,
  toExact,
} from '../../../shared/measure';

const runs = { numRuns: process.env.SCANTLING_LONG ? 10_000 : 300 };
const mixed = fc.tuple(fc.integer({ min: 0, max: 3000 }), fc.integer({ min: 0, max: 63 }));

describe('Round trips', () => {
  test('what a tape shows of a marked length reads back as the same length', () => {
    fc.assert(
      fc.property(mixed, fc.boolean(), ([whole, marks], feet) => {
        const mm = Rational.of(whole * 64 + marks, 64).times(Rational.of(127, 5));
        const shown = displayLength(mm, { system: 'in', instrument: 'rule', grid: 64, feet });
        const read = parseLength(shown.text, { unit: 'mm' });
        expect(read.ok && read.value.mm.toString()).toBe(mm.toString());
        expect(shown.restMm).toBe(0);
      }),
      runs,
    );
  });

  test('a stored figure comes back exactly, through JSON', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 9_999_999 }),
        fc.integer({ min: 0, max: 4 }),
        (n, places) => {
          const text = `${(n / 10 ** places).toFixed(places)} mm`;
          const stored = toExact(text, 'in');
          if (!stored.ok) return expect(n / 10 ** places).toBeGreaterThan(100_000);
          const back = JSON.parse(JSON.stringify(stored.value)) as typeof stored.value;
          expect(back).toEqual(stored.value);
          expect(fromExact(back).mm.equals(Rational.of(n, 10 ** places))).toBe(true);
        },
      ),
      runs,
    );
  });

  test('never shows further from the exact value than half a mark', () => {
    const grids = fc.constantFrom(16 as const, 32 as const, 64 as const);
    fc.assert(
      fc.property(fc.bigInt({ min: -9_000_000n, max: 9_000_000n }), grids, (n, grid) => {
        const mm = Rational.of(n, 1000n);
        const tape = displayLength(mm, { system: 'in', instrument: 'tape', grid });
        expect(Math.abs(tape.restMm)).toBeLessThanOrEqual(25.4 / grid / 2 + 1e-12);
        const metric = displayLength(mm, { system: 'mm', instrument: 'rule', grid });
        expect(Math.abs(metric.restMm)).toBeLessThanOrEqual(0.25 + 1e-12);
      }),
      runs,
    );
  });

  test('any text is read or refused inside it, never thrown on', () => {
    const shop = fc.string({
      unit: fc.constantFrom(...'0123456789./-\'" ½inftmch⁄'),
      maxLength: 24,
    });
    fc.assert(
      fc.property(fc.oneof(shop, fc.string()), (text) => {
        const read = parseLength(text, { unit: 'mm' });
        if (read.ok) expect(read.value.mm.sign()).toBeGreaterThanOrEqual(0);
        else {
          expect(read.at).toBeGreaterThanOrEqual(0);
          expect(read.at).toBeLessThanOrEqual(text.length);
        }
      }),
      runs,
    );
  });
});

/** ISO 286-1:1988 annex A: i = 0.45·∛D + 0.001·D µm; multipliers from memory. The table rules, the formula checks it. */
const multipliers = { 6: 10, 7: 16, 8: 25, 9: 40, 10: 64, 11: 100, 12: 160 } as const;
const steps = [3, 6, 10, 18, 30, 50, 80, 120, 180, 250];

describe('Tolerance tables', () => {
  test.each(steps.slice(1).map((to, i) => [steps[i]!, to]))(
    'ISO 286 grades over %i to %i follow the formula',
    (over, to) => {
      const d = Math.sqrt(over * to);
      const unit = 0.45 * Math.cbrt(d) + 0.001 * d;
      for (const grade of [6, 7, 8, 9, 10, 11, 12] as const) {
        const tabled = (gradeTolerance(to, grade) ?? 0) * 1000;
        expect(Math.abs(tabled / (unit * multipliers[grade]) - 1)).toBeLessThan(0.1);
      }
    },
  );

  // Two transcriptions of ISO 286-1 agree on these rows; 30 mm belongs to 18-30.
  test.each([
    [30, 7, 0.021],
    [30.1, 7, 0.025],
    [100, 11, 0.22],
    [6, 12, 0.12],
    [3, 7, null],
  ] as const)('%f mm in IT%i is %p', (size, grade, mm) => {
    expect(gradeTolerance(size, grade)).toBe(mm);
  });

  test('ISO 2768-1 table 3: 90° on a 300 mm leg, m, is ±0°10′, 0.873 mm at its end', () => {
    const half = angularTolerance(300, 'm');
    expect(half * 60).toBeCloseTo(10, 12);
    expect(300 * Math.tan((half * Math.PI) / 180)).toBeCloseTo(0.873, 3);
  });
});
