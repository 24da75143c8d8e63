import { type Token } from '../tokens';
import { readDenominator } from './numbers';

export type Units = 'imperial' | 'metric' | 'mixed';

/** The tokens with what is known of the whole talk: which units it uses, and where. */
export interface Talk {
  tokens: readonly Token[];
  units: Units;
  /** Places where inches or millimetres were said, in order. */
  anchors: { at: number; unit: 'in' | 'mm'; weight: number }[];
}

const inch = /^(?:inch|inches|thou|thousandths?|foot|feet)$/;
const metric = /^(?:mils?|mm|millimet(?:er|re)s?|centimet(?:er|re)s?|cm|met(?:re|er)s?)$/;
const metricThread = /^m(?:3|4|5|6|8|10|12)$/;

function anchorAt(
  tokens: readonly Token[],
  at: number,
): { unit: 'in' | 'mm'; weight: number } | null {
  const w = tokens[at]?.w ?? '';
  const before = tokens[at - 1]?.w ?? '';
  if (inch.test(w))
    return w === 'foot' || w === 'feet'
      ? /^(?:a|one|two|three|four|five|six|seven|eight|nine|ten|twelve|\d+)$/.test(before)
        ? { unit: 'in', weight: 0.5 }
        : null
      : { unit: 'in', weight: 1 };
  if (metric.test(w)) return { unit: 'mm', weight: 1 };
  if (metricThread.test(w)) return { unit: 'mm', weight: 0.8 };
  const down = readDenominator(tokens, at);
  if (down && down.value >= 8 && down.value <= 64 && down.value % 8 === 0)
    return { unit: 'in', weight: 0.7 };
  return null;
}

/** Reads the talk once: its units and their places. */
export function listen(tokens: readonly Token[], units?: Units): Talk {
  const anchors: Talk['anchors'] = [];
  const sums = { in: 0, mm: 0 };
  for (let at = 0; at < tokens.length; at += 1) {
    const anchor = anchorAt(tokens, at);
    if (!anchor) continue;
    anchors.push({ at, ...anchor });
    sums[anchor.unit] += anchor.weight;
  }
  const all = sums.in + sums.mm;
  const lesser = Math.min(sums.in, sums.mm);
  const found =
    all > 0 && lesser / all > 0.12 && lesser >= 2
      ? 'mixed'
      : sums.mm > sums.in
        ? 'metric'
        : 'imperial';
  return { tokens, units: units ?? found, anchors };
}

/** The unit a length without one has at a place: the talk's, or in a mixed talk that of the words nearest. */
export function unitNear(talk: Talk, at: number): 'in' | 'mm' {
  if (talk.units !== 'mixed') return talk.units === 'metric' ? 'mm' : 'in';
  const sums = { in: 0, mm: 0 };
  for (const anchor of anchorsAround(talk, at, 120)) {
    const away = anchor.at - at;
    // What was said before weighs more than what is still to come.
    sums[anchor.unit] += anchor.weight * Math.exp(-Math.abs(away) / (away < 0 ? 25 : 14));
  }
  return sums.mm > sums.in ? 'mm' : 'in';
}

function anchorsAround(talk: Talk, at: number, reach: number): Talk['anchors'] {
  let lo = 0;
  let hi = talk.anchors.length;
  while (lo < hi) {
    const mid = (lo + hi) >> 1;
    if ((talk.anchors[mid]?.at ?? 0) < at - reach) lo = mid + 1;
    else hi = mid;
  }
  const found: Talk['anchors'] = [];
  for (let k = lo; k < talk.anchors.length; k += 1) {
    const anchor = talk.anchors[k];
    if (!anchor || anchor.at > at + reach) break;
    found.push(anchor);
  }
  return found;
}

/** Is one of these words within so many tokens before or after `from`…`to`? */
export function near(
  tokens: readonly Token[],
  from: number,
  to: number,
  words: ReadonlySet<string>,
  before: number,
  after: number,
): boolean {
  return wordBefore(tokens, from, words, before) >= 0 || wordAfter(tokens, to, words, after) >= 0;
}

/** Place of the nearest of these words before a place, within reach; -1 when there is none. */
export function wordBefore(
  tokens: readonly Token[],
  at: number,
  words: ReadonlySet<string>,
  reach: number,
): number {
  for (let k = at - 1; k >= Math.max(0, at - reach); k -= 1)
    if (words.has(tokens[k]?.w ?? '')) return k;
  return -1;
}

export function wordAfter(
  tokens: readonly Token[],
  at: number,
  words: ReadonlySet<string>,
  reach: number,
): number {
  for (let k = at; k < Math.min(tokens.length, at + reach); k += 1)
    if (words.has(tokens[k]?.w ?? '')) return k;
  return -1;
}
