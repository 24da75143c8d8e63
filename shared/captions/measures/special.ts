import { follows, type Token } from '../tokens';
import { type MeasureUnit } from '../types';
import { readChain, readQuantity, type Chain } from './quantity';
import { readNumber } from './numbers';
import { near, type Talk, unitNear, wordAfter, wordBefore } from './talk';
import { readUnit } from './units';
import {
  abrasiveWords,
  boltNouns,
  lumberNouns,
  ratioWords,
  screwNouns,
  sheetNouns,
} from './words.data';

/** A measure as found among the tokens. */
export interface Found {
  from: number;
  n: number;
  values: number[];
  unit: MeasureUnit;
  range?: true;
  inferred?: true;
}

const whole = (value: number | undefined): value is number =>
  value !== undefined && Number.isInteger(value);
const found = (from: number, n: number, values: number[], unit: MeasureUnit): Found => ({
  from,
  n,
  values,
  unit,
});

/** Threads per inch by diameter, coarse and fine (ASME B1.1 unified series, from memory). */
const threads: Record<string, number[]> = {
  '0.25': [20, 28],
  '0.3125': [18, 24],
  '0.375': [16, 24],
  '0.4375': [14, 20],
  '0.5': [13, 20],
  '0.625': [11, 18],
  '0.75': [10, 16],
  '4': [40],
  '6': [32],
  '8': [32],
  '10': [24, 32],
  '12': [24],
};

function lengthAfterBy(tokens: readonly Token[], at: number): { value: number; n: number } | null {
  if (!follows(tokens, at, 'by')) return null;
  const length = readQuantity(tokens, at + 1);
  return length && (length.unit === null || length.unit === 'in' || length.unit === 'mm')
    ? { value: length.value, n: length.n + 1 }
    : null;
}

/** "m6 by forty", "quarter twenty by two inch", "ten twenty four": a bolt by its thread. */
export function readBolt({ tokens }: Talk, at: number): Found | null {
  const metric = /^m(\d{1,2})$/.exec(tokens[at]?.w ?? '');
  const spacedM = tokens[at]?.w === 'm' ? readNumber(tokens, at + 1) : null;
  if (metric || (spacedM && whole(spacedM.value) && spacedM.value >= 2 && spacedM.value <= 24)) {
    const head = metric ? 1 : 1 + (spacedM?.n ?? 0);
    const length = lengthAfterBy(tokens, at + head);
    return found(
      at,
      head + (length?.n ?? 0),
      [Number(metric?.[1] ?? spacedM?.value), ...(length ? [length.value] : [])],
      'bolt',
    );
  }
  return unified(tokens, at);
}

function unified(tokens: readonly Token[], at: number): Found | null {
  const article = follows(tokens, at, 'a') ? 0 : 0;
  for (const take of [1, 2, 3]) {
    const head = readNumber(tokens.slice(at, at + take), 0);
    if (!head || head.n !== take) continue;
    const pitches = threads[String(head.value)];
    const i =
      at +
      take +
      (follows(tokens, at + take, 'inch|by|dash') &&
      head.value < 1 &&
      follows(tokens, at + take, 'dash')
        ? 1
        : 0);
    const pitch = pitches ? pitchAt(tokens, i, pitches) : null;
    if (!pitch) continue;
    const gauge = head.value >= 1;
    if (gauge && !near(tokens, at, i + 2, boltNouns, 6, 8)) continue;
    const length = lengthAfterBy(tokens, i + pitch.n);
    if (!length && readUnit(tokens, i + pitch.n)?.unit === 'in') continue;
    return found(
      at + article,
      i - at + pitch.n + (length?.n ?? 0),
      [head.value, pitch.value, ...(length ? [length.value] : [])],
      'bolt',
    );
  }
  return null;
}

/** One of the pitches, said in one or two words. */
function pitchAt(
  tokens: readonly Token[],
  at: number,
  pitches: readonly number[],
): { value: number; n: number } | null {
  for (const take of [2, 1]) {
    const number = readNumber(tokens.slice(at, at + take), 0);
    if (number && number.n === take && pitches.includes(number.value))
      return { value: number.value, n: take };
  }
  return null;
}

/** "number eight by inch and a quarter", "number tens": a wood screw by its gauge. */
export function readScrew({ tokens }: Talk, at: number): Found | null {
  if (!follows(tokens, at, 'number|no')) return null;
  const w = tokens[at + 1]?.w ?? '';
  const plural = /^(fours|sixes|eights|tens|twelves|fourteens)$/.exec(w);
  const gauge = plural
    ? {
        value: { fours: 4, sixes: 6, eights: 8, tens: 10, twelves: 12, fourteens: 14 }[w] ?? 0,
        n: 1,
      }
    : readNumber(tokens, at + 1);
  if (!gauge || !whole(gauge.value) || gauge.value > 24) return null;
  let i = at + 1 + gauge.n;
  if (/^\d+s$/.test(w)) i = at + 2;
  const length = lengthAfterBy(tokens, i) ?? bareLength(tokens, i);
  if (!length && !plural && wordAfter(tokens, i, screwNouns, 4) < 0) return null;
  if (
    !length &&
    !plural &&
    wordBefore(
      tokens,
      wordAfter(tokens, i, screwNouns, 4),
      new Set(['biscuit', 'biscuits', 'plane', 'iron', 'card']),
      4,
    ) >= i
  )
    return null;
  return found(
    at,
    i - at + (length?.n ?? 0),
    [gauge.value, ...(length ? [length.value] : [])],
    'screw',
  );
}

/** "number eight inch and a quarter screws": the "by" swallowed. */
function bareLength(tokens: readonly Token[], at: number): { value: number; n: number } | null {
  const length = readQuantity(tokens, at);
  return length?.unit === 'in' && wordAfter(tokens, at + length.n, screwNouns, 3) >= 0
    ? length
    : null;
}

/** A chain of two that is a screw or a bolt by the words beside it. */
export function asFastener(talk: Talk, at: number, chain: Chain): Found | null {
  const [a, b] = chain.items;
  if (!a || !b || chain.items.length !== 2) return null;
  const { tokens } = talk;
  const to = at + chain.n;
  const bolt = wordAfter(tokens, to, boltNouns, 4);
  const screw = wordAfter(tokens, to, screwNouns, 3);
  const unit = unitNear(talk, at);
  const values = [a.value, b.value];
  if (
    bolt >= 0 &&
    (screw < 0 || bolt < screw) &&
    a.value < b.value &&
    (a.form === 'fraction' || unit === 'mm')
  )
    return found(at, chain.n, values, 'bolt');
  const metric =
    (a.unit ?? b.unit ?? unit) === 'mm' &&
    a.value >= 2 &&
    a.value <= 14 &&
    b.value >= 10 &&
    b.value <= 300 &&
    b.value / a.value >= 2.4;
  const imperial =
    (b.unit === 'in' || (b.unit === null && unit === 'in')) &&
    b.value <= 12 &&
    ((whole(a.value) && a.unit === null && a.value >= 2 && a.value <= 24) || a.value < 1) &&
    (a.value >= 1 || b.value > a.value);
  if (!metric && !imperial) return null;
  if (screw >= 0 || wordBefore(tokens, at, screwNouns, 6) >= 0)
    return found(at, chain.n, values, 'screw');
  // Farther back only for metric sizes that no part has.
  return metric &&
    b.unit === null &&
    !endsBetween(tokens, at, 4) &&
    wordBefore(tokens, at, screwNouns, 22) >= 0
    ? found(at, chain.n, values, 'screw')
    : null;
}

function endsBetween(tokens: readonly Token[], at: number, reach: number): boolean {
  return tokens.slice(Math.max(0, at - reach), at).some((token) => token.end);
}

const nominalSizes = new Set([1, 2, 3, 4, 6, 8, 10, 12]);

/** "two by four", "one by sixes": lumber by name; "four by eight" of a sheet is feet. */
export function asLumber(talk: Talk, at: number, chain: Chain): Found | null {
  const { tokens } = talk;
  const [a, b] = chain.items;
  const to = at + chain.n;
  if (!a || chain.items.some((item) => !whole(item.said))) return pluralLumber(tokens, at);
  if (!b) return pluralLumber(tokens, at);
  const last = chain.items[chain.items.length - 1];
  const bare = chain.items.every((item) => item.unit === null);
  if (
    chain.items.length === 2 &&
    a.value <= 10 &&
    b.value <= 12 &&
    (bare || (last?.unit === 'ft' && a.unit === null)) &&
    a.value >= 2 &&
    wordAfter(tokens, to, sheetNouns, 3) >= 0 &&
    b.value >= 4
  )
    return found(at, chain.n, [a.value, b.value], 'ft');
  if (!bare || chain.items.length !== 2 || !nominalSizes.has(a.value) || !nominalSizes.has(b.value))
    return null;
  if (
    Math.min(a.value, b.value) > 4 ||
    (Math.min(a.value, b.value) === 4 && Math.max(a.value, b.value) > 6)
  )
    return null;
  const named =
    wordAfter(tokens, to, lumberNouns, 2) >= 0 ||
    follows(
      tokens,
      at - 1,
      'a|of|some|the|that|this|these|scrap|from|offcut|standard|regular|construction|treated|softwood',
    );
  const metric = unitNear(talk, at) === 'mm';
  return named || (!metric && a.value <= 2)
    ? found(at, chain.n, [a.value, b.value], 'nominal')
    : null;
}

const plurals: Record<string, number> = {
  ones: 1,
  twos: 2,
  threes: 3,
  fours: 4,
  sixes: 6,
  eights: 8,
  tens: 10,
  twelves: 12,
};

export function pluralLumber(tokens: readonly Token[], at: number): Found | null {
  const a = readNumber(tokens, at);
  if (!a || !whole(a.value) || a.value > 8 || !follows(tokens, at + a.n, 'by')) return null;
  const b = plurals[tokens[at + a.n + 1]?.w ?? ''];
  return b === undefined ? null : found(at, a.n + 2, [a.value, b], 'nominal');
}

/** "four quarter" rough stock: thickness in quarters of an inch. */
export function readQuarters({ tokens }: Talk, at: number): Found | null {
  const slash = /^(4|5|6|8|10|12|16)\/4$/.exec(tokens[at]?.w ?? '');
  if (slash) return found(at, 1, [Number(slash[1]) / 4], 'nominal');
  const number = readNumber(tokens.slice(at, at + 1), 0);
  const quarters =
    number &&
    [4, 5, 6, 8, 10, 12, 16].includes(number.value) &&
    follows(tokens, at + 1, 'quarter|quarters');
  if (!quarters || follows(tokens, at + 2, 'inch|inches|twenty|by|round|hour|of|turns|turn'))
    return null;
  return found(at, 2, [number.value / 4], 'nominal');
}

/** "three to one", "one in six", "two parts resin to one part hardener". */
export function readRatio({ tokens }: Talk, at: number): Found | null {
  const a = readNumber(tokens, at);
  if (!a || !whole(a.value) || a.value < 1 || a.value > 200) return null;
  let i = at + a.n;
  const parts = follows(tokens, i, 'part|parts');
  if (parts) {
    const to = [1, 2, 3, 4, 5].find(
      (k) => follows(tokens, i + k, 'to|and') && readNumber(tokens, i + k + 1) !== null,
    );
    if (to === undefined) return null;
    i += to;
  }
  if (!follows(tokens, i, 'to|in|:')) return null;
  const slope = tokens[i]?.w === 'in';
  const b = readNumber(tokens, i + 1);
  if (!b || !whole(b.value) || b.value < 1 || (slope && a.value !== 1)) return null;
  const to = i + 1 + b.n;
  const unit = readUnit(tokens, to);
  if (unit && !parts && tokens[to]?.w !== 'a') return null;
  if (parts && !follows(tokens, to, 'part|parts|of')) return null;
  const colon = tokens[i]?.w === ':';
  if (!parts && !colon && !near(tokens, at, to, ratioWords, 9, 6) && b.value !== 1) return null;
  if (slope && !near(tokens, at, to, ratioWords, 9, 6)) return null;
  if (colon && follows(tokens, at - 1, 'at|around|by')) return null;
  return found(at, to - at, [a.value, b.value], 'ratio');
}

const grits = new Set([
  24, 36, 40, 50, 60, 80, 100, 120, 150, 180, 220, 240, 280, 320, 360, 400, 500, 600, 800, 1000,
  1200, 1500, 2000, 2500, 3000, 4000,
]);

/** A grit at a place, in as many words as it takes; the longest that is a grit made. */
function gritAt(tokens: readonly Token[], at: number): { value: number; n: number } | null {
  for (const take of [4, 3, 2, 1]) {
    const number = readNumber(tokens.slice(at, at + take), 0);
    if (number && number.n === take && grits.has(number.value))
      return { value: number.value, n: take };
  }
  return null;
}

/** Sandpaper by its grit, also when only the number is said: "to two twenty", "then two forty". */
export function readGrit({ tokens }: Talk, at: number, lastGrit: number): Found | null {
  const grit = gritAt(tokens, at);
  if (!grit) return null;
  const to = at + grit.n;
  if (follows(tokens, to, 'grit')) return found(at, grit.n + 1, [grit.value], 'grit');
  if (readUnit(tokens, to, true) || follows(tokens, to, 'by|degrees')) return null;
  const listed = at - lastGrit <= 6;
  const joined =
    wordBefore(
      tokens,
      at,
      new Set([
        'then',
        'to',
        'with',
        'and',
        'through',
        'at',
        'by',
        'up',
        'finer',
        'from',
        'or',
        'using',
        'in',
        'some',
      ]),
      3,
    ) >= 0;
  if (listed && joined && grit.value >= 60) return found(at, grit.n, [grit.value], 'grit');
  const said = near(tokens, at, to, abrasiveWords, 9, 5);
  return said &&
    grit.value >= 60 &&
    (joined || follows(tokens, to, 'paper|sandpaper|disc|discs|mesh'))
    ? found(at, grit.n, [grit.value], 'grit')
    : null;
}

export { readChain };
