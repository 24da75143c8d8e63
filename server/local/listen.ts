import express from 'express';
import { createServer, type RequestListener, type Server } from 'node:http';
import pino from 'pino';
import { createApp } from '../app';
import { makeDataSource } from '../db/data-source';
import { readEnv } from '../env';
import { startWork } from '../features/work';
import { startJobs } from '../jobs/jobs';
import { makeStorage } from '../storage/storage';
import { type MailCatcher } from './mail-catcher';
import { mailCatcherRouter } from './mail-routes';

export interface Listening {
  port: number;
  stop(): Promise<void>;
}

type Close = () => Promise<void>;

function open(server: Server, port: number, host: string): Promise<number> {
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, host, () => {
      const address = server.address();
      resolve(address !== null && typeof address === 'object' ? address.port : port);
    });
  });
}

async function application(
  source: Record<string, string | undefined>,
): Promise<{ app: RequestListener; close: Close }> {
  const env = readEnv(source);
  const log = pino({ level: env.LOG_LEVEL });
  const db = await makeDataSource(env.DATABASE_URL).initialize();
  const storage = makeStorage(env);
  await storage.ensureBucket();
  const jobs = await startJobs(env, log);
  const deps = { env, db, storage, jobs, log, now: () => new Date() };
  const app = createApp(deps);
  await startWork(deps);
  const close = async () => {
    await jobs.stop();
    await db.destroy();
  };
  return { app, close };
}

/**
 * Listens with the application and, in development, the pages of caught mail before it; with
 * `whole` false with the mail pages alone, on any free port.
 */
export async function listen(
  source: Record<string, string | undefined>,
  mail: MailCatcher | null,
  whole: boolean,
): Promise<Listening> {
  const { app, close } = whole
    ? await application(source)
    : { app: express(), close: () => Promise.resolve() };
  const pages = express().disable('x-powered-by');
  if (mail !== null && source.NODE_ENV !== 'production') pages.use(mailCatcherRouter(mail));
  // Not mounted inside the application: the pages have a stricter policy and no session.
  const server = createServer((request, response) => {
    if (/^\/local(\/|\?|$)/.test(request.url ?? '')) pages(request, response);
    else app(request, response);
  });
  const port = await open(server, whole ? Number(source.PORT) : 0, source.HOST ?? '127.0.0.1');
  return {
    port,
    stop: async () => {
      const closed = new Promise((resolve) => server.close(resolve));
      server.closeAllConnections();
      await closed;
      await close();
    },
  };
}
