import { execFile } from 'node:child_process';
import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { promisify } from 'node:util';

const run = promisify(execFile);
const debianRoot = '/usr/lib/postgresql';

export const isRoot = process.getuid?.() === 0;

/** Folder of PostgreSQL's programs: the version a data folder was made with, else the newest installed. */
export function postgresBin(dataDir?: string): string {
  const versions = existsSync(debianRoot)
    ? readdirSync(debianRoot)
        .filter((name) => existsSync(join(debianRoot, name, 'bin', 'initdb')))
        .sort((a, b) => Number(b) - Number(a))
    : [];
  const versionFile = dataDir === undefined ? '' : join(dataDir, 'PG_VERSION');
  const wanted = existsSync(versionFile) ? readFileSync(versionFile, 'utf8').trim() : versions[0];
  if (versions.length === 0) {
    throw new Error('PostgreSQL is not installed. Install it with: apt-get install postgresql');
  }
  if (wanted === undefined || !versions.includes(wanted)) {
    throw new Error(
      `The data in ${dataDir ?? ''} is PostgreSQL ${wanted ?? ''}'s, and only ${versions.join(', ')} is installed. ` +
        `Install postgresql-${wanted ?? ''}, or move that folder away to start empty.`,
    );
  }
  return join(debianRoot, wanted, 'bin');
}

/**
 * Runs a program as the user PostgreSQL may run as: oneself, or `postgres` for root, whom the
 * server refuses. Rejects with the program's own words.
 */
export async function asPostgres(program: string, args: string[]): Promise<string> {
  const [file, all] = isRoot
    ? ['runuser', ['-u', 'postgres', '--', program, ...args]]
    : [program, args];
  // The working folder may be closed to `postgres`, so every program starts in the root folder.
  const { stdout } = await run(file, all, { cwd: '/', maxBuffer: 4_000_000 });
  return stdout;
}

/** Whether the program ends with status 0. */
export async function succeedsAsPostgres(program: string, args: string[]): Promise<boolean> {
  return asPostgres(program, args).then(
    () => true,
    () => false,
  );
}
