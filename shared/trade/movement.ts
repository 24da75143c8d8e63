import { movementCoefficients } from './movement.data';

/** For a wood that is not in the table; about the middle of it. Common practice, no source. */
const unknown = { radial: 0.0017, tangential: 0.003 };

/** A species of the table whose name, or last word ("oak", "maple"), stands in a text; the one that moves most. */
export function coefficientsOf(text: string): { radial: number; tangential: number } {
  const said = text.toLowerCase();
  const by = (name: (wood: string) => string) =>
    movementCoefficients.filter(({ wood }) => new RegExp(`\\b${name(wood)}\\b`).test(said));
  const whole = by((wood) => wood);
  const found = whole.length > 0 ? whole : by((wood) => wood.split(' ').at(-1) ?? wood);
  return found.reduce(
    (most, c) => (c.tangential > most.tangential ? c : most),
    found[0] ?? unknown,
  );
}

/**
 * Change of a width across the grain, in the width's unit: ΔD = D · C · (M₂ − M₁), moisture content in percent
 * (Wood Handbook Eq. 13–2, for 6 to 14 %). Below zero it shrinks.
 */
export const movement = (width: number, coefficient: number, from: number, to: number): number =>
  width * coefficient * (to - from);
