import { actionsOf, atStep, workOf } from '../actions';
import { type Finding, type Rule } from '../rule';

/** Shortest piece over cutters that pull, mm; the machine's manual may ask for more. */
const shortest = 300;
const machines = new Set(['jointer', 'planer']);

export const safetyMinimumLength: Rule = {
  id: 'safety/minimum-length',
  level: 'must',
  source: 'common practice, no source: 300 mm over a jointer or through a planer; the manual wins',
  run: ({ document, model }) =>
    actionsOf(document, 'cut').flatMap(({ action, step, number }): Finding[] => {
      if (!machines.has(action.machine)) return [];
      const { length } = workOf(document, model(), action);
      return length !== null && length < shortest
        ? [
            atStep(
              step,
              `Step ${number} runs a piece of ${Math.round(length)} mm over the ${action.machine}; it is too short to be held there.`,
              'Work it while it is part of a longer piece, or by hand.',
            ),
          ]
        : [];
    }),
};
