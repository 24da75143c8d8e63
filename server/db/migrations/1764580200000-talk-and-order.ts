import { type MigrationInterface, type QueryRunner } from 'typeorm';

/** Comments, reports, cases, rulings and the append-only log. */
export class TalkAndOrder1764580200000 implements MigrationInterface {
  name = 'TalkAndOrder1764580200000';

  async up(q: QueryRunner): Promise<void> {
    await q.query(`
      CREATE TABLE comments (
        id uuid PRIMARY KEY,
        plan_id uuid NOT NULL REFERENCES plans(id) ON DELETE CASCADE,
        letter text NOT NULL,
        kind text NOT NULL CHECK (kind IN ('critique','question','answer')),
        anchor_on text NOT NULL CHECK (anchor_on IN ('plan','step','part','dimension')),
        anchor_element_id uuid,
        stance text CHECK (stance IN ('keep','change')),
        text text NOT NULL,
        why text NOT NULL,
        author_id uuid NOT NULL REFERENCES people(id) ON DELETE CASCADE,
        parent_id uuid REFERENCES comments(id) ON DELETE CASCADE,
        settled_by uuid REFERENCES comments(id) ON DELETE SET NULL,
        state text NOT NULL CHECK (state IN ('shown','deleted','hidden','removed')),
        created_at timestamptz NOT NULL DEFAULT now(),
        edited_at timestamptz,
        CHECK ((kind = 'answer') = (parent_id IS NOT NULL))
      )`);
    await q.query(
      `CREATE INDEX comments_plan ON comments (plan_id, created_at DESC, id DESC) WHERE parent_id IS NULL`,
    );
    await q.query(
      `CREATE INDEX comments_parent ON comments (parent_id, created_at) WHERE parent_id IS NOT NULL`,
    );
    await q.query(`
      CREATE TABLE comment_versions (
        id bigint GENERATED ALWAYS AS IDENTITY PRIMARY KEY,
        comment_id uuid NOT NULL REFERENCES comments(id) ON DELETE CASCADE,
        text text NOT NULL,
        why text NOT NULL,
        until timestamptz NOT NULL DEFAULT now()
      )`);
    await q.query(`
      CREATE TABLE cases (
        id uuid PRIMARY KEY,
        number integer GENERATED ALWAYS AS IDENTITY,
        subject_kind text NOT NULL CHECK (subject_kind IN ('comment','plan','person')),
        subject_id uuid NOT NULL,
        harm integer NOT NULL,
        state text NOT NULL CHECK (state IN ('open','ruled')),
        worked_by uuid REFERENCES people(id) ON DELETE SET NULL,
        opened_at timestamptz NOT NULL DEFAULT now()
      )`);
    await q.query(
      `CREATE UNIQUE INDEX cases_one_open ON cases (subject_kind, subject_id) WHERE state = 'open'`,
    );
    await q.query(`CREATE INDEX cases_queue ON cases (state, harm, opened_at, number)`);
    await q.query(`
      CREATE TABLE reports (
        id uuid PRIMARY KEY,
        case_id uuid NOT NULL REFERENCES cases(id) ON DELETE CASCADE,
        problem text NOT NULL,
        reason text NOT NULL,
        person_id uuid REFERENCES people(id) ON DELETE SET NULL,
        email text,
        created_at timestamptz NOT NULL DEFAULT now()
      )`);
    await q.query(`CREATE INDEX reports_case ON reports (case_id, created_at)`);
    await q.query(`
      CREATE TABLE rulings (
        id uuid PRIMARY KEY,
        case_id uuid NOT NULL REFERENCES cases(id) ON DELETE CASCADE,
        act text NOT NULL CHECK (act IN ('no-action','hide','remove','suspend')),
        rule text,
        reasons text NOT NULL,
        until timestamptz,
        moderator_id uuid NOT NULL REFERENCES people(id) ON DELETE RESTRICT,
        created_at timestamptz NOT NULL DEFAULT now()
      )`);
    await q.query(`CREATE INDEX rulings_case ON rulings (case_id, created_at)`);
    await q.query(`
      CREATE TABLE log (
        id bigint GENERATED ALWAYS AS IDENTITY PRIMARY KEY,
        at timestamptz NOT NULL DEFAULT now(),
        act text NOT NULL,
        actor_id uuid,
        subject_id text NOT NULL,
        text_hash text NOT NULL,
        previous text NOT NULL,
        hash text NOT NULL
      )`);
    await q.query(`CREATE INDEX log_subject ON log (subject_id, id)`);
    await q.query(`CREATE TABLE log_texts (
      log_id bigint PRIMARY KEY REFERENCES log(id) ON DELETE RESTRICT, text text NOT NULL)`);
    await q.query(`CREATE TRIGGER log_append BEFORE UPDATE OR DELETE ON log
      FOR EACH ROW EXECUTE FUNCTION refuse_change()`);
    await q.query(`CREATE TRIGGER log_no_truncate BEFORE TRUNCATE ON log
      FOR EACH STATEMENT EXECUTE FUNCTION refuse_change()`);
  }

  async down(q: QueryRunner): Promise<void> {
    for (const table of [
      'log_texts',
      'log',
      'rulings',
      'reports',
      'cases',
      'comment_versions',
      'comments',
    ]) {
      await q.query(`DROP TABLE ${table}`);
    }
  }
}
