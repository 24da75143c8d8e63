const abs = (n: bigint) => (n < 0n ? -n : n);
const safe = 9007199254740991n;

function gcd(a: bigint, b: bigint): bigint {
  let [x, y] = [abs(a), abs(b)];
  while (y > safe) [x, y] = [y, x % y];
  if (y === 0n) return x;
  let m = Number(x % y);
  let n = Number(y);
  while (m !== 0) [n, m] = [m, n % m];
  return BigInt(n);
}

export type Tie = 'up' | 'even';

/** An exact fraction in lowest terms with a positive denominator. Immutable. */
export class Rational {
  private constructor(
    readonly n: bigint,
    readonly d: bigint,
  ) {}

  static readonly zero = new Rational(0n, 1n);
  static readonly one = new Rational(1n, 1n);

  /** n over d; throws a RangeError when d is zero. */
  static of(n: bigint | number, d: bigint | number = 1n): Rational {
    let [top, bottom] = [BigInt(n), BigInt(d)];
    if (bottom === 0n) throw new RangeError('A fraction over zero has no value.');
    if (bottom < 0n) [top, bottom] = [-top, -bottom];
    if (bottom === 1n) return new Rational(top, 1n);
    const common = gcd(top, bottom);
    return new Rational(top / common, bottom / common);
  }

  /** Digits with an optional decimal point, such as `.742` or `18`; exact. */
  static decimal(text: string): Rational {
    const point = text.indexOf('.');
    if (point < 0) return new Rational(BigInt(text), 1n);
    const digits = text.slice(0, point) + text.slice(point + 1);
    return Rational.of(BigInt(digits === '' ? 0 : digits), tenTo(text.length - point - 1));
  }

  /** The stored form, `"7239/80"` or `"-18"`; throws a RangeError on anything else. */
  static parse(text: string): Rational {
    const found = /^(-?\d+)(?:\/(\d+))?$/.exec(text);
    if (!found?.[1]) throw new RangeError(`Not an exact fraction: ${text}`);
    return Rational.of(BigInt(found[1]), BigInt(found[2] ?? 1));
  }

  /** The exact value of a float64. Throws a RangeError when it is not finite. */
  static fromNumber(value: number): Rational {
    let d = 1n;
    let x = value;
    while (!Number.isInteger(x)) {
      if (!Number.isFinite(x)) throw new RangeError('Not a finite number.');
      x *= 2;
      d *= 2n;
    }
    return Rational.of(BigInt(x), d);
  }

  plus(b: Rational): Rational {
    if (this.d === b.d) return Rational.of(this.n + b.n, this.d);
    return Rational.of(this.n * b.d + b.n * this.d, this.d * b.d);
  }
  minus(b: Rational): Rational {
    return this.plus(b.negate());
  }
  times(b: Rational): Rational {
    return Rational.of(this.n * b.n, this.d * b.d);
  }
  over(b: Rational): Rational {
    return Rational.of(this.n * b.d, this.d * b.n);
  }
  negate(): Rational {
    return new Rational(-this.n, this.d);
  }
  abs(): Rational {
    return this.n < 0n ? this.negate() : this;
  }
  /** Below, at or above zero: −1, 0, 1. */
  sign(): -1 | 0 | 1 {
    return this.n < 0n ? -1 : this.n > 0n ? 1 : 0;
  }
  compare(b: Rational): -1 | 0 | 1 {
    return this.minus(b).sign();
  }
  equals(b: Rational): boolean {
    return this.n === b.n && this.d === b.d;
  }
  /** Whole number not above the value. */
  floor(): bigint {
    const q = this.n / this.d;
    return this.n < 0n && q * this.d !== this.n ? q - 1n : q;
  }
  /** Nearest whole number. A tie goes away from zero (`up`) or to the even one (ISO 80000-1, NIST SP 811 B.7.1). */
  round(tie: Tie = 'up'): bigint {
    const size = this.abs();
    const low = size.floor();
    const twice = (size.n - low * size.d) * 2n;
    const up = twice > size.d || (twice === size.d && (tie === 'up' || low % 2n === 1n));
    const whole = up ? low + 1n : low;
    return this.n < 0n ? -whole : whole;
  }
  toNumber(): number {
    const [n, d] = [abs(this.n), this.d];
    if (n <= safe && d <= safe) return Number(this.n) / Number(d);
    const shift = BigInt(Math.max(0, d.toString(2).length - n.toString(2).length + 64));
    const scaled = Number((n << shift) / d) / 2 ** Number(shift);
    return this.n < 0n ? -scaled : scaled;
  }
  /** Bits of the longer of both terms, to keep growth in bounds. */
  isLong(): boolean {
    const limit = 1n << 512n;
    return this.d > limit || abs(this.n) > limit;
  }
  toString(): string {
    return this.d === 1n ? String(this.n) : `${this.n}/${this.d}`;
  }
}

function tenTo(power: number): bigint {
  return BigInt(`1${'0'.repeat(power)}`);
}
