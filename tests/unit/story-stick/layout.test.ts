import fc from 'fast-check';
import { layoutStick, mergeTalk } from '../../../shared/plan/stick/layout';
import { type StickInput, type StickStep } from '../../../shared/plan/stick/types';

/** Starts of the nine steps of the drawn sample, seconds, and their clip of 12:22. */
const starts = [0, 58, 131, 168, 262, 351, 430, 560, 655];
const duration = 742;

const step = (start: number, i: number, all: readonly number[], end: number): StickStep => ({
  id: `s${i + 1}`,
  number: i + 1,
  title: `Step ${i + 1}`,
  start,
  end: all[i + 1] ?? end,
  state: i < 3 ? 'done' : i === 3 ? 'current' : 'open',
  verdicts: [],
  waits: [],
  talk: [],
});

const nine: StickInput = { duration, steps: starts.map((s, i) => step(s, i, starts, duration)) };

/** A changed copy of one step, by its number. */
const changed = (number: number, change: Partial<StickStep>): StickInput => ({
  duration,
  steps: nine.steps.map((s) => (s.number === number ? { ...s, ...change } : s)),
});

describe('where marks stand', () => {
  // Places read off the drawn sample (design reference, body of 550): x − 2 px of margin.
  test.each([
    [1, 8],
    [2, 50.37],
    [3, 103.69],
    [4, 130.72],
    [5, 199.38],
    [9, 486.45],
  ])('mark %i of the drawn nine-step stick', (number, at) => {
    expect(layoutStick(nine, 550).marks[number - 1]?.at).toBeCloseTo(at, 1);
  });

  test('stretches join and end with the body', () => {
    const { spans } = layoutStick(nine, 550);
    spans.slice(1).forEach((s, i) => expect(s.from).toBeCloseTo(spans[i]?.to ?? NaN, 6));
    expect(spans.at(-1)?.to).toBeCloseTo(550, 6);
  });

  test('nothing leaves the body, whatever the times', () => {
    const time = fc.double({ min: -1e4, max: 1e4, noNaN: true });
    fc.assert(
      fc.property(
        fc.array(time, { minLength: 1, maxLength: 80 }),
        fc.double({ min: 100, max: 1500, noNaN: true }),
        (times, length) => {
          const input: StickInput = {
            duration,
            steps: times.map((t, i) => ({
              ...step(t, i, times, duration),
              verdicts: [{ at: t, verdict: 'need' }],
              waits: [{ at: t }],
            })),
          };
          const layout = layoutStick(input, length);
          for (const place of [...layout.marks, ...layout.dims]) {
            expect(place.at).toBeGreaterThanOrEqual(8);
            expect(place.at).toBeLessThanOrEqual(length);
          }
        },
      ),
    );
  });

  test('a stick without duration puts every mark at its zero and does not divide by it', () => {
    const { marks } = layoutStick({ ...nine, duration: 0 }, 300);
    expect(new Set(marks.map((m) => m.at))).toEqual(new Set([8]));
  });
});

describe('waits', () => {
  test('the gap keeps clear of the next mark, as drawn: right edge 2 before it', () => {
    const { waits, marks } = layoutStick(
      changed(4, { waits: [{ at: 262, running: true, left: 60 }] }),
      550,
    );
    expect((waits[0]?.at ?? 0) + 6).toBeCloseTo((marks[4]?.at ?? 0) - 2, 6);
    expect(waits[0]).toMatchObject({ running: true, left: 60 });
  });

  test('time left is only said while it runs', () => {
    const { waits } = layoutStick(changed(4, { waits: [{ at: 200, left: 60 }] }), 550);
    expect(waits[0]).toMatchObject({ running: false, left: null });
  });
});

describe('what hangs', () => {
  test('a failing step’s square takes the place of a verdict under 9 px away', () => {
    const layout = layoutStick(
      changed(5, { failing: true, verdicts: [{ at: 268, verdict: 'holds' }] }),
      550,
    );
    expect(layout.failures).toEqual([{ at: expect.closeTo(199.38, 1) as number, shape: true }]);
    expect(layout.dims[0]?.shape).toBe(false);
  });

  test('short marks of done steps are scribed through the dye', () => {
    const layout = layoutStick(
      {
        duration,
        steps: nine.steps.map((s) => ({
          ...s,
          verdicts: [{ at: s.start + 20, verdict: 'need' as const }],
        })),
      },
      550,
    );
    expect(layout.dims.map((d) => d.onDye)).toEqual([
      true,
      true,
      true,
      false,
      false,
      false,
      false,
      false,
      false,
    ]);
  });

  test('overlapping notes become one with the counts added', () => {
    expect(
      mergeTalk(
        [
          { at: 100, count: 2 },
          { at: 110, count: 3 },
          { at: 160, count: 1 },
        ],
        400,
      ),
    ).toEqual([
      { at: 100, count: 5 },
      { at: 160, count: 1 },
    ]);
  });

  test('no talk is lost in merging, and notes stay on the stick', () => {
    const note = fc.record({
      at: fc.double({ min: 0, max: 400, noNaN: true }),
      count: fc.integer({ min: 1, max: 99 }),
    });
    fc.assert(
      fc.property(fc.array(note), (notes) => {
        const merged = mergeTalk(notes, 400);
        const sum = (list: { count: number }[]) => list.reduce((a, n) => a + n.count, 0);
        expect(sum(merged)).toBe(sum(notes));
        merged.forEach((n) => expect(n.at).toBeLessThanOrEqual(400));
      }),
    );
  });
});
