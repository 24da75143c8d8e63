import { mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { makeDataSource } from '../../../server/db/data-source';
import { startMailCatcher, type MailCatcher } from '../../../server/local/mail-catcher';
import { startObjectStore } from '../../../server/local/object-store';
import { startPostgres } from '../../../server/local/postgres';

/** The database every test application is cloned from. */
export const templateName = 'scantling_template';

export interface SharedServices {
  dir: string;
  stop(): Promise<void>;
}

declare global {
  var scantlingServices: SharedServices | undefined;
}

/** The address of another database of the same cluster. */
export function databaseUrl(url: string, name: string): string {
  const address = new URL(url);
  address.pathname = `/${name}`;
  return address.toString();
}

async function migrateTemplate(url: string): Promise<void> {
  const root = await makeDataSource(url, 1).initialize();
  await root.query(`CREATE DATABASE ${templateName}`);
  await root.destroy();
  const template = await makeDataSource(databaseUrl(url, templateName), 1).initialize();
  await template.runMigrations();
  // A template must have nobody connected when it is cloned.
  await template.destroy();
}

/** PostgreSQL with the migrated template, and the object store, once for all API tests. */
export default async function startServices(): Promise<void> {
  const dir = mkdtempSync(join(tmpdir(), 'scantling-api-'));
  const postgres = await startPostgres({ dir: join(dir, 'pg'), durable: false });
  const store = await startObjectStore({ dir: join(dir, 's3'), buckets: ['scantling'] });
  await migrateTemplate(postgres.url);
  process.env.SCANTLING_TEST_DATABASE = postgres.url;
  process.env.SCANTLING_TEST_STORE = store.endpoint;
  globalThis.scantlingServices = {
    dir,
    stop: async () => {
      await store.stop();
      await postgres.stop();
    },
  };
}

export { startMailCatcher, type MailCatcher };
