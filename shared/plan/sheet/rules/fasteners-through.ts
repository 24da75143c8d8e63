import { atStep } from '../actions';
import { drivenOf } from '../screws';
import { type Finding, type Rule } from '../rule';

export const fastenersThrough: Rule = {
  id: 'fasteners/through',
  level: 'must',
  source: 'arithmetic of the stack, with its tolerances',
  run: ({ document, model }) =>
    drivenOf(document, model()).flatMap(
      ({ item, length, through, into, slack, step, number }): Finding[] => {
        if (item.through || into === null) return [];
        const out = length + slack - through - into;
        return out >= -1e-6
          ? [
              atStep(
                step,
                `In step ${number} ${item.name} comes out the far side${out > 0.05 ? ` by ${out.toFixed(1)} mm at the worst` : ''}.`,
                'Take a shorter one, or mark it as going through on purpose.',
              ),
            ]
          : [];
      },
    ),
};
