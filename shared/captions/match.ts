import { type Jottings } from './types';

interface Kept {
  id: string;
  t: number;
  words: string;
}

/** Seconds that a jotting may move between two imports and still be the same. */
const near = 12;

const kept = {
  steps: (j: Jottings): Kept[] =>
    j.steps.map(({ id, start, title }) => ({ id, t: start, words: title })),
  measures: (j: Jottings): Kept[] =>
    j.measures.map((m) => ({
      id: m.id,
      t: m.t,
      words: `${(m.values ?? [m.value]).join()} ${m.unit}`,
    })),
  tools: (j: Jottings): Kept[] => j.tools.map(({ id, t, name }) => ({ id, t, words: name })),
  materials: (j: Jottings): Kept[] =>
    j.materials.map(({ id, t, name }) => ({ id, t, words: name })),
  cautions: (j: Jottings): Kept[] => j.cautions.map(({ id, t, text }) => ({ id, t, words: text })),
  corrections: (j: Jottings): Kept[] =>
    j.corrections.map(({ id, t, heard }) => ({ id, t, words: heard })),
};

/** Pairs of one kind: same id first, then same words nearest in time, then for steps and cautions the same moment. */
function pairs(
  before: readonly Kept[],
  after: readonly Kept[],
  byMoment: boolean,
  found: Map<string, string>,
): void {
  const ids = new Set(after.map((item) => item.id));
  const taken = new Set<string>();
  const left = before.filter((item) => {
    if (!ids.has(item.id)) return true;
    found.set(item.id, item.id);
    taken.add(item.id);
    return false;
  });
  for (const same of byMoment ? [true, false] : [true]) {
    for (const item of left) {
      if (found.has(item.id)) continue;
      const best = after
        .filter(
          (each) =>
            !taken.has(each.id) &&
            Math.abs(each.t - item.t) <= (same ? near : near / 4) &&
            (!same || each.words === item.words),
        )
        .sort((a, b) => Math.abs(a.t - item.t) - Math.abs(b.t - item.t))[0];
      if (!best) continue;
      found.set(item.id, best.id);
      taken.add(best.id);
    }
  }
}

/**
 * Which jotting of an earlier import is which of a later one, by id, so that what was decided is carried
 * over. Ids without a partner are not in the map.
 */
export function matchJottings(before: Jottings, after: Jottings): Map<string, string> {
  const found = new Map<string, string>();
  for (const kind of Object.keys(kept) as (keyof typeof kept)[]) {
    pairs(kept[kind](before), kept[kind](after), kind === 'steps' || kind === 'cautions', found);
  }
  return found;
}
