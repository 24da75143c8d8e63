import { inchRows, roundingRows } from '../../data/measure/rounding.data';
import {
  displayLength,
  displayValue,
  parseLength,
  Rational,
  term,
  type DisplayPreference,
} from '../../../shared/measure';

const exact = (text: string) => {
  const parsed = parseLength(text, { unit: 'mm' });
  if (!parsed.ok) throw new Error(parsed.message);
  return parsed.value.mm;
};
const tape: DisplayPreference = { system: 'in', instrument: 'tape', grid: 16 };

describe('Shown lengths', () => {
  test.each(inchRows)('%s in is %s mm exactly', (fraction, mm) => {
    expect(exact(`${fraction} in`).equals(Rational.decimal(mm))).toBe(true);
  });

  test.each(roundingRows)('%s at 1/%i is %s, to even %s', (text, grid, up, even, rest) => {
    const shown = displayLength(exact(text), { ...tape, grid });
    expect(shown.text).toBe(up);
    expect(shown.restMm).toBeCloseTo(rest, 9);
    expect(displayLength(exact(text), { ...tape, grid, tie: 'even' }).text).toBe(even);
  });

  test('carries into feet', () => {
    const feet = { ...tape, feet: true };
    expect(displayLength(exact('11-31/32 in'), feet).text).toBe('1 ft 0 in');
    expect(displayLength(exact('2440 mm'), feet).text).toBe('8 ft 0 1/16 in');
    expect(displayLength(exact('1000 mm'), feet)).toMatchObject({
      feet: '3',
      whole: '3',
      numerator: '3',
      denominator: '8',
      spoken: 'three feet three and three eighths inches',
    });
  });

  test('calipers show thou with the nearest fraction, and 0.01 mm', () => {
    const calipers: DisplayPreference = { system: 'in', instrument: 'calipers', grid: 64 };
    const shown = displayLength(exact('0.742 in'), calipers);
    expect(shown).toMatchObject({ decimal: '0.742', spoken: 'seven forty-two thou' });
    expect(shown.near?.text).toBe('47/64 in');
    expect(displayLength(exact('17.604 mm'), { ...calipers, system: 'mm' }).text).toBe('17.6 mm');
    expect(displayLength(exact('1.705 in'), calipers).spoken).toBe('one inch seven oh five thou');
  });

  test('metric tape goes to half a millimetre; a rest over a quarter of the tolerance shows', () => {
    const pref: DisplayPreference = { system: 'mm', instrument: 'tape', grid: 16, tolerance: 0.5 };
    const shown = displayLength(exact('564.7 mm'), pref);
    expect(shown).toMatchObject({ text: '564.5 mm', decimal: '564.5', unit: 'mm' });
    expect(shown.rest?.text).toBe('+0.2 mm');
    expect(displayLength(exact('564.6 mm'), pref).rest).toBeUndefined();
  });

  test('a negative figure has a minus sign and is rounded by size', () => {
    const shown = displayLength(exact('3/4 in').negate(), tape);
    expect(shown).toMatchObject({ sign: '−', text: '−3/4 in' });
    expect(shown.spoken).toBe('minus three quarters of an inch');
  });

  test.each([
    [45.5, 'angle', '45.5°', '45.5 degrees'],
    [90, 'duration', '1.5 h', '1.5 hours'],
    [20, 'duration', '20 min', 'twenty minutes'],
    [-2, 'mass', '−2 kg', 'minus two kilograms'],
    [4, 'count', '4', 'four'],
    [18, 'length', '11/16 in', 'eleven sixteenths of an inch'],
  ] as const)('%f as %s is %s', (x, kind, text, spoken) => {
    expect(displayValue(x, kind, tape)).toMatchObject({ text, spoken });
  });

  test('speaks mixed figures and picks the terms of a side', () => {
    expect(displayLength(exact('3 9/16 in'), tape).spoken).toBe('three and nine sixteenths inches');
    expect([term('rabbet', 'uk'), term('jointer', 'uk'), term('planer', 'us')]).toEqual([
      'rebate',
      'planer',
      'planer',
    ]);
  });
});
