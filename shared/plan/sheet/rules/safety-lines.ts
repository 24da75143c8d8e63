import { actionsOf, atStep, turns, wordsOf } from '../actions';
import { type Finding, type Rule } from '../rule';

const removed =
  (id: string, what: string): Rule['run'] =>
  ({ document }) =>
    document.steps.flatMap((step, i): Finding[] => {
      if (!step.withoutLines.includes(id) || !step.actions.some((a) => a.do === 'cut')) return [];
      return [
        atStep(
          step,
          `The standing line on ${what} was taken out of step ${i + 1}.`,
          'Put it back: somebody may start with this step.',
        ),
      ];
    });

export const safetyEyeEarDust: Rule = {
  id: 'safety/eye-ear-dust',
  level: 'should',
  source: '29 CFR 1910.133 (eyes), 1910.95 (ears); NIOSH REL for wood dust',
  run: removed('safety/eye-ear-dust', 'eyes, ears and dust'),
};

const gloves = /\b(?:wear|put on|with|pull on)\b[^.]{0,20}\bgloves?\b|\bgloves on\b/;

/** The line taken out, or a step that asks for gloves where something turns. */
export const safetyLooseClothing: Rule = {
  id: 'safety/loose-clothing',
  level: 'should',
  source:
    'common practice, no source; machine manuals: no gloves, loose sleeves, jewellery or loose hair near what turns',
  run: (context) => {
    const asked = actionsOf(context.document, 'cut')
      .filter(
        ({ action, step }) =>
          turns(action.machine) &&
          gloves.test(wordsOf(step)) &&
          !/\bno gloves|gloves off|without gloves/.test(wordsOf(step)),
      )
      .map(({ step, number }) =>
        atStep(
          step,
          `Step ${number} asks for gloves at a machine that turns.`,
          'Gloves off before the machine starts.',
        ),
      );
    return [...removed('safety/loose-clothing', 'loose clothing')(context), ...asked];
  },
};
