import { type MigrationInterface, type QueryRunner } from 'typeorm';

/** Corrections, notices to people, the letters they go out in, and what each person wants. */
export class Notices1764583000000 implements MigrationInterface {
  name = 'Notices1764583000000';

  async up(q: QueryRunner): Promise<void> {
    await q.query(`
      CREATE TABLE corrections (
        id uuid PRIMARY KEY,
        plan_id uuid NOT NULL REFERENCES plans(id) ON DELETE CASCADE,
        revision_id uuid NOT NULL REFERENCES revisions(id) ON DELETE CASCADE,
        reason text NOT NULL,
        safety boolean NOT NULL,
        reasons jsonb NOT NULL,
        created_at timestamptz NOT NULL DEFAULT now(),
        spread_at timestamptz
      )`);
    await q.query(`CREATE UNIQUE INDEX corrections_revision ON corrections (revision_id)`);
    await q.query(`CREATE INDEX corrections_plan ON corrections (plan_id, created_at)`);
    await q.query(
      `CREATE INDEX corrections_open ON corrections (created_at) WHERE spread_at IS NULL`,
    );
    await q.query(`
      CREATE TABLE letters (
        id uuid PRIMARY KEY,
        person_id uuid NOT NULL REFERENCES people(id) ON DELETE CASCADE,
        plan_id uuid REFERENCES plans(id) ON DELETE CASCADE,
        urgent boolean NOT NULL,
        state text NOT NULL CHECK (state IN ('waiting','sending','sent','dropped')),
        due_at timestamptz NOT NULL,
        lease_until timestamptz,
        tries integer NOT NULL DEFAULT 0,
        sent_at timestamptz
      )`);
    await q.query(`CREATE UNIQUE INDEX letters_open ON letters (person_id, plan_id)
      WHERE state = 'waiting' AND NOT urgent`);
    await q.query(
      `CREATE INDEX letters_due ON letters (due_at) WHERE state IN ('waiting','sending')`,
    );
    await q.query(`CREATE INDEX letters_sent ON letters (person_id, plan_id, sent_at)`);
    await q.query(`
      CREATE TABLE notices (
        id uuid PRIMARY KEY,
        person_id uuid NOT NULL REFERENCES people(id) ON DELETE CASCADE,
        kind text NOT NULL CHECK (kind IN ('safety','correction','answer','talk')),
        plan_id uuid REFERENCES plans(id) ON DELETE CASCADE,
        cause text NOT NULL,
        title text NOT NULL,
        text text NOT NULL,
        path text NOT NULL,
        shown boolean NOT NULL,
        letter_id uuid REFERENCES letters(id) ON DELETE SET NULL,
        created_at timestamptz NOT NULL DEFAULT now(),
        read_at timestamptz
      )`);
    await q.query(`CREATE UNIQUE INDEX notices_cause ON notices (person_id, cause)`);
    await q.query(`CREATE INDEX notices_person ON notices (person_id, created_at DESC, id DESC)`);
    await q.query(`CREATE INDEX notices_letter ON notices (letter_id)`);
    await q.query(`
      CREATE TABLE notice_settings (
        person_id uuid NOT NULL REFERENCES people(id) ON DELETE CASCADE,
        kind text NOT NULL CHECK (kind IN ('safety','correction','answer','talk')),
        mail boolean NOT NULL,
        product boolean NOT NULL,
        PRIMARY KEY (person_id, kind)
      )`);
  }

  async down(q: QueryRunner): Promise<void> {
    for (const table of ['notice_settings', 'notices', 'letters', 'corrections'])
      await q.query(`DROP TABLE ${table}`);
  }
}
