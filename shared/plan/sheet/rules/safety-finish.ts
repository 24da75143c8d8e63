import { actionsOf, atStep, wordsOf } from '../actions';
import { type Finding, type Rule } from '../rule';

export const safetyFinish: Rule = {
  id: 'safety/finish',
  level: 'should',
  source: 'common practice, no source; the label of the finish wins',
  run: ({ document }) =>
    actionsOf(document, 'finish').flatMap(({ action, step, number }): Finding[] => {
      const words = wordsOf(step);
      const found: Finding[] = [];
      if (action.oily && !/\brags?\b|\bcloths?\b/.test(words))
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
