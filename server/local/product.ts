import { execFile } from 'node:child_process';
import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { makeDataSource } from '../db/data-source';
import { readEnv } from '../env';
import { demoPeople, type DemoPerson } from './demo-people';
import { freePort } from './free-port';
import { type Listening } from './listen';
import { startServices, type LocalServices } from './services';

const root = join(__dirname, '../..');
const demoCommand = join(root, 'server/cli/demo.ts');

export interface ProductOptions {
  /** Port of the application; 0 for any free one. */
  port: number;
  /** Where data stays between starts; left out, everything vanishes at the end. */
  dataDir?: string;
  webDir: string;
  /** `apart`: the API is started by someone else (npm run dev), here only what it stands on. */
  server?: 'here' | 'apart';
}

export interface Product {
  /** In order, each with the name to show; a step may give a word for its line. */
  steps: [name: string, work: () => Promise<string | undefined>][];
  /** Where it is, once the steps are done. */
  found(): {
    address: string;
    databaseUrl: string;
    mail: string | null;
    signIns: DemoPerson[];
  };
  /** For `server: 'apart'`: the port the API is expected on, and its environment. */
  apart(): { apiPort: number; mailPort: number; env: Record<string, string> };
  stop(): Promise<void>;
}

function keptSecret(dir: string | undefined): string {
  const fresh = randomBytes(32).toString('hex');
  if (dir === undefined) return fresh;
  const file = join(dir, 'session-secret');
  if (existsSync(file)) return readFileSync(file, 'utf8').trim();
  mkdirSync(dir, { recursive: true });
  writeFileSync(file, fresh, { mode: 0o600 });
  return fresh;
}

// Stands for what is not up yet while the rest of the environment is judged.
const placeholders = {
  DATABASE_URL: 'postgres://postgres@127.0.0.1/postgres',
  S3_ENDPOINT: 'http://127.0.0.1',
  SMTP_URL: 'smtp://127.0.0.1',
  SESSION_SECRET: 'not-used-for-anything',
};

async function migrate(url: string): Promise<string> {
  const db = await makeDataSource(url, 1).initialize();
  try {
    const done = await db.runMigrations();
    return done.length === 0 ? 'up to date' : `${done.length} run`;
  } finally {
    await db.destroy();
  }
}

/** Loads the demo data, once for a data folder; never into a database that was given to us. */
async function loadDemo(env: Record<string, string>, dir: string | undefined): Promise<string> {
  const mark = dir === undefined ? null : join(dir, 'demo-loaded');
  if (mark !== null && existsSync(mark)) return 'there';
  if (!existsSync(demoCommand)) return 'none yet';
  const args = ['--import', 'tsx', join(root, 'server/cli/index.ts'), 'demo'];
  const run = promisify(execFile)('node', args, { cwd: root, env: { ...process.env, ...env } });
  await run.catch((error: unknown) => {
    const { stderr } = error as { stderr?: string };
    throw new Error(`The demo data did not load: ${stderr?.trim() || String(error)}`);
  });
  if (mark !== null) writeFileSync(mark, new Date().toISOString());
  return 'loaded';
}

/** The whole product on this machine: services, migrations, demo data, and the server in this process. */
export function createProduct(options: ProductOptions): Product {
  // Faults of the environment are told before anything is started.
  readEnv({ ...placeholders, ...process.env, PORT: String(options.port) });
  const givenDatabase = Boolean(process.env.DATABASE_URL);
  const env: Record<string, string> = {};
  let port = options.port;
  let services: LocalServices | undefined;
  let server: Listening | undefined;
  const here = options.server !== 'apart';

  const prepare = async () => {
    if (port === 0) port = await freePort();
    const apiPort = here ? port : await freePort();
    services = await startServices({ dir: options.dataDir, given: process.env });
    Object.assign(env, services.env, {
      NODE_ENV: process.env.NODE_ENV ?? 'development',
      PORT: String(apiPort),
      APP_ORIGIN: process.env.APP_ORIGIN ?? `http://127.0.0.1:${port}`,
      SESSION_SECRET: process.env.SESSION_SECRET ?? keptSecret(options.dataDir),
      WEB_DIR: options.webDir,
      LOG_LEVEL: process.env.LOG_LEVEL ?? 'warn',
    });
    return services.started.join(', ');
  };
  const databaseUrl = () => env.DATABASE_URL ?? process.env.DATABASE_URL ?? '';
  const serve = async () => {
    // Loaded only now: the services start while nothing else has to be read.
    const { listen } = await import('./listen');
    server = await listen({ ...process.env, ...env }, services?.mail ?? null, here);
    return undefined;
  };
  const steps: Product['steps'] = [
    ['services', prepare],
    ['migrations', () => migrate(databaseUrl())],
    ...(givenDatabase
      ? []
      : ([['demo data', () => loadDemo(env, options.dataDir)]] satisfies Product['steps'])),
    [here ? 'server' : 'mail pages', serve],
  ];
  return {
    steps,
    found: () => ({
      address: `http://127.0.0.1:${port}`,
      databaseUrl: databaseUrl(),
      mail: services?.mail == null ? null : `http://127.0.0.1:${port}/local/mail`,
      signIns: givenDatabase ? [] : demoPeople(),
    }),
    apart: () => ({ apiPort: Number(env.PORT), mailPort: server?.port ?? 0, env }),
    stop: async () => {
      await server?.stop();
      await services?.stop();
    },
  };
}
