import { numberWords } from '../plan/stick/number-words';

const names: Record<number, [one: string, many: string]> = {
  2: ['half', 'halves'],
  4: ['quarter', 'quarters'],
  8: ['eighth', 'eighths'],
  16: ['sixteenth', 'sixteenths'],
  32: ['thirty-second', 'thirty-seconds'],
  64: ['sixty-fourth', 'sixty-fourths'],
};

/** `nine sixteenths`, `one half`. */
export function fractionWords(numerator: number, denominator: number): string {
  const name = names[denominator];
  if (!name) return `${numberWords(numerator)} over ${numberWords(denominator)}`;
  return `${numberWords(numerator)} ${numerator === 1 ? name[0] : name[1]}`;
}

/** Thousandths as a machinist says them: 742 is `seven forty-two`, 5 is `five`, 705 is `seven oh five`. */
export function thouWords(thou: number): string {
  if (thou < 100) return numberWords(thou);
  const hundreds = Math.floor(thou / 100);
  const rest = thou % 100;
  if (rest === 0) return `${numberWords(hundreds)} hundred`;
  return `${numberWords(hundreds)} ${rest < 10 ? 'oh ' : ''}${numberWords(rest)}`;
}

/** The same as `numberWords`, digits above a hundred. */
export { numberWords };
