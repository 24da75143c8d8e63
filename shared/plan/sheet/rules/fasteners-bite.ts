import { leastBite } from '../../../trade/shop.data';
import { atStep } from '../actions';
import { drivenOf, shankOf } from '../screws';
import { type Finding, type Rule } from '../rule';

export const fastenersBite: Rule = {
  id: 'fasteners/bite',
  level: 'should',
  source:
    'common practice, no source: three diameters hold a jig or a cabinet; structures ask for more (NDS)',
  run: ({ document, model }) =>
    drivenOf(document, model()).flatMap(({ item, length, through, step, number }): Finding[] => {
      const bite = length - through;
      if (bite <= 0)
        return [
          atStep(
            step,
            `In step ${number} ${item.name} does not reach the second piece.`,
            'Take a longer one.',
          ),
        ];
      const shank = item.kind === 'screw' ? shankOf(item, document, model()) : null;
      const least = shank === null ? 0 : leastBite * shank;
      return bite < least - 1e-6
        ? [
            atStep(
              step,
              `In step ${number} ${item.name} bites only ${bite.toFixed(0)} mm in the second piece.`,
              `Give it ${least.toFixed(0)} mm, ${leastBite} times its diameter, or more.`,
            ),
          ]
        : [];
    }),
};
