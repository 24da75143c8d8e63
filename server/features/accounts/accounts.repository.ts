import { type DataSource, type EntityManager } from 'typeorm';
import { EmailTokenEntity, PersonEntity } from '../../db/entities/person';

type Db = DataSource | EntityManager;

export const findPersonById = (db: Db, id: string): Promise<PersonEntity | null> =>
  db.getRepository(PersonEntity).findOneBy({ id });

export const findPersonByEmail = (db: Db, email: string): Promise<PersonEntity | null> =>
  db
    .getRepository(PersonEntity)
    .createQueryBuilder('p')
    .where('lower(p.email) = lower(:email)', { email })
    .getOne();

export const savePerson = (db: Db, person: PersonEntity): Promise<PersonEntity> =>
  db.getRepository(PersonEntity).save(person);

/** A handle nobody has: from the name, with a number when it is taken. */
export async function freeHandle(db: Db, name: string): Promise<string> {
  const base =
    name
      .normalize('NFKD')
      .replace(/[\u0300-\u036f]/g, '')
      .toLowerCase()
      .replace(/[^a-z0-9]+/g, '-')
      .replace(/^-+|-+$/g, '')
      .slice(0, 40) || 'maker';
  for (let n = 1; ; n += 1) {
    const handle = n === 1 ? base : `${base}-${n}`;
    if (!(await db.getRepository(PersonEntity).existsBy({ handle }))) return handle;
  }
}

export async function keepToken(db: Db, token: Omit<EmailTokenEntity, 'usedAt'>): Promise<void> {
  await db.getRepository(EmailTokenEntity).insert({ ...token, usedAt: null });
}

/** Uses a token up; its person, or null when it is unknown, used or over. One statement, so it works once. */
export async function useToken(
  db: Db,
  hash: string,
  purpose: 'confirm' | 'reset',
  now: Date,
): Promise<string | null> {
  const rows: { person_id: string }[][] = await db.query(
    `UPDATE email_tokens SET used_at = $3 WHERE token_hash = $1 AND purpose = $2 AND used_at IS NULL AND expires_at > $3 RETURNING person_id`,
    [hash, purpose, now],
  );
  return rows[0]?.[0]?.person_id ?? null;
}

/** Letters sent before stop working. */
export async function voidTokens(
  db: Db,
  personId: string,
  purpose: 'confirm' | 'reset',
  now: Date,
): Promise<void> {
  await db.query(
    `UPDATE email_tokens SET used_at = $3 WHERE person_id = $1 AND purpose = $2 AND used_at IS NULL`,
    [personId, purpose, now],
  );
}

export interface SessionRow {
  sid: string;
  sess: { device?: string; createdAt?: string; lastSeenAt?: string };
}

export const sessionsOf = (db: Db, personId: string): Promise<SessionRow[]> =>
  db.query(
    `SELECT sid, sess FROM session WHERE sess->'passport'->>'user' = $1 AND expire > now() ORDER BY sess->>'lastSeenAt' DESC NULLS LAST`,
    [personId],
  );

export async function endSessions(db: Db, personId: string, sid?: string): Promise<number> {
  const [, count]: [unknown, number] = await db.query(
    `DELETE FROM session WHERE sess->'passport'->>'user' = $1 ${sid === undefined ? '' : 'AND sid = $2'}`,
    sid === undefined ? [personId] : [personId, sid],
  );
  return count;
}

export interface PeoplePage {
  people: PersonEntity[];
  next: string | null;
}

/** People by a part of name or e-mail, ordered by id (made in order of time). */
export async function searchPeople(
  db: Db,
  q: string,
  cursor: string | undefined,
  limit: number,
): Promise<PeoplePage> {
  const query = db
    .getRepository(PersonEntity)
    .createQueryBuilder('p')
    .orderBy('p.id', 'ASC')
    .take(limit + 1);
  if (q)
    query.andWhere('(p.displayName ILIKE :q OR p.email ILIKE :q)', {
      q: `%${q.replace(/[\\%_]/g, '\\$&')}%`,
    });
  if (cursor) query.andWhere('p.id > :cursor', { cursor });
  const people = await query.getMany();
  const page = people.slice(0, limit);
  return { people: page, next: people.length > limit ? page[page.length - 1]!.id : null };
}
