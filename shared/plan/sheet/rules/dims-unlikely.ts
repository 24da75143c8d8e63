import { mm } from '../actions';
import { type Finding, type Rule } from '../rule';

/** What is usual, mm; outside it a unit was probably slipped. Common practice, no source. */
const usual = { sheet: [1, 60], screw: [4, 350] } as const;
const outside = (x: number | null, [low, high]: readonly [number, number]): boolean =>
  x !== null && (x < low || x > high);

export const dimsUnlikely: Rule = {
  id: 'dims/unlikely',
  level: 'should',
  source: 'common practice, no source: 18 in plywood and 3/4 mm screws are slips of the unit',
  run: ({ document, model }) => {
    const stock = document.stock.flatMap((s): Finding[] =>
      s.form === 'sheet' && outside(mm(model(), s.thickness), usual.sheet)
        ? [
            {
              place: { in: 'stock', elementId: s.id },
              message: `${s.name} would be ${(mm(model(), s.thickness) ?? 0).toFixed(1)} mm thick.`,
              cure: 'Look at the unit.',
            },
          ]
        : [],
    );
    const hardware = document.hardware.flatMap((h): Finding[] =>
      (h.kind === 'screw' || h.kind === 'brad') &&
      h.length &&
      outside(mm(model(), h.length), usual.screw)
        ? [
            {
              place: { in: 'hardware', elementId: h.id },
              message: `${h.name} would be ${(mm(model(), h.length) ?? 0).toFixed(1)} mm long.`,
              cure: 'Look at the unit.',
            },
          ]
        : [],
    );
    return [...stock, ...hardware];
  },
};
