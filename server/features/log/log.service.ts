import { createHash } from 'node:crypto';
import { type DataSource, type EntityManager } from 'typeorm';

export interface LogRow {
  act: string;
  actorId: string | null;
  subjectId: string;
  /** Words for moderators; kept beside the chain so that they can be erased. */
  text: string;
}

const genesis = '0'.repeat(64);
const sha256 = (text: string) => createHash('sha256').update(text).digest('hex');

interface Link {
  act: string;
  actor_id: string | null;
  subject_id: string;
  text_hash: string;
  previous: string;
}
const hashOf = (l: Link): string =>
  sha256(JSON.stringify([l.previous, l.act, l.actor_id, l.subject_id, l.text_hash]));

/** Adds a row to the chain inside the caller's transaction; rows are added one after the other. */
export async function appendLog(manager: EntityManager, row: LogRow): Promise<void> {
  // One writer at a time: the chain has one end.
  await manager.query(`SELECT pg_advisory_xact_lock(7217)`);
  const last: { hash: string }[] = await manager.query(
    `SELECT hash FROM log ORDER BY id DESC LIMIT 1`,
  );
  const link: Link = {
    act: row.act,
    actor_id: row.actorId,
    subject_id: row.subjectId,
    text_hash: sha256(row.text),
    previous: last[0]?.hash ?? genesis,
  };
  const added: { id: string }[] = await manager.query(
    `INSERT INTO log (act, actor_id, subject_id, text_hash, previous, hash) VALUES ($1,$2,$3,$4,$5,$6) RETURNING id`,
    [link.act, link.actor_id, link.subject_id, link.text_hash, link.previous, hashOf(link)],
  );
  await manager.query(`INSERT INTO log_texts (log_id, text) VALUES ($1,$2)`, [
    added[0]!.id,
    row.text,
  ]);
}

export interface LogCheck {
  rows: number;
  /** Id of the first row that does not fit, or null. */
  brokenAt: string | null;
}

/** Walks the chain: every hash, every link, and every text that is still there. */
export async function verifyLog(db: DataSource): Promise<LogCheck> {
  const rows: (Link & { id: string; hash: string; text: string | null })[] = await db.query(
    `SELECT l.*, t.text FROM log l LEFT JOIN log_texts t ON t.log_id = l.id ORDER BY l.id`,
  );
  let previous = genesis;
  for (const row of rows) {
    const fits =
      row.previous === previous &&
      row.hash === hashOf(row) &&
      (row.text === null || sha256(row.text) === row.text_hash);
    if (!fits) return { rows: rows.length, brokenAt: row.id };
    previous = row.hash;
  }
  return { rows: rows.length, brokenAt: null };
}

/** Log rows about any of some things, oldest first, with their words. */
export function logOf(
  db: DataSource,
  subjectIds: string[],
): Promise<{ id: string; at: Date; act: string; actor_id: string | null; text: string | null }[]> {
  return db.query(
    `SELECT l.id, l.at, l.act, l.actor_id, t.text FROM log l LEFT JOIN log_texts t ON t.log_id = l.id WHERE l.subject_id = ANY($1) ORDER BY l.id`,
    [subjectIds],
  );
}
