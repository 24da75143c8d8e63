import { execFileSync, spawn } from 'node:child_process';
import { chmodSync, mkdirSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { conditions, report, table } from './write-section';

const root = join(__dirname, '../..');
const port = process.env.PORT ?? '18080';
const warmRuns = 3;

interface Start {
  seconds: number;
  /** The command's own lines, one per step. */
  steps: Map<string, string>;
}

/** Runs `npm start` in a clone until it says it is ready, then ends it as Ctrl-C would. */
function timeStart(clone: string, tmp: string): Promise<Start> {
  return new Promise((resolve, reject) => {
    const since = performance.now();
    let output = '';
    let seconds = 0;
    const child = spawn('npm', ['start'], {
      cwd: clone,
      detached: true,
      // A folder of its own for temporary files: Metro keeps its cache there.
      env: { ...process.env, PORT: port, TMPDIR: tmp },
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    const read = (chunk: Buffer) => {
      output += chunk.toString();
      if (seconds > 0 || !output.includes('Ready in')) return;
      seconds = (performance.now() - since) / 1000;
      process.kill(-(child.pid ?? 0), 'SIGINT');
    };
    child.stdout.on('data', read);
    child.stderr.on('data', read);
    child.once('error', reject);
    child.once('close', () => {
      if (seconds === 0) {
        reject(new Error(`npm start did not come up:\n${output}`));
        return;
      }
      const steps = [...output.matchAll(/^ {2}(\S.*?) +(\d+\.\d) s/gm)].map(
        ([, name = '', time = '']) => [name, time] as const,
      );
      resolve({ seconds, steps: new Map(steps) });
    });
  });
}

const median = (values: number[]) =>
  values.toSorted((a, b) => a - b)[Math.floor(values.length / 2)] ?? 0;

async function main(): Promise<void> {
  const folder = mkdtempSync(join(tmpdir(), 'scantling-start-'));
  chmodSync(folder, 0o755);
  const clone = join(folder, 'clone');
  const tmp = join(folder, 'tmp');
  mkdirSync(tmp, { mode: 0o1777 });
  chmodSync(tmp, 0o1777);
  try {
    execFileSync('git', ['clone', '--quiet', root, clone]);
    const cold = await timeStart(clone, tmp);
    const warm: Start[] = [];
    for (let run = 0; run < warmRuns; run += 1) warm.push(await timeStart(clone, tmp));
    const middle = (name: string) => median(warm.map(({ steps }) => Number(steps.get(name) ?? 0)));
    const rows = [...cold.steps].map(([name, time]) => [name, time, middle(name).toFixed(1)]);
    const all = [
      'until ready',
      cold.seconds.toFixed(1),
      median(warm.map((run) => run.seconds)).toFixed(1),
    ];
    report(
      'start',
      `## Start

\`npm run bench:start\`: \`npm start\` in a fresh clone, then again (median of ${warmRuns}). Cold: nothing installed,
nothing built; PostgreSQL's package is there and npm's download cache may be.

${table(['step', 'cold, s', 'warm, s'], [...rows, all])}

${conditions()}`,
    );
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

main().catch((error: unknown) => {
  console.error(error);
  process.exitCode = 1;
});
