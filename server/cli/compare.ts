import { readFile } from 'node:fs/promises';
import { readEntriesFile } from '../../shared/plan/bench/entries-file';
import { foldEntries } from '../../shared/plan/bench/fold';
import { compareRevisions, type Change } from '../../shared/plan/compare';
import { type PlanDocument } from '../../shared/plan/document';
import { importPlan } from '../../shared/plan/interchange';
import { describeItem, meaningWord, noticeOf } from '../../shared/plan/notice';
import { type Command } from './index';

class Unreadable extends Error {}

async function textOf(path: string): Promise<string> {
  try {
    return await readFile(path, 'utf8');
  } catch {
    throw new Unreadable(`${path} cannot be read.`);
  }
}

async function planOf(path: string): Promise<PlanDocument> {
  const text = await textOf(path);
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    throw new Unreadable(`${path} is not JSON.`);
  }
  const imported = importPlan(value);
  if (imported.ok) return imported.document;
  const [first] = imported.faults;
  throw new Unreadable(`${path} is no plan: ${first?.path ?? ''} ${first?.message ?? ''}`);
}

async function entriesOf(path: string) {
  const file = readEntriesFile(await textOf(path));
  if (!file.ok) throw new Unreadable(`${path}: ${file.message}`);
  return file.entries.map(({ entry }, i) => ({ entry, sequence: i + 1 }));
}

const line = (change: Change) => {
  const fields = change.fields.map((f) => `${f.field}: ${f.before || '–'} → ${f.after || '–'}`);
  const figures = change.figures.map(
    (f) => `${f.of} ${f.before?.x ?? '–'} → ${f.after?.x ?? '–'} mm`,
  );
  const verdict = change.verdict ? [`${change.verdict.before} → ${change.verdict.after}`] : [];
  const said = [...fields, ...figures, ...verdict].join('; ');
  return `${change.how.padEnd(8)} ${change.subject.padEnd(10)} ${change.name}${said ? `: ${said}` : ''}`;
};

async function compare(argv: string[]): Promise<number> {
  const at = argv.indexOf('--copy');
  const copy = at < 0 ? undefined : argv[at + 1];
  const [first, second] = argv.filter((a, i) => !a.startsWith('--') && (at < 0 || i !== at + 1));
  if (!first || !second || (at >= 0 && !copy))
    throw new Unreadable(
      'Say which: scantling compare A.json B.json [--copy entries.json] [--json]',
    );
  const [before, after] = [await planOf(first), await planOf(second)];
  const state = copy === undefined ? null : foldEntries(await entriesOf(copy));
  const comparison = compareRevisions(before, after, state);
  const notice = state && noticeOf(comparison, state);
  if (argv.includes('--json')) {
    console.log(JSON.stringify({ changes: comparison.changes, notice }, null, 2));
  } else if (notice) {
    const pref = { system: after.units, instrument: 'calipers' as const, grid: 64 as const };
    for (const item of notice.items)
      console.log(
        `${meaningWord(item.means).padEnd(18)} ${item.change.name}: ${describeItem(item, pref)}`,
      );
  } else for (const change of comparison.changes) console.log(line(change));
  return comparison.changes.length > 0 ? 1 : 0;
}

/** Like diff: 0 the same by meaning, 1 something differs, 2 a file cannot be read. */
async function run(argv: string[]): Promise<number> {
  try {
    return await compare(argv);
  } catch (error) {
    if (!(error instanceof Unreadable)) throw error;
    console.error(error.message);
    return 2;
  }
}

const command: Command = {
  name: 'compare',
  summary: 'what differs by meaning between two plan files, and what it means for a bench copy',
  run,
};
export default command;
