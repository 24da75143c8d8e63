import { type EntityManager } from 'typeorm';
import { v7 as uuid } from 'uuid';
import { type NoticeKind } from '../../../shared/api/notices';
import { joinLetter } from './letters.repository';

export interface NewNotice {
  personId: string;
  kind: NoticeKind;
  planId: string | null;
  /** What it comes from; a person has one notice per cause, however often it is told. */
  cause: string;
  title: string;
  text: string;
  path: string;
}

interface Wants {
  mail: boolean;
  product: boolean;
  confirmed: boolean;
}

async function wants(manager: EntityManager, personId: string, kind: NoticeKind): Promise<Wants> {
  const rows: { mail: boolean | null; product: boolean | null; confirmed: boolean }[] =
    await manager.query(
      `SELECT s.mail, s.product, p.email_confirmed_at IS NOT NULL AS confirmed
       FROM people p LEFT JOIN notice_settings s ON s.person_id = p.id AND s.kind = $2 WHERE p.id = $1`,
      [personId, kind],
    );
  const row = rows[0];
  return {
    mail: row?.mail ?? true,
    product: kind === 'safety' || (row?.product ?? true),
    confirmed: row?.confirmed ?? false,
  };
}

/**
 * Tells a person something, in the product and by letter, as they want it; joins the caller's transaction. Telling the
 * same cause again does nothing. Gives whether it was new.
 */
export async function notify(
  manager: EntityManager,
  notice: NewNotice,
  now: Date,
): Promise<boolean> {
  const { personId, kind, planId, cause, title, text, path } = notice;
  const wanted = await wants(manager, personId, kind);
  const mail = wanted.mail && wanted.confirmed;
  if (!mail && !wanted.product) return false;
  const id = uuid();
  const added: { id: string }[] = await manager.query(
    `INSERT INTO notices (id, person_id, kind, plan_id, cause, title, text, path, shown, created_at)
     VALUES ($1,$2,$3,$4,$5,$6,$7,$8,$9,$10) ON CONFLICT (person_id, cause) DO NOTHING RETURNING id`,
    [id, personId, kind, planId, cause, title, text, path, wanted.product, now],
  );
  if (!added[0]) return false;
  if (mail) {
    const letterId = await joinLetter(manager, personId, planId, kind === 'safety', now);
    await manager.query(`UPDATE notices SET letter_id = $2 WHERE id = $1`, [id, letterId]);
  }
  return true;
}
