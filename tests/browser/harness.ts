import { type Browser } from 'playwright-core';
import {
  keepPicture,
  launchBrowser,
  openPage,
  type PageOptions,
  type WatchedPage,
} from './harness-page';

export { axe, sidewaysScroll, signIn } from './harness-page';
export { type PageOptions, type WatchedPage } from './harness-page';

export interface LetterSeen {
  to: string[];
  subject: string;
  text: string;
}

/** What a story is given. */
export interface Stage {
  /** `http://127.0.0.1:PORT` of the running product. */
  base: string;
  newPage(options?: PageOptions): Promise<WatchedPage>;
  /** The newest letter to an address whose subject fits, waiting for it up to 10 s. */
  letter(to: string, subject: RegExp): Promise<LetterSeen>;
}

/** Address of the product that harness-setup.ts started for all browser tests. */
export function baseUrl(): string {
  const base = process.env.SCANTLING_TEST_BASE;
  if (base === undefined)
    throw new Error('Browser tests run as a Jest project: npm run test:browser');
  return base;
}

async function waitForLetter(to: string, subject: RegExp): Promise<LetterSeen> {
  const until = Date.now() + 10_000;
  let seen: LetterSeen[] = [];
  while (Date.now() < until) {
    const answer = await fetch(`${baseUrl()}/local/mail.json`);
    seen = (await answer.json()) as LetterSeen[];
    const found = seen.findLast((mail) => mail.to.includes(to) && subject.test(mail.subject));
    if (found !== undefined) return found;
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  const there = seen.map((mail) => `${mail.to.join()}: ${mail.subject}`).join('; ');
  throw new Error(`No letter to ${to} with ${String(subject)}. There are: ${there || 'none'}.`);
}

let browser: Browser | undefined;
beforeAll(async () => {
  browser = await launchBrowser();
}, 30_000);
afterAll(async () => {
  await browser?.close();
});

async function play(name: string, run: (stage: Stage) => Promise<void>): Promise<void> {
  const pages: WatchedPage[] = [];
  const stage: Stage = {
    base: baseUrl(),
    newPage: async (options) => {
      if (browser === undefined) throw new Error('The browser did not start.');
      const opened = await openPage(browser, baseUrl(), options);
      pages.push(opened);
      return opened;
    },
    letter: waitForLetter,
  };
  try {
    await run(stage);
    expect(pages.flatMap((each) => each.faults())).toEqual([]);
  } catch (error) {
    const pictures = await Promise.all(
      pages.map(({ page }, index) => keepPicture(page, `${name}-${index}`)),
    );
    if (error instanceof Error) {
      const faults = pages.flatMap((each) => each.faults());
      error.message += `\nPictures: ${pictures.join(', ')}\nFaults: ${faults.join('\n') || 'none'}`;
    }
    throw error;
  } finally {
    await Promise.all(pages.map((each) => each.close()));
  }
}

/**
 * One test in the browser. It fails on any console error, uncaught error or CSP violation in any of
 * its pages, and leaves a picture of each page when it fails.
 */
export function story(
  name: string,
  run: (stage: Stage) => Promise<void>,
  timeoutMs = 60_000,
): void {
  it(name, () => play(name, run), timeoutMs);
}
