import { spawn } from 'node:child_process';
import { join } from 'node:path';
import autocannon from 'autocannon';
import { conditions, report, table } from './write-section';

const root = join(__dirname, '../..');
const runs = 3;
const seconds = 4;
const connections = 20;

interface Found {
  address: string;
  databaseUrl: string;
}

/** Starts a server that prints a line of JSON when it is up and ends with its standard input. */
async function start(
  args: string[],
  env: Record<string, string>,
): Promise<{ found: Found; stop(): Promise<void> }> {
  const child = spawn('node', args, {
    cwd: root,
    stdio: ['pipe', 'pipe', 'inherit'],
    env: { ...process.env, NODE_ENV: 'production', ...env },
  });
  const closed = new Promise<void>((resolve) => {
    child.once('close', () => {
      resolve();
    });
  });
  const found = await new Promise<Found>((resolve, reject) => {
    let output = '';
    child.stdout.on('data', (chunk: Buffer) => {
      output += chunk.toString();
      const line = /^\{.*\}$/m.exec(output)?.[0];
      if (line !== undefined) resolve(JSON.parse(line) as Found);
    });
    void closed.then(() => {
      reject(new Error(`${args.join(' ')} did not start:\n${output}`));
    });
  });
  return {
    found,
    stop: () => {
      child.stdin.end();
      return closed;
    },
  };
}

async function firstSlug(address: string): Promise<string> {
  const answer = await fetch(`${address}/api/plans`);
  const { items } = (await answer.json()) as { items: { slug: string }[] };
  const slug = items[0]?.slug;
  if (slug === undefined) throw new Error('The demo data holds no published plan to measure with.');
  return slug;
}

interface Measured {
  rate: number;
  p50: number;
  p99: number;
}

async function measure(url: string): Promise<Measured> {
  const result = await autocannon({ url, connections, duration: seconds });
  const bad = result.non2xx + result.errors;
  if (bad > 0) throw new Error(`${bad} of the answers of ${url} were no success.`);
  return { rate: result.requests.average, p50: result.latency.p50, p99: result.latency.p99 };
}

const middle = (values: number[]) =>
  values.toSorted((a, b) => a - b)[Math.floor(values.length / 2)] ?? 0;

function row(name: string, all: Measured[], bytes: number): (string | number)[] {
  const rates = all.map(({ rate }) => rate);
  return [
    name,
    Math.round(middle(rates)),
    `${Math.round(Math.min(...rates))}–${Math.round(Math.max(...rates))}`,
    middle(all.map(({ p50 }) => p50)),
    middle(all.map(({ p99 }) => p99)),
    bytes,
  ];
}

const bytesOf = async (url: string) => (await (await fetch(url)).arrayBuffer()).byteLength;

async function main(): Promise<void> {
  const product = await start([join(root, 'scripts/throw-away.mjs')], { RATE_FACTOR: '100000' });
  const bare = await start(['--import', 'tsx', join(root, 'tests/bench/bare.ts')], {
    DATABASE_URL: product.found.databaseUrl,
  });
  try {
    const path = `/api/plans/${await firstSlug(product.found.address)}`;
    const urls = {
      ours: product.found.address + path,
      bare: bare.found.address + path,
    };
    await measure(urls.ours);
    await measure(urls.bare);
    const ours: Measured[] = [];
    const least: Measured[] = [];
    // In turn, so that what else the machine does falls on both.
    for (let run = 0; run < runs; run += 1) {
      ours.push(await measure(urls.ours));
      least.push(await measure(urls.bare));
    }
    const share = middle(ours.map(({ rate }) => rate)) / middle(least.map(({ rate }) => rate));
    const head = ['server', 'requests/s', 'range', 'p50, ms', 'p99, ms', 'answer, B'];
    const rows = [
      row('Scantling', ours, await bytesOf(urls.ours)),
      row('bare Express + pg, same rows', least, await bytesOf(urls.bare)),
    ];
    report(
      'api',
      `## The plan page’s data

\`npm run bench:api\`: \`GET ${path}\`, ${connections} connections, median of ${runs} runs of ${seconds} s in turn after a warm-up.
Each server is one process; the load generator shares the machine. Ours does ${(share * 100).toFixed(0)} % of bare.

${table(head, rows)}

${conditions()}`,
    );
  } finally {
    await bare.stop();
    await product.stop();
  }
}

main().catch((error: unknown) => {
  console.error(error);
  process.exitCode = 1;
});
