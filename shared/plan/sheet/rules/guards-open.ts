import { guardKey, walkGuards, type GuardedCut } from '../../guards';
import { atStep, grooveCuts, isHeld, raisedCuts, throughCuts } from '../actions';
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
  for (const item of ['blade-guard', 'hood', 'anti-kickback'] as const) {
    if (standing(item) === 'on') continue;
    if (through && !replaced) {
      found.push(
        atStep(
          step,
          `Step ${number} cuts through with the ${itemWords[item]} off.`,
          `Put the ${itemWords[item]} back on before this cut, or name what replaces it.`,
        ),
      );
    } else if (item === 'blade-guard' && !through && !replaced && !isHeld(cut)) {
      found.push(
        atStep(
          step,
          `Step ${number} cuts with the blade guard off and names nothing in its place.`,
          'Name the feather board, hold-down, tunnel or jig that keeps hands away.',
        ),
      );
    }
  }
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
        `The ${itemWords[item]} of the ${machine.replace('-', ' ')} is ${standing} and never put back.`,
        'Add the moment it goes back on, at the latest in the last step.',
      ),
    );
    return [...walk.cuts.flatMap(faultsOf), ...left].filter(once);
  },
};
