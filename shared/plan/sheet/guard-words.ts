import { type PlanDocument } from '../document';
import { wordsOf } from './actions';
import { saysSo } from './words';

const item = '(?:blade guard|guards?|riving knife|splitter|anti-kickback \\w+|pawls|hood)';
const takenOff = new RegExp(
  `\\b(?:take|lift|pull)\\w*\\s+(?:the |your |both )?${item}\\s+(?:off|out|away)\\b` +
    `|\\b(?:remove|take off|take out|unbolt|unclip)\\w*\\s+(?:the |your |both )?${item}\\b` +
    `|\\b${item}\\s+(?:comes? |is |has to come |must come )?(?:off|removed)\\b`,
);
const putBack =
  /\b(?:back on|back in place|refit\w*|reinstall\w*|put\w* (?:it|them|the [a-z-]+(?: [a-z]+)?|both) back|goes? back|go back|replace the (?:blade )?guard)\b/;

/**
 * Steps whose words take a guard off that no action names, and that nothing said at the same place or later puts back.
 * Numbers from 1.
 */
export function unnamedRemovals(document: PlanDocument): number[] {
  const words = document.steps.map(wordsOf);
  return document.steps.flatMap((step, i) => {
    if (step.actions.some((a) => a.do === 'guard')) return [];
    if (!saysSo(words[i]!, takenOff)) return [];
    const named = document.steps
      .slice(i)
      .some((later) => later.actions.some((a) => a.do === 'guard' && a.to === 'back-on'));
    return named || words.slice(i).some((w) => putBack.test(w)) ? [] : [i + 1];
  });
}
