import { type Kind } from '../plan/document-values';
import {
  displayDifference,
  displayMm,
  type DisplayFigure,
  type DisplayPreference,
} from './display';
import { Rational } from './rational';
import { numberWords } from './spoken';

/** A value of any kind ready to draw; lengths come from `displayLength`. */
export type DisplayValue = Omit<DisplayFigure, 'unit' | 'restMm' | 'rest' | 'near'> & {
  unit: string;
};

interface UnitWords {
  unit: string;
  said: [one: string, many: string];
  places: number;
}
const words: Record<Exclude<Kind, 'length' | 'duration'>, UnitWords> = {
  area: { unit: 'mm²', said: ['square millimetre', 'square millimetres'], places: 0 },
  volume: { unit: 'mm³', said: ['cubic millimetre', 'cubic millimetres'], places: 0 },
  angle: { unit: '°', said: ['degree', 'degrees'], places: 2 },
  mass: { unit: 'kg', said: ['kilogram', 'kilograms'], places: 3 },
  force: { unit: 'N', said: ['newton', 'newtons'], places: 1 },
  temperature: { unit: '°C', said: ['degree Celsius', 'degrees Celsius'], places: 1 },
  count: { unit: '', said: ['', ''], places: 2 },
  money: { unit: '', said: ['', ''], places: 2 },
  number: { unit: '', said: ['', ''], places: 4 },
};

function duration(minutes: number): UnitWords & { factor: number } {
  if (minutes >= 1440) return { unit: 'd', said: ['day', 'days'], places: 1, factor: 1440 };
  if (minutes >= 60) return { unit: 'h', said: ['hour', 'hours'], places: 1, factor: 60 };
  if (minutes > 0 && minutes < 1)
    return { unit: 's', said: ['second', 'seconds'], places: 0, factor: 1 / 60 };
  return { unit: 'min', said: ['minute', 'minutes'], places: 0, factor: 1 };
}

/**
 * A value in base units (degree, minute, kilogram …) as it is shown. `signed` keeps a plus; a length shows as a
 * difference then, else for the instrument in hand.
 */
export function displayValue(
  x: number,
  kind: Kind,
  pref: DisplayPreference,
  signed = false,
): DisplayValue {
  if (kind === 'length')
    return signed ? displayDifference(Rational.fromNumber(x), pref) : displayMm(x, pref);
  const size = Math.abs(x);
  const { unit, said, places, factor } =
    kind === 'duration' ? duration(size) : { ...words[kind], factor: 1 };
  const rounded = (size / factor).toFixed(places);
  const decimal = rounded.includes('.') ? rounded.replace(/\.?0+$/, '') : rounded;
  const zero = Number(decimal) === 0;
  const sign = zero ? '' : x < 0 ? '−' : signed ? '+' : '';
  const spokenSign = sign === '−' ? 'minus ' : sign === '+' ? 'plus ' : '';
  const amount = /^\d\d?$/.test(decimal) ? numberWords(Number(decimal)) : decimal;
  const parts = decimal.includes('.') ? { decimal } : { whole: decimal };
  const gap = unit === '' || unit === '°' ? '' : ' ';
  return {
    sign,
    ...parts,
    unit,
    text: `${sign}${decimal}${gap}${unit}`,
    spoken: `${spokenSign}${amount} ${decimal === '1' ? said[0] : said[1]}`.trim(),
  };
}
