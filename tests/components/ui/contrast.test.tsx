import {
  benchPairs,
  graphicPairs,
  palettes,
  textPairs,
  type ColourRole,
  type ThemeName,
} from '../../../components/ui/palette.data';

/** Relative luminance, WCAG 2.2, definition of "relative luminance" (w3.org/TR/WCAG22/#dfn-relative-luminance). */
function luminance(hex: string): number {
  const channel = (at: number) => {
    const c = parseInt(hex.slice(at, at + 2), 16) / 255;
    return c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4;
  };
  return 0.2126 * channel(1) + 0.7152 * channel(3) + 0.0722 * channel(5);
}

/** Contrast ratio, WCAG 2.2 (w3.org/TR/WCAG22/#dfn-contrast-ratio). */
function contrast(a: string, b: string): number {
  const [dark, light] = [luminance(a), luminance(b)].sort((x, y) => x - y) as [number, number];
  return (light + 0.05) / (dark + 0.05);
}

const themes: ThemeName[] = ['day', 'night'];
const ratio = (theme: ThemeName, [text, ground]: readonly [ColourRole, ColourRole]) =>
  contrast(palettes[theme][text], palettes[theme][ground]);

test('the formula gives WCAG’s ends: 21 for black on white, 1 for a colour on itself', () => {
  expect(contrast('#000000', '#FFFFFF')).toBeCloseTo(21, 5);
  expect(contrast('#1D43B8', '#1D43B8')).toBe(1);
});

describe.each(themes)('%s', (theme) => {
  test.each(textPairs)('text %s on %s is at least 4.5 (WCAG 1.4.3)', (...pair) => {
    expect(ratio(theme, pair)).toBeGreaterThanOrEqual(4.5);
  });
  test.each(benchPairs)('at the bench %s on %s is at least 7 (WCAG 1.4.6)', (...pair) => {
    expect(ratio(theme, pair)).toBeGreaterThanOrEqual(7);
  });
  test.each(graphicPairs)('shape %s on %s is at least 3 (WCAG 1.4.11)', (...pair) => {
    expect(ratio(theme, pair)).toBeGreaterThanOrEqual(3);
  });
  test('every text role is held against the page ground', () => {
    const texts = (Object.keys(palettes.day) as ColourRole[]).filter((r) =>
      /^ink|Text$|^blue$/.test(r),
    );
    const low = texts.filter((r) => ratio(theme, [r, 'film']) < 4.5);
    expect(low).toEqual([]);
  });
});

test('day and night have the same roles', () => {
  expect(Object.keys(palettes.night)).toEqual(Object.keys(palettes.day));
});
