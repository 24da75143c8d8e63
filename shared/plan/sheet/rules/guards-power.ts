import { type Step } from '../../document';
import { atStep, wordsOf } from '../actions';
import { saysSo } from '../words';
import { type Finding, type Rule } from '../rule';

const between = String.raw`\s+(?:(?:the|a|an|its|your|new|old|other|same|saw|rip|crosscut|combination|dado|straight|spiral|flush|larger|smaller|wider|\d[\d./-]*|mm|in|inch)\s+){0,4}`;
const touched =
  '(?:blade guard|blade|cutter|router bit|guard|riving knife|splitter|collet|dado (?:head|set|stack))';
const hands = new RegExp(
  String.raw`\b(?:(?:re)?fit|change|swap|seat|mount|install|remove|take off|take out|put back|replace|lower)(?:ing|s|ed|ted)?${between}${touched}\b(?! (?:cover|guide|mark|height|speed|side|line|path|cut))` +
    String.raw`|\b(?:take|put)${between}${touched}\s+(?:off|out|back)\b`,
);
/** The blade is lowered by its handwheel; nobody touches it. */
const handwheel = /\blower(?:ing|s|ed)?\s+(?:the\s+)?(?:saw\s+)?blade\b(?! guard)/g;
const isolated =
  /\b(?:unplug|(?:pull|draw)\w* the plug|plug(?:'s| is| are|s are)? (?:out|pulled)|isolat|disconnect|batter(?:y|ies)(?: is| are)? out|(?:take|pull|remove)\w* (?:out )?the batter|power (?:is )?off|no power|switched off at the wall)/;

/** Machines whose guards a step changes, in the order of its actions. */
function open(step: Step, isolatedBefore: ReadonlySet<string>): string | null {
  const off = new Set(isolatedBefore);
  for (const action of step.actions) {
    if (action.do === 'power' && action.isolated) off.add(action.machine);
    if (action.do === 'cut') off.delete(action.machine);
    if (action.do === 'guard' && !off.has(action.machine)) return action.machine;
  }
  return null;
}

function after(step: Step, before: ReadonlySet<string>): Set<string> {
  const off = new Set(before);
  for (const action of step.actions) {
    if (action.do === 'power' && action.isolated) off.add(action.machine);
    if (action.do === 'power' && !action.isolated) off.delete(action.machine);
    if (action.do === 'cut') off.delete(action.machine);
  }
  return off;
}

export const guardsPower: Rule = {
  id: 'guards/power',
  level: 'must',
  source: '29 CFR 1910.147 (control of hazardous energy), from memory; machine manuals',
  run: ({ document }) => {
    let off = new Set<string>();
    return document.steps.flatMap((step, i): Finding[] => {
      const before = off;
      off = after(step, off);
      const live = step.actions.find((a) => a.do === 'power' && !a.isolated);
      if (live?.do === 'power')
        return [
          atStep(
            step,
            `Step ${i + 1} has hands near the ${live.touches} with the power on.`,
            'Isolate the power: plug out, or battery out.',
          ),
        ];
      const said = isolated.test(wordsOf(step));
      const prose = `${step.title}. \n${step.text}`.toLowerCase().replace(handwheel, ' ');
      const byWords = saysSo(prose, hands) && before.size === 0 && off.size === 0;
      const isolates = step.actions.some((a) => a.do === 'power');
      if (said || (open(step, before) === null && (!byWords || isolates))) return [];
      return [
        atStep(
          step,
          `Step ${i + 1} touches a guard, blade or bit and does not isolate the power.`,
          'Say that the plug is out, or the battery, before hands go near.',
        ),
      ];
    });
  },
};
