import { actionsOf, atStep } from '../actions';
import { type Rule } from '../rule';

export const machineRegion: Rule = {
  id: 'machine/region',
  level: 'should',
  source: 'common practice, no source: many saws, and most in Europe, take no dado head',
  run: ({ document }) =>
    actionsOf(document, 'cut').flatMap(({ action, step, number }) => {
      if (!action.dadoHead) return [];
      const choice = document.flow.some(
        (f) => f.kind === 'alternatives' && f.groups.some((g) => g.stepIds.includes(step.id)),
      );
      const instead = document.tools.some(
        (t) => t.machine === action.machine && t.instead.trim() !== '',
      );
      return choice || instead
        ? []
        : [
            atStep(
              step,
              `Step ${number} needs a dado head and offers nothing else.`,
              'Add the router as an alternative.',
            ),
          ];
    }),
};
