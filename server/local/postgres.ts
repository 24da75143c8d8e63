import { execFileSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import {
  chmodSync,
  existsSync,
  lstatSync,
  mkdirSync,
  mkdtempSync,
  readFileSync,
  realpathSync,
  rmSync,
  symlinkSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { freePort } from './free-port';
import { asPostgres, isRoot, postgresBin, succeedsAsPostgres } from './postgres-command';

export interface LocalPostgres {
  /** `postgres://postgres@127.0.0.1:PORT/postgres` */
  url: string;
  port: number;
  stop(): Promise<void>;
}

export interface PostgresOptions {
  /** Data folder; made when missing, used again when it holds data. Left out: a folder in tmp, removed at stop. */
  dir?: string;
  port?: number;
  /** False turns off every flush to disk: for tests only. */
  durable: boolean;
}

const settings = (port: number, durable: boolean) =>
  [
    'listen_addresses=127.0.0.1',
    `port=${String(port)}`,
    "unix_socket_directories=''",
    'max_connections=60',
    ...(durable ? [] : ['fsync=off', 'synchronous_commit=off', 'full_page_writes=off']),
  ]
    .map((setting) => `-c ${setting}`)
    .join(' ');

/**
 * A folder root may hand to `postgres`. Where `postgres` cannot reach the wanted place (a project
 * in /root, say) the data lies in /var/lib/scantling and the wanted place is a link to it.
 */
function placeForRoot(dir: string): string {
  const place = join(
    '/var/lib/scantling',
    createHash('sha256').update(dir).digest('hex').slice(0, 12),
  );
  mkdirSync(dirname(dir), { recursive: true });
  if (existsSync(dir)) return realpathSync(dir);
  if (lstatSync(dir, { throwIfNoEntry: false }) !== undefined) rmSync(dir);
  if (reachable(dirname(dir))) {
    mkdirSync(dir, { recursive: true });
    return dir;
  }
  mkdirSync(place, { recursive: true });
  symlinkSync(place, dir);
  return place;
}

function reachable(dir: string): boolean {
  try {
    execFileSync('runuser', ['-u', 'postgres', '--', 'test', '-x', dir], {
      cwd: '/',
      stdio: 'ignore',
    });
    return true;
  } catch {
    return false;
  }
}

function prepareDir(dir: string): string {
  if (!isRoot) {
    mkdirSync(dir, { recursive: true, mode: 0o700 });
    return dir;
  }
  const place = placeForRoot(dir);
  execFileSync('chown', ['-R', 'postgres:postgres', place]);
  chmodSync(place, 0o700);
  return place;
}

/** Ends a server an earlier run left behind on this folder, and clears a stale lock file. */
async function clearLeftovers(bin: string, data: string): Promise<void> {
  const lock = join(data, 'postmaster.pid');
  if (!existsSync(lock)) return;
  const ctl = join(bin, 'pg_ctl');
  if (await succeedsAsPostgres(ctl, ['-D', data, 'status'])) {
    await asPostgres(ctl, ['-D', data, '-m', 'fast', '-w', '-t', '30', 'stop']);
  }
  rmSync(lock, { force: true });
}

function logTail(log: string): string {
  if (!existsSync(log)) return '';
  return readFileSync(log, 'utf8').trim().split('\n').slice(-6).join('\n');
}

/**
 * Starts a PostgreSQL of our own on loopback with trust authentication, as `postgres` when run by
 * root. Throws when the programs are missing or the server does not come up, with its last words.
 */
export async function startPostgres(options: PostgresOptions): Promise<LocalPostgres> {
  const temporary = options.dir === undefined;
  const data = prepareDir(options.dir ?? mkdtempSync(join(tmpdir(), 'scantling-pg-')));
  const bin = postgresBin(data);
  if (!existsSync(join(data, 'PG_VERSION'))) {
    const fast = options.durable ? [] : ['--no-sync'];
    const fixed = ['-D', data, '-U', 'postgres', '-A', 'trust', '-E', 'UTF8', '--locale=C.UTF-8'];
    await asPostgres(join(bin, 'initdb'), [...fixed, ...fast]);
  }
  await clearLeftovers(bin, data);
  const port = options.port ?? (await freePort());
  const log = join(data, 'server.log');
  const ctl = join(bin, 'pg_ctl');
  try {
    // Without a log file pg_ctl would keep our pipe open and never seem to end.
    const start = ['-D', data, '-w', '-t', '60', '-l', log];
    await asPostgres(ctl, [...start, '-o', settings(port, options.durable), 'start']);
  } catch (error) {
    throw new Error(`PostgreSQL did not start on port ${String(port)}.\n${logTail(log)}`, {
      cause: error,
    });
  }
  let stopped: Promise<void> | undefined;
  const stop = async () => {
    const mode = options.durable ? 'fast' : 'immediate';
    await asPostgres(ctl, ['-D', data, '-m', mode, '-w', '-t', '30', 'stop']).catch(() => '');
    if (temporary) rmSync(data, { recursive: true, force: true });
  };
  return {
    url: `postgres://postgres@127.0.0.1:${String(port)}/postgres`,
    port,
    stop: () => (stopped ??= stop()),
  };
}
