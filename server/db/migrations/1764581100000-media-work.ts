import { type MigrationInterface, type QueryRunner } from 'typeorm';

/** Work on media: its state, what the file was before the work, and a lease so that one process does it. */
export class MediaWork1764581100000 implements MigrationInterface {
  async up(q: QueryRunner): Promise<void> {
    await q.query(`
      ALTER TABLE media
        ADD COLUMN state text NOT NULL DEFAULT 'ready'
          CHECK (state IN ('waiting','working','ready','refused','failed')),
        ADD COLUMN reason text,
        ADD COLUMN progress smallint NOT NULL DEFAULT 0,
        ADD COLUMN source_key text,
        ADD COLUMN lease_until timestamptz`);
    await q.query(
      `CREATE INDEX media_undone ON media (state) WHERE state IN ('waiting','working')`,
    );
    // Clips that came before there was any work on them are taken up by the next sweep.
    await q.query(`
      UPDATE media SET state = 'waiting', source_key = renditions->'original'->>'key'
      WHERE kind = 'clip' AND renditions ? 'original'`);
  }

  async down(q: QueryRunner): Promise<void> {
    await q.query(`DROP INDEX media_undone`);
    await q.query(`
      ALTER TABLE media DROP COLUMN state, DROP COLUMN reason, DROP COLUMN progress,
        DROP COLUMN source_key, DROP COLUMN lease_until`);
  }
}
