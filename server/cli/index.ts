import { readdirSync } from 'node:fs';
import { extname, join, parse } from 'node:path';

/** A subcommand of `scantling`: one file in this folder that exports these three. */
export interface Command {
  name: string;
  /** One line for the list of commands. */
  summary: string;
  /** Does the work and gives the exit status. */
  run(argv: string[]): Promise<number>;
}

function isCommand(value: unknown): value is Command {
  const command = value as Partial<Command> | undefined;
  return typeof command?.name === 'string' && typeof command.run === 'function';
}

async function commands(): Promise<Command[]> {
  const files = readdirSync(__dirname).filter(
    (file) => extname(file) === extname(__filename) && parse(file).name !== 'index',
  );
  const modules = await Promise.all(
    files.map((file) => import(join(__dirname, file)) as Promise<{ default?: unknown }>),
  );
  return modules
    .map((module) => (isCommand(module) ? module : module.default))
    .filter(isCommand)
    .sort((a, b) => a.name.localeCompare(b.name));
}

async function main([name, ...argv]: string[]): Promise<number> {
  const all = await commands();
  const command = all.find((candidate) => candidate.name === name);
  if (command !== undefined) return command.run(argv);
  const asked = name === undefined || name === 'help' || name === '--help';
  if (!asked) console.error(`There is no command ${name}.`);
  const lines = all.map((each) => `  ${each.name.padEnd(18)} ${each.summary}`);
  console.log(`scantling COMMAND\n\n${lines.join('\n')}`);
  return asked ? 0 : 1;
}

main(process.argv.slice(2)).then(
  (status) => {
    process.exitCode = status;
  },
  (error: unknown) => {
    console.error(error instanceof Error ? error.message : error);
    process.exitCode = 1;
  },
);
