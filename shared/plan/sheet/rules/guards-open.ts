import { guardKey, walkGuards, type GuardedCut } from '../../guards';
import {
  atStep,
  grooveCuts,
  guardReplaced,
  machineWords,
  raisedCuts,
  throughCuts,
} from '../actions';
import { unnamedRemovals } from '../guard-words';
import { type Finding, type Rule } from '../rule';

const itemWords = {
  'blade-guard': 'blade guard',
  'riving-knife': 'riving knife',
  splitter: 'splitter',
  'anti-kickback': 'anti-kickback fingers',
  hood: 'hood',
  'fence-cover': 'fence cover',
} as const;
type Item = keyof typeof itemWords;

/** What is wrong with one cut as the guards stand. */
function faultsOf({ cut, step, number, guards }: GuardedCut): Finding[] {
  const standing = (item: Item) => guards.get(guardKey(cut.machine, item)) ?? 'on';
  const replaced = cut.guardInstead.trim() !== '';
  const found: Finding[] = [];
  const through = throughCuts.has(cut.kind);
  const cannotPass =
    cut.machine === 'table-saw' && (grooveCuts.has(cut.kind) || raisedCuts.has(cut.kind));
  if (!through && !guardReplaced(cut) && (cannotPass || standing('blade-guard') !== 'on'))
    found.push(
      atStep(
        step,
        `Step ${number} makes a cut that the blade guard cannot stay on for and names nothing in its place.`,
        'Name the feather board, hold-down, tunnel or cover on the jig that keeps hands away.',
      ),
    );
  for (const item of ['blade-guard', 'hood', 'anti-kickback'] as const)
    if (through && !replaced && standing(item) !== 'on')
      found.push(
        atStep(
          step,
          `Step ${number} cuts through with the ${itemWords[item]} off.`,
          `Put the ${itemWords[item]} back on before this cut, or name what replaces it.`,
        ),
      );
  for (const item of ['riving-knife', 'splitter'] as const) {
    const now = standing(item);
    if (through && now !== 'on') {
      found.push(
        atStep(
          step,
          `Step ${number} cuts through with the ${itemWords[item]} ${now}.`,
          `Put the ${itemWords[item]} back before this cut.`,
        ),
      );
    } else if (
      now === 'off' &&
      item === 'riving-knife' &&
      grooveCuts.has(cut.kind) &&
      !cut.dadoHead &&
      !raisedCuts.has(cut.kind)
    ) {
      found.push(
        atStep(
          step,
          `Step ${number} takes the riving knife off for a cut that does not need it off.`,
          'Lower it below the tooth tops instead; only a dado head, a plunge or a raised blade takes it off.',
        ),
      );
    }
  }
  return found;
}

export const guardsOpen: Rule = {
  id: 'guards/open',
  level: 'must',
  source: '29 CFR 1910.213(c); 8 CCR 4296: spreader and hood go back at once after grooving',
  run: ({ document }) => {
    const walk = walkGuards(document);
    const seen = new Set<string>();
    const once = (f: Finding) => {
      const key = `${f.place.elementId ?? ''}${f.message}`;
      if (seen.has(key)) return false;
      seen.add(key);
      return true;
    };
    const left = walk.left.map(({ machine, item, standing, step }) =>
      atStep(
        step,
        `The ${itemWords[item]} of the ${machineWords(machine)} is ${standing} and never put back.`,
        'Add the moment it goes back on, at the latest in the last step.',
      ),
    );
    const unnamed = unnamedRemovals(document).map((number) =>
      atStep(
        document.steps[number - 1]!,
        `Step ${number} takes a guard off, and nothing says that it goes back on.`,
        'Name the guard among the actions of the step, off and back on.',
      ),
    );
    return [...walk.cuts.flatMap(faultsOf), ...left, ...unnamed].filter(once);
  },
};
