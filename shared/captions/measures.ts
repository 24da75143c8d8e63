import { type Cue } from './read';
import { readFraction, readNumber, type ReadNumber } from './numbers';

/** A measurement spoken in the clip. Several numbers that belong together ("600 by 400") are in `values`. */
export interface HeardMeasure {
  /** Seconds: start of the cue that holds the first word. */
  t: number;
  text: string;
  value: number | null;
  values?: number[];
  unit: 'in' | 'mm' | 'ft' | 'deg' | 's' | 'min' | 'h' | 'day';
  kind: 'length' | 'angle' | 'duration';
}

type Unit = HeardMeasure['unit'];

const unitWords: Record<string, { unit: Unit; factor?: number }> = {
  inch: { unit: 'in' },
  inches: { unit: 'in' },
  in: { unit: 'in' },
  '"': { unit: 'in' },
  thou: { unit: 'in', factor: 0.001 },
  thousandths: { unit: 'in', factor: 0.001 },
  thousandth: { unit: 'in', factor: 0.001 },
  mil: { unit: 'mm' },
  mils: { unit: 'mm' },
  mm: { unit: 'mm' },
  millimeter: { unit: 'mm' },
  millimeters: { unit: 'mm' },
  millimetre: { unit: 'mm' },
  millimetres: { unit: 'mm' },
  cm: { unit: 'mm', factor: 10 },
  centimeters: { unit: 'mm', factor: 10 },
  centimetres: { unit: 'mm', factor: 10 },
  foot: { unit: 'ft' },
  feet: { unit: 'ft' },
  degree: { unit: 'deg' },
  degrees: { unit: 'deg' },
  second: { unit: 's' },
  seconds: { unit: 's' },
  minute: { unit: 'min' },
  minutes: { unit: 'min' },
  hour: { unit: 'h' },
  hours: { unit: 'h' },
  day: { unit: 'day' },
  days: { unit: 'day' },
};

const kindOf = (unit: Unit): HeardMeasure['kind'] =>
  unit === 'deg'
    ? 'angle'
    : unit === 's' || unit === 'min' || unit === 'h' || unit === 'day'
      ? 'duration'
      : 'length';

interface Word {
  text: string;
  t: number;
}

/** All words of the captions in order, lower case, each with its cue's start. */
export function wordsOf(cues: readonly Cue[]): Word[] {
  return cues.flatMap((cue) =>
    cue.text
      .toLowerCase()
      .replace(/[“”]/g, '"')
      .replace(/(\d)(mm|cm|in|ft|")(?=\W|$)/g, '$1 $2')
      .split(/[\s,;:!?()]+|\.(?=\s|$)|-(?=[a-z])/)
      .filter((w) => w !== '')
      .map((text) => ({ text, t: cue.start })),
  );
}

/** The talk's own unit: whichever is said more. */
export function mainUnit(words: readonly Word[]): 'in' | 'mm' {
  let inches = 0;
  let metric = 0;
  for (const { text } of words) {
    const unit = unitWords[text]?.unit;
    if (text !== 'in' && (unit === 'in' || unit === 'ft')) inches += 1;
    if (unit === 'mm') metric += 1;
    if (/^(eighths?|sixteenths?|quarters)$/.test(text)) inches += 1;
  }
  return metric > inches ? 'mm' : 'in';
}

/** A chain of numbers joined with "by": "twelve by twenty", "600 by 400 by 18". */
function readChain(
  texts: readonly string[],
  at: number,
): { numbers: number[]; taken: number; unit: Unit | null; factor: number } | null {
  const numbers: number[] = [];
  let i = at;
  let unit: Unit | null = null;
  let factor = 1;
  for (;;) {
    const number: ReadNumber | null = readNumber(texts, i);
    if (!number) break;
    numbers.push(number.value);
    i += number.taken;
    const found = takeUnit(texts, i);
    if (found) {
      unit = found.unit;
      factor = found.factor ?? 1;
      i += 1;
      // "an inch and a half", "two inches and a quarter"
      const more = texts[i] === 'and' ? readFraction(texts, i + 1) : null;
      if (more && numbers.length > 0 && unit === 'in') {
        numbers[numbers.length - 1] = numbers[numbers.length - 1]! + more.value;
        i += 1 + more.taken;
      }
    }
    if ((texts[i] === 'by' || texts[i] === 'x') && readNumber(texts, i + 1)) i += 1;
    else break;
  }
  return numbers.length > 0 ? { numbers, taken: i - at, unit, factor } : null;
}

function takeUnit(texts: readonly string[], at: number): { unit: Unit; factor?: number } | null {
  const word = texts[at];
  if (word === undefined) return null;
  // "in" is a preposition far more often than a unit; only after a digit and before no noun is it one.
  if (word === 'in' && !/^\d/.test(texts[at - 1] ?? '')) return null;
  if (
    word === 'of' &&
    (texts[at + 1] === 'an' || texts[at + 1] === 'a') &&
    texts[at + 2] === 'inch'
  )
    return { unit: 'in' };
  return unitWords[word] ?? null;
}

/**
 * Measurements in the captions, by plain means: a number with its unit, sizes joined with "by", and bare
 * fractions of an inch. What has neither unit nor fraction is left alone.
 */
export function heardMeasures(cues: readonly Cue[]): HeardMeasure[] {
  const words = wordsOf(cues);
  const texts = words.map((w) => w.text);
  const main = mainUnit(words);
  const found: HeardMeasure[] = [];
  for (let i = 0; i < words.length; i += 1) {
    const anInch = (texts[i] === 'an' || texts[i] === 'a') && texts[i + 1] === 'inch';
    const chain = anInch
      ? {
          ...(readChain(['one', ...texts.slice(i + 1, i + 8)], 0) ?? {
            numbers: [],
            taken: 0,
            unit: null,
            factor: 1,
          }),
        }
      : readChain(texts, i);
    if (!chain || chain.taken === 0) continue;
    const fraction = chain.numbers.some((n) => !Number.isInteger(n));
    const unit = chain.unit ?? (chain.numbers.length > 1 || fraction ? main : null);
    if (unit !== null && !(unit === 'mm' && chain.unit === null && chain.numbers.length === 1)) {
      const values = chain.numbers.map((n) => Number((n * chain.factor).toFixed(9)));
      const text = texts.slice(i, i + chain.taken).join(' ');
      const many = values.length > 1;
      found.push({
        t: words[i]!.t,
        text,
        value: many ? null : values[0]!,
        ...(many ? { values } : {}),
        unit,
        kind: kindOf(unit),
      });
    }
    i += chain.taken - 1;
  }
  return found;
}
