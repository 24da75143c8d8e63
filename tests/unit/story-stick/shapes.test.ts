import fc from 'fast-check';
import {
  drawnShapes,
  spreadShapes,
  verdictOrder,
  worstVerdict,
} from '../../../shared/plan/stick/shapes';
import { type StickVerdict } from '../../../shared/plan/stick/types';

const shape = (at: number, verdict: StickVerdict) => ({ at, verdict });
const anyVerdict = fc.constantFrom(...verdictOrder);

test('worst first: fails, too close to call, at risk, needs a reading, holds', () => {
  expect(worstVerdict(['holds', 'need', 'risk', 'close', 'fails'])).toBe('fails');
  expect(worstVerdict(['holds', 'need', 'risk', 'close'])).toBe('close');
  expect(worstVerdict(['holds', 'need', 'risk'])).toBe('risk');
  expect(worstVerdict(['holds', 'need'])).toBe('need');
  expect(worstVerdict([])).toBeUndefined();
});

describe('shapes that would overlap', () => {
  test('the worse is drawn', () => {
    expect(drawnShapes([shape(10, 'holds'), shape(18, 'risk')])).toEqual([shape(18, 'risk')]);
  });

  test('at 9 px both are', () => {
    expect(drawnShapes([shape(10, 'holds'), shape(19, 'risk')])).toHaveLength(2);
  });

  test('none overlap, and one left out has one at least as bad within 9 px', () => {
    const many = fc.array(
      fc.record({ at: fc.double({ min: 0, max: 300, noNaN: true }), verdict: anyVerdict }),
    );
    fc.assert(
      fc.property(many, (shapes) => {
        const drawn = drawnShapes(shapes);
        drawn
          .slice(1)
          .forEach((d, i) => expect(d.at - (drawn[i]?.at ?? 0)).toBeGreaterThanOrEqual(9));
        for (const s of shapes) {
          const near = drawn.filter((d) => d === s || Math.abs(d.at - s.at) < 9);
          expect(
            near.some((d) => verdictOrder.indexOf(d.verdict) <= verdictOrder.indexOf(s.verdict)),
          ).toBe(true);
        }
      }),
    );
  });
});

describe('shapes beside text', () => {
  test('stand evenly, in order', () => {
    expect(spreadShapes(['need'])).toEqual({
      shapes: [{ verdict: 'need', share: 0.48 }],
      note: null,
    });
    expect(spreadShapes(['need', 'holds']).shapes.map((s) => s.share)).toEqual([0.28, 0.58]);
  });

  test('of more than three the worst are kept, in the order of the step', () => {
    const { shapes } = spreadShapes(['holds', 'need', 'fails', 'holds', 'risk']);
    expect(shapes.map((s) => s.verdict)).toEqual(['need', 'fails', 'risk']);
  });

  test('talk stands below the shapes', () => {
    expect(spreadShapes(['holds'], true).note).toBe(0.58);
    expect(spreadShapes([], true).note).toBe(0.48);
  });
});
