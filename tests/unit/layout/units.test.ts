import { Rational } from '../../../shared/measure';
import { partUnits, stockUnits, unitsToMm } from '../../../shared/layout';

describe('units of the layout', () => {
  it('holds 1/64 in and 0.01 mm exactly (1 in = 25.4 mm, NIST SP 811 B.8)', () => {
    const inch = Rational.of(254, 10);
    expect(partUnits(inch.over(Rational.of(64)))).toBe(635);
    expect(stockUnits(inch.over(Rational.of(64)))).toBe(635);
    expect(partUnits(Rational.decimal('0.01'))).toBe(16);
    expect(stockUnits(Rational.decimal('3.2'))).toBe(5120);
  });
  it('rounds a part up and stock down', () => {
    const third = Rational.of(1, 3);
    expect(partUnits(third)).toBe(534);
    expect(stockUnits(third)).toBe(533);
  });
  it('goes back to decimals', () => {
    expect(unitsToMm(635)).toBe(0.396875);
    expect(unitsToMm(partUnits(Rational.decimal('1039.5')))).toBe(1039.5);
  });
});
