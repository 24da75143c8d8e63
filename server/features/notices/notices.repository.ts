import { type DataSource } from 'typeorm';
import { noticeKinds, type NoticeSetting } from '../../../shared/api/notices';
import { NoticeSettingEntity, type NoticeEntity } from '../../db/entities/notices';

export type NoticeRow = Pick<NoticeEntity, 'id' | 'kind' | 'title' | 'text' | 'path'> & {
  created_at: Date;
  read_at: Date | null;
};

const mark = /^(.+Z)_([0-9a-f-]{36})$/;

/** One page of a person's notices, the newest first; the cursor is the last one's time and id. */
export async function noticesPage(
  db: DataSource,
  personId: string,
  cursor: string | undefined,
  limit: number,
): Promise<{ rows: NoticeRow[]; next: string | null }> {
  const [, at, id] = mark.exec(cursor ?? '') ?? [];
  const after = at && id && !Number.isNaN(Date.parse(at)) ? [at, id] : null;
  // Times have more digits in the database than in JavaScript: both are cut to milliseconds.
  const rows: NoticeRow[] = await db.query(
    `SELECT id, kind, title, text, path, created_at, read_at FROM notices WHERE person_id = $1 AND shown
     ${after ? `AND (date_trunc('milliseconds', created_at), id) < ($3, $4::uuid)` : ''}
     ORDER BY date_trunc('milliseconds', created_at) DESC, id DESC LIMIT $2`,
    [personId, limit + 1, ...(after ?? [])],
  );
  const shown = rows.slice(0, limit);
  const last = shown[shown.length - 1];
  return {
    rows: shown,
    next: rows.length > limit && last ? `${last.created_at.toISOString()}_${last.id}` : null,
  };
}

export async function countUnread(db: DataSource, personId: string): Promise<number> {
  const rows: { count: number }[] = await db.query(
    `SELECT count(*)::int AS count FROM notices WHERE person_id = $1 AND shown AND read_at IS NULL`,
    [personId],
  );
  return rows[0]?.count ?? 0;
}

export async function markRead(
  db: DataSource,
  personId: string,
  ids: readonly string[] | undefined,
  now: Date,
): Promise<void> {
  await db.query(
    `UPDATE notices SET read_at = $2 WHERE person_id = $1 AND read_at IS NULL AND ($3::uuid[] IS NULL OR id = ANY($3))`,
    [personId, now, ids ?? null],
  );
}

/** A setting for every kind; what was never touched is on. */
export async function settingsOf(db: DataSource, personId: string): Promise<NoticeSetting[]> {
  const rows = await db.getRepository(NoticeSettingEntity).findBy({ personId });
  return noticeKinds.map((kind) => {
    const row = rows.find((r) => r.kind === kind);
    return { kind, mail: row?.mail ?? true, product: kind === 'safety' || (row?.product ?? true) };
  });
}

export async function keepSetting(
  db: DataSource,
  personId: string,
  setting: NoticeSetting,
): Promise<void> {
  const { kind, mail, product } = setting;
  await db
    .getRepository(NoticeSettingEntity)
    .upsert({ personId, kind, mail, product: product || kind === 'safety' }, ['personId', 'kind']);
}
