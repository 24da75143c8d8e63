// Pictures of screens at phone and desk width, by day and by night:
// npm run screens -- OUT_DIR --base http://127.0.0.1:8080 --route / --route /plans --as ada@example.org:password
import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { parseArgs } from 'node:util';
import { launchChromium, signIn } from './lib/browser.mjs';

const { values, positionals } = parseArgs({
  allowPositionals: true,
  options: {
    base: { type: 'string', default: 'http://127.0.0.1:8080' },
    route: { type: 'string', multiple: true, default: ['/'] },
    as: { type: 'string' },
    full: { type: 'boolean', default: false },
  },
});
const [out] = positionals;
if (out === undefined) {
  console.error('Say where the pictures go: npm run screens -- OUT_DIR --route /');
  process.exit(1);
}
mkdirSync(out, { recursive: true });

const nameOf = (route) => route.replace(/^\//, '').replace(/[^\w-]+/g, '-') || 'home';
const sizes = { 360: 740, 1280: 800 };
const themes = { day: 'light', night: 'dark' };

async function takeAll(browser, width, theme) {
  const context = await browser.newContext({
    viewport: { width: Number(width), height: sizes[width] },
    colorScheme: themes[theme],
    reducedMotion: 'reduce',
  });
  if (values.as !== undefined) {
    const colon = values.as.indexOf(':');
    await signIn(context, values.base, values.as.slice(0, colon), values.as.slice(colon + 1));
  }
  const page = await context.newPage();
  page.on('pageerror', (error) => console.error(`${width} ${theme}: ${error.message}`));
  page.on('console', (message) => {
    if (message.type() === 'error') console.error(`${width} ${theme}: ${message.text()}`);
  });
  for (const route of values.route) {
    // The network may never rest on a page that polls, so waiting for it has an end.
    await page.goto(values.base + route, { waitUntil: 'load' });
    await page.waitForLoadState('networkidle', { timeout: 5000 }).catch(() => undefined);
    const file = join(out, `${nameOf(route)}-${width}-${theme}.png`);
    await page.screenshot({ path: file, fullPage: values.full });
    console.log(file);
  }
  await context.close();
}

const browser = await launchChromium();
try {
  for (const width of Object.keys(sizes)) {
    for (const theme of Object.keys(themes)) await takeAll(browser, width, theme);
  }
} catch (error) {
  console.error(error.message);
  process.exitCode = 1;
} finally {
  await browser.close();
}
