import { actionsOf, atStep } from '../actions';
import { type Rule } from '../rule';

export const safetyCoast: Rule = {
  id: 'safety/coast',
  level: 'should',
  source: 'common practice, no source; HSE WIS16 asks for a stop within 10 s',
  run: ({ document }) =>
    actionsOf(document, 'cut').flatMap(({ action, step, number }) =>
      action.waitsForBlade === false
        ? [
            atStep(
              step,
              `Step ${number} does not wait for the blade to stop.`,
              'Let it stop before reaching past it or clearing an offcut.',
            ),
          ]
        : [],
    ),
};
