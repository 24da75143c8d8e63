import fc from 'fast-check';
import { create, all } from 'mathjs';
import { bladeSpeedInput, workBladeSpeed } from '../../../shared/aids/blade-speed/blade-speed';
import { riseAndRunInput, workRiseAndRun } from '../../../shared/aids/rise-and-run/rise-and-run';
import { sawDepthInput, workSawDepth } from '../../../shared/aids/saw-depth/saw-depth';
import { chord, rimSpeed, speedLimit } from '../../../shared/trade/saws';
import { finite, worked } from './worked';

if (!all) throw new Error('mathjs has no functions.');
const math = create(all);

describe('rim speed v = π D N / 60 (computed)', () => {
  it.each([
    [254, 4000, 53.2, 10472],
    [254, 3450, 45.88, 9032],
    [250, 4500, 58.9, 11595],
    [315, 3000, 49.48, 9740],
    // 305 mm: the row's feet are of 12 in (304.8) within a foot or two.
    [305, 3900, 62.28, 12260],
    [185, 5800, 56.18, 11059],
  ])('%i mm at %i', (diameter, rpm, metres, feet) => {
    const r = worked(workBladeSpeed(bladeSpeedInput.parse({ diameter, rpm })));
    expect(r.metresPerSecond).toBeCloseTo(metres, 2);
    expect(Math.abs(r.feetPerMinute - feet)).toBeLessThan(1);
    expect(r.feetPerMinute).toBeCloseTo(
      math.unit(r.metresPerSecond, 'm/s').toNumber('ft/minute'),
      6,
    );
    expect(speedLimit(diameter, r.metresPerSecond)).toBeCloseTo(rpm, 6);
  });

  const speed = (input: object) =>
    worked(workBladeSpeed(bladeSpeedInput.parse({ diameter: 250, rpm: 4500, ...input })));

  it('never exceeds the mark (WAC 296-78-70509(5), read), and says nothing without one', () => {
    expect(speed({ marked: 4500 }).verdict).toBe('under');
    expect(speed({ marked: 4499 })).toMatchObject({ verdict: 'over', margin: -1 });
    expect(speed({}).verdict).toBe('no-mark');
  });

  it('wants a blade of at least 60 % of the largest (HSE circular saw bench, read)', () => {
    expect(speed({ largest: 315 }).size).toBe('fits');
    expect(speed({ diameter: 180, largest: 315 }).size).toBe('too-small');
    expect(speed({ diameter: 189, largest: 315 }).size).toBe('fits');
    expect(speed({ diameter: 350, largest: 315 }).size).toBe('too-large');
  });

  it.each([
    ['an inch figure as mm', { diameter: 0.4 }],
    ['rev/s for rev/min', { rpm: 40 }],
    ['a router’s speed for a saw blade', { diameter: 300, rpm: 24000 }],
    ['nothing turning', { rpm: 0 }],
  ])('refuses %s', (_, input) => {
    expect(
      workBladeSpeed(bladeSpeedInput.parse({ diameter: 250, rpm: 4500, ...input })),
    ).toMatchObject({ ok: false });
  });
});

describe('depth of cut and chord (computed)', () => {
  const depth = (input: object) => worked(workSawDepth(sawDepthInput.parse(input)));
  it.each([
    [254, 50, 77, 54.45],
    [305, 60, 92.5, 65.41],
  ])('%i mm, arbor %i below: %f upright, %f at 45°', (diameter, arborBelow, h, at45) => {
    expect(depth({ diameter, arborBelow }).left).toBeCloseTo(h, 6);
    expect(depth({ diameter, arborBelow, bevel: 45 }).left).toBeCloseTo(at45, 2);
  });

  it.each([
    [254, 25, 151.33],
    [254, 50, 201.99],
    [250, 40, 183.3],
  ])('%i mm raised %i: chord %f', (diameter, height, length) => {
    expect(chord(diameter, height)).toBeCloseTo(length, 2);
  });

  it('takes the base off, and the chord at its face with it', () => {
    const r = depth({ diameter: 254, arborBelow: 50, base: 27 });
    expect(r.left).toBeCloseTo(50, 6);
    expect(r.chordAtBase).toBeCloseTo(201.99, 2);
  });

  const saw = fc.record({
    diameter: fc.double({ min: 150, max: 400, noNaN: true }),
    arborBelow: fc.double({ min: 5, max: 60, noNaN: true }),
    base: fc.double({ min: 0, max: 40, noNaN: true }),
    bevel: fc.double({ min: 0, max: 50, noNaN: true }),
  });
  it('loses a base exactly, loses more with tilt, chord never longer than the blade; or refuses', () => {
    fc.assert(
      fc.property(saw, (input) => {
        const outcome = workSawDepth(sawDepthInput.parse(input));
        if (!outcome.ok) return expect(outcome.cure).not.toBe('');
        const r = outcome.result;
        expect(r.upright - r.left).toBeCloseTo(input.base, 9);
        expect(r.chordAtTable).toBeLessThanOrEqual(input.diameter + 1e-9);
        expect(r.chordAtBase).toBeLessThanOrEqual(r.chordAtTable + 1e-9);
        expect(depth({ ...input, bevel: 0 }).left).toBeGreaterThanOrEqual(r.left);
        // The line through the blade at that height, cut again: h = r − √(r² − (c/2)²).
        const half = input.diameter / 2;
        const back = half - Math.sqrt(half ** 2 - (r.chordAtTable / 2) ** 2);
        expect(back).toBeCloseTo(r.full, 4);
        return expect(finite(r)).toBe(true);
      }),
    );
  });

  it('says through, short, or too near to tell', () => {
    const of = (stock: number) => depth({ diameter: 254, arborBelow: 50, base: 20, stock }).verdict;
    expect([of(50), of(57), of(60)]).toEqual(['through', 'near', 'short']);
  });

  it.each([
    ['an arbor deeper than the blade', { diameter: 200, arborBelow: 120 }],
    ['a base thicker than the cut', { diameter: 254, arborBelow: 50, base: 90 }],
    ['a tilt of 90°', { diameter: 254, arborBelow: 50, bevel: 90 }],
    ['a tilt under zero', { diameter: 254, arborBelow: 50, bevel: -5 }],
  ])('refuses %s', (_, input) => {
    expect(workSawDepth(sawDepthInput.parse(input))).toMatchObject({ ok: false });
  });
});

describe('angle by rise and run', () => {
  const of = (rise: number, run: number) =>
    worked(workRiseAndRun(riseAndRunInput.parse({ rise, run })));
  // Computed (§9 taper rows, dovetail slopes are the same arctangent).
  it.each([
    [15, 500, 1.7184],
    [19.05, 609.6, 1.7899],
    [50, 250, 11.31],
    [30, 180, 9.462],
    [20, 140, 8.13],
    [10, 80, 7.125],
  ])('%f over %f: %f°', (rise, run, angle) => {
    expect(of(rise, run).angle).toBeCloseTo(angle, 3);
    expect(of(rise, run).angle).toBeCloseTo(
      math.unit(math.atan(rise / run), 'rad').toNumber('deg'),
      9,
    );
  });

  it('is odd in the rise, undone by the tangent, and surer over a longer run', () => {
    const length = fc.double({ min: 10, max: 2000, noNaN: true });
    fc.assert(
      fc.property(length, length, (rise, run) => {
        const r = of(rise, run);
        expect(of(-rise, run).angle).toBeCloseTo(-r.angle, 9);
        expect(run * Math.tan((r.angle * Math.PI) / 180)).toBeCloseTo(rise, 6);
        expect(of(2 * rise, 2 * run).uncertainty).toBeCloseTo(r.uncertainty / 2, 9);
        expect(rimSpeed(run, 100)).toBeGreaterThan(0);
      }),
    );
  });

  it('refuses what is smaller than its error', () => {
    const input = riseAndRunInput.parse({ rise: 0.1, run: 0.3 });
    expect(workRiseAndRun(input)).toMatchObject({ ok: false });
  });
});
