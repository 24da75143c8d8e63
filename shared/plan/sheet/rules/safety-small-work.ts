import { crosscutClear, handClear } from '../../../trade/shop.data';
import { type Cut } from '../../document';
import { actionsOf, atStep, isHeld, turns, workOf } from '../actions';
import { type Finding, type Rule } from '../rule';

/** Machines where the hand that holds the work comes near: not those held in both hands, nor those that draw it in. */
const elsewhere = new Set(['router', 'planer', 'lathe', 'grinder']);

/** How near a hand comes, mm: along a crosscut to the end that is held, across the piece in any other cut. */
function nearTo(
  cut: Cut,
  { length, width }: { length: number | null; width: number | null },
): { near: number; least: number } | null {
  if (cut.kind === 'through-crosscut' || cut.kind === 'mitre-cut')
    return length === null ? null : { near: length, least: crosscutClear };
  const across =
    cut.kind === 'through-rip'
      ? width
      : length !== null && width !== null
        ? Math.min(length, width)
        : (width ?? length);
  return across === null ? null : { near: across, least: handClear };
}

export const safetySmallWork: Rule = {
  id: 'safety/small-work',
  level: 'must',
  source:
    'common practice, no source: within 100 mm of a blade a push stick or hold-down takes the place of the hand',
  run: ({ document, model }) =>
    actionsOf(document, 'cut').flatMap(({ action, step, number }): Finding[] => {
      if (!turns(action.machine) || elsewhere.has(action.machine) || isHeld(action)) return [];
      const found = nearTo(action, workOf(document, model(), action));
      return found && found.near < found.least - 1e-6
        ? [
            atStep(
              step,
              `Step ${number} brings a hand near the blade: the work is only ${Math.round(found.near)} mm there.`,
              'Name what holds or feeds it: push stick, hold-down, feather board, clamp or jig.',
            ),
          ]
        : [];
    }),
};
