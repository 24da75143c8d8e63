import { type MigrationInterface, type QueryRunner } from 'typeorm';

/** Plans, frozen revisions, derived cards, media, bench copies and their entries, shop cards. */
export class Plans1764580100000 implements MigrationInterface {
  name = 'Plans1764580100000';

  async up(q: QueryRunner): Promise<void> {
    await q.query(`
      CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
      BEGIN
        RAISE EXCEPTION '% is append-only', TG_TABLE_NAME USING ERRCODE = '55006';
      END $$`);
    await q.query(`
      CREATE TABLE plans (
        id uuid PRIMARY KEY,
        owner_id uuid NOT NULL REFERENCES people(id) ON DELETE CASCADE,
        slug text,
        draft jsonb NOT NULL,
        version integer NOT NULL,
        state text NOT NULL CHECK (state IN ('draft','published','unpublished','hidden','removed')),
        current_revision_id uuid,
        created_at timestamptz NOT NULL DEFAULT now(),
        updated_at timestamptz NOT NULL DEFAULT now()
      )`);
    await q.query(`CREATE UNIQUE INDEX plans_slug ON plans (slug)`);
    await q.query(`CREATE INDEX plans_owner ON plans (owner_id, updated_at DESC)`);
    await q.query(`
      CREATE TABLE revisions (
        id uuid PRIMARY KEY,
        plan_id uuid NOT NULL REFERENCES plans(id) ON DELETE CASCADE,
        letter text NOT NULL,
        document jsonb NOT NULL,
        sha256 text NOT NULL,
        note text NOT NULL,
        overrides jsonb NOT NULL,
        published_at timestamptz NOT NULL
      )`);
    await q.query(`CREATE UNIQUE INDEX revisions_letter ON revisions (plan_id, letter)`);
    await q.query(`ALTER TABLE plans ADD CONSTRAINT plans_current_revision
      FOREIGN KEY (current_revision_id) REFERENCES revisions(id) ON DELETE SET NULL`);
    await q.query(`CREATE TRIGGER revisions_frozen BEFORE UPDATE ON revisions
      FOR EACH ROW EXECUTE FUNCTION refuse_change()`);
    await q.query(`
      CREATE TABLE plan_cards (
        plan_id uuid PRIMARY KEY REFERENCES plans(id) ON DELETE CASCADE,
        title text NOT NULL,
        summary text NOT NULL,
        cover text,
        cover_alt text NOT NULL,
        category text NOT NULL,
        skill text NOT NULL,
        units text NOT NULL,
        steps integer NOT NULL,
        hands_on double precision NOT NULL,
        elapsed double precision NOT NULL,
        machines text[] NOT NULL,
        clip_duration double precision,
        words tsvector NOT NULL
      )`);
    await q.query(`CREATE INDEX plan_cards_words ON plan_cards USING gin (words)`);
    await q.query(`
      CREATE TABLE media (
        hash text PRIMARY KEY,
        kind text NOT NULL CHECK (kind IN ('clip','photo','captions')),
        type text NOT NULL,
        bytes bigint NOT NULL,
        width integer,
        height integer,
        duration double precision,
        renditions jsonb NOT NULL,
        created_at timestamptz NOT NULL DEFAULT now()
      )`);
    await q.query(`
      CREATE TABLE media_owners (
        hash text NOT NULL REFERENCES media(hash) ON DELETE CASCADE,
        person_id uuid NOT NULL REFERENCES people(id) ON DELETE CASCADE,
        name text NOT NULL,
        created_at timestamptz NOT NULL DEFAULT now(),
        PRIMARY KEY (hash, person_id)
      )`);
    await q.query(`
      CREATE TABLE media_uses (
        hash text NOT NULL,
        plan_id uuid NOT NULL REFERENCES plans(id) ON DELETE CASCADE,
        PRIMARY KEY (hash, plan_id)
      )`);
    await q.query(`
      CREATE TABLE bench_copies (
        id uuid PRIMARY KEY,
        person_id uuid NOT NULL REFERENCES people(id) ON DELETE CASCADE,
        plan_id uuid NOT NULL REFERENCES plans(id) ON DELETE CASCADE,
        revision_id uuid NOT NULL REFERENCES revisions(id) ON DELETE CASCADE,
        started_at timestamptz NOT NULL DEFAULT now()
      )`);
    await q.query(`CREATE INDEX bench_copies_person ON bench_copies (person_id, started_at DESC)`);
    await q.query(`CREATE INDEX bench_copies_plan ON bench_copies (plan_id)`);
    await q.query(`
      CREATE TABLE bench_entries (
        copy_id uuid NOT NULL REFERENCES bench_copies(id) ON DELETE CASCADE,
        id uuid NOT NULL,
        sequence bigint GENERATED ALWAYS AS IDENTITY,
        entry jsonb NOT NULL,
        received_at timestamptz NOT NULL DEFAULT now(),
        PRIMARY KEY (copy_id, id)
      )`);
    await q.query(
      `CREATE UNIQUE INDEX bench_entries_sequence ON bench_entries (copy_id, sequence)`,
    );
    await q.query(`CREATE TRIGGER bench_entries_append BEFORE UPDATE ON bench_entries
      FOR EACH ROW EXECUTE FUNCTION refuse_change()`);
    await q.query(`
      CREATE TABLE shop_cards (
        person_id uuid PRIMARY KEY REFERENCES people(id) ON DELETE CASCADE,
        version integer NOT NULL,
        card jsonb NOT NULL
      )`);
  }

  async down(q: QueryRunner): Promise<void> {
    await q.query(`DROP TABLE shop_cards`);
    await q.query(`DROP TABLE bench_entries`);
    await q.query(`DROP TABLE bench_copies`);
    await q.query(`DROP TABLE media_uses`);
    await q.query(`DROP TABLE media_owners`);
    await q.query(`DROP TABLE media`);
    await q.query(`DROP TABLE plan_cards`);
    await q.query(`ALTER TABLE plans DROP CONSTRAINT plans_current_revision`);
    await q.query(`DROP TABLE revisions`);
    await q.query(`DROP TABLE plans`);
    await q.query(`DROP FUNCTION refuse_change()`);
  }
}
