import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { z } from 'zod';
import { barInstanceSchema, barJobOf, solveBars, verifyBars } from '../../shared/layout/bars';
import { conditions, report, table } from './write-section';

const fileSchema = z.object({
  instances: z.array(barInstanceSchema.extend({ best: z.number().optional() })),
});

interface Row {
  set: string;
  best: number;
  cost: number;
  proven: boolean;
  ms: number;
}

/** Sets of one file: Falkenauer's uniform and triplet instances are two. */
const setOf = (file: string, name: string) =>
  file.includes('falkenauer') ? `${file} ${name.startsWith('t') ? 'T' : 'U'}` : file;

function run(folder: string, file: string): Row[] {
  const path = join(folder, `${file}.json`);
  if (!existsSync(path)) return [];
  const { instances } = fileSchema.parse(JSON.parse(readFileSync(path, 'utf8')));
  return instances.map((instance) => {
    const job = barJobOf(instance);
    const start = performance.now();
    const answer = solveBars(job);
    const ms = performance.now() - start;
    const faults = verifyBars(job, answer);
    if (faults.length > 0) throw new Error(`${instance.name}: ${faults.join('; ')}`);
    const { cost, proven } = answer;
    return { set: setOf(file, instance.name), best: instance.best ?? 0, cost, proven, ms };
  });
}

function line(set: string, rows: readonly Row[]): (string | number)[] {
  const times = rows.map((r) => r.ms).sort((a, b) => a - b);
  const sum = (of: (r: Row) => number) => rows.reduce((total, r) => total + of(r), 0);
  return [
    set,
    rows.length,
    sum((r) => r.best),
    sum((r) => r.cost),
    `${rows.filter((r) => r.cost === r.best).length}`,
    `${rows.filter((r) => r.proven).length}`,
    Math.max(...rows.map((r) => r.cost - r.best)),
    (times[Math.floor(times.length / 2)] ?? 0).toFixed(0),
    (times.at(-1) ?? 0).toFixed(0),
  ];
}

/** The table of boards, strips and rod; every answer goes through the verifier. Empty without such files in the folder. */
export function barsTable(folder: string): string {
  const rows = ['1d-workshop-kerf', '1d-falkenauer'].flatMap((file) => run(folder, file));
  const sets = [...new Set(rows.map((r) => r.set))];
  return table(
    [
      'set',
      'instances',
      'best known',
      'bars',
      'optimal',
      'proven',
      'most over',
      'median, ms',
      'longest, ms',
    ],
    sets.map((set) =>
      line(
        set,
        rows.filter((r) => r.set === set),
      ),
    ),
  );
}

if (require.main === module) {
  const folder = process.argv.slice(2).find((arg) => !arg.startsWith('-'));
  if (!folder) throw new Error('npm run -s bench:bars -- FOLDER [--write]');
  const intro = `## Boards, strips and rod\n\n\`npm run -s bench:bars -- FOLDER\`: the sets of one dimension, one call each with the default effort; every answer replayed by the verifier.`;
  report('bars', `${intro}\n\n${barsTable(folder)}\n\n${conditions()}`);
}
