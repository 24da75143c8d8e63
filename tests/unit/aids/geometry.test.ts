import fc from 'fast-check';
import { aidOf } from '../../../shared/aids';
import { arcInput, workArc } from '../../../shared/aids/arc/arc';
import {
  equalSpacingInput,
  workEqualSpacing,
} from '../../../shared/aids/equal-spacing/equal-spacing';
import { mitreInput, workMitre } from '../../../shared/aids/mitre/mitre';
import { squarenessInput, workSquareness } from '../../../shared/aids/squareness/squareness';
import { taperInput, workTaper } from '../../../shared/aids/taper/taper';
import { worked } from './worked';

const seed = Number(process.env.SEED ?? Date.now() % 1_000_000);
const runs = { seed, numRuns: process.env.SCANTLING_LONG ? 5000 : 300 };
const degrees = Math.PI / 180;
const inch = 25.4;

describe('square by the diagonals', () => {
  const square = (input: object) => worked(workSquareness(squarenessInput.parse(input)));
  // Elementary geometry of the parallelogram (computed): sides, diagonals, degrees.
  test.each([
    [800, 600, 1001, 999, 0.11937],
    [800, 600, 1000, 1000, 0],
    [1200, 900, 1502, 1498, 0.15916],
    [2440, 1220, 2729, 2727, 0.05251],
  ])('%p × %p with diagonals %p and %p', (a, b, d1, d2, angle) => {
    expect(square({ a, b, d1, d2 }).angle).toBeCloseTo(angle, 5);
  });
  test('3-4-5 is square', () => {
    expect(square({ a: 900, b: 1200, d1: 1500, d2: 1500 })).toMatchObject({
      verdict: 'square',
      diagonal: 1500,
      shorten: 0,
    });
    expect(
      square({ a: 24 * inch, b: 32 * inch, d1: 40 * inch, d2: 40 * inch }).diagonal,
    ).toBeCloseTo(40 * inch, 9);
  });
  test('finds the angle of any parallelogram from its own diagonals', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 100, max: 3000, noNaN: true }),
        fc.double({ min: 100, max: 3000, noNaN: true }),
        fc.double({ min: -5, max: 5, noNaN: true }),
        (a, b, off) => {
          const corner = (90 - off) * degrees;
          const d1 = Math.sqrt(a * a + b * b + 2 * a * b * Math.cos(corner));
          const d2 = Math.sqrt(a * a + b * b - 2 * a * b * Math.cos(corner));
          expect(square({ a, b, d1, d2 }).angle).toBeCloseTo(off, 6);
        },
      ),
      runs,
    );
  });
  test('refuses diagonals that do not belong to the sides', () => {
    expect(aidOf('squareness')?.run({ a: 800, b: 600, d1: 1100, d2: 1090 })).toMatchObject({
      ok: false,
      field: 'd1',
    });
  });
});

describe('an arc over a chord', () => {
  const arc = (input: object) => worked(workArc(arcInput.parse(input)));
  // R = c²/(8s) + s/2 (computed): chord, rise, radius.
  test.each([
    [1000, 50, 2525],
    [600, 20, 2260],
    [48, 3, 97.5],
    [36, 4, 42.5],
    [2400, 10, 72_005],
  ])('chord %p, rise %p', (chord, rise, radius) => {
    expect(arc({ chord, rise }).radius).toBeCloseTo(radius, 9);
    expect(arc({ chord, radius }).rise).toBeCloseTo(rise, 6);
  });
  test('a half circle is the end of the range', () => {
    expect(arc({ chord: 200, rise: 100 })).toMatchObject({ radius: 100, angle: 180 });
    expect(aidOf('arc')?.run({ chord: 200, rise: 101 })).toMatchObject({
      ok: false,
      field: 'rise',
    });
    expect(aidOf('arc')?.run({ chord: 200, radius: 99 })).toMatchObject({
      ok: false,
      field: 'radius',
    });
    expect(aidOf('arc')?.run({ chord: 200 })).toMatchObject({ ok: false, field: 'rise' });
  });
  test('every ordinate lies on the circle, and rise and radius are inverse', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 10, max: 5000, noNaN: true }),
        fc.double({ min: 0.001, max: 0.5, noNaN: true }),
        (chord, share) => {
          const rise = share * chord;
          const { radius, ordinates } = arc({ chord, rise });
          expect(arc({ chord, radius }).rise / rise).toBeCloseTo(1, 6);
          for (const { x, y } of ordinates) {
            const r = Math.hypot(x - chord / 2, y - (rise - radius));
            expect(r / radius).toBeCloseTo(1, 9);
          }
        },
      ),
      runs,
    );
  });
});

describe('equal spacing', () => {
  const space = (input: object) => worked(workEqualSpacing(equalSpacingInput.parse(input)));
  // (W − n·w)/(n ± 1) (computed): opening, slats, width, gap with gaps at the ends, gap flush.
  test.each([
    [1000, 7, 60, 72.5, 96.66667],
    [36, 9, 1.5, 2.25, 2.8125],
    [600, 5, 40, 66.66667, 100],
  ])('%p with %p of %p', (opening, count, width, gaps, flush) => {
    expect(space({ opening, count, width }).gap).toBeCloseTo(gaps, 5);
    expect(space({ opening, count, width, ends: 'flush' }).gap).toBeCloseTo(flush, 5);
  });
  test('one slat flush is undefined', () => {
    expect(
      aidOf('equal-spacing')?.run({ opening: 9, count: 1, width: 1, ends: 'flush' }),
    ).toMatchObject({ ok: false, field: 'count' });
  });
  test('gaps and slats fill the opening; the fewest slats keep the gap within the limit, and one fewer does not', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 500, max: 5000 }),
        fc.integer({ min: 10, max: 60 }),
        fc.integer({ min: 20, max: 120 }),
        fc.constantFrom('gaps' as const, 'flush' as const),
        (opening, width, widest, ends) => {
          const asked = space({ opening, count: 2, width, ends, widest }).fewest ?? 0;
          if (asked * width > opening) return;
          const { gap, positions } = space({ opening, count: asked, width, ends });
          expect(gap).toBeLessThanOrEqual(widest + 1e-6);
          const last = (positions.at(-1) ?? 0) + width + (ends === 'gaps' ? gap : 0);
          expect(last).toBeCloseTo(opening, 6);
          const least = ends === 'gaps' ? 1 : 2;
          if (asked > least)
            expect(space({ opening, count: asked - 1, width, ends }).gap).toBeGreaterThan(
              widest - 1e-6,
            );
        },
      ),
      runs,
    );
  });
});

describe('mitres', () => {
  const mitre = (input: object) => worked(workMitre(mitreInput.parse(input)));
  // tan M = cos α tan(180/n), sin B = sin α sin(180/n) (computed, checked against vectors to 1e-3°).
  test.each([
    [4, 90, 0, 45, 90],
    [4, 75, 14.511, 43.08, 93.841],
    [4, 60, 26.565, 37.761, 104.478],
    [4, 45, 35.264, 30, 120],
    [4, 0, 45, 0, 180],
    [6, 75, 8.499, 28.879, 122.242],
    [8, 80, 4.114, 22.14, 135.72],
  ])('%p sides at %p°', (sides, slope, turn, tilt, dihedral) => {
    const r = mitre({ sides, slope });
    expect(r.mitre).toBeCloseTo(turn, 2);
    expect(r.bevel).toBeCloseTo(tilt, 2);
    expect(r.dihedral).toBeCloseTo(dihedral, 2);
  });
  // 180/n (computed).
  test.each([
    [3, 60],
    [4, 45],
    [5, 36],
    [6, 30],
    [8, 22.5],
    [10, 18],
    [12, 15],
  ])('a flat frame of %p', (sides, turn) => {
    expect(mitre({ sides }).mitre).toBeCloseTo(turn, 9);
    expect(mitre({ sides }).corner).toBeCloseTo(180 - 2 * turn, 9);
  });
  test('the side of an octagon across flats, of a hexagon across points (computed)', () => {
    expect(mitre({ sides: 8, acrossFlats: 1 }).side).toBeCloseTo(0.41421, 5);
    expect(mitre({ sides: 6, acrossPoints: 1 }).side).toBeCloseTo(0.5, 9);
  });
  test('faces that meet as vectors say', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 3, max: 24 }),
        fc.double({ min: 1, max: 90, noNaN: true }),
        (sides, slope) => {
          // Outward normals of two neighbouring faces, each tilted from upright by 90 − slope.
          const normal = (turn: number): [number, number, number] => [
            Math.sin(slope * degrees) * Math.cos(turn),
            Math.sin(slope * degrees) * Math.sin(turn),
            Math.cos(slope * degrees),
          ];
          const [p, q] = [normal(0), normal((2 * Math.PI) / sides)];
          const between = Math.acos(Math.min(1, p[0] * q[0] + p[1] * q[1] + p[2] * q[2])) / degrees;
          expect(mitre({ sides, slope }).dihedral).toBeCloseTo(180 - between, 4);
        },
      ),
      runs,
    );
  });
});

describe('tapers', () => {
  const taper = (input: object) => worked(workTaper(taperInput.parse(input)));
  // atan(d/L), 2·atan(d/2L) (computed).
  test.each([
    [{ length: 500, narrower: 15 }, 1.7184],
    [{ length: 24 * inch, narrower: 0.75 * inch }, 1.7899],
    [{ length: 500, narrower: 15, faces: 'both' }, 1.7187],
    [{ length: 24 * inch, narrower: 0.75 * inch, faces: 'both' }, 1.7903],
  ])('%p', (input, angle) => expect(taper(input).included).toBeCloseTo(angle, 4));
  // atan(1/k) (computed); 1:6 and 1:8 are common practice.
  test.each([
    [5, 11.31],
    [6, 9.462],
    [7, 8.13],
    [8, 7.125],
  ])('a dovetail of 1 in %p', (oneIn, angle) =>
    expect(taper({ oneIn }).perFace).toBeCloseTo(angle, 3),
  );
  test.each([[{}], [{ length: 5 }], [{ length: 5, narrower: 1, oneIn: 6 }]])(
    'refuses %p',
    (input) => {
      expect(aidOf('taper')?.run(input)).toMatchObject({ ok: false });
    },
  );
});
