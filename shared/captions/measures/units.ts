import { follows, type Token } from '../tokens';
import { type MeasureKind, type MeasureUnit } from '../types';

/** A unit as said: how many tokens, and what one of it is in the unit we keep. */
export interface SpokenUnit {
  unit: MeasureUnit;
  factor: number;
  n: number;
}

const words: Record<string, [MeasureUnit, number?]> = {
  inch: ['in'],
  inches: ['in'],
  thou: ['in', 0.001],
  thousandths: ['in', 0.001],
  thousandth: ['in', 0.001],
  mil: ['mm'],
  mils: ['mm'],
  mill: ['mm'],
  mills: ['mm'],
  mm: ['mm'],
  millimeter: ['mm'],
  millimeters: ['mm'],
  millimetre: ['mm'],
  millimetres: ['mm'],
  mms: ['mm'],
  cm: ['mm', 10],
  centimeter: ['mm', 10],
  centimeters: ['mm', 10],
  centimetre: ['mm', 10],
  centimetres: ['mm', 10],
  cms: ['mm', 10],
  meter: ['mm', 1000],
  meters: ['mm', 1000],
  metre: ['mm', 1000],
  metres: ['mm', 1000],
  micron: ['mm', 0.001],
  microns: ['mm', 0.001],
  foot: ['ft'],
  feet: ['ft'],
  ft: ['ft'],
  yard: ['ft', 3],
  yards: ['ft', 3],
  degree: ['deg'],
  degrees: ['deg'],
  second: ['s'],
  seconds: ['s'],
  sec: ['s'],
  secs: ['s'],
  minute: ['min'],
  minutes: ['min'],
  min: ['min'],
  mins: ['min'],
  hour: ['h'],
  hours: ['h'],
  hr: ['h'],
  hrs: ['h'],
  day: ['day'],
  days: ['day'],
  week: ['day', 7],
  weeks: ['day', 7],
  gauge: ['gauge'],
  gage: ['gauge'],
  grit: ['grit'],
  percent: ['percent'],
  pound: ['lb'],
  pounds: ['lb'],
  lb: ['lb'],
  lbs: ['lb'],
  kilo: ['kg'],
  kilos: ['kg'],
  kg: ['kg'],
  kgs: ['kg'],
  kilogram: ['kg'],
  kilograms: ['kg'],
  kilogrammes: ['kg'],
  rpm: ['rpm'],
  revs: ['rpm'],
  tpi: ['tpi'],
  celsius: ['C'],
  centigrade: ['C'],
  fahrenheit: ['F'],
};

/** The unit at a place, or null. `written` tells that digits stand before it, so that "in" and "m" may be units. */
export function readUnit(tokens: readonly Token[], at: number, written = false): SpokenUnit | null {
  const w = tokens[at]?.w;
  if (w === undefined) return null;
  if (w === 'of' && follows(tokens, at + 1, 'an|a|one')) {
    const inner = readUnit(tokens, at + 2);
    return inner && inner.unit !== 'gauge' ? { ...inner, n: inner.n + 2 } : null;
  }
  if ((w === 'a' || w === 'an') && !written) return null;
  if (follows(tokens, at, 'teeth per inch') || follows(tokens, at, 't p i'))
    return { unit: 'tpi', factor: 1, n: 3 };
  if (
    follows(tokens, at, 'r p m') ||
    follows(tokens, at, 'revs per minute') ||
    follows(tokens, at, 'revolutions per|a minute')
  )
    return { unit: 'rpm', factor: 1, n: 3 };
  if (follows(tokens, at, 'ten thousandths')) return { unit: 'in', factor: 0.0001, n: 2 };
  if (follows(tokens, at, 'tenths|tenth of a')) {
    const inner = readUnit(tokens, at + 3);
    return inner ? { ...inner, factor: inner.factor / 10, n: inner.n + 3 } : null;
  }
  if (follows(tokens, at, 'degrees|degree c|celsius|centigrade'))
    return { unit: 'C', factor: 1, n: 2 };
  if (follows(tokens, at, 'degrees|degree f|fahrenheit')) return { unit: 'F', factor: 1, n: 2 };
  if (written && w === 'in' && tokens[at + 1]?.w !== 'from')
    return tokens[at]?.end ||
      tokens[at]?.comma ||
      /^(?:long|wide|deep|thick|high|tall|x|by|ply)$/.test(tokens[at + 1]?.w ?? '')
      ? { unit: 'in', factor: 1, n: 1 }
      : null;
  if (written && w === 'm') return { unit: 'mm', factor: 1000, n: 1 };
  const found = Object.hasOwn(words, w) ? words[w] : undefined;
  return found ? { unit: found[0], factor: found[1] ?? 1, n: 1 } : null;
}

const kinds: Record<MeasureUnit, MeasureKind> = {
  in: 'length',
  mm: 'length',
  ft: 'length',
  deg: 'angle',
  s: 'duration',
  min: 'duration',
  h: 'duration',
  day: 'duration',
  count: 'quantity',
  screw: 'fastener',
  bolt: 'fastener',
  gauge: 'fastener',
  nominal: 'nominal-lumber',
  grit: 'abrasive',
  ratio: 'ratio',
  percent: 'percentage',
  lb: 'weight',
  kg: 'weight',
  rpm: 'speed',
  tpi: 'pitch',
  C: 'temperature',
  F: 'temperature',
};

/** What a unit measures, unless the words beside it say otherwise (clamp force in pounds). */
export const kindOf = (unit: MeasureUnit): MeasureKind => kinds[unit];
export const isLength = (unit: MeasureUnit | null): boolean =>
  unit === 'in' || unit === 'mm' || unit === 'ft';
export const isTime = (unit: MeasureUnit | null): boolean =>
  unit === 's' || unit === 'min' || unit === 'h' || unit === 'day';

/** Products of decimal factors without the dust of binary fractions. */
export const tidy = (value: number): number => Number(value.toPrecision(12));
