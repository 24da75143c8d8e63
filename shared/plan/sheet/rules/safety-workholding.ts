import { actionsOf, atStep, isHeld } from '../actions';
import { type Finding, type Rule } from '../rule';

const grabbing = new Set(['drill-press', 'router', 'bandsaw']);

export const safetyWorkholding: Rule = {
  id: 'safety/workholding',
  level: 'should',
  source: 'common practice, no source: a bit that grabs spins the work',
  run: ({ document }) =>
    actionsOf(document, 'cut').flatMap(({ action, step, number }): Finding[] => {
      if (action.offcutHeld === false)
        return [
          atStep(
            step,
            `In step ${number} one half comes free and is not held.`,
            'Hold or support both halves until the blade stops.',
          ),
        ];
      if (!grabbing.has(action.machine) || isHeld(action) || action.heldBy.includes('fence'))
        return [];
      return [
        atStep(
          step,
          `In step ${number} the work at the ${action.machine.replace('-', ' ')} is held by hand alone.`,
          'Clamp it, or hold it in a jig.',
        ),
      ];
    }),
};
