import { actionsOf, atStep, throughCuts } from '../actions';
import { type Rule } from '../rule';

export const guardsExit: Rule = {
  id: 'guards/exit',
  level: 'must',
  source:
    'common practice, no source: a jig the blade passes through covers where the blade comes out',
  run: ({ document }) =>
    actionsOf(document, 'cut').flatMap(({ action, step, number }) => {
      if (
        !action.heldBy.includes('jig') ||
        !throughCuts.has(action.kind) ||
        action.machine !== 'table-saw'
      )
        return [];
      const lacks = [
        action.exitCover.trim() === '' ? 'covers the place where the blade comes out' : '',
        action.exitStop.trim() === '' ? 'has a stop so that it goes no further' : '',
      ].filter(Boolean);
      return lacks.length === 0
        ? []
        : [
            atStep(
              step,
              `The jig in step ${number} does not say that it ${lacks.join(' and ')}.`,
              'Name the block over the exit and the stop.',
            ),
          ];
    }),
};
