import { type DataSource } from 'typeorm';
import { type Entry } from '../../../shared/plan/bench/entry';
import { BenchCopyEntity, BenchEntryEntity } from '../../db/entities/bench';

export interface EntryRow {
  entry: Entry;
  sequence: string;
  received_at: Date;
}

export const findCopy = (db: DataSource, id: string): Promise<BenchCopyEntity | null> =>
  db.getRepository(BenchCopyEntity).findOneBy({ id });
export const copiesOf = (db: DataSource, personId: string): Promise<BenchCopyEntity[]> =>
  db.getRepository(BenchCopyEntity).find({ where: { personId }, order: { startedAt: 'DESC' } });

/** Entries of a copy after a sequence, in order. */
export const entriesOf = (db: DataSource, copyId: string, after = 0): Promise<EntryRow[]> =>
  db.query(
    `SELECT entry, sequence, received_at FROM bench_entries WHERE copy_id = $1 AND sequence > $2 ORDER BY sequence`,
    [copyId, after],
  );

export async function findEntry(
  db: DataSource,
  copyId: string,
  id: string,
): Promise<EntryRow | null> {
  const rows: EntryRow[] = await db.query(
    `SELECT entry, sequence, received_at FROM bench_entries WHERE copy_id = $1 AND id = $2`,
    [copyId, id],
  );
  return rows[0] ?? null;
}

/** Adds an entry unless its id is there; null when it is. */
export async function addEntry(
  db: DataSource,
  copyId: string,
  entry: Entry,
): Promise<EntryRow | null> {
  const rows: EntryRow[] = await db.query(
    `INSERT INTO bench_entries (copy_id, id, entry) VALUES ($1,$2,$3) ON CONFLICT (copy_id, id) DO NOTHING RETURNING entry, sequence, received_at`,
    [copyId, entry.id, JSON.stringify(entry)],
  );
  return rows[0] ?? null;
}

export const countEntries = (db: DataSource, copyId: string): Promise<number> =>
  db.getRepository(BenchEntryEntity).countBy({ copyId });
