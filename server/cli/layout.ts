import { readFile } from 'node:fs/promises';
import { performance } from 'node:perf_hooks';
import { z } from 'zod';
import { type Options, solve } from '../../shared/layout';
import { barInstanceSchema, solveBarInstance } from '../../shared/layout/bars';
import { jobOf, resultOf, sheetInstanceSchema, whyTooBig } from '../../shared/layout/file';
import { type Command } from './index';

const fileSchema = z.object({ instances: z.array(z.unknown()).min(1) });

interface Flags {
  path: string;
  json: boolean;
  seed: number;
  iterations: number | undefined;
  /** Milliseconds for each instance. */
  time: number;
  options: Options;
}

class BadInput extends Error {}

const isBar = (value: unknown): boolean => {
  const bins = (value as { bins?: unknown } | null)?.bins;
  return (
    Array.isArray(bins) &&
    bins.some((bin) => typeof bin === 'object' && bin !== null && 'length' in bin)
  );
};

const numberFlag = z.coerce.number().min(0).max(1e9);

function flagsOf(argv: string[]): Flags {
  const values = new Map<string, string>();
  const paths: string[] = [];
  const known = ['--seed', '--iterations', '--time', '--stages', '--first'];
  for (let i = 0; i < argv.length; i++) {
    const arg = argv[i] ?? '';
    if (arg === '--json') values.set(arg, '');
    else if (known.includes(arg)) values.set(arg, argv[++i] ?? '');
    else if (arg.startsWith('--')) throw new BadInput(`There is no ${arg} here.`);
    else paths.push(arg);
  }
  const number = (flag: string): number | undefined => {
    const text = values.get(flag);
    if (text === undefined) return undefined;
    const read = numberFlag.safeParse(text === '' ? undefined : text);
    if (!read.success) throw new BadInput(`${flag} takes a number; got “${text}”.`);
    return read.data;
  };
  const choice = <T extends string>(flag: string, choices: readonly T[]): T | undefined => {
    const text = values.get(flag);
    if (text === undefined) return undefined;
    const found = choices.find((c) => c === text);
    if (!found) throw new BadInput(`${flag} takes ${choices.join(' or ')}; got “${text}”.`);
    return found;
  };
  const [path] = paths;
  if (path === undefined || paths.length > 1)
    throw new BadInput(
      'Say which file: scantling layout FILE.json [--json] [--time MS] [--iterations N] [--seed N] [--stages 2|3] [--first rip|crosscut]',
    );
  const stages = choice('--stages', ['2', '3'] as const);
  const firstCut = choice('--first', ['rip', 'crosscut'] as const);
  return {
    path,
    json: values.has('--json'),
    seed: number('--seed') ?? 1,
    iterations: number('--iterations'),
    time: number('--time') ?? 900,
    options: {
      ...(stages === undefined ? {} : { stages: stages === '2' ? 2 : 3 }),
      ...(firstCut === undefined ? {} : { firstCut }),
    },
  };
}

async function instancesOf(path: string): Promise<unknown[]> {
  const text = await readFile(path, 'utf8').catch(() => {
    throw new BadInput(`${path} cannot be read.`);
  });
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch (error) {
    throw new BadInput(`${path} is not JSON: ${(error as Error).message}`);
  }
  const file = fileSchema.safeParse(value);
  if (!file.success) throw new BadInput(`${path} holds no list of instances.`);
  return file.data.instances;
}

/** Reads one instance; names the field where it is wrong. */
function read<T>(schema: z.ZodType<T>, value: unknown, index: number): T {
  const result = schema.safeParse(value);
  if (result.success) return result.data;
  const lines = result.error.issues.map((issue) => {
    const path = issue.path
      .map((p) => (typeof p === 'number' ? `[${p}]` : `.${String(p)}`))
      .join('');
    return `instances[${index}]${path}: ${issue.message}`;
  });
  throw new BadInput(lines.slice(0, 20).join('\n'));
}

/** Makes what works an instance out, once it is known to be right. */
function prepare(
  value: unknown,
  index: number,
  flags: Flags,
): () => { name: string; sheets: unknown[] } {
  const { seed, iterations, time } = flags;
  const limit =
    iterations === undefined ? { clock: () => performance.now(), timeLimit: time } : { iterations };
  if (isBar(value)) {
    read(barInstanceSchema, value, index);
    return () => solveBarInstance(value, iterations === undefined ? {} : { effort: iterations });
  }
  const instance = read(sheetInstanceSchema, value, index);
  return () => {
    const { job, scale, coin } = jobOf(instance, flags.options);
    const answer = solve(job, { seed, ...limit });
    for (const { item, qty, why } of answer.unplaced) {
      const because =
        why === 'too-big'
          ? whyTooBig(instance, job, item)
          : why === 'machine'
            ? `the machine cannot cut part ${item}`
            : `the stock is used up: ${qty} of part ${item} are left`;
      console.error(`${instance.name || `instance ${index}`}: ${because}.`);
    }
    return resultOf(instance.name, answer, scale, coin);
  };
}

/** `scantling layout FILE.json [--json]`: 0 laid out, 2 the file is none. */
async function run(argv: string[]): Promise<number> {
  try {
    const flags = flagsOf(argv);
    const instances = await instancesOf(flags.path);
    const work = instances.map((value, index) => prepare(value, index, flags));
    const results = work.map((solveOne) => solveOne());
    if (flags.json) console.log(JSON.stringify(results));
    else for (const result of results) console.log(lineOf(result));
    return 0;
  } catch (error) {
    if (!(error instanceof BadInput)) throw error;
    console.error(error.message);
    return 2;
  }
}

function lineOf(result: {
  name: string;
  sheets: unknown[];
  lowerBound?: number;
  proven?: boolean;
}): string {
  const said = result.proven ? 'proven least' : `at least ${result.lowerBound ?? 0}`;
  return `${result.name.padEnd(16)} ${result.sheets.length} pieces of stock, ${said}`;
}

const command: Command = {
  name: 'layout',
  summary: 'lays out the instances of a file on their stock; --json prints every part and cut',
  run,
};
export default command;
