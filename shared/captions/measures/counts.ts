import { follows, type Token } from '../tokens';
import { readNumber } from './numbers';
import { readQuantity } from './quantity';
import { pluralLumber, readBolt, readQuarters, readScrew, type Found } from './special';
import { near, type Talk } from './talk';
import { readUnit } from './units';
import {
  adjectives,
  countables,
  fastenerNouns,
  makingVerbs,
  namedNumbers,
  neverCounted,
  otherUnits,
} from './words.data';

/** "boxes" → "box", "shelves" → "shelf", "dowels" → "dowel". */
export function singular(w: string): string {
  if (/(?:shel|hal|kni|lea|wol)ves$/.test(w)) return `${w.slice(0, -3)}f`;
  if (/ies$/.test(w)) return `${w.slice(0, -3)}y`;
  if (/(?:sh|ch|x|ss|o)es$/.test(w)) return w.slice(0, -2);
  return /[^s]s$/.test(w) ? w.slice(0, -1) : w;
}

const plural = (w: string) => (w !== singular(w) && w.length > 2) || w === 'feet';

/** The noun that a number at `at` counts, after adjectives; null when the words make no count. */
function countedNoun(
  tokens: readonly Token[],
  at: number,
): { at: number; listed: boolean; w: string } | null {
  for (let k = 0; k < 4; k += 1) {
    const w = tokens[at + k]?.w ?? '';
    if (w === '' || neverCounted.has(w) || otherUnits.has(w)) return null;
    if (plural(w) && countables.has(singular(w))) return { at: at + k, listed: true, w };
    if (w === 'ones' && k > 0) return { at: at + k, listed: true, w };
    if (tokens[at + k]?.end || tokens[at + k]?.comma)
      return plural(w) && w.length > 3 ? { at: at + k, listed: false, w } : null;
    if (k === 3) return null;
    const size = readQuantity(tokens, at + k);
    if (adjectives.has(w) || countables.has(w) || (w === 'of' && k > 0)) continue;
    if (size) return null;
    return plural(w) && w.length > 3 && !/(?:ss|'s|us|is)$/.test(w) && !stopsCount.has(w)
      ? { at: at + k, listed: false, w }
      : null;
  }
  return null;
}

const stopsCount = new Set([
  'this',
  'his',
  'its',
  'was',
  'has',
  'does',
  'goes',
  'gets',
  'always',
  'plus',
  'minus',
  'less',
  'across',
  'thus',
  'is',
  'inches',
  'sits',
  'comes',
  'makes',
  'leaves',
  'looks',
  'works',
  'needs',
  'takes',
  'gives',
  'fits',
  'sorry',
  'equals',
  'runs',
  'seems',
  'sometimes',
  'towards',
  'besides',
  'afterwards',
  'upwards',
  'says',
  'reads',
  'means',
  'lets',
  'thous',
]);

/** A size between the number and the thing counted: "two 18 gauge brads", "four number eight … screws". */
function sizedThing({ tokens, ...talk }: Talk, at: number): boolean {
  const own = { tokens, ...talk };
  const special =
    readScrew(own, at) ?? readBolt(own, at) ?? readQuarters(own, at) ?? pluralLumber(tokens, at);
  const size = readQuantity(tokens, at);
  const chained = size ? chainEnd(tokens, at + size.n) : at;
  const n = special
    ? special.n
    : size && (size.unit !== null || size.form === 'fraction' || chained > at + size.n)
      ? chained - at
      : 0;
  if (n === 0) return false;
  if (special) return true;
  for (let k = 0; k < 4; k += 1) {
    const w = tokens[at + n + k]?.w ?? '';
    if (neverCounted.has(w)) return false;
    if (plural(w) && (countables.has(singular(w)) || fastenerNouns.has(w))) return true;
    if (/^(?:in|to|at|on|the|and|so|for|with|from|is|are|by|then|of|a|it)$/.test(w)) return false;
  }
  return false;
}

function chainEnd(tokens: readonly Token[], at: number): number {
  if (!follows(tokens, at, 'by')) return at;
  const next = readQuantity(tokens, at + 1);
  return next ? chainEnd(tokens, at + 1 + next.n) : at;
}

function dozen(tokens: readonly Token[], at: number): { value: number; n: number } | null {
  if (follows(tokens, at, 'a dozen')) return { value: 12, n: 2 };
  if (follows(tokens, at, 'half a dozen')) return { value: 6, n: 3 };
  return follows(tokens, at, 'two dozen') ? { value: 24, n: 2 } : null;
}

const pointing = 'these|those|other|my|his|her|our|your|last|first|next|any';

/** How many of something are made or used: "four legs", "two coats", "twenty six of them". */
export function readCount(talk: Talk, at: number): Found | null {
  const { tokens } = talk;
  const many = dozen(tokens, at);
  const number = many ?? headNumber(tokens, at);
  if (!number || !Number.isInteger(number.value) || number.value < 1 || number.value > 500)
    return null;
  const to = at + number.n;
  if (tokens[to - 1]?.end || namedNumbers.has(tokens[at - 1]?.w ?? '')) return null;
  const count = (n: number): Found => ({ from: at, n, values: [number.value], unit: 'count' });
  if (number.value === 1)
    return follows(tokens, to, 'coat|pass|layer') &&
      !follows(tokens, at - 1, 'that|this|which|the|another|no')
      ? count(number.n + 1)
      : null;
  if (ofThem(tokens, at, to)) return count(number.n);
  if (follows(tokens, at - 1, pointing)) return null;
  if ((!readUnit(tokens, to) || follows(tokens, to, 'inch and')) && sizedThing(talk, to))
    return count(number.n);
  if (follows(tokens, to, 'or so') && sizedThing(talk, to + 2)) return count(number.n);
  if (follows(tokens, to, 'doors down')) return null;
  if (readUnit(tokens, to) && !/^(?:min|second)$/.test(tokens[to]?.w ?? '')) return null;
  if (
    follows(tokens, at - 1, 'need|make|cut|want') &&
    (follows(tokens, to, 'of each|obviously|altogether') ||
      follows(tokens, to, 'for|per each|side|end'))
  )
    return count(number.n);
  const noun = countedNoun(tokens, to);
  if (!noun) return null;
  if (!noun.listed && !near(tokens, at, at, makingVerbs, 4, 0)) return null;
  // "on the two saws": the two that were spoken of.
  if (!noun.listed && follows(tokens, at - 1, 'the|all|both')) return null;
  if (
    /^(?:side|end)s$/.test(noun.w) &&
    follows(tokens, at - 1, 'on|both|from|the') &&
    !follows(tokens, at - 2, 'minus|less|plus')
  )
    return null;
  return count(noun.at + 1 - at);
}

/** The number a count begins with: "two" in "two three quarter inch holes". */
function headNumber(tokens: readonly Token[], at: number): { value: number; n: number } | null {
  const number = readNumber(tokens, at);
  if (!number) return null;
  if (number.form === 'whole' || number.form === 'written') return number;
  if (number.form === 'mixed' || number.form === 'hundreds') {
    const first = readNumber(tokens.slice(at, at + 1), 0);
    const rest = first ? readQuantity(tokens, at + 1) : null;
    return first &&
      rest &&
      !follows(tokens, at + 1, 'and') &&
      (rest.unit !== null || rest.form === 'fraction')
      ? first
      : null;
  }
  return null;
}

function ofThem(tokens: readonly Token[], at: number, to: number): boolean {
  if (follows(tokens, at - 1, 'the|all|both|any|these|those|other|no|last|first')) return false;
  if (follows(tokens, to, 'of them|those|these|em'))
    return !follows(tokens, to + 2, 'videos|days|things|people');
  if (follows(tokens, to, 'in total|all') || follows(tokens, to, 'altogether|total')) return true;
  return (
    follows(tokens, to, 'per') &&
    follows(
      tokens,
      to + 1,
      'end|side|corner|hinge|joint|leg|rail|door|shelf|drawer|board|edge|bracket|cleat|piece',
    )
  );
}
