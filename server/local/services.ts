import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { createConnection } from 'node:net';
import { join } from 'node:path';
import { freePort } from './free-port';
import { startMailCatcher, type MailCatcher } from './mail-catcher';
import { localStoreKeys, startObjectStore } from './object-store';
import { startPostgres } from './postgres';

export interface LocalServices {
  /** Settings that lead the server to what was started; empty for what was already given. */
  env: Record<string, string>;
  /** Null when SMTP_URL was given. */
  mail: MailCatcher | null;
  /** Names of what was started, for the reader. */
  started: string[];
  stop(): Promise<void>;
}

export interface ServicesOptions {
  /** Where the data stays between runs; left out for throw-away services in tmp. */
  dir?: string;
  /** The environment: what it names is not started. */
  given: NodeJS.ProcessEnv;
}

export const localBucket = 'scantling';

type Stop = () => Promise<void>;
type Names = 'postgres' | 'store' | 'mail';

const answers = (port: number) =>
  new Promise<boolean>((resolve) => {
    const socket = createConnection({ port, host: '127.0.0.1' });
    socket.once('connect', () => {
      socket.destroy();
      resolve(true);
    });
    socket.once('error', () => {
      resolve(false);
    });
  });

/**
 * Ports that stay the same from start to start while they are free: pictures kept for offline use
 * are named by their origin.
 */
async function keptPorts(dir: string | undefined): Promise<Record<Names, number>> {
  const file = dir === undefined ? '' : join(dir, 'ports.json');
  const kept = existsSync(file)
    ? (JSON.parse(readFileSync(file, 'utf8')) as Partial<Record<Names, number>>)
    : {};
  const portFor = async (name: Names) => {
    const port = kept[name];
    return port !== undefined && !(await answers(port)) ? port : freePort();
  };
  const ports = {
    postgres: await portFor('postgres'),
    store: await portFor('store'),
    mail: await portFor('mail'),
  };
  if (dir !== undefined) {
    mkdirSync(dir, { recursive: true });
    writeFileSync(file, JSON.stringify(ports));
  }
  return ports;
}

/** Starts PostgreSQL, the object store and the mail catcher, each unless the environment names one. */
export async function startServices({ dir, given }: ServicesOptions): Promise<LocalServices> {
  const stops: Stop[] = [];
  const started: string[] = [];
  const env: Record<string, string> = {};
  const ports = await keptPorts(dir);
  const place = (name: string) => (dir === undefined ? undefined : join(dir, name));
  const stop = async () => {
    await Promise.all(stops.map((end) => end()));
  };
  const postgres = async () => {
    const wanted = { dir: place('postgres'), port: ports.postgres, durable: dir !== undefined };
    const running = await startPostgres(wanted);
    stops.push(() => running.stop());
    started.push(`PostgreSQL :${String(running.port)}`);
    env.DATABASE_URL = running.url;
  };
  const store = async () => {
    const running = await startObjectStore({
      dir: place('objects'),
      port: ports.store,
      buckets: [localBucket],
    });
    stops.push(() => running.stop());
    started.push(`object store :${String(running.port)}`);
    Object.assign(env, {
      S3_ENDPOINT: running.endpoint,
      S3_BUCKET: localBucket,
      S3_REGION: 'us-east-1',
      S3_ACCESS_KEY: localStoreKeys.accessKeyId,
      S3_SECRET_KEY: localStoreKeys.secretAccessKey,
      MEDIA_ORIGIN: running.endpoint,
    });
  };
  let mail: MailCatcher | null = null;
  const catcher = async () => {
    const running = await startMailCatcher({ dir: place('mail'), port: ports.mail });
    mail = running;
    stops.push(() => running.stop());
    started.push(`mail :${String(running.port)}`);
    env.SMTP_URL = running.url;
  };
  const wanted = [
    ...(given.DATABASE_URL ? [] : [postgres()]),
    ...(given.S3_ENDPOINT ? [] : [store()]),
    ...(given.SMTP_URL ? [] : [catcher()]),
  ];
  const results = await Promise.allSettled(wanted);
  const failure = results.find((result) => result.status === 'rejected');
  if (failure !== undefined) {
    await stop();
    throw failure.reason;
  }
  return { env, mail, started, stop };
}
