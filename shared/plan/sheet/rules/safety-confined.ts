import { actionsOf, atStep, workOf } from '../actions';
import { type Finding, type Rule } from '../rule';

export const safetyConfined: Rule = {
  id: 'safety/confined',
  level: 'must',
  source: 'common practice, no source; machine manuals: nothing is caught between blade and fence',
  run: ({ document, model }) =>
    actionsOf(document, 'cut').flatMap(({ action, step, number }): Finding[] => {
      if (action.trapped)
        return [
          atStep(
            step,
            `In step ${number} a piece is caught between the blade and a fence, stop or table.`,
            'Leave one side of the cut free to move away.',
          ),
        ];
      if (action.kind !== 'through-rip' || action.machine !== 'table-saw') return [];
      const { length, width } = workOf(document, model(), action);
      return length !== null && width !== null && width > length
        ? [
            atStep(
              step,
              `Step ${number} rips a piece that is wider than it is long against the fence.`,
              'Crosscut it with the mitre gauge or a jig, fence out of the way.',
            ),
          ]
        : [];
    }),
};
