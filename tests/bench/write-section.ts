import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { cpus, loadavg } from 'node:os';
import { join } from 'node:path';

const page = join(__dirname, '../../docs/performance.md');
const opening = `# Performance

Figures measured on one machine, each with the command that repeats it. A command with \`--write\` puts
its figures here.
`;

/**
 * Puts the text between `<!-- bench:NAME -->` and `<!-- /bench:NAME -->` of docs/performance.md, at the
 * end when the marks are not there yet.
 */
export function writeSection(name: string, text: string, file = page): void {
  const [start, end] = [`<!-- bench:${name} -->`, `<!-- /bench:${name} -->`];
  const before = existsSync(file) ? readFileSync(file, 'utf8') : opening;
  const section = `${start}\n\n${text.trim()}\n\n${end}`;
  const from = before.indexOf(start);
  const to = before.indexOf(end);
  if ((from === -1) !== (to === -1))
    throw new Error(`The marks of ${name} in ${file} are not a pair.`);
  const after =
    from === -1
      ? `${before.trimEnd()}\n\n${section}\n`
      : before.slice(0, from) + section + before.slice(to + end.length);
  writeFileSync(file, after);
}

/** A Markdown table. */
export function table(head: string[], rows: (string | number)[][]): string {
  const line = (cells: (string | number)[]) => `| ${cells.join(' | ')} |`;
  return [line(head), line(head.map(() => '---')), ...rows.map(line)].join('\n');
}

/** Where and when, for under a table. */
export function conditions(): string {
  const processor = cpus()[0]?.model.trim() ?? 'unknown processor';
  const day = new Date().toISOString().slice(0, 10);
  const load = (loadavg()[1] ?? 0).toFixed(1);
  return `Measured ${day}, Node ${process.versions.node}, ${cpus().length} cores (${processor}), loopback; load of the last five minutes ${load}.`;
}

/** Prints the section; with `--write` on the command line also writes it. */
export function report(name: string, text: string): void {
  console.log(text);
  if (process.argv.includes('--write')) writeSection(name, text);
}
