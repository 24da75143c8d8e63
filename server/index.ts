import { createServer } from 'node:http';
import pino from 'pino';
import { createApp } from './app';
import { makeDataSource } from './db/data-source';
import { readEnv, type Env } from './env';
import { startWork } from './features/work';
import { startJobs } from './jobs/jobs';
import { makeStorage } from './storage/storage';

async function serve(env: Env): Promise<void> {
  const log = pino({ level: env.LOG_LEVEL });
  const db = await makeDataSource(env.DATABASE_URL).initialize();
  if (env.MIGRATE === '1') await db.runMigrations();
  const storage = makeStorage(env);
  await storage.ensureBucket();
  const jobs = await startJobs(env, log);
  const deps = { env, db, storage, jobs, log, now: () => new Date() };
  const app = createApp(deps);
  await startWork(deps);
  const server = createServer(app);
  server.once('error', (error: NodeJS.ErrnoException) => {
    const taken = error.code === 'EADDRINUSE';
    process.stderr.write(
      taken ? `Port ${env.PORT} is taken. Set PORT to another one.\n` : `${error.message}\n`,
    );
    process.exit(1);
  });
  server.listen(env.PORT, env.HOST, () => log.info({ port: env.PORT }, 'listening'));
  let stopping = false;
  const stop = async () => {
    if (stopping) return;
    stopping = true;
    const closed = new Promise<void>((resolve) => server.close(() => resolve()));
    server.closeIdleConnections();
    await Promise.race([closed, new Promise((resolve) => setTimeout(resolve, 5000).unref())]);
    await jobs.stop();
    await db.destroy();
    process.exit(0);
  };
  process.on('SIGTERM', () => void stop());
  process.on('SIGINT', () => void stop());
}

async function main(): Promise<void> {
  let env: Env;
  try {
    env = readEnv(process.env);
  } catch (error) {
    process.stderr.write(`${(error as Error).message}\n`);
    process.exit(2);
  }
  await serve(env);
}

main().catch((error: unknown) => {
  process.stderr.write(
    `The server could not start: ${error instanceof Error ? error.message : String(error)}\n`,
  );
  process.exit(1);
});
