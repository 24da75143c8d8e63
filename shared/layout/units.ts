import { Rational } from '../measure';

/** Whole units in a millimetre: a unit is 0.000625 mm, so that 1/64 in is 635 units and 0.01 mm is 16. */
export const unitsPerMm = 1600;

const perMm = Rational.of(unitsPerMm);

/** Stock in units: rounded down, so that nothing is laid out on what is not there. Millimetres in, exact. */
export const stockUnits = (mm: Rational): number => Number(mm.times(perMm).floor());

/** A part, a kerf or a trim in units: rounded up, so that it is never cut too small. Millimetres in, exact. */
export const partUnits = (mm: Rational): number => -Number(mm.times(perMm).negate().floor());

/** Units back to millimetres; exact in decimals, which a float64 shows in full. */
export const unitsToMm = (units: number): number => units / unitsPerMm;
