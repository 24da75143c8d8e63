/** Whole numbers by a seed (xorshift32, G. Marsaglia, J. Stat. Software 8 (2003) 14). */
export class Random {
  private state: number;
  constructor(seed: number) {
    this.state = (Math.imul(seed | 0, 0x9e3779b1) ^ 0x6d2b79f5) | 0 || 1;
    for (let i = 0; i < 8; i++) this.bits();
  }
  bits(): number {
    let x = this.state;
    x ^= x << 13;
    x ^= x >>> 17;
    x ^= x << 5;
    this.state = x;
    return x >>> 0;
  }
  /** 0 ≤ n < below. */
  below(below: number): number {
    return Math.floor((this.bits() / 4294967296) * below);
  }
  /** 0 ≤ x < 1. */
  unit(): number {
    return this.bits() / 4294967296;
  }
}
