import { follows, type Token } from '../tokens';
import { type MeasureUnit } from '../types';
import { readBare } from './bare';
import { readCount } from './counts';
import { asTemperature, belongs } from './filters';
import { readNumber } from './numbers';
import { readChain, readQuantity, type Chain, type Quantity } from './quantity';
import {
  asFastener,
  asLumber,
  readBolt,
  readGrit,
  readQuarters,
  readRatio,
  readScrew,
  type Found,
} from './special';
import { type Talk, unitNear } from './talk';
import { isLength, tidy } from './units';

/** What the reading so far remembers. */
interface Memory {
  lastLength: number;
  lastGrit: number;
  /** Sizes said as exact decimals, so that "two forty two" is known again. */
  known: Set<number>;
  last: Found | null;
  lastCount: number;
}

function special(talk: Talk, at: number, memory: Memory): Found | null {
  const grit = readGrit(talk, at, memory.lastGrit);
  if (grit) memory.lastGrit = at + grit.n;
  return (
    readScrew(talk, at) ??
    readBolt(talk, at) ??
    readQuarters(talk, at) ??
    grit ??
    readRatio(talk, at)
  );
}

/** "ten to fifteen minutes", "an hour or two": two numbers for one thing. */
function readRange(talk: Talk, at: number, first: Quantity): Found | null {
  const { tokens } = talk;
  const i = at + first.n;
  if (tokens[i - 1]?.end || !follows(tokens, i, 'to|or|and')) return null;
  if (tokens[i]?.w === 'and' && !follows(tokens, at - 1, 'between')) return null;
  const second = readQuantity(tokens, i + 1);
  if (
    !second ||
    (tokens[i]?.w === 'to' &&
      follows(tokens, i + 1, 'a|an') &&
      second.form !== 'implied' &&
      second.form !== 'fraction')
  )
    return null;
  const unit = second.unit ?? first.unit;
  if (
    !unit ||
    (first.unit && second.unit && first.unit !== second.unit) ||
    !(second.said > first.said)
  )
    return null;
  if (!second.unit && follows(tokens, i, 'to')) return null;
  const factor = second.unit ? second.value / second.said : first.value / first.said;
  return {
    from: at,
    n: first.n + 1 + second.n,
    values: [tidy(first.said * factor), tidy(second.said * factor)],
    unit,
    range: true,
  };
}

/** Sizes joined with "by", in one unit. */
function asSizes(talk: Talk, at: number, chain: Chain): Found | null {
  const said = [
    ...new Set(
      chain.items.map((item) => item.unit).filter((unit): unit is MeasureUnit => unit !== null),
    ),
  ];
  if (said.some((unit) => !isLength(unit))) return null;
  const last = chain.items[chain.items.length - 1];
  const guess =
    chain.items.some((item) => (item.part ?? 0) >= 4 && item.form !== 'decimal') &&
    talk.units !== 'metric'
      ? 'in'
      : unitNear(talk, at);
  const unit: MeasureUnit = said.includes('in') ? 'in' : (said[0] ?? guess);
  const factor = last?.unit === 'mm' ? last.value / last.said : 1;
  const values = chain.items.map((item) => {
    if (item.unit === null) return tidy(item.said * factor);
    return unit === 'in' && item.unit === 'ft' ? item.value * 12 : item.value;
  });
  if (unit === 'ft' && chain.items.some((item) => item.unit === null && item.said > 16))
    return null;
  return {
    from: at,
    n: chain.n,
    values,
    unit,
    ...(said.length === 0 ? { inferred: true as const } : {}),
  };
}

function quantityAt(talk: Talk, at: number, memory: Memory): { found: Found | null; n: number } {
  const { tokens } = talk;
  const lumber = /^\d|^[a-z]/.test(tokens[at]?.w ?? '')
    ? asLumber(talk, at, readChain(tokens, at) ?? { items: [], n: 0 })
    : null;
  if (lumber) return { found: lumber, n: lumber.n };
  const chain = readChain(tokens, at);
  const first = chain?.items[0];
  if (!chain || !first) return { found: null, n: 1 };
  if (chain.items.length > 1)
    return { found: asFastener(talk, at, chain) ?? asSizes(talk, at, chain), n: chain.n };
  const range = readRange(talk, at, first);
  if (range) return { found: range, n: range.n };
  if (first.unit)
    return { found: { from: at, n: first.n, values: [first.value], unit: first.unit }, n: first.n };
  return { found: readBare(talk, at, first, memory), n: first.n };
}

function numberStarts(tokens: readonly Token[], at: number): boolean {
  const before = tokens[at - 1]?.w ?? '';
  // The tail of a number that was read as something else.
  if (
    tokens[at]?.w === 'one' &&
    /^(?:each|this|that|every|which|another|other|first|last|next|big|old|new)$/.test(before)
  )
    return false;
  return !(before === 'point' || before === '$' || before === '€' || before === '£');
}

/** All measures among the tokens, in order. */
export function findMeasures(talk: Talk): Found[] {
  const { tokens } = talk;
  const memory: Memory = {
    lastLength: -99,
    lastGrit: -99,
    known: new Set(),
    last: null,
    lastCount: -99,
  };
  const all: Found[] = [];
  let at = 0;
  while (at < tokens.length) {
    if (!startsNumber.test(tokens[at]?.w ?? '') || !numberStarts(tokens, at)) {
      at += 1;
      continue;
    }
    const step = measureAt(talk, at, memory);
    if (step.found) remember(memory, step.found, all);
    at += Math.max(1, step.n);
  }
  return takeBack(talk, all);
}

const startsNumber =
  /^(?:\d.*|\.\d+|a|an|no|number|m\d*|point|half|halves|inch|third|quarter|eighth|sixteenth|zero|nought|one|two|three|four|five|six|seven|eight|nine|ten|eleven|twelve|(?:thir|four|fif|six|seven|eigh|nine)teen|twenty|thirty|fou?rty|fifty|sixty|seventy|eighty|ninety|hundred|thousand|tenth|hundredth|foot)$/;

function measureAt(talk: Talk, at: number, memory: Memory): { found: Found | null; n: number } {
  const own = special(talk, at, memory);
  if (own) return { found: own, n: own.n };
  const chain = quantityAt(talk, at, memory);
  const named =
    chain.found &&
    !chain.found.inferred &&
    (chain.found.unit === 'nominal' ||
      chain.found.unit === 'screw' ||
      chain.found.unit === 'bolt' ||
      chain.found.values.length > 1);
  const count = named ? null : (readCount(talk, at) ?? countAgain(talk, at, memory));
  if (count) return { found: count, n: count.n };
  if (!chain.found || !belongs(talk, chain.found)) return { found: null, n: chain.n };
  return { found: asTemperature(talk, chain.found), n: chain.n };
}

/** "eight boards at thirty six … and eight at sixteen": the second eight counts what the first did. */
function countAgain({ tokens }: Talk, at: number, memory: Memory): Found | null {
  const number = readNumber(tokens, at);
  if (!number || number.form !== 'whole' || number.value > 60 || at - memory.lastCount > 18)
    return null;
  if (
    !follows(tokens, at + number.n, 'at|of') ||
    follows(tokens, at + number.n, 'of the') ||
    !follows(tokens, at - 1, 'and|then|plus|another')
  )
    return null;
  return { from: at, n: number.n, values: [number.value], unit: 'count' };
}

function remember(memory: Memory, found: Found, all: Found[]): void {
  all.push(found);
  memory.last = found;
  if (found.unit === 'count') memory.lastCount = found.from;
  if (!isLength(found.unit)) return;
  memory.lastLength = found.from + found.n;
  for (const value of found.values) if (found.unit === 'in' && value < 1) memory.known.add(value);
}

const sorry =
  /^(?:(?:um|uh|er|oh|no|sorry|wait|i|mean|make|that|scratch|correction|rather|or|actually|excuse|me|my|bad|pardon|meant|strike|let's|say|well|hang|on|it's|that's|wrong|should|be|to|call|it|not)\s?)+$/;
const strong =
  /\b(?:sorry|no|wait|i mean|i meant|make that|scratch that|strike that|correction|rather|actually|excuse me|my bad|pardon)\b/;

/** Leaves out what the speaker takes back: "five eighths, sorry, eleven sixteenths" is eleven sixteenths. */
function takeBack({ tokens }: Talk, all: Found[]): Found[] {
  return all
    .map((found, i) =>
      carriesUnit(tokens, all[i - 1], found)
        ? { ...found, unit: all[i - 1]?.unit ?? found.unit }
        : found,
    )
    .filter((found, i) => !(all[i + 1] && correctedBy(tokens, found, all[i + 1])));
}

function correctedBy(tokens: readonly Token[], found: Found, next: Found | undefined): boolean {
  if (!next) return false;
  const from = found.from + found.n;
  if (next.from - from < 1 || next.from - from > 6) return false;
  const between = tokens
    .slice(from, next.from)
    .map((token) => token.w)
    .join(' ');
  const alike =
    found.unit === next.unit ||
    (isLength(found.unit) && isLength(next.unit)) ||
    (next.inferred ?? false) ||
    (found.inferred ?? false);
  return alike && strong.test(between) && sorry.test(between);
}

function carriesUnit(tokens: readonly Token[], before: Found | undefined, found: Found): boolean {
  return (
    before !== undefined &&
    (found.inferred ?? false) &&
    !(before.inferred ?? false) &&
    correctedBy(tokens, before, found)
  );
}
