import PgBoss from 'pg-boss';
import { type Logger } from 'pino';
import { type EntityManager } from 'typeorm';
import { v7 as uuid } from 'uuid';
import { type Env } from '../env';
import { type Letter } from '../mail/letters';
import { makeMailer, type AddressedLetter } from '../mail/mailer';

const mailQueue = 'mail';

export interface Turn {
  /** Aborted when the process is about to end. */
  signal: AbortSignal;
  /** It is not tried again after this. */
  last: boolean;
}

/** A kind of work: its queue, how often it is tried again, and what does it. */
export interface Work<T extends object> {
  queue: string;
  /** Tries after the first one, with growing pauses from `retryDelay` seconds on. */
  retryLimit: number;
  retryDelay: number;
  /** Throws to be tried again. */
  run(data: T, turn: Turn): Promise<void>;
  /** Cron line for work that comes round by itself, without data. */
  every?: string;
}

/** Work that can wait, kept in PostgreSQL. */
export interface Jobs {
  /** Queues a letter; with a manager it joins that transaction. */
  mail(to: string, letter: Letter, manager?: EntityManager): Promise<void>;
  /** Queues work, once per key while it waits; with a manager it joins that transaction. */
  send(queue: string, key: string, data: object, manager?: EntityManager): Promise<void>;
  /** Does work of a kind in this process, one at a time. */
  work<T extends object>(work: Work<T>): Promise<void>;
  stop(): Promise<void>;
}

const within = (manager: EntityManager | undefined) =>
  manager
    ? {
        db: {
          executeSql: async (text: string, values: unknown[]) => ({
            rows: await manager.query<unknown[]>(text, values),
          }),
        },
      }
    : {};

async function startWork<T extends object>(boss: PgBoss, stopping: AbortSignal, work: Work<T>) {
  const { queue, retryLimit, retryDelay } = work;
  // A process that dies does not end its job; whoever cares keeps a lease and sweeps (features/media/work).
  const options = { retryLimit, retryDelay, retryBackoff: true, expireInHours: 23 };
  await boss.createQueue(queue, { name: queue, policy: 'short', ...options });
  await boss.work<T>(
    queue,
    { batchSize: 1, pollingIntervalSeconds: 0.5, includeMetadata: true },
    async (batch) => {
      for (const { data, retryCount } of batch)
        await work.run(data, { signal: stopping, last: retryCount >= retryLimit });
    },
  );
  if (work.every) await boss.schedule(queue, work.every);
}

/** Starts the queue and its workers. Several processes may run them. */
export async function startJobs(env: Env, log: Logger): Promise<Jobs> {
  const boss = new PgBoss({ connectionString: env.DATABASE_URL, schema: 'pgboss', max: 4 });
  boss.on('error', (error) => log.error({ err: error }, 'jobs'));
  await boss.start();
  await boss.createQueue(mailQueue, {
    name: mailQueue,
    retryLimit: 8,
    retryBackoff: true,
    retryDelay: 2,
  });
  const mailer = makeMailer(env);
  const stopping = new AbortController();
  await boss.work<AddressedLetter>(
    mailQueue,
    { batchSize: 1, pollingIntervalSeconds: 0.5 },
    async (batch) => {
      for (const job of batch) await mailer.send(job.data);
    },
  );
  return {
    async mail(to, letter, manager) {
      const data: AddressedLetter = { ...letter, to, messageId: `<${uuid()}@scantling.example>` };
      await boss.send(mailQueue, data, within(manager));
    },
    async send(queue, key, data, manager) {
      await boss.send(queue, data, { singletonKey: key, ...within(manager) });
    },
    work: (work) => startWork(boss, stopping.signal, work),
    async stop() {
      stopping.abort();
      await boss.stop({ graceful: true, timeout: 5000, wait: true });
      mailer.close();
    },
  };
}
