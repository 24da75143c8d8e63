import { follows, spoken, tokensOf, type Token } from '../tokens';
import { type Cue, type HeardMeasure, type MeasureKind, type Qualifier } from '../types';
import { singular } from './counts';
import { isForce } from './filters';
import { findMeasures } from './find';
import { type Found } from './special';
import { listen, type Talk, type Units, wordAfter } from './talk';
import { isLength, kindOf } from './units';
import { countables, dimensionWords, fastenerNouns, sizedNouns } from './words.data';

const about = 'about|around|roughly|approximately|maybe|nearly|almost|approx|circa|say|like';

function qualifierOf(tokens: readonly Token[], found: Found): Qualifier | null {
  const { from } = found;
  const to = from + found.n;
  if (
    follows(tokens, from - 2, 'less|fewer than') ||
    (follows(tokens, from - 2, 'more than') && follows(tokens, from - 3, 'no|not'))
  )
    return 'less than';
  if (
    follows(tokens, from - 1, 'under|within') ||
    follows(tokens, from - 2, 'up to') ||
    follows(tokens, from - 2, 'within a|like|about')
  )
    return 'less than';
  if (
    follows(tokens, from - 2, 'at least') ||
    follows(tokens, from - 2, 'more|shorter|over than') ||
    follows(tokens, from - 1, 'minimum|least') ||
    follows(tokens, to, 'minimum|or more')
  )
    return 'at least';
  if (
    follows(tokens, from - 1, about) ||
    follows(tokens, to, 'or so') ||
    follows(tokens, to, 'ish|maybe') ||
    follows(tokens, from - 2, 'something like')
  )
    return 'about';
  return null;
}

/** The word beside the figure that says what it is of. */
function refersTo(tokens: readonly Token[], found: Found): string | null {
  const to = found.from + found.n;
  const isThing = (w: string) =>
    sizedNouns.has(w) || countables.has(singular(w)) || fastenerNouns.has(w);
  for (let k = to; k < Math.min(tokens.length, to + 3); k += 1) {
    const w = tokens[k]?.w ?? '';
    if (isThing(w))
      return tokens
        .slice(to, k + 1)
        .map((token) => token.w)
        .join(' ');
    if (tokens[k]?.end) break;
  }
  const way = dimensionWords.has(tokens[to]?.w ?? '') ? tokens[to]?.w : undefined;
  for (let k = found.from - 1; k >= Math.max(0, found.from - 8); k -= 1) {
    const w = tokens[k]?.w ?? '';
    if (isThing(w)) return [w, ...(way === undefined ? [] : [way])].join(' ');
  }
  return way ?? null;
}

function kindIn(talk: Talk, found: Found): MeasureKind {
  if (isForce(talk, found)) return 'force';
  const next = wordAfter(talk.tokens, found.from + found.n, fastenerNouns, 2);
  return isLength(found.unit) && next >= 0 && found.values.length === 1
    ? 'fastener'
    : kindOf(found.unit);
}

/** A measure ready but for its id. */
export type Unnamed = Omit<HeardMeasure, 'id'>;

function describe(cues: readonly Cue[], talk: Talk, found: Found): Unnamed {
  const { tokens } = talk;
  const { text, wordsRange } = spoken(cues, tokens, found.from, found.from + found.n);
  const many = found.values.length > 1;
  return {
    t: tokens[found.from]?.t ?? 0,
    text,
    wordsRange,
    value: many ? null : (found.values[0] ?? null),
    ...(many ? { values: found.values } : {}),
    ...(found.range ? { range: true as const } : {}),
    unit: found.unit,
    kind: kindIn(talk, found),
    qualifier: qualifierOf(tokens, found),
    refersTo: refersTo(tokens, found),
    unitInferred: found.inferred ?? false,
  };
}

/** Every measurement spoken, and the units of the talk. */
export function heardMeasures(
  cues: readonly Cue[],
  units?: Units,
): { measures: Unnamed[]; talk: Talk } {
  const talk = listen(tokensOf(cues), units);
  return { measures: findMeasures(talk).map((found) => describe(cues, talk, found)), talk };
}
