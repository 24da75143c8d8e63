import { type Step } from '../../document';
import { atStep, wordsOf } from '../actions';
import { type Finding, type Rule } from '../rule';

const hands =
  /\b(?:fit|change|swap|seat|mount|install|remove|take (?:off|out)|lower|raise|put back)\w*\b[^.]{0,40}\b(?:blade|bit|cutter|guard|riving knife|splitter|collet)\b/;
const isolated =
  /\b(?:unplug|pull the plug|plug (?:out|pulled)|isolat|disconnect|battery out|take (?:out )?the battery|power off|switched off at the wall)/;

function touches(step: Step): boolean {
  return (
    step.actions.some((a) => a.do === 'guard') ||
    hands.test(`${step.title} \n${step.text}`.toLowerCase())
  );
}

export const guardsPower: Rule = {
  id: 'guards/power',
  level: 'must',
  source: '29 CFR 1910.147 (control of hazardous energy), from memory; machine manuals',
  run: ({ document }) =>
    document.steps.flatMap((step, i): Finding[] => {
      const off = step.actions.filter((a) => a.do === 'power');
      const live = off.find((a) => a.do === 'power' && !a.isolated);
      if (live)
        return [
          atStep(
            step,
            `Step ${i + 1} has hands near the ${live.do === 'power' ? live.touches : 'tool'} with the power on.`,
            'Isolate the power: plug out, or battery out.',
          ),
        ];
      if (!touches(step) || off.length > 0 || isolated.test(wordsOf(step))) return [];
      return [
        atStep(
          step,
          `Step ${i + 1} touches a guard, blade or bit and does not isolate the power.`,
          'Say that the plug is out, or the battery, before hands go near.',
        ),
      ];
    }),
};
