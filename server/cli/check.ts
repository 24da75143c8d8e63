import { readFile } from 'node:fs/promises';
import { importPlan } from '../../shared/plan/interchange';
import { checkSheet, type SheetRow } from '../../shared/plan/sheet';
import { type Command } from './index';

const words = {
  fails: 'FAILS',
  'at-risk': 'at risk',
  'needs-a-reading': 'note',
  holds: 'holds',
} as const;

const line = (row: SheetRow) => {
  const place = row.place.elementId ? `${row.place.in}/${row.place.elementId}` : row.place.in;
  return `${words[row.verdict].padEnd(8)} ${row.rule.padEnd(24)} ${row.message} ${row.cure} [${place}]`;
};

async function load(path: string): Promise<{ value: unknown } | { fault: string }> {
  let text: string;
  try {
    text = await readFile(path, 'utf8');
  } catch {
    return { fault: `${path} cannot be read.` };
  }
  try {
    return { value: JSON.parse(text) as unknown };
  } catch (error) {
    return { fault: `${path} is not JSON: ${(error as Error).message}` };
  }
}

/** `scantling check plan.json [--json]`: 0 clean, 1 a must fails, 2 the file is no plan. */
async function run(argv: string[]): Promise<number> {
  const json = argv.includes('--json');
  const [path] = argv.filter((arg) => !arg.startsWith('--'));
  if (path === undefined) {
    console.error('Say which plan: scantling check plan.json [--json]');
    return 2;
  }
  const loaded = await load(path);
  if ('fault' in loaded) {
    if (json)
      console.log(
        JSON.stringify(
          { ok: false, faults: [{ path: '', code: 'file', message: loaded.fault }] },
          null,
          2,
        ),
      );
    else console.error(loaded.fault);
    return 2;
  }
  const imported = importPlan(loaded.value);
  if (!imported.ok) {
    if (json) console.log(JSON.stringify({ ok: false, faults: imported.faults }, null, 2));
    else
      for (const fault of imported.faults)
        console.error(`${fault.path || 'the file'}: ${fault.message} (${fault.code})`);
    return 2;
  }
  const sheet = checkSheet(imported.document, undefined, 'publish');
  const failing = sheet.rows.filter((row) => row.verdict === 'fails').length;
  if (json)
    console.log(
      JSON.stringify({ ok: failing === 0, rows: sheet.rows, quiet: sheet.quiet }, null, 2),
    );
  else {
    for (const row of sheet.rows) console.log(line(row));
    console.log(
      `${imported.document.title}: ${failing} fail, ${sheet.rows.length - failing} to look at, ${sheet.quiet} rules find nothing.`,
    );
  }
  return failing > 0 ? 1 : 0;
}

const command: Command = {
  name: 'check',
  summary: 'prints the check sheet of a plan file; 1 when a must fails',
  run,
};
export default command;
