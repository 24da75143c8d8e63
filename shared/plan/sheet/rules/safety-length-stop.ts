import { actionsOf, atStep } from '../actions';
import { type Rule } from '../rule';

export const safetyLengthStop: Rule = {
  id: 'safety/length-stop',
  level: 'must',
  source: 'common practice, no source in government text; several machine manuals say exactly this',
  run: ({ document }) =>
    actionsOf(document, 'cut').flatMap(({ action, step, number }) =>
      action.kind === 'through-crosscut' &&
      action.machine === 'table-saw' &&
      action.lengthStop === 'rip-fence'
        ? [
            atStep(
              step,
              `Step ${number} uses the rip fence as a length stop: the offcut is caught and kicks back.`,
              'Clamp a stand-off block to the fence so that the work leaves it before it meets the blade.',
            ),
          ]
        : [],
    ),
};
