import fc from 'fast-check';
import { numberEvery, shownNumbers } from '../../../shared/plan/stick/numbers';

// Rules and figures: the design reference's table (story stick, density).
describe('density', () => {
  test.each([
    [550, 9, 1],
    [258, 9, 1],
    [810, 60, 5],
    [330, 60, 10],
    [8 + 20 * 30, 30, 1],
    [8 + 19.9 * 30, 30, 5],
    [8 + 9 * 30, 30, 5],
    [8 + 8.9 * 30, 30, 10],
  ])('%d px with %d steps numbers every %d', (length, steps, every) => {
    expect(numberEvery(length, steps)).toBe(every);
  });
});

const mark = (at: number, number: number, current = false) => ({ at, number, current });

describe('which numbers are shown', () => {
  test('one is left out when under 17 px from the last', () => {
    const shown = shownNumbers([mark(8, 1), mark(40, 2), mark(56.9, 3), mark(58, 4)], 1);
    expect([...shown].sort()).toEqual([0, 1, 3]);
  });

  test('the current is always shown and pushes its neighbours out', () => {
    const shown = shownNumbers(
      [mark(8, 1), mark(40, 2), mark(50, 3, true), mark(60, 4), mark(67, 5)],
      1,
    );
    expect([...shown].sort()).toEqual([0, 2, 4]);
  });

  test('sixty steps: every fifth, the first and the current', () => {
    const marks = Array.from({ length: 60 }, (_, i) => mark(8 + i * 13.4, i + 1, i === 21));
    const numbers = [...shownNumbers(marks, 5)].map((i) => i + 1).sort((a, b) => a - b);
    expect(numbers).toEqual([1, 5, 10, 15, 20, 22, 25, 30, 35, 40, 45, 50, 55, 60]);
  });

  test('two numbers never stand nearer than 17 px', () => {
    const places = fc.array(fc.double({ min: 8, max: 800, noNaN: true }), { maxLength: 100 });
    fc.assert(
      fc.property(
        places,
        fc.nat(),
        fc.constantFrom(1 as const, 5 as const, 10 as const),
        (ats, pick, every) => {
          const sorted = [...ats].sort((a, b) => a - b);
          const marks = sorted.map((at, i) =>
            mark(at, i + 1, sorted.length > 0 && i === pick % sorted.length),
          );
          const shown = [...shownNumbers(marks, every)]
            .map((i) => marks[i]?.at ?? 0)
            .sort((a, b) => a - b);
          shown
            .slice(1)
            .forEach((at, i) => expect(at - (shown[i] ?? 0)).toBeGreaterThanOrEqual(17));
          if (marks.length) expect(shownNumbers(marks, every).has(pick % sorted.length)).toBe(true);
        },
      ),
    );
  });
});
