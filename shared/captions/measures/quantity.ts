import { follows, type Token } from '../tokens';
import { type MeasureUnit } from '../types';
import { readAndFraction, readFraction, readNumber, type SpokenNumber } from './numbers';
import { isLength, readUnit, tidy } from './units';

/** A number with the unit said after it, or none. */
export interface Quantity {
  value: number;
  n: number;
  unit: MeasureUnit | null;
  form: SpokenNumber['form'] | 'implied';
  part?: number;
  /** The number as said, before the unit's factor. */
  said: number;
}

/** "an inch and a half", "inch and a quarter", "a foot", "a mil": the one is not said. */
function implied(tokens: readonly Token[], at: number): Quantity | null {
  const article = follows(tokens, at, 'a|an') ? 1 : 0;
  const unit = readUnit(tokens, at + article);
  if (!unit || tokens[at + article]?.w === 'of' || tokens[at + article]?.w === 'in') return null;
  const more =
    unit.factor === 1 || isLength(unit.unit)
      ? readAndFraction(tokens, at + article + unit.n)
      : null;
  if (article === 0 && !(more && unit.unit === 'in')) return null;
  if (
    unit.unit === 'grit' ||
    unit.unit === 'gauge' ||
    unit.unit === 'rpm' ||
    unit.unit === 'tpi' ||
    unit.unit === 'percent'
  )
    return null;
  const said = 1 + (more?.value ?? 0);
  return {
    value: tidy(said * unit.factor),
    said,
    n: article + unit.n + (more?.n ?? 0),
    unit: unit.unit,
    form: 'implied',
    ...(more?.part === undefined ? {} : { part: more.part }),
  };
}

/** Feet with the inches after them; null when no inches follow. */
function feetInches(tokens: readonly Token[], at: number, feet: Quantity): Quantity | null {
  let i = at + feet.n;
  if (tokens[i - 1]?.end) return null;
  const and = tokens[i]?.w === 'and';
  if (and) i += 1;
  const number = readNumber(tokens, i);
  if (!number || number.value >= 12 || number.value <= 0) return null;
  const after = i + number.n;
  const unit = readUnit(tokens, after, /^[\d./]+$/.test(tokens[after - 1]?.w ?? ''));
  const inch = unit?.unit === 'in' && unit.factor === 1;
  if (unit && !inch) return null;
  // "eight foot two by fours": the two is not inches. "eight foot three quarter ply" neither.
  if (!inch && (number.form === 'fraction' || and)) return null;
  if (!inch && follows(tokens, after, 'by') && !hasFeet(tokens, after + 1)) return null;
  if (
    !inch &&
    follows(tokens, after - 1, 'one|two|three|four|five|six|eight') &&
    /^[a-z]{3,}s$/.test(tokens[after]?.w ?? '') &&
    !follows(tokens, after, 'across|less|plus|is|this')
  )
    return null;
  const more = inch ? readAndFraction(tokens, after + 1) : null;
  return {
    ...feet,
    value: tidy(feet.said * 12 + number.value + (more?.value ?? 0)),
    n: after + (inch ? 1 : 0) + (more?.n ?? 0) - at,
    unit: 'in',
    form: number.form === 'whole' ? 'whole' : 'mixed',
  };
}

function hasFeet(tokens: readonly Token[], at: number): boolean {
  const number = readNumber(tokens, at);
  return number !== null && readUnit(tokens, at + number.n)?.unit === 'ft';
}

/** "one metre twenty": centimetres after metres. */
function metresMore(tokens: readonly Token[], at: number, metres: Quantity): Quantity | null {
  const number = readNumber(tokens, at + metres.n);
  if (
    !number ||
    number.form !== 'whole' ||
    number.value < 10 ||
    number.value > 999 ||
    tokens[at + metres.n - 1]?.end
  )
    return null;
  const after = at + metres.n + number.n;
  const unit = readUnit(tokens, after);
  if (unit && unit.unit !== 'mm') return null;
  if (!unit && follows(tokens, after, 'by')) return null;
  const factor = unit?.factor ?? (number.value < 100 ? 10 : 1);
  return {
    ...metres,
    value: metres.value + number.value * factor,
    n: metres.n + number.n + (unit?.n ?? 0),
  };
}

/** A number and its unit at a place. */
export function readQuantity(tokens: readonly Token[], at: number): Quantity | null {
  const one = implied(tokens, at);
  if (one) return one.unit === 'ft' ? (feetInches(tokens, at, one) ?? one) : one;
  const number = splitShorthand(tokens, at, readNumber(tokens, at));
  if (!number) return null;
  const after = at + number.n;
  const written = /^[\d./]+$/.test(tokens[after - 1]?.w ?? '');
  const unit = tokens[after - 1]?.end ? null : unitAfter(tokens, after, number, written);
  const base = {
    said: number.value,
    form: number.form,
    ...(number.part === undefined ? {} : { part: number.part }),
  };
  if (!unit) return { ...base, value: number.value, n: number.n, unit: null };
  // "two inches and a quarter", "two foot and a half"
  const more =
    number.form === 'whole' || number.form === 'written'
      ? readAndFraction(tokens, after + unit.n)
      : null;
  const usable =
    more &&
    (unit.unit === 'in' || unit.unit === 'h' || unit.unit === 'ft') &&
    !readUnit(tokens, after + unit.n + more.n)
      ? more
      : null;
  const said = number.value + (usable?.value ?? 0);
  const quantity: Quantity = {
    ...base,
    said,
    value: tidy(said * unit.factor),
    n: number.n + unit.n + (usable?.n ?? 0),
    unit: unit.unit,
  };
  if (unit.unit === 'ft' && unit.factor === 1) return feetInches(tokens, at, quantity) ?? quantity;
  return unit.factor === 1000 ? (metresMore(tokens, at, quantity) ?? quantity) : quantity;
}

function unitAfter(tokens: readonly Token[], at: number, number: SpokenNumber, written: boolean) {
  if (number.form === 'fraction' && follows(tokens, at, 'a|an')) {
    // "half an inch", "half a degree"
    const inner = readUnit(tokens, at + 1);
    return inner ? { ...inner, n: inner.n + 1 } : null;
  }
  const unit = readUnit(tokens, at, written);
  if (unit && tokens[at]?.w === 'of' && number.form !== 'fraction' && number.value >= 1)
    return null;
  // "five second coats"? a single second after more than one is an ordinal unless something is timed by it.
  if (
    unit?.unit === 's' &&
    tokens[at]?.w === 'second' &&
    number.form === 'whole' &&
    follows(tokens, at + 1, 'coat|one|piece|pass|side|time')
  )
    return null;
  return unit;
}

/** "six sixteen inch boards" is six of sixteen, not 616. */
function splitShorthand(
  tokens: readonly Token[],
  at: number,
  number: SpokenNumber | null,
): SpokenNumber | null {
  if (number?.form !== 'hundreds') return number;
  const unit = readUnit(tokens, at + number.n);
  const inches = unit && (unit.unit === 'in' || unit.unit === 'ft') && unit.factor === 1;
  const few = number.value >= 100 && number.value < 1000;
  return inches && few ? { value: Math.floor(number.value / 100), n: 1, form: 'whole' } : number;
}

/** Numbers joined with "by". */
export interface Chain {
  items: Quantity[];
  n: number;
}

/** One quantity, or several joined with "by" ("fifteen by ninety"), at a place. */
export function readChain(tokens: readonly Token[], at: number): Chain | null {
  const first = readQuantity(tokens, at);
  if (!first) return null;
  const items = [first];
  let i = at + first.n;
  while (follows(tokens, i, 'by') && items.length < 4 && !tokens[i - 1]?.end) {
    const next = readQuantity(tokens, i + 1);
    if (!next || (next.form === 'fraction' && readFraction(tokens, i + 1) === null)) break;
    items.push(next);
    i += 1 + next.n;
  }
  return { items, n: i - at };
}
