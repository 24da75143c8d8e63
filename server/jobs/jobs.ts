import PgBoss from 'pg-boss';
import { type Logger } from 'pino';
import { type EntityManager } from 'typeorm';
import { v7 as uuid } from 'uuid';
import { type Env } from '../env';
import { type Letter } from '../mail/letters';
import { makeMailer, type AddressedLetter } from '../mail/mailer';

const mailQueue = 'mail';

/** Work that can wait, kept in PostgreSQL. */
export interface Jobs {
  /** Queues a letter; with a manager it joins that transaction. */
  mail(to: string, letter: Letter, manager?: EntityManager): Promise<void>;
  stop(): Promise<void>;
}

/** Starts the queue and its workers. Several processes may run them. */
export async function startJobs(env: Env, log: Logger): Promise<Jobs> {
  const boss = new PgBoss({ connectionString: env.DATABASE_URL, schema: 'pgboss', max: 3 });
  boss.on('error', (error) => log.error({ err: error }, 'jobs'));
  await boss.start();
  await boss.createQueue(mailQueue, {
    name: mailQueue,
    retryLimit: 8,
    retryBackoff: true,
    retryDelay: 2,
  });
  const mailer = makeMailer(env);
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
      const db = manager
        ? {
            executeSql: async (text: string, values: unknown[]) => ({
              rows: await manager.query<unknown[]>(text, values),
            }),
          }
        : undefined;
      await boss.send(mailQueue, data, db ? { db } : {});
    },
    async stop() {
      await boss.stop({ graceful: true, timeout: 5000, wait: true });
      mailer.close();
    },
  };
}
