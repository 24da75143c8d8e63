/**
 * Pull-out of a wood screw or a common nail from side grain of seasoned wood, in newtons. The ultimate load breaks it; the
 * allowable reference is what a design may count on before its own factors. One is 5.5 to 5.7 times the other: the two are
 * different functions and different fields, never one number.
 *
 * Ultimate: screws 15 700 G² D L lb (USDA Wood Handbook FPL-GTR-190 ch. 8, from memory; its form read), nails
 * 7 850 G^(5/2) D L (constant read twice removed, exponent read in the FPL notes). Allowable: screws 2 850 G² D per inch
 * of thread (NDS; read in an engineering handbook), nails 1 380 G^(5/2) D (read twice removed).
 */
export type Fastener = 'screw' | 'nail';

const facts = {
  screw: { ultimate: 15_700, allowable: 2_850, power: 2 },
  nail: { ultimate: 7_850, allowable: 1_380, power: 2.5 },
} as const;

/** 1 psi in N/mm², from 1 lb = 0.45359237 kg, g = 9.80665 m/s², 1 in = 25.4 mm, all exact. */
const psi = (0.45359237 * 9.80665) / 25.4 ** 2;
/** One pound-force in newtons, exact. */
export const poundForce = 0.45359237 * 9.80665;

const load = (kind: Fastener, which: 'ultimate' | 'allowable') => {
  const fact = facts[kind];
  return (gravity: number, diameter: number, bite: number): number =>
    fact[which] * psi * gravity ** fact.power * diameter * bite;
};

/** N at which it pulls out; G oven-dry specific gravity, diameter and bite of the thread or nail in mm. */
export const ultimateWithdrawal = (
  kind: Fastener,
  gravity: number,
  diameter: number,
  bite: number,
) => load(kind, 'ultimate')(gravity, diameter, bite);

/** N of the allowable reference, before the adjustment factors of the code. Same arguments. */
export const allowableWithdrawal = (
  kind: Fastener,
  gravity: number,
  diameter: number,
  bite: number,
) => load(kind, 'allowable')(gravity, diameter, bite);

/** Gauges for which the screw equation was tried, by length in inches (Wood Handbook ch. 8, from memory). */
export const triedGauges: readonly { inches: number; from: number; to: number }[] = [
  { inches: 0.5, from: 1, to: 6 },
  { inches: 0.75, from: 2, to: 11 },
  { inches: 1, from: 3, to: 12 },
  { inches: 1.5, from: 5, to: 14 },
  { inches: 2, from: 7, to: 16 },
  { inches: 2.5, from: 9, to: 18 },
  { inches: 3, from: 12, to: 20 },
];

/** Specific gravities of the design tables run about so far (NDS, from memory). */
export const gravityDomain = [0.31, 0.73] as const;
/** Least penetration a design may count on, in diameters (NDS, from memory). */
export const leastPenetration = 6;
