import { actionsOf, atStep, isHeld, turns, workOf } from '../actions';
import { type Finding, type Rule } from '../rule';

/** Narrower than this a hand comes near the blade, mm. */
const near = 100;

export const safetySmallWork: Rule = {
  id: 'safety/small-work',
  level: 'must',
  source:
    'common practice, no source: within 100 mm of a blade a push stick or hold-down takes the place of the hand',
  run: ({ document, model }) =>
    actionsOf(document, 'cut').flatMap(({ action, step, number }): Finding[] => {
      if (!turns(action.machine) || isHeld(action)) return [];
      const { length, width } = workOf(document, model(), action);
      const across =
        action.kind === 'through-rip'
          ? width
          : length !== null && width !== null
            ? Math.min(length, width)
            : (width ?? length);
      return across !== null && across < near
        ? [
            atStep(
              step,
              `Step ${number} brings a hand near the blade: the work is only ${Math.round(across)} mm across.`,
              'Name what holds or feeds it: push stick, hold-down, feather board, clamp or jig.',
            ),
          ]
        : [];
    }),
};
