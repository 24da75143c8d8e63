import { Rational } from './rational';

/**
 * A value with its slopes: `x` in base units, `q` the exact fraction while the operations keep one, `g` the
 * derivative by each input of the expression (null when all are 0). Forward mode, so a − a has slope exactly 0.
 */
export interface Dual {
  x: number;
  q: Rational | null;
  g: readonly number[] | null;
}

export const exact = (q: Rational): Dual => ({ x: q.toNumber(), q, g: null });

/** Fractions that grow beyond 512 bits go on as floats. */
function kept(q: Rational | null, x: number, g: Dual['g']): Dual {
  if (q === null || q.isLong()) return { x, q: null, g };
  return { x: q.toNumber(), q, g };
}

/** sa·a + sb·b over slopes. */
export function mix(a: Dual['g'], sa: number, b: Dual['g'], sb: number): Dual['g'] {
  if (!a && !b) return null;
  const size = (a ?? b)?.length ?? 0;
  const g: number[] = [];
  for (let i = 0; i < size; i += 1) g[i] = (a?.[i] ? sa * a[i]! : 0) + (b?.[i] ? sb * b[i]! : 0);
  return g;
}

const both = (a: Dual, b: Dual, f: (p: Rational, q: Rational) => Rational) =>
  a.q && b.q ? f(a.q, b.q) : null;

export const negate = (a: Dual): Dual => ({
  x: -a.x,
  q: a.q?.negate() ?? null,
  g: mix(a.g, -1, null, 0),
});
export const add = (a: Dual, b: Dual): Dual =>
  kept(
    both(a, b, (p, q) => p.plus(q)),
    a.x + b.x,
    mix(a.g, 1, b.g, 1),
  );
export const subtract = (a: Dual, b: Dual): Dual =>
  kept(
    both(a, b, (p, q) => p.minus(q)),
    a.x - b.x,
    mix(a.g, 1, b.g, -1),
  );
export const multiply = (a: Dual, b: Dual): Dual =>
  kept(
    both(a, b, (p, q) => p.times(q)),
    a.x * b.x,
    mix(a.g, b.x, b.g, a.x),
  );
/** b must not be zero. */
export const divide = (a: Dual, b: Dual): Dual =>
  kept(
    both(a, b, (p, q) => p.over(q)),
    a.x / b.x,
    mix(a.g, 1 / b.x, b.g, -a.x / (b.x * b.x)),
  );

/** A function of one value with its slope there; the exact fraction when there is one. */
export const through = (a: Dual, x: number, slope: number, q: Rational | null = null): Dual =>
  kept(q, x, a.g && mix(a.g, slope, null, 0));

/** Base to a power. An exact base with a small whole exponent stays exact. */
export function power(a: Dual, b: Dual): Dual {
  const x = Math.pow(a.x, b.x);
  const slope = b.x === 0 ? 0 : b.x * Math.pow(a.x, b.x - 1);
  const log = a.x > 0 ? x * Math.log(a.x) : 0;
  const g = mix(a.g, Number.isFinite(slope) ? slope : 0, b.g, log);
  return kept(wholePower(a.q, b.q), x, g);
}

function wholePower(base: Rational | null, exponent: Rational | null): Rational | null {
  if (!base || exponent?.d !== 1n) return null;
  const n = exponent.n < 0n ? -exponent.n : exponent.n;
  if (n > 64n) return null;
  let q = Rational.one;
  for (let i = 0n; i < n; i += 1n) {
    q = q.times(base);
    if (q.isLong()) return null;
  }
  if (exponent.n >= 0n) return q;
  return base.sign() === 0 ? null : Rational.one.over(q);
}

/** Which of two is the larger; exact when both are. */
export const compare = (a: Dual, b: Dual): number =>
  a.q && b.q ? a.q.compare(b.q) : Math.sign(a.x - b.x);
