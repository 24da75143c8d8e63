import { actionsOf, atStep, wordsOf } from '../actions';
import { type Finding, type Rule } from '../rule';

/** Finishes that dry by taking up oxygen, and heat up in a heap of rags as they do. */
const oils = /\b(?:linseed|tung|danish|teak|boiled|hard.?wax) ?oil\b|\boil finish\b/i;

export const safetyFinish: Rule = {
  id: 'safety/finish',
  level: 'should',
  source: 'common practice, no source; the label of the finish wins',
  run: ({ document }) =>
    actionsOf(document, 'finish').flatMap(({ action, step, number }): Finding[] => {
      const words = wordsOf(step);
      // Rags are cleared up at the end, perhaps in a step of their own.
      const later = document.steps
        .slice(number - 1)
        .map(wordsOf)
        .join(' ');
      const finish = document.consumables.find((c) => c.id === action.consumableId);
      const oily = action.oily || oils.test(finish?.name ?? '');
      const found: Finding[] = [];
      if (oily && !/\brags?\b|\bcloths?\b/.test(later))
        found.push(
          atStep(
            step,
            `Step ${number} leaves oily rags and does not say what to do with them.`,
            'Lay them flat outdoors or in water in a closed tin: they can catch fire by themselves.',
          ),
        );
      if (action.solvent && !/\b(?:air|ventilat|window|outdoors|respirator)/.test(words))
        found.push(
          atStep(
            step,
            `Step ${number} uses a solvent and says nothing of fumes.`,
            'Air the room, keep flames away, protect skin and lungs.',
          ),
        );
      return found;
    }),
};
