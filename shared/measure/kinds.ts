import { type Kind } from '../plan/document-values';

/** Exponents of length, angle, duration, mass, force, temperature, money. */
export type Powers = readonly [number, number, number, number, number, number, number];

export const plain: Powers = [0, 0, 0, 0, 0, 0, 0];
const bases = ['length', 'angle', 'duration', 'mass', 'force', 'temperature', 'money'] as const;
export type Base = (typeof bases)[number];

/** The exponents of one base raised. */
export const powersOf = (base: Base, power = 1): Powers =>
  mapPowers(plain, (_, i) => (bases[i] === base ? power : 0));

const byKind: Record<Kind, Powers> = {
  length: powersOf('length'),
  area: powersOf('length', 2),
  volume: powersOf('length', 3),
  angle: powersOf('angle'),
  duration: powersOf('duration'),
  mass: powersOf('mass'),
  force: powersOf('force'),
  temperature: powersOf('temperature'),
  money: powersOf('money'),
  // A count multiplies like a plain number: four strips of 20 mm are 80 mm.
  count: plain,
  number: plain,
};

/** The exponents of a declared kind. */
export const kindPowers = (kind: Kind): Powers => byKind[kind];

export const samePowers = (a: Powers, b: Powers): boolean => a.every((p, i) => p === b[i]);
export const isPlain = (a: Powers): boolean => a.every((p) => p === 0);

export function mapPowers(a: Powers, f: (power: number, i: number) => number): Powers {
  return [f(a[0], 0), f(a[1], 1), f(a[2], 2), f(a[3], 3), f(a[4], 4), f(a[5], 5), f(a[6], 6)];
}

const names: Partial<Record<Kind, string>> = {
  length: 'a length',
  area: 'an area',
  volume: 'a volume',
  angle: 'an angle',
  duration: 'a duration',
  mass: 'a mass',
  force: 'a force',
  temperature: 'a temperature',
  money: 'an amount of money',
  number: 'a plain number',
};

/** The kind with these exponents, or null for any other product. */
export const kindOf = (powers: Powers): Kind | null =>
  (Object.keys(names) as Kind[]).find((k) => samePowers(byKind[k], powers)) ?? null;

/** `a length`, `an area`, `a plain number`; other products by their factors. */
export function kindName(powers: Powers): string {
  const kind = kindOf(powers);
  if (kind) return names[kind] ?? kind;
  const factors = bases.flatMap((base, i) => {
    const power = powers[i] ?? 0;
    return power === 0 ? [] : [power === 1 ? base : `${base} to the ${power}`];
  });
  return factors.join(' times ');
}
