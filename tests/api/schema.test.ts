import { testApp, type TestApp } from './setup/app';

let app: TestApp;
beforeAll(async () => {
  app = await testApp();
}, 60_000);
afterAll(async () => {
  await app.close();
}, 30_000);

/** Keys, checks and indexes are the migrations' alone; entities describe tables and columns. */
const ofMigrations = /DROP (?:CONSTRAINT|INDEX) /;

it('finds every table and column as the entities describe them', async () => {
  const { upQueries } = await app.deps.db.driver.createSchemaBuilder().log();
  expect(upQueries.map((q) => q.query).filter((q) => !ofMigrations.test(q))).toEqual([]);
});

it('goes all the way down and up again', async () => {
  const { db } = app.deps;
  const count = db.migrations.length;
  for (let i = 0; i < count; i += 1) await db.undoLastMigration();
  const left: { table_name: string }[] = await db.query(
    `SELECT table_name FROM information_schema.tables WHERE table_schema = 'public' AND table_name <> 'migrations'`,
  );
  expect(left).toEqual([]);
  expect(await db.runMigrations()).toHaveLength(count);
});
