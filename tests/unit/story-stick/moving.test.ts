import fc from 'fast-check';
import { benchNumberAt } from '../../../shared/plan/stick/bench';
import { handsOnTimes } from '../../../shared/plan/stick/hands-on';
import { bodyLength, panOffset } from '../../../shared/plan/stick/pan';
import { currentStep, stepAtTime, stickScale } from '../../../shared/plan/stick/scale';
import { markRange, nudgeMark, snapTime } from '../../../shared/plan/stick/snap';
import { clockTime, spokenTime, stickValueText } from '../../../shared/plan/stick/spoken';
import { type StickStep } from '../../../shared/plan/stick/types';

const step = (
  number: number,
  start: number,
  end: number,
  more: Partial<StickStep> = {},
): StickStep => ({
  id: `s${number}`,
  number,
  title: `Step ${number}`,
  start,
  end,
  state: 'open',
  verdicts: [],
  waits: [],
  talk: [],
  ...more,
});
const steps = [step(1, 0, 10), step(2, 10, 20, { state: 'current' }), step(3, 20, 30)];

describe('scale', () => {
  test('goes there and back', () => {
    const seconds = fc.double({ min: 0, max: 742, noNaN: true });
    fc.assert(
      fc.property(seconds, fc.integer({ min: 60, max: 2000 }), (t, length) => {
        const scale = stickScale(length, 742);
        expect(scale.timeAt(scale.at(t))).toBeCloseTo(t, 6);
      }),
    );
  });

  test('a place off the stick is its end', () => {
    expect(stickScale(100, 60).timeAt(-20)).toBe(0);
    expect(stickScale(100, 60).timeAt(500)).toBe(60);
  });

  test('finds the step of a time and the step in hand', () => {
    expect(stepAtTime(steps, 19.9)?.number).toBe(2);
    expect(stepAtTime(steps, 20)?.number).toBe(3);
    expect(stepAtTime([], 5)).toBeUndefined();
    expect(currentStep({ duration: 30, steps })?.number).toBe(2);
    expect(
      currentStep({ duration: 30, steps: steps.map((s) => ({ ...s, state: 'done' })) })?.number,
    ).toBe(3);
  });
});

describe('snapping', () => {
  const captions = [9.84, 12.3];
  test('to a caption’s start within reach', () => {
    expect(snapTime(10.1, { captionStarts: captions, reach: 0.5, fine: false })).toBe(9.84);
  });
  test('to tenths beyond it, and always with Shift', () => {
    expect(snapTime(11.17, { captionStarts: captions, reach: 0.5, fine: false })).toBe(11.2);
    expect(snapTime(9.87, { captionStarts: captions, reach: 0.5, fine: true })).toBe(9.9);
  });
  test('a mark stays between its neighbours', () => {
    expect(markRange(steps, 's2', 30)).toEqual({ from: 0.1, to: 19.9 });
    expect(markRange(steps, 's1', 30)).toEqual({ from: 0, to: 9.9 });
    expect(markRange(steps, 's3', 30)).toEqual({ from: 10.1, to: 30 });
  });
  test('nudges by a tenth, with Shift by a second, and stops at the neighbour', () => {
    const range = { from: 9.5, to: 19.9 };
    expect(nudgeMark(steps[1] as StickStep, 1, false, range)).toBe(10.1);
    expect(nudgeMark(steps[1] as StickStep, -1, true, range)).toBe(9.5);
  });
});

describe('panning', () => {
  test('sixty steps fit, sixty-one pan', () => {
    expect(bodyLength(340, 60)).toBe(340);
    expect(bodyLength(340, 61)).toBe(8 + 61 * 14);
  });
  test('the current stretch comes into the middle third and the stick never leaves its frame', () => {
    const px = fc.double({ min: 0, max: 3000, noNaN: true });
    fc.assert(
      fc.property(px, px, (current, offset) => {
        const shift = panOffset({ body: 3000, frame: 340, current, offset });
        expect(shift).toBeGreaterThanOrEqual(0);
        expect(shift).toBeLessThanOrEqual(2660);
        const seen = current - shift;
        if (shift > 0 && shift < 2660) {
          expect(seen).toBeGreaterThanOrEqual(340 / 3 - 1e-6);
          expect(seen).toBeLessThanOrEqual((2 * 340) / 3 + 1e-6);
        }
      }),
    );
  });
  test('a shift that already shows it is kept', () => {
    expect(panOffset({ body: 3000, frame: 300, current: 1000, offset: 850 })).toBe(850);
  });
});

describe('numbers on the bench stick', () => {
  const span = (from: number, to: number) => ({
    id: 's',
    number: 4,
    from,
    to,
    state: 'current' as const,
  });
  test('stand in the middle of a stretch of 15 or more', () => {
    expect(benchNumberAt(span(100, 176), null)).toBe(138);
    expect(benchNumberAt(span(100, 114), null)).toBeNull();
  });
  test('keep 12 px from the pointer, inside the stretch', () => {
    const place = fc.double({ min: 0, max: 600, noNaN: true });
    fc.assert(
      fc.property(
        place,
        fc.double({ min: 15, max: 200, noNaN: true }),
        place,
        (from, length, pointer) => {
          const at = benchNumberAt(span(from, from + length), pointer);
          if (at === null) return;
          expect(Math.abs(at - pointer)).toBeGreaterThanOrEqual(12 - 1e-9);
          expect(at).toBeGreaterThanOrEqual(from + 7.5 - 1e-9);
          expect(at).toBeLessThanOrEqual(from + length - 7.5 + 1e-9);
        },
      ),
    );
  });
  test('are left out where pointer and edges leave no room', () => {
    expect(benchNumberAt(span(100, 130), 115)).toBeNull();
  });
  test('keep clear of a break', () => {
    const wait = { at: 165, running: true, left: 60 };
    const at = benchNumberAt(span(100, 176), 140, [wait]) ?? 0;
    expect(at).toBeGreaterThanOrEqual(107.5);
    expect(at).toBeLessThanOrEqual(128);
    expect(benchNumberAt(span(100, 176), null, [wait])).toBe(130);
  });
});

describe('hands-on time', () => {
  test('adds up minutes and gives unstated ones the mean', () => {
    const { duration, stretches } = handsOnTimes([10, null, 20]);
    expect(stretches).toEqual([
      { start: 0, end: 600 },
      { start: 600, end: 1500 },
      { start: 1500, end: 2700 },
    ]);
    expect(duration).toBe(2700);
  });
  test('with nothing stated every step gets a stretch', () => {
    expect(handsOnTimes([null, undefined, -3]).stretches.map((s) => s.end - s.start)).toEqual([
      60, 60, 60,
    ]);
  });
});

describe('what the slider says', () => {
  test('the design reference’s sentence', () => {
    const glue = step(4, 168, 262, {
      title: 'Glue bed B to base A',
      verdicts: [
        { at: 170, verdict: 'holds' },
        { at: 180, verdict: 'holds' },
        { at: 190, verdict: 'need' },
      ],
    });
    expect(stickValueText(glue, 9)).toBe(
      'Step 4 of 9, Glue bed B to base A, 2 minutes 48, two of three readings hold',
    );
  });
  test('failing, waiting, done', () => {
    const s = step(2, 58, 131, {
      title: 'Fit',
      failing: true,
      state: 'done',
      verdicts: [{ at: 60, verdict: 'fails' }],
      waits: [{ at: 70, running: true, left: 90 }],
    });
    expect(stickValueText(s, 9)).toBe(
      'Step 2 of 9, Fit, 58 seconds, a check fails, its reading fails, a wait runs, 1 minute 30 left, done',
    );
  });
  test.each([
    [0, '0 seconds', '0:00'],
    [61, '1 minute 1', '1:01'],
    [3600, '1 hour', '1:00:00'],
    [NaN, '0 seconds', '0:00'],
  ])('%d s is said "%s", written "%s"', (seconds, said, written) => {
    expect(spokenTime(seconds)).toBe(said);
    expect(clockTime(seconds)).toBe(written);
  });
});
