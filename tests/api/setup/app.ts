import { randomUUID } from 'node:crypto';
import pino from 'pino';
import request from 'supertest';
import { v7 as uuid } from 'uuid';
import { type Role } from '../../../shared/api/accounts';
import { createApp } from '../../../server/app';
import { makeDataSource } from '../../../server/db/data-source';
import { PersonEntity } from '../../../server/db/entities/person';
import { type Deps } from '../../../server/deps';
import { readEnv } from '../../../server/env';
import { hashPassword } from '../../../server/features/accounts/passwords';
import { startWork } from '../../../server/features/work';
import { startNoticeWork } from '../../../server/features/notices/work';
import { startJobs } from '../../../server/jobs/jobs';
import { databaseUrl, startMailCatcher, templateName, type MailCatcher } from './services';
import { makeStorage } from '../../../server/storage/storage';

export const password = 'a long enough phrase';

export interface TestApp {
  deps: Deps;
  mail: MailCatcher;
  /** A request from nobody, with the application's own header. */
  anonymous(): ReturnType<typeof request.agent>;
  person(roles?: Role[], confirmed?: boolean): Promise<PersonEntity>;
  /** An agent signed in as the person. */
  as(person: PersonEntity): Promise<ReturnType<typeof request.agent>>;
  close(): Promise<void>;
}

/** The real application on services of its own: PostgreSQL, object store, mail. */
export async function testApp({
  rateFactor = 10_000,
  mediaWork = false,
  noticeWork = false,
} = {}): Promise<TestApp> {
  const shared = process.env.SCANTLING_TEST_DATABASE;
  const store = process.env.SCANTLING_TEST_STORE;
  if (!shared || !store) throw new Error('API tests run as a Jest project: npm run test:api');
  const name = `t_${randomUUID().replaceAll('-', '')}`;
  const root = await makeDataSource(shared, 1).initialize();
  await root.query(`CREATE DATABASE ${name} TEMPLATE ${templateName}`);
  const mail = await startMailCatcher({});
  const env = readEnv({
    NODE_ENV: 'test',
    DATABASE_URL: databaseUrl(shared, name),
    S3_ENDPOINT: store,
    SMTP_URL: mail.url,
    SESSION_SECRET: randomUUID(),
    LOG_LEVEL: 'silent',
    RATE_FACTOR: String(rateFactor),
  });
  const log = pino({ level: 'silent' });
  const db = await makeDataSource(env.DATABASE_URL, 5).initialize();
  const storage = makeStorage(env);
  await storage.ensureBucket();
  const jobs = await startJobs(env, log);
  const deps: Deps = { env, db, storage, jobs, log, now: () => new Date() };
  const app = createApp(deps);
  if (mediaWork) await startWork(deps);
  if (noticeWork) await startNoticeWork(deps);
  const passwordHash = await hashPassword(password);
  const agent = () => request.agent(app).set('X-Scantling', '1');
  return {
    deps,
    mail,
    anonymous: agent,
    async person(roles = ['viewer'], confirmed = true) {
      const id = uuid();
      const people = db.getRepository(PersonEntity);
      return people.save(
        people.create({
          id,
          email: `${id}@chalk-end.example`,
          emailConfirmedAt: confirmed ? new Date() : null,
          displayName: `Person ${id.slice(-4)}`,
          handle: `p-${id.slice(-12)}`,
          shopName: null,
          passwordHash,
          roles,
          preferences: { units: 'in', inchGrid: 16 },
          suspendedUntil: null,
          suspendedFor: null,
        }),
      );
    },
    async as(person) {
      const signedIn = agent();
      const answer = await signedIn.post('/api/sessions').send({ email: person.email, password });
      if (answer.status !== 200) throw new Error(`sign-in: ${answer.status}`);
      return signedIn;
    },
    async close() {
      await jobs.stop();
      await db.destroy();
      await mail.stop();
      await root.query(`DROP DATABASE ${name} WITH (FORCE)`);
      await root.destroy();
    },
  };
}
