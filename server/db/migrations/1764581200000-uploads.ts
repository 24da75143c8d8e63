import { type MigrationInterface, type QueryRunner } from 'typeorm';

/** Files on their way into the store, and the ledger of their parts, since not every store can list them. */
export class Uploads1764581200000 implements MigrationInterface {
  async up(q: QueryRunner): Promise<void> {
    await q.query(`
      CREATE TABLE uploads (
        id uuid PRIMARY KEY,
        person_id uuid NOT NULL REFERENCES people(id) ON DELETE CASCADE,
        plan_id uuid,
        name text NOT NULL,
        mark text NOT NULL,
        bytes bigint NOT NULL,
        part_bytes integer NOT NULL,
        key text NOT NULL,
        store_id text NOT NULL,
        state text NOT NULL CHECK (state IN ('open','waiting','working','done','refused','failed')),
        reason text,
        hash text,
        lease_until timestamptz,
        created_at timestamptz NOT NULL DEFAULT now(),
        touched_at timestamptz NOT NULL DEFAULT now()
      )`);
    await q.query(`CREATE INDEX uploads_person ON uploads (person_id, created_at DESC)`);
    await q.query(`CREATE INDEX uploads_undone ON uploads (touched_at) WHERE state <> 'done'`);
    await q.query(`
      CREATE TABLE upload_parts (
        upload_id uuid NOT NULL REFERENCES uploads(id) ON DELETE CASCADE,
        number integer NOT NULL,
        etag text NOT NULL,
        bytes bigint NOT NULL,
        PRIMARY KEY (upload_id, number)
      )`);
  }

  async down(q: QueryRunner): Promise<void> {
    await q.query(`DROP TABLE upload_parts`);
    await q.query(`DROP TABLE uploads`);
  }
}
