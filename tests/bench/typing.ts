/// <reference lib="dom" />
import { spawn } from 'node:child_process';
import { join } from 'node:path';
import { chromium, type Page } from 'playwright-core';
import { chromiumOptions, signIn } from '../browser/harness-page';
import { benchPlan } from './model-plan';
import { conditions, report, table } from './write-section';

const root = join(__dirname, '../..');
const odalys = { email: 'odalys@marrow-lane.example', password: 'cut once measure twice' };
const keys = 80;
const pause = 120;

/** The product on throw-away services; ends with its standard input. */
async function product(): Promise<{ address: string; stop: () => Promise<void> }> {
  const child = spawn('node', [join(root, 'scripts/throw-away.mjs')], {
    cwd: root,
    stdio: ['pipe', 'pipe', 'inherit'],
    env: { ...process.env, NODE_ENV: 'production' },
  });
  const closed = new Promise<void>((resolve) => {
    child.once('close', () => {
      resolve();
    });
  });
  const address = await new Promise<string>((resolve, reject) => {
    let output = '';
    child.stdout.on('data', (chunk: Buffer) => {
      output += chunk.toString();
      const line = /^\{.*\}$/m.exec(output)?.[0];
      if (line !== undefined) resolve((JSON.parse(line) as { address: string }).address);
    });
    void closed.then(() => {
      reject(new Error(`The product did not start:\n${output}`));
    });
  });
  return {
    address,
    stop: () => {
      child.stdin.end();
      return closed;
    },
  };
}

interface Timed {
  /** Key press to the paint after it, ms. */
  paints: number[];
  /** Tasks of 50 ms and more while typing, ms. */
  tasks: number[];
}

/** Records in the page: every key press until the frame after it is on the screen, and every long task. */
async function record(page: Page): Promise<void> {
  await page.evaluate(() => {
    const timed: Timed = { paints: [], tasks: [] };
    Object.assign(window, { timed });
    addEventListener(
      'keydown',
      (event) => {
        requestAnimationFrame(() => {
          const { port1, port2 } = new MessageChannel();
          port1.onmessage = () => timed.paints.push(performance.now() - event.timeStamp);
          port2.postMessage(null);
        });
      },
      { capture: true },
    );
    new PerformanceObserver((list) => {
      for (const task of list.getEntries()) timed.tasks.push(task.duration);
    }).observe({ type: 'longtask' });
  });
}

async function typeInto(page: Page, symbol: string): Promise<Timed> {
  await page.getByLabel('Find a dimension').fill('');
  await page.getByRole('button', { name: new RegExp(`^Work on ${symbol},`) }).click();
  const field = page.getByRole('combobox', { name: new RegExp(`of ${symbol}$`) });
  await field.fill('');
  await page.waitForTimeout(1500);
  await page.evaluate(() =>
    Object.assign((window as unknown as { timed: Timed }).timed, { paints: [], tasks: [] }),
  );
  for (let i = 0; i < keys; i += 1) {
    if (i % 8 === 0) await field.fill('');
    await page.keyboard.type('12.5 + 3'[i % 8] ?? '1');
    await page.waitForTimeout(pause);
  }
  return page.evaluate(() => (window as unknown as { timed: Timed }).timed);
}

const at = (values: number[], share: number) =>
  values.toSorted((a, b) => a - b)[
    Math.min(values.length - 1, Math.floor(values.length * share))
  ] ?? 0;

async function main(): Promise<void> {
  const { address, stop } = await product();
  const browser = await chromium.launch(chromiumOptions);
  try {
    const context = await browser.newContext({
      baseURL: address,
      viewport: { width: 1280, height: 800 },
      serviceWorkers: 'block',
    });
    await signIn(context, address, odalys);
    const headers = { 'X-Scantling': '1' };
    const plan = { ...benchPlan(1000), id: crypto.randomUUID() };
    const made = await context.request.post('/api/drafts', {
      headers,
      data: { id: plan.id, title: plan.title, units: plan.units },
    });
    const { version } = (await made.json()) as { version: number };
    const put = await context.request.put(`/api/drafts/${plan.id}`, {
      headers,
      data: { version, document: plan },
    });
    if (!put.ok()) throw new Error(`The plan was not taken: ${await put.text()}`);
    const page = await context.newPage();
    await page.goto(`/drafting/${plan.id}`);
    await page.getByRole('tab', { name: 'Dimensions' }).click();
    await page.getByRole('button', { name: /^Work on d500,/ }).waitFor();
    await record(page);
    const rows = [];
    for (const symbol of ['d500', 'd0']) {
      const { paints, tasks } = await typeInto(page, symbol);
      rows.push([
        symbol,
        paints.length,
        at(paints, 0.5).toFixed(0),
        at(paints, 0.95).toFixed(0),
        Math.max(...paints).toFixed(0),
        tasks.filter((ms) => ms > 100).length,
        Math.max(0, ...tasks).toFixed(0),
      ]);
    }
    report(
      'typing',
      `## Typing in the dimensions table\n\n\`npm run bench:typing\`: a plan of 1,000 dimensions, 500 parts, 200 steps, 300 checks in Chromium, a key every ${pause} ms; from the key press to the frame after it. At most: p95 50 ms, no task over 100 ms.\n\n${table(['dimension', 'keys', 'median, ms', 'p95, ms', 'longest, ms', 'tasks over 100 ms', 'longest task, ms'], rows)}\n\n${conditions()}`,
    );
  } finally {
    await browser.close();
    await stop();
  }
}

void main();
