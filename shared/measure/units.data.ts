import { type Base } from './kinds';
import { Rational } from './rational';

/** What a unit is of, and how many base units it makes: mm, degree, minute, kilogram, newton, °C. */
export interface UnitFact {
  of: Base | 'count';
  power: number;
  factor: Rational;
}

const fact = (
  of: UnitFact['of'],
  n: number | bigint,
  d: number | bigint = 1,
  power = 1,
): UnitFact => ({ of, power, factor: Rational.of(n, d) });

const inch = fact('length', 127, 5);
const foot = fact('length', 1524, 5);

/**
 * Units that an expression knows. 1 in = 25.4 mm exactly (NIST HB 44 App. C); 1 lb = 0.45359237 kg and
 * g = 9.80665 m/s² exactly (NIST SP 811 App. B).
 */
export const unitFacts: ReadonlyMap<string, UnitFact> = new Map([
  ['mm', fact('length', 1)],
  ['cm', fact('length', 10)],
  ['m', fact('length', 1000)],
  ['in', inch],
  ['inch', inch],
  ['inches', inch],
  ['"', inch],
  ['ft', foot],
  ['foot', foot],
  ['feet', foot],
  ["'", foot],
  ['thou', fact('length', 127, 5000)],
  ['mm2', fact('length', 1, 1, 2)],
  ['cm2', fact('length', 100, 1, 2)],
  ['m2', fact('length', 1_000_000, 1, 2)],
  ['in2', fact('length', 16129, 25, 2)],
  ['ft2', fact('length', 2322576, 25, 2)],
  ['mm3', fact('length', 1, 1, 3)],
  ['cm3', fact('length', 1000, 1, 3)],
  ['m3', fact('length', 1_000_000_000, 1, 3)],
  ['in3', fact('length', 2048383, 125, 3)],
  ['deg', fact('angle', 1)],
  ['°', fact('angle', 1)],
  ['s', fact('duration', 1, 60)],
  ['min', fact('duration', 1)],
  ['h', fact('duration', 60)],
  ['d', fact('duration', 1440)],
  ['g', fact('mass', 1, 1000)],
  ['kg', fact('mass', 1)],
  ['lb', fact('mass', 45359237, 100000000)],
  ['N', fact('force', 1)],
  ['kN', fact('force', 1000)],
  ['lbf', fact('force', 8896443230521n, 2000000000000n)],
  ['degC', fact('temperature', 1)],
  ['pcs', fact('count', 1)],
]);
