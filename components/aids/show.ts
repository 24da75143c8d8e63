import { displayDifference, displayMm, Rational, type DisplayFigure } from '../../shared/measure';
import { type Preferences } from '../../shared/api/accounts';
import { type Units } from './form-values';

/** How figures are written for a person: their unit, fractions of an inch or decimals. */
export interface Show {
  units: Units;
  /** A length to be set or cut. */
  length: (mm: number) => DisplayFigure;
  /** A difference, with its sign. */
  signed: (mm: number) => DisplayFigure;
  /** The same as words. */
  text: (mm: number) => string;
  temperature: (celsius: number) => string;
  force: (newtons: number) => string;
  mass: (kilograms: number) => string;
}

const trimmed = (x: number, places: number) =>
  x
    .toFixed(places)
    .replace(/(\.\d*?)0+$/, '$1')
    .replace(/\.$/, '')
    .replace('-', '−');

/** A figure without a unit of ours, e.g. percent or degrees, with a true minus. */
export const plain = trimmed;

/** Minutes as a person says them. */
export function spanWords(minutes: number): string {
  if (minutes < 1) return `${trimmed(minutes * 60, 0)} s`;
  if (minutes < 120) return `${trimmed(minutes, minutes < 10 ? 1 : 0)} min`;
  if (minutes < 2880) return `${trimmed(minutes / 60, 1)} h`;
  return `${trimmed(minutes / 1440, 1)} days`;
}

/** How figures are shown for these preferences. */
export function showFor(preferences: Preferences, decimals: boolean): Show {
  const units = preferences.units;
  const inches = units === 'in';
  const preference = {
    system: units,
    instrument: inches && !decimals ? ('rule' as const) : ('calipers' as const),
    grid: preferences.inchGrid,
  };
  const length = (mm: number) => {
    const { near: _, ...figure } = displayMm(mm, preference);
    return figure as DisplayFigure;
  };
  return {
    units,
    length,
    signed: (mm) => displayDifference(Rational.fromNumber(mm), preference),
    text: (mm) => length(mm).text,
    temperature: (celsius) =>
      inches ? `${trimmed((celsius * 9) / 5 + 32, 0)} °F` : `${trimmed(celsius, 0)} °C`,
    force: (newtons) =>
      inches ? `${trimmed(newtons / 4.4482216, 0)} lb` : `${trimmed(newtons, 0)} N`,
    mass: (kilograms) =>
      inches ? `${trimmed(kilograms / 0.45359237, 1)} lb` : `${trimmed(kilograms, 1)} kg`,
  };
}
