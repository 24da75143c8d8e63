import { actionsOf, atStep, turns, wordsOf } from '../actions';
import { removedLine } from '../removed-lines';
import { saysSo } from '../words';
import { type Rule } from '../rule';

const gloves = /\b(?:wear|put on|with|pull on|in)\b[^.]{0,20}\bgloves?\b(?! off)|\bgloves on\b/;

/** The line taken out, or a step that asks for gloves where something turns. */
export const safetyLooseClothing: Rule = {
  id: 'safety/loose-clothing',
  level: 'should',
  source:
    'common practice, no source; machine manuals: no gloves, loose sleeves, jewellery or loose hair near what turns',
  run: (context) => {
    const asked = actionsOf(context.document, 'cut')
      .filter(({ action, step }) => turns(action.machine) && saysSo(wordsOf(step), gloves))
      .map(({ step, number }) =>
        atStep(
          step,
          `Step ${number} asks for gloves at a machine that turns.`,
          'Gloves off before the machine starts.',
        ),
      );
    return [...removedLine('safety/loose-clothing', 'loose clothing')(context), ...asked];
  },
};
