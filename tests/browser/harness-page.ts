import { mkdirSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import AxeBuilder from '@axe-core/playwright';
import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core';

export interface PageOptions {
  /** Viewport width in px; 360 is the phone, 1280 the desk. */
  width?: 360 | 768 | 1280;
  theme?: 'day' | 'night';
  /** E-mail and password to sign in with first. */
  as?: { email: string; password: string };
}

/** A page that remembers everything that went wrong in it. */
export interface WatchedPage {
  page: Page;
  context: BrowserContext;
  /** Console errors, uncaught errors and CSP violations so far. */
  faults(): string[];
  /** Leaves out faults a test has provoked on purpose. */
  forgive(pattern: RegExp): void;
  close(): Promise<void>;
}

/** Debian's Chromium; several seconds of background work are switched off. */
export const chromiumOptions = {
  executablePath: '/usr/bin/chromium',
  args: [
    '--no-sandbox',
    '--disable-gpu',
    '--disable-dev-shm-usage',
    '--disable-background-networking',
    '--disable-component-update',
    '--no-first-run',
    '--disable-sync',
    '--mute-audio',
  ],
};

export function launchBrowser(): Promise<Browser> {
  return chromium.launch(chromiumOptions);
}

/** Signs a context in through the API, as the form would. */
export async function signIn(
  context: BrowserContext,
  base: string,
  { email, password }: { email: string; password: string },
): Promise<void> {
  const answer = await context.request.post(`${base}/api/sessions`, {
    headers: { 'X-Scantling': '1' },
    data: { email, password },
  });
  if (!answer.ok()) {
    throw new Error(`Signing in as ${email} gave ${answer.status()}: ${await answer.text()}`);
  }
}

async function watch(context: BrowserContext, page: Page): Promise<() => string[]> {
  const faults: string[] = [];
  page.on('console', (message) => {
    if (message.type() === 'error')
      faults.push(`console: ${message.text()} (${message.location().url})`);
  });
  page.on('pageerror', (error) => faults.push(`uncaught: ${error.message}`));
  await context.exposeFunction('reportViolation', (text: string) => faults.push(`CSP: ${text}`));
  await context.addInitScript(() => {
    const scope = globalThis as unknown as {
      document: { addEventListener(name: string, listener: (event: Violation) => void): void };
      reportViolation(text: string): void;
    };
    interface Violation {
      violatedDirective: string;
      blockedURI: string;
      sourceFile: string;
    }
    scope.document.addEventListener('securitypolicyviolation', (event) => {
      // Playwright's own evaluate is reported too; it comes from no file of the page.
      if (event.blockedURI === 'eval' && !event.sourceFile.startsWith('http')) return;
      scope.reportViolation(
        `${event.violatedDirective} blocked ${event.blockedURI} in ${event.sourceFile}`,
      );
    });
  });
  return () => faults;
}

/** Opens a fresh context (own cookies and storage) with one page. */
export async function openPage(
  browser: Browser,
  base: string,
  { width = 360, theme = 'day', as }: PageOptions = {},
): Promise<WatchedPage> {
  const context = await browser.newContext({
    baseURL: base,
    viewport: { width, height: width === 360 ? 740 : 800 },
    hasTouch: width === 360,
    colorScheme: theme === 'day' ? 'light' : 'dark',
    reducedMotion: 'reduce',
  });
  context.setDefaultTimeout(15_000);
  if (as !== undefined) await signIn(context, base, as);
  const page = await context.newPage();
  const faults = await watch(context, page);
  const forgiven: RegExp[] = [];
  return {
    page,
    context,
    faults: () => faults().filter((fault) => !forgiven.some((pattern) => pattern.test(fault))),
    forgive: (pattern) => {
      forgiven.push(pattern);
    },
    close: () => context.close(),
  };
}

/** What axe finds on the page now, one line per finding; empty is the goal. */
export async function axe(page: Page): Promise<string[]> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  return violations.flatMap((violation) =>
    violation.nodes.map(
      (node) => `${violation.id}: ${violation.help} – ${node.html.slice(0, 160)}`,
    ),
  );
}

/** How many px the page is wider than the window; 0 is the goal. */
export function sidewaysScroll(page: Page): Promise<number> {
  return page.evaluate<number>(
    'document.documentElement.scrollWidth - document.documentElement.clientWidth',
  );
}

/** Where a failing test leaves its picture. */
export async function keepPicture(page: Page, name: string): Promise<string> {
  const folder = join(tmpdir(), 'scantling-browser');
  mkdirSync(folder, { recursive: true });
  const path = join(folder, `${name.replace(/[^\w-]+/g, '-').slice(0, 80)}.png`);
  await page.screenshot({ path, fullPage: true }).catch(() => undefined);
  return path;
}
