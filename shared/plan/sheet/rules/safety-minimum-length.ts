import { shortestWork } from '../../../trade/shop.data';
import { actionsOf, atStep, machineWords, workOf } from '../actions';
import { type Finding, type Rule } from '../rule';

const over = { 'table-saw': 'along the fence of', jointer: 'over', planer: 'through' } as const;

export const safetyMinimumLength: Rule = {
  id: 'safety/minimum-length',
  level: 'must',
  source:
    'common practice, no source: 250 mm along a rip fence, 300 mm over a jointer or through a planer; the manual wins',
  run: ({ document, model }) =>
    actionsOf(document, 'cut').flatMap(({ action, step, number }): Finding[] => {
      const { machine } = action;
      if (machine !== 'table-saw' && machine !== 'jointer' && machine !== 'planer') return [];
      // At the saw only a rip runs along the fence; a jig carries what is short.
      if (
        machine === 'table-saw' &&
        (action.kind !== 'through-rip' || action.heldBy.includes('jig'))
      )
        return [];
      const { length } = workOf(document, model(), action);
      return length !== null && length < (shortestWork[machine] ?? 0) - 1e-6
        ? [
            atStep(
              step,
              `Step ${number} runs a piece of ${Math.round(length)} mm ${over[machine]} the ${machineWords(machine)}; it is too short to be held there.`,
              'Work it while it is part of a longer piece, in a jig, or by hand.',
            ),
          ]
        : [];
    }),
};
