import fc from 'fast-check';
import { glueWaitInput, workGlueWait } from '../../../shared/aids/glue-wait/glue-wait';
import { noiseDoseInput, workNoiseDose } from '../../../shared/aids/noise-dose/noise-dose';
import { clampPressure, glueFamilies } from '../../../shared/trade/glue.data';
import { noiseDose, permittedMinutes, timeWeightedAverage } from '../../../shared/trade/noise';
import { finite, worked } from './worked';

// OSHA 29 CFR 1910.95 Table G-16a (read; one page prints 21.2 at 83 dB, the formula gives 21.1) and NIOSH 98-126
// minutes (exact, computed from the formula read twice removed).
const levels: [number, number, number, number][] = [
  [80, 32, 32, 1523.9],
  [83, 21.1, 21.112, 761.95],
  [85, 16, 16, 480],
  [88, 10.6, 10.556, 240],
  [90, 8, 8, 151.19],
  [92, 6.1, 6.063, 95.24],
  [95, 4, 4, 47.62],
  [97, 3.0, 3.031, 30],
  [100, 2, 2, 15],
  [105, 1, 1, 4.72],
  [110, 0.5, 0.5, 1.49],
  [115, 0.25, 0.25, 0.47],
];

describe('permitted time', () => {
  it.each(levels)(
    '%i dBA: %f h in the table, %f exact; NIOSH %f min',
    (level, table, hours, minutes) => {
      const osha = permittedMinutes('osha', level) / 60;
      expect(osha).toBeCloseTo(hours, 2);
      // G-16a prints one decimal and cuts 10.556 to 10.6, 6.063 to 6.1.
      expect(Math.abs(osha - table)).toBeLessThanOrEqual(0.05);
      expect(Math.abs(permittedMinutes('niosh', level) - minutes)).toBeLessThanOrEqual(0.05);
    },
  );
});

const dose = (day: [number, number][]) =>
  worked(
    workNoiseDose(
      noiseDoseInput.parse({ day: day.map(([level, h]) => ({ level, minutes: h * 60 })) }),
    ),
  );

describe('doses', () => {
  it('92 dBA for 8 h is 131.95 % exact (131 by the rounded table, read twice removed)', () => {
    expect(dose([[92, 8]]).osha.dose).toBeCloseTo(131.95, 2);
    expect((100 * 8) / 6.1).toBeCloseTo(131.1, 1);
  });

  it('95 dBA 2 h, 90 dBA 3 h, 100 dBA 1 h: OSHA 137.5 %, TWA 92.30 (computed)', () => {
    const { osha } = dose([
      [95, 2],
      [90, 3],
      [100, 1],
    ]);
    expect(osha.dose).toBeCloseTo(137.5, 9);
    expect(osha.average).toBeCloseTo(92.3, 2);
  });

  it('95 dBA 2 h, 100 dBA 0.5 h, 88 dBA 1 h: NIOSH 477.0 %, TWA 91.79 (computed)', () => {
    const r = dose([
      [95, 2],
      [100, 0.5],
      [88, 1],
    ]);
    expect(r.niosh.dose).toBeCloseTo(477, 1);
    expect(r.niosh.average).toBeCloseTo(91.79, 2);
    expect(r.verdict).toBe('over');
  });

  it('90 dBA for 4 h is OSHA’s action level of 50 % and far over NIOSH’s day', () => {
    const r = dose([[90, 4]]);
    expect(r.osha.dose).toBeCloseTo(50, 9);
    expect(r).toMatchObject({ action: true, verdict: 'over' });
  });

  it('counts nothing under 80 dBA, and warns over 115', () => {
    expect(dose([[75, 8]])).toMatchObject({ niosh: { dose: 0, average: null }, verdict: 'under' });
    expect(dose([[120, 0.01]]).tooLoud).toBe(true);
    expect(dose([[115, 0.01]]).tooLoud).toBe(false);
  });

  it('adds up whatever the order, halves with half the time, and the TWA held 8 h gives the dose back', () => {
    const entry = fc.record({
      level: fc.double({ min: 80, max: 115, noNaN: true }),
      minutes: fc.double({ min: 1, max: 100, noNaN: true }),
    });
    fc.assert(
      fc.property(fc.array(entry, { minLength: 1, maxLength: 8 }), (day) => {
        for (const rule of ['niosh', 'osha'] as const) {
          const whole = noiseDose(rule, day);
          expect(noiseDose(rule, [...day].reverse())).toBeCloseTo(whole, 6);
          expect(
            noiseDose(
              rule,
              day.map((e) => ({ ...e, minutes: e.minutes / 2 })),
            ),
          ).toBeCloseTo(whole / 2, 6);
          const level = timeWeightedAverage(rule, whole) ?? 0;
          // 16.61 is 5/log₁₀2 rounded, 10 is 3/log₁₀2 rounded: the round trip is good to half a percent.
          if (level >= 80)
            expect(noiseDose(rule, [{ level, minutes: 480 }]) / whole).toBeCloseTo(1, 1);
        }
        expect(noiseDose('niosh', day)).toBeGreaterThanOrEqual(noiseDose('osha', day));
        expect(finite(worked(workNoiseDose(noiseDoseInput.parse({ day }))))).toBe(true);
      }),
    );
  });

  it.each([
    ['a jet', [[150, 1]]],
    ['a level that is no level', [[5, 1]]],
    ['a time under zero', [[90, -1]]],
    ['a day of 30 hours', [[90, 30]]],
  ] as [string, [number, number][]][])('refuses %s', (_, day) => {
    const input = { day: day.map(([level, h]) => ({ level, minutes: h * 60 })) };
    expect(workNoiseDose(noiseDoseInput.parse(input))).toMatchObject({ ok: false });
  });
});

describe('glue waits', () => {
  const wait = (input: object) =>
    worked(workGlueWait(glueWaitInput.parse({ family: 'pva-yellow', celsius: 20, ...input })));

  // PVA 30–60 min unstressed, 24 h stressed (a maker's guide, read twice removed); open time from memory.
  it('fills what the label does not say with placeholders, and says so', () => {
    expect(wait({})).toMatchObject({
      open: { low: 5, high: 10, from: 'placeholder' },
      clamp: { low: 30, high: 60, from: 'placeholder' },
      cure: { low: 1440, high: 1440, from: 'placeholder' },
    });
    expect(wait({ stressed: true }).clamp.low).toBe(1440);
  });

  it('lets the label win, field by field', () => {
    const r = wait({ label: { clamp: 45, least: 5 }, celsius: 6 });
    expect(r.clamp).toEqual({ low: 45, high: 45, from: 'label' });
    expect(r.least).toEqual({ celsius: 5, from: 'label' });
    expect(r.cure.from).toBe('placeholder');
  });

  // 100–150, 150–200, 200–300 psi (read twice removed).
  it.each([
    ['soft', 100, 150],
    ['medium', 150, 200],
    ['hard', 200, 300],
  ] as const)('%s wood: %i to %i psi', (wood, low, high) => {
    const psi = (0.45359237 * 9.80665) / 25.4 ** 2;
    expect(clampPressure[wood][0]).toBeCloseTo(low * psi, 2);
    expect(clampPressure[wood][1]).toBeCloseTo(high * psi, 2);
    const [least] = wait({ wood, faceLength: 100, faceWidth: 100 }).force ?? [0];
    expect(least).toBeCloseTo(clampPressure[wood][0] * 10, 9);
  });

  it('asks no such force of epoxy, which fills gaps under light pressure', () => {
    expect(wait({ family: 'epoxy', faceLength: 100, faceWidth: 100 }).force).toBeNull();
  });

  it('compares the assembly with the open time', () => {
    expect([3, 8, 15].map((assembly) => wait({ assembly }).assembly)).toEqual([
      'fits',
      'may-not',
      'too-long',
    ]);
  });

  it.each(glueFamilies)('$name: clamps after it is open, cures after it is clamped', (family) => {
    expect(family.clamp[0]).toBeLessThanOrEqual(family.clamp[1]);
    expect(family.cure[1]).toBeGreaterThanOrEqual(family.clamp[1]);
    expect(family.mark).toMatch(/memory|guide/);
  });

  it.each([
    ['a shop under the label’s temperature', { celsius: 4 }],
    ['a shop under the person’s own figure', { celsius: 14, label: { least: 15 } }],
    ['°F by mistake', { celsius: 68 }],
    ['a glue that is no family', { family: 'chewing gum' }],
  ])('refuses %s', (_, input) => {
    const parsed = glueWaitInput.parse({ family: 'pva-yellow', celsius: 20, ...input });
    expect(workGlueWait(parsed)).toMatchObject({ ok: false });
  });
});
