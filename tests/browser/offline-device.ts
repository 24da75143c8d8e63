import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { chromium, type BrowserContext, type Page } from 'playwright-core';
import { type StoredEntry } from '../../shared/api/bench';
import { chromiumOptions, signIn } from './harness-page';

/** A phone of its own: a browser whose storage stays when it is closed, and which can lose its signal. */
export interface Device {
  page: Page;
  context: BrowserContext;
  signal(on: boolean): Promise<void>;
  /** Closes the whole browser and opens it again, still without a signal if there was none. */
  restart(): Promise<void>;
  close(): Promise<void>;
}

export interface DeviceOwner {
  email: string;
  password: string;
}

async function open(folder: string, base: string): Promise<BrowserContext> {
  const context = await chromium.launchPersistentContext(folder, {
    ...chromiumOptions,
    baseURL: base,
    viewport: { width: 360, height: 740 },
    hasTouch: true,
    reducedMotion: 'reduce',
  });
  context.setDefaultTimeout(15_000);
  return context;
}

export async function makeDevice(base: string, as: DeviceOwner): Promise<Device> {
  const folder = mkdtempSync(join(tmpdir(), 'scantling-device-'));
  let context = await open(folder, base);
  let online = true;
  await signIn(context, base, as);
  const device: Device = {
    context,
    page: context.pages()[0] ?? (await context.newPage()),
    signal: async (on) => {
      online = on;
      await context.setOffline(!on);
    },
    restart: async () => {
      await context.close();
      context = await open(folder, base);
      await context.setOffline(!online);
      device.context = context;
      device.page = context.pages()[0] ?? (await context.newPage());
    },
    close: async () => {
      await context.close();
      rmSync(folder, { recursive: true, force: true });
    },
  };
  return device;
}

/** Waits until an expression is true in the page; Playwright's own way of asking again is forbidden by our policy. */
export async function until(page: Page, expression: string): Promise<void> {
  const end = Date.now() + 15_000;
  while (!(await page.evaluate<boolean>(`Boolean(${expression})`))) {
    if (Date.now() > end) throw new Error(`Not true within 15 s: ${expression}`);
    await page.waitForTimeout(100);
  }
}

/** Opens a plan at the bench and waits until all of it is on the device. Returns the copy's id. */
export async function openAtBench({ page }: Device, slug: string): Promise<string> {
  await page.goto(`/plans/${slug}`);
  await page.getByRole('button', { name: /Start a bench copy|Go on at the bench/ }).click();
  await page.getByRole('heading', { level: 1, name: /^Step \d+ of/ }).waitFor();
  await page.getByText(/are kept on this device/).waitFor();
  await until(page, 'navigator.serviceWorker.controller !== null');
  return new URL(page.url()).pathname.split('/').pop() ?? '';
}

export const atStep = ({ page }: Device, step: number) =>
  page.getByRole('heading', { level: 1, name: new RegExp(`^Step ${step} of`) }).waitFor();

/** Goes to a step by the page keys, as a foot pedal does. */
export async function goTo(device: Device, step: number): Promise<void> {
  const heading = device.page.getByRole('heading', { level: 1, name: /^Step \d+ of/ });
  for (;;) {
    const at = Number(/\d+/.exec(await heading.innerText())?.[0]);
    if (at === step) return;
    await device.page.keyboard.press(at < step ? 'PageDown' : 'PageUp');
    await atStep(device, at < step ? at + 1 : at - 1);
  }
}

/** Takes readings of the dimension on show, one place after the other. Returns its name. */
export async function takeReadings({ page }: Device, readings: readonly string[]): Promise<string> {
  await page.getByRole('button', { name: 'Reading', exact: true }).click();
  const name = await page.getByRole('heading', { level: 2, name: /^Reading: / }).innerText();
  for (const [i, reading] of readings.entries()) {
    await page.getByLabel('What you read').fill(reading);
    await page.getByRole('button', { name: 'Take reading', exact: true }).click();
    await page.getByRole('button', { name: `Take reading ${i + 1} back` }).waitFor();
  }
  await page.getByRole('button', { name: 'Done reading' }).click();
  return name.replace(/^Reading: /, '');
}

/** So many readings of a dimension of the step on show are there. */
export async function seeReadings({ page }: Device, name: string, count: number): Promise<void> {
  await page.getByRole('button', { name: 'Reading', exact: true }).click();
  await page.getByRole('button', { name: new RegExp(`^${name}$`, 'i') }).click();
  await page.getByRole('button', { name: `Take reading ${count} back` }).waitFor();
  await page.getByRole('button', { name: 'Done reading' }).click();
}

export async function keepNote({ page }: Device, text: string): Promise<void> {
  await page.getByLabel('A note for yourself').fill(text);
  await page.getByRole('button', { name: 'Keep the note' }).click();
  await page.getByText(text).waitFor();
}

export async function tick(device: Device, step: number): Promise<void> {
  await device.page.getByRole('button', { name: 'Done, next step' }).click();
  await atStep(device, step + 1);
}

interface Waiting {
  entry: { id: string };
  state: string;
}

/** Ids of what this device still holds, read from its IndexedDB. */
export async function heldIds({ page }: Device): Promise<string[]> {
  const jobs = await page.evaluate<Waiting[]>(
    `new Promise((resolve, reject) => {
      const request = indexedDB.open('keyval-store');
      request.onerror = () => reject(request.error);
      request.onsuccess = () => {
        const all = request.result.transaction('keyval').objectStore('keyval').get('scantling-outbox');
        all.onsuccess = () => resolve(all.result ?? []);
      };
    })`,
  );
  return jobs.map((job) => job.entry.id);
}

/** The text of all answers this device keeps, and the names of its caches beside the application's own. */
export async function keptThings({ page }: Device): Promise<{ answers: string; caches: string[] }> {
  return page.evaluate(
    `new Promise((resolve) => {
      const request = indexedDB.open('keyval-store');
      request.onsuccess = () => {
        const all = request.result.transaction('keyval').objectStore('keyval').get('scantling-queries');
        all.onsuccess = async () =>
          resolve({
            answers: all.result ?? '',
            caches: (await caches.keys()).filter((name) => !name.startsWith('workbox-precache')),
          });
      };
    })`,
  );
}

/** What the server has of a bench copy, in its order. */
export async function onServer({ context }: Device, copyId: string): Promise<StoredEntry[]> {
  const answer = await context.request.get(`/api/bench/${copyId}/entries`);
  return ((await answer.json()) as { items: StoredEntry[] }).items;
}
