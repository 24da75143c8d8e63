import { type Refusal, refuse } from './length-fault';
import { Rational } from './rational';

/** One figure of a length with its unit as `mm cm m in ft thou`, or null when none was written. */
export interface Piece {
  at: number;
  value: Rational;
  /** Written with a decimal point. */
  pointed: boolean;
  unit: string | null;
}

const glyphs = new Map<string, [number, number]>(
  [...'½⅓⅔¼¾⅕⅖⅗⅘⅙⅚⅛⅜⅝⅞'].map((glyph, i) => [
    glyph,
    (
      [
        [1, 2],
        [1, 3],
        [2, 3],
        [1, 4],
        [3, 4],
        [1, 5],
        [2, 5],
        [3, 5],
        [4, 5],
        [1, 6],
        [5, 6],
        [1, 8],
        [3, 8],
        [5, 8],
        [7, 8],
      ] as [number, number][]
    )[i]!,
  ]),
);
const words: Record<string, string> = {
  mm: 'mm',
  cm: 'cm',
  m: 'm',
  in: 'in',
  inch: 'in',
  inches: 'in',
  ft: 'ft',
  foot: 'ft',
  feet: 'ft',
  thou: 'thou',
};
const unitAt = /(?:''|′′|’’|["″”“]|['′’‘]|[A-Za-z∞]+\.?)/y;
const numberAt = /(?:\d+\.?\d*|\.\d+)/y;

/** A reader that goes through one text once. */
class Scan {
  at = 0;
  constructor(readonly text: string) {}
  match(pattern: RegExp): string | null {
    pattern.lastIndex = this.at;
    const found = pattern.exec(this.text)?.[0];
    if (found === undefined || found === '') return null;
    this.at += found.length;
    return found;
  }
  spaces(): boolean {
    return this.match(/[\s\u00a0\u2009\u202f]+/y) !== null;
  }
  get rest(): string {
    return this.text.slice(this.at);
  }
}

type Step<T> = { value: T } | Refusal;

/** `/den` after a numerator; the numerator must be whole. */
function denominator(scan: Scan, top: string): Step<Rational | null> {
  const slash = scan.match(/\s?[/⁄∕]\s?/y);
  if (slash === null) return { value: null };
  const at = scan.at;
  const bottom = scan.match(numberAt);
  const whole = (t: string) => /^\d+$/.test(t);
  if (bottom === null)
    return refuse(at, 'fraction', 'The fraction has nothing under the line.', 'Write it as 3/4.');
  if (!whole(top) || !whole(bottom))
    return refuse(
      at - slash.length,
      'fraction',
      'A fraction takes whole figures above and below.',
      'Write either a decimal or a fraction.',
    );
  if (/^0+$/.test(bottom))
    return refuse(
      at,
      'zero-denominator',
      'Nothing can be divided by zero.',
      'Correct the figure under the line.',
    );
  if (/^\s?[/⁄∕]/.test(scan.rest))
    return refuse(
      scan.at,
      'fraction',
      'Two fraction lines follow each other.',
      'Write one fraction, such as 1/2.',
    );
  return { value: Rational.of(BigInt(top), BigInt(bottom)) };
}

/** What can follow the whole of a mixed number: `-1/2`, ` 1/2`, `½`. Null when nothing of it does. */
function mixedTail(scan: Scan, whole: string): Step<Rational | null> {
  const start = scan.at;
  const joint = scan.match(/(?:[-‐‑]|[\s\u00a0\u2009\u202f]+)/y) ?? '';
  const glyph = glyphs.get(scan.text[scan.at] ?? '');
  if (glyph) {
    scan.at += 1;
    return { value: Rational.of(BigInt(whole)).plus(Rational.of(...glyph)) };
  }
  const at = scan.at;
  const top = joint === '' ? null : scan.match(numberAt);
  if (top === null) {
    scan.at = start;
    return { value: null };
  }
  const fraction = denominator(scan, top);
  if ('ok' in fraction) return fraction;
  if (fraction.value === null) {
    const cure = joint === '-' ? 'Write one figure.' : 'Write one figure, or a unit after each.';
    return refuse(at, 'mixed', 'Two figures follow each other.', cure);
  }
  if (fraction.value.compare(Rational.one) >= 0) {
    const sum = Rational.of(BigInt(whole)).plus(fraction.value);
    return refuse(
      at,
      'mixed',
      'The fraction after a whole is one or more.',
      `Did you mean ${spell(sum)}?`,
    );
  }
  return { value: Rational.of(BigInt(whole)).plus(fraction.value) };
}

function spell(value: Rational): string {
  const whole = value.floor();
  const rest = value.minus(Rational.of(whole));
  return rest.sign() === 0 ? String(whole) : `${whole}-${rest.toString()}`;
}

function figure(scan: Scan): Step<{ value: Rational; pointed: boolean }> {
  const at = scan.at;
  const glyph = glyphs.get(scan.text[at] ?? '');
  if (glyph) {
    scan.at += 1;
    return { value: { value: Rational.of(...glyph), pointed: true } };
  }
  const number = scan.match(numberAt);
  if (number === null) return notAFigure(scan);
  const fraction = denominator(scan, number);
  if ('ok' in fraction) return fraction;
  if (fraction.value) return { value: { value: fraction.value, pointed: true } };
  if (scan.rest.startsWith(',') && /^,\d/.test(scan.rest))
    return refuse(
      scan.at,
      'character',
      'A comma could part thousands or decimals.',
      'Use a point for decimals and nothing for thousands.',
    );
  if (number.includes('.')) return { value: { value: Rational.decimal(number), pointed: true } };
  const mixed = mixedTail(scan, number);
  if ('ok' in mixed) return mixed;
  const value = mixed.value ?? Rational.of(BigInt(number));
  return { value: { value, pointed: mixed.value !== null } };
}

function notAFigure(scan: Scan): Refusal {
  const { rest, at } = scan;
  if (/^[-−–]/.test(rest))
    return refuse(at, 'negative', 'A size cannot be below zero.', 'Leave the minus out.');
  if (/^(?:nan|inf|infinity|∞)(?![a-z])/i.test(rest))
    return refuse(at, 'not-a-number', 'This is not a figure.', 'Type a figure such as 18 mm.');
  return refuse(at, 'character', 'A figure was expected here.', 'Type a figure such as 3/4 in.');
}

function unit(scan: Scan): Step<string | null> {
  const at = scan.at;
  const mark = scan.match(unitAt);
  if (mark === null) return { value: null };
  if (/^(?:''|′′|’’|["″”“])$/.test(mark)) return { value: 'in' };
  if (/^['′’‘]$/.test(mark)) return { value: 'ft' };
  const word = mark.replace(/\.$/, '');
  const known = words[word] ?? (word.length > 1 ? words[word.toLowerCase()] : undefined);
  if (known) return { value: known };
  return refuse(
    at,
    'unknown-unit',
    `${word.slice(0, 20)} is no unit of length.`,
    'Use mm, cm, m, in, ft or thou.',
  );
}

/** After a figure and its unit: what may stand before the next one. */
function joint(scan: Scan, piece: Piece): Refusal | null {
  const spaced = scan.spaces();
  if (scan.rest === '') return null;
  const dash = scan.match(/[-‐‑−–]/y);
  if (dash === null) return null;
  const at = scan.at - 1;
  if (piece.unit === 'ft' && !spaced && /^\d/.test(scan.rest)) return null;
  if (piece.unit === null && !spaced && /^\d/.test(scan.rest))
    return refuse(
      at,
      'mixed',
      'A mixed figure has one whole and one fraction.',
      'Write it as 1-1/2.',
    );
  return refuse(
    at,
    'spaces',
    'A field takes one figure, not a subtraction.',
    'Write 1-1/2 without spaces for one and a half.',
  );
}

/** Takes a length apart into figures and units, or says where it breaks. */
export function scanLength(text: string): { ok: true; pieces: Piece[] } | Refusal {
  if (text.length > 200)
    return refuse(200, 'too-long', 'A figure has at most 200 characters.', 'Type the figure only.');
  const scan = new Scan(text);
  scan.spaces();
  if (scan.rest === '')
    return refuse(0, 'empty', 'There is no figure.', 'Type a figure such as 18 mm or 3/4 in.');
  const pieces: Piece[] = [];
  while (scan.rest !== '') {
    const at = scan.at;
    const found = figure(scan);
    if ('ok' in found) return found;
    const before = scan.at;
    scan.spaces();
    const named = unit(scan);
    if ('ok' in named) return named;
    if (named.value === null) scan.at = before;
    const piece = { at, ...found.value, unit: named.value };
    pieces.push(piece);
    const fault = joint(scan, piece);
    if (fault) return fault;
  }
  return { ok: true, pieces };
}
