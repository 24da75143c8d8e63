import { type DataSource } from 'typeorm';
import { type Entry } from '../../../shared/plan/bench/entry';
import { foldEntries } from '../../../shared/plan/bench/fold';
import { compareRevisions, type Comparison } from '../../../shared/plan/compare';
import { type PlanDocument } from '../../../shared/plan/document';
import { noticeOf, type Notice } from '../../../shared/plan/notice';
import { frozenRevision } from '../plans/frozen';

export interface CopyRow {
  id: string;
  person_id: string;
  revision_id: string;
}

const page = 200;

/** Bench copies of a plan on another revision than this one, page by page; the creator's own are left out. */
async function* copiesOn(
  db: DataSource,
  planId: string,
  except: string | null,
): AsyncGenerator<CopyRow[]> {
  for (let after = '00000000-0000-0000-0000-000000000000'; ;) {
    const rows: CopyRow[] = await db.query(
      `SELECT b.id, b.person_id, b.revision_id FROM bench_copies b JOIN plans p ON p.id = b.plan_id
       WHERE b.plan_id = $1 AND b.id > $2 AND b.revision_id IS DISTINCT FROM $3 AND b.person_id <> p.owner_id
       ORDER BY b.id LIMIT ${page}`,
      [planId, after, except],
    );
    if (rows.length > 0) yield rows;
    const last = rows[rows.length - 1];
    if (!last || rows.length < page) return;
    after = last.id;
  }
}

async function entriesOfAll(db: DataSource, copies: readonly CopyRow[]) {
  const rows: { copy_id: string; entry: Entry; sequence: string }[] = await db.query(
    `SELECT copy_id, entry, sequence FROM bench_entries WHERE copy_id = ANY($1) ORDER BY sequence`,
    [copies.map((c) => c.id)],
  );
  const byCopy = new Map<string, { entry: Entry; sequence: number }[]>();
  for (const { copy_id, entry, sequence } of rows) {
    const list = byCopy.get(copy_id) ?? [];
    list.push({ entry, sequence: Number(sequence) });
    byCopy.set(copy_id, list);
  }
  return byCopy;
}

export interface CopyNotice {
  copy: CopyRow;
  notice: Notice;
}

/** What a later document means for each bench copy of the plan. Copies without readings share one comparison. */
export async function* noticesOf(
  db: DataSource,
  planId: string,
  after: PlanDocument,
  except: string | null,
): AsyncGenerator<CopyNotice> {
  const unread = new Map<string, Comparison>();
  for await (const copies of copiesOn(db, planId, except)) {
    const entries = await entriesOfAll(db, copies);
    for (const copy of copies) {
      const before = await frozenRevision(db, copy.revision_id);
      if (!before) continue;
      const state = foldEntries(entries.get(copy.id) ?? []);
      const plain = state.readings.size + state.trials.size + state.looks.size === 0;
      const known = plain ? unread.get(copy.revision_id) : undefined;
      const comparison = known ?? compareRevisions(before.document, after, state);
      if (plain) unread.set(copy.revision_id, comparison);
      yield { copy, notice: noticeOf(comparison, state) };
    }
  }
}
