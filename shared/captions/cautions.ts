import { cautionNot, cautionSigns } from './cautions.data';
import { spoken, type Token } from './tokens';
import { type Cue, type HeardCaution } from './types';

/** Words that one thought may span. */
const thought = 24;
const enough = 2;

interface Sign {
  at: number;
  weight: number;
  rule: number;
}

/** Signs of a caution at each token. */
function signs(tokens: readonly Token[]): Sign[] {
  const found: Sign[] = [];
  for (let at = 0; at < tokens.length; at += 1) {
    const text = tokens
      .slice(at, at + 8)
      .map((token) => token.w)
      .join(' ');
    cautionSigns.forEach(({ is, weight }, rule) => {
      if (is.test(text) && !(cautionNot.test(text) && cautionNot.exec(text)?.index === 0))
        found.push({ at, weight, rule });
    });
  }
  return found;
}

/** Best stretch starting at a sign: its weight, each rule counted once. */
function weigh(
  all: readonly Sign[],
  from: number,
): { weight: number; last: number; strong: number } {
  const start = all[from]?.at ?? 0;
  const rules = new Set<number>();
  let weight = 0;
  let last = from;
  let strong = 0;
  for (let k = from; k < all.length; k += 1) {
    const sign = all[k];
    if (!sign || sign.at - start > thought) break;
    if (rules.has(sign.rule)) continue;
    rules.add(sign.rule);
    weight += sign.weight;
    strong = Math.max(strong, sign.weight);
    last = k;
    if (weight >= enough && sign.weight < 0.8) break;
  }
  return { weight, last, strong };
}

/** Cautions among the words from one time to another (the building, not the sign-off). */
export function heardCautions(
  cues: readonly Cue[],
  tokens: readonly Token[],
  from: number,
  to: number,
): Omit<HeardCaution, 'id'>[] {
  const all = signs(tokens).filter((sign) => {
    const t = tokens[sign.at]?.t ?? 0;
    return t >= from && t < to;
  });
  const found: Omit<HeardCaution, 'id'>[] = [];
  for (let k = 0; k < all.length; k += 1) {
    const sign = all[k];
    // A body part or a machine alone begins nothing.
    if (!sign || sign.weight < 0.7) continue;
    const { weight, last, strong } = weigh(all, k);
    if (weight < enough || strong < 0.8) continue;
    const end = Math.min(tokens.length, Math.max(sign.at + 8, (all[last]?.at ?? 0) + 4));
    found.push({ t: tokens[sign.at]?.t ?? 0, ...spoken(cues, tokens, sign.at, end) });
    const past = (all[last]?.at ?? 0) + 12;
    while (k + 1 < all.length && (all[k + 1]?.at ?? 0) <= past) k += 1;
  }
  return found;
}
