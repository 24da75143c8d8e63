import { parseLength, toExact, fromExact } from '../../../shared/measure';

/** Accepted forms and refusals: the plan model's own rules of notation. 1 in = 25.4 mm (NIST HB 44 App. C). */
const accepted: [string, string][] = [
  ['3/4 in', '381/20'],
  ['3/4"', '381/20'],
  ['1-1/2"', '381/10'],
  ['1 1/2 in', '381/10'],
  ['5\' 3-1/2"', '16129/10'],
  ['5 ft 3 1/2 in', '16129/10'],
  ['5\'-3-1/2"', '16129/10'],
  ['0.742"', '47117/2500'],
  ['.742 in', '47117/2500'],
  ['742 thou', '47117/2500'],
  ['18 mm', '18'],
  ['18mm', '18'],
  ['1.8 cm', '18'],
  ['2.44 m', '2440'],
  ['1½ in', '381/10'],
  ['1 ½ in', '381/10'],
  ['⅝"', '127/8'],
  ['3⁄8 in', '381/40'],
  ['5′ 3½″', '16129/10'],
  ['5’ 3-1/2”', '16129/10'],
  ['  18 mm  ', '18'],
  ['3 9/16"', '7239/80'],
  ['5 feet', '1524'],
  ['18', '18'],
  ['0 mm', '0'],
];

const refused: [string, string, number][] = [
  ['3/0', 'zero-denominator', 2],
  ['1-1/2-1/4', 'mixed', 5],
  ['5" 3\'', 'nesting', 3],
  ['1/2/3', 'fraction', 3],
  ['1.1/2', 'fraction', 3],
  ['', 'empty', 0],
  ['   ', 'empty', 0],
  ['5 mm 3 in', 'nesting', 5],
  ['5 ft 3', 'unit-missing', 5],
  ['NaN', 'not-a-number', 0],
  ['Infinity', 'not-a-number', 0],
  ['∞', 'not-a-number', 0],
  ['-5 mm', 'negative', 0],
  ['−5 mm', 'negative', 0],
  ['101 m', 'too-large', 0],
  ['1 - 1/2 in', 'spaces', 2],
  ['12-3', 'mixed', 3],
  ['12 3', 'mixed', 3],
  ['1 5/4 in', 'mixed', 2],
  ['1,5 mm', 'character', 1],
  ['5 furlongs', 'unknown-unit', 2],
  ['1e5', 'unknown-unit', 1],
  ['3/', 'fraction', 2],
  ['mm', 'character', 0],
  ['1/2 ft 3 in', 'nesting', 0],
  ['9'.repeat(300), 'too-long', 200],
];

describe('Typed lengths', () => {
  test.each(accepted)('reads %s exactly', (text, mm) => {
    const parsed = parseLength(text, { unit: 'mm' });
    expect(parsed.ok && parsed.value.mm.toString()).toBe(mm);
  });

  test('a bare figure takes the unit of the field', () => {
    expect(toExact('3/4', 'in')).toEqual({ ok: true, value: { text: '3/4', mm: '381/20' } });
  });

  test.each(refused)('refuses %j as %s at %i with a cure', (text, code, at) => {
    const parsed = parseLength(text, { unit: 'in' });
    expect(parsed).toMatchObject({ ok: false, code, at });
    if (!parsed.ok) expect(parsed.message.length * parsed.cure.length).toBeGreaterThan(0);
  });

  test('a stored figure comes back as it was', () => {
    const stored = toExact('3 9/16"', 'mm');
    if (!stored.ok) throw new Error(stored.message);
    expect(stored.value).toEqual({ text: '3 9/16"', mm: '7239/80' });
    expect(fromExact(stored.value).mm.toString()).toBe('7239/80');
  });
});
