import { type DataSource, type EntityManager } from 'typeorm';
import { v7 as uuid } from 'uuid';
import { type NoticeKind } from '../../../shared/api/notices';

/** A first notice waits this long for others; after a letter the next one about the plan waits a day. */
const pause = { firstMinutes: 10, nextHours: 24 } as const;

/**
 * The letter a notice goes out in: its own, at once, when it is urgent; else the one that waits for this person and
 * plan, or a new one. The row stays locked until the caller's transaction ends, so that it is not sent meanwhile.
 */
export async function joinLetter(
  manager: EntityManager,
  personId: string,
  planId: string | null,
  urgent: boolean,
  now: Date,
): Promise<string> {
  const id = uuid();
  if (urgent) {
    await manager.query(
      `INSERT INTO letters (id, person_id, plan_id, urgent, state, due_at) VALUES ($1,$2,$3,true,'waiting',$4)`,
      [id, personId, planId, now],
    );
    return id;
  }
  const rows: { id: string }[] = await manager.query(
    `INSERT INTO letters (id, person_id, plan_id, urgent, state, due_at)
     VALUES ($1,$2,$3,false,'waiting', greatest($4::timestamptz + make_interval(mins => $5),
       (SELECT max(sent_at) FROM letters WHERE person_id = $2 AND plan_id = $3 AND NOT urgent) + make_interval(hours => $6)))
     ON CONFLICT (person_id, plan_id) WHERE state = 'waiting' AND NOT urgent
     DO UPDATE SET due_at = letters.due_at RETURNING id`,
    [id, personId, planId, now, pause.firstMinutes, pause.nextHours],
  );
  return rows[0]?.id ?? id;
}

export interface ClaimedLetter {
  id: string;
  person_id: string;
  plan_id: string | null;
  urgent: boolean;
  tries: number;
}

/**
 * Takes letters that are due, or whose sender died, for as long as the lease. Urgent ones first. Several processes may
 * do so; none gets another's.
 */
export async function claimLetters(
  db: DataSource,
  now: Date,
  leaseMs: number,
  count: number,
): Promise<ClaimedLetter[]> {
  const [rows]: [ClaimedLetter[], number] = await db.query(
    `UPDATE letters SET state = 'sending', tries = tries + 1, lease_until = $2 WHERE id IN (
       SELECT id FROM letters WHERE (state = 'waiting' AND due_at <= $1) OR (state = 'sending' AND lease_until < $1)
       ORDER BY urgent DESC, due_at, id LIMIT $3 FOR UPDATE SKIP LOCKED)
     RETURNING id, person_id, plan_id, urgent, tries`,
    [now, new Date(now.getTime() + leaseMs), count],
  );
  return rows;
}

export interface LetterNotice {
  kind: NoticeKind;
  title: string;
  text: string;
  path: string;
}

/** What a letter says, oldest first, to whom, and about which plan. */
export async function letterContents(db: DataSource, letter: ClaimedLetter) {
  const [notices, people] = await Promise.all([
    db.query<LetterNotice[]>(
      `SELECT kind, title, text, path FROM notices WHERE letter_id = $1 ORDER BY created_at, id`,
      [letter.id],
    ),
    db.query<{ email: string; display_name: string; plan: string | null }[]>(
      `SELECT p.email, p.display_name, (SELECT title FROM plan_cards WHERE plan_id = $2) AS plan
       FROM people p WHERE p.id = $1 AND p.email_confirmed_at IS NOT NULL`,
      [letter.person_id, letter.plan_id],
    ),
  ]);
  return { notices, person: people[0] ?? null };
}

/** Ends a letter's sending: sent, dropped (nobody to send to), or back to wait until later. */
export async function endLetter(
  db: DataSource,
  id: string,
  state: 'sent' | 'dropped' | 'later',
  at: Date,
): Promise<void> {
  if (state === 'later')
    await db.query(`UPDATE letters SET lease_until = $2 WHERE id = $1 AND state = 'sending'`, [
      id,
      at,
    ]);
  else
    await db.query(
      `UPDATE letters SET state = $2, sent_at = $3, lease_until = NULL WHERE id = $1`,
      [id, state, at],
    );
}
