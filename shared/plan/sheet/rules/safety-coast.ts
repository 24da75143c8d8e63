import { type Step } from '../../document';
import { actionsOf, atStep, turns, wordsOf } from '../actions';
import { saysSo } from '../words';
import { type Rule } from '../rule';

const reaches =
  /\b(?:reach\w* (?:past|over|across|behind|round|around) the (?:\w+ )?(?:blade|cutter|bit)|(?:clear|brush|flick|pick|grab|knock|sweep)\w* (?:\w+ ){0,3}off-?cuts?\b)/;
const still = /\b(?:stop|stops|stopped|still|standstill|coast\w*|at rest)\b/;

const hurries = (step: Step): boolean => {
  const words = wordsOf(step);
  return saysSo(words, reaches) && !still.test(words);
};

export const safetyCoast: Rule = {
  id: 'safety/coast',
  level: 'should',
  source: 'common practice, no source; HSE WIS16 asks for a stop within 10 s',
  run: ({ document }) =>
    actionsOf(document, 'cut').flatMap(({ action, step, number }) =>
      action.waitsForBlade === false ||
      (action.waitsForBlade === undefined && turns(action.machine) && hurries(step))
        ? [
            atStep(
              step,
              `Step ${number} does not wait for the blade to stop.`,
              'Let it stop before reaching past it or clearing an offcut.',
            ),
          ]
        : [],
    ),
};
