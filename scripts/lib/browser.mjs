import { chromium } from 'playwright-core';

/** Starts Debian's Chromium without its background chatter. */
export const launchChromium = () =>
  chromium.launch({
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
  });

/** Signs a browser context in through the API. */
export async function signIn(context, base, email, password) {
  const answer = await context.request.post(`${base}/api/sessions`, {
    headers: { 'X-Scantling': '1', Origin: base },
    data: { email, password },
  });
  if (!answer.ok()) throw new Error(`Signing in as ${email} gave ${answer.status()}.`);
}
