import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { runInNewContext } from 'node:vm';
import { act, render, screen } from '@testing-library/react';
import { palettes } from '../../../components/ui/palette.data';
import { chooseTheme, useTheme } from '../../../components/ui/theme';
import { preloadedFonts, themeCss } from '../../../components/ui/theme-css';
import { colour } from '../../../components/ui/tokens';

const root = join(__dirname, '../../..');
const atStart = readFileSync(join(root, 'public/theme.js'), 'utf8');

/** What the page does before its first paint. */
const load = () => {
  delete document.documentElement.dataset.theme;
  runInNewContext(atStart, { localStorage: window.localStorage, document });
  return document.documentElement.dataset.theme;
};

function Shown() {
  const { choice, shown } = useTheme();
  return <p>{`${choice} ${shown}`}</p>;
}

afterEach(() => act(() => chooseTheme('system')));

test('a choice shows at once and is there before the first paint of the next visit', () => {
  render(<Shown />);
  expect(screen.getByText('system day')).toBeTruthy();
  act(() => chooseTheme('night'));
  expect(screen.getByText('night night')).toBeTruthy();
  expect(document.documentElement.dataset.theme).toBe('night');
  expect(load()).toBe('night');
});

test('the system’s theme keeps nothing', () => {
  act(() => chooseTheme('night'));
  act(() => chooseTheme('system'));
  expect(load()).toBeUndefined();
  expect(window.localStorage.length).toBe(0);
});

test('rubbish in the storage is the system’s theme', () => {
  window.localStorage.setItem('scantling.theme', '"><script>');
  expect(load()).toBeUndefined();
});

test('every role is a variable of both themes', () => {
  for (const role of Object.keys(palettes.day)) {
    expect(colour[role as keyof typeof colour]).toBe(`var(--${role})`);
    expect(themeCss).toContain(`--${role}:${palettes.day[role as keyof typeof palettes.day]}`);
    expect(themeCss).toContain(`--${role}:${palettes.night[role as keyof typeof palettes.night]}`);
  }
});

test('every font the style sheet names is shipped, with its licence', () => {
  const named = [...themeCss.matchAll(/url\((\/fonts\/[^)]+)\)/g)].map((m) => m[1] ?? '');
  expect(named).toHaveLength(7);
  for (const file of [...named, ...preloadedFonts]) {
    // A woff2 file begins with "wOF2" (W3C, WOFF 2.0, section 4.1).
    expect(
      readFileSync(join(root, 'public', file))
        .subarray(0, 4)
        .toString('latin1'),
    ).toBe('wOF2');
  }
  expect(readFileSync(join(root, 'public/fonts/OFL.txt'), 'utf8')).toContain(
    'SIL OPEN FONT LICENSE',
  );
});

test('the manifest’s icons are shipped in the sizes it says', () => {
  const manifest = JSON.parse(readFileSync(join(root, 'public/manifest.webmanifest'), 'utf8')) as {
    icons: { src: string; sizes: string }[];
  };
  for (const { src, sizes } of manifest.icons) {
    const file = readFileSync(join(root, 'public', src));
    if (src.endsWith('.svg')) continue;
    // PNG: width and height are big-endian at bytes 16 and 20 (W3C, PNG, IHDR).
    expect(`${file.readUInt32BE(16)}x${file.readUInt32BE(20)}`).toBe(sizes);
  }
});
