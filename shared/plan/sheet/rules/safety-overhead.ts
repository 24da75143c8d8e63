import { twoPeopleLift } from '../../../trade/shop.data';
import { actionsOf, atStep, planWordsOf, wordsOf } from '../actions';
import { type Finding, type Rule } from '../rule';

const load = /\b\d+(?:\.\d+)?\s?(?:kg|kilos?|kilograms?|lbs?|pounds?)\b/;

export const safetyOverhead: Rule = {
  id: 'safety/overhead',
  level: 'should',
  source: 'common practice, no source; local codes and licensed practice win',
  run: ({ document }) => {
    const mounts = actionsOf(document, 'mount').flatMap(({ action, step, number }): Finding[] => {
      const words = wordsOf(step);
      const lacks = [
        action.kg === undefined && !load.test(words) ? 'the load' : '',
        action.intoStructure || /\b(?:studs?|structure|masonry|joists?)\b/.test(words)
          ? ''
          : 'that it is fixed into structure',
        action.servicesLookedFor || /\bpipes?\b/.test(words)
          ? ''
          : 'that pipes and cables are looked for',
        (action.kg ?? 0) <= twoPeopleLift || action.liftingHelp || step.people > 1
          ? ''
          : 'who helps to lift it',
      ].filter(Boolean);
      return lacks.length > 0
        ? [
            atStep(
              step,
              `Step ${number} hangs something up and does not say ${lacks.join(', ')}.`,
              'Say it; what comes down, comes down on somebody.',
            ),
          ]
        : [];
    });
    const castors = document.hardware.filter((h) => h.kind === 'castor');
    const rolls = castors.length > 0 && !/\block/.test(planWordsOf(document));
    const unlocked = rolls
      ? [
          {
            place: { in: 'hardware' as const, elementId: castors[0]!.id },
            message: 'It stands on castors and no step says that they are locked.',
            cure: 'Lock them before anything leans on it.',
          },
        ]
      : [];
    return [...mounts, ...unlocked];
  },
};
