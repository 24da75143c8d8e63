import { type DataSource, type EntityManager } from 'typeorm';
import { type z } from 'zod';
import { type listPlansQuery } from '../../../shared/api/plans';
import { PlanEntity, RevisionEntity } from '../../db/entities/plan';

type Db = DataSource | EntityManager;

export const findPlan = (db: Db, id: string): Promise<PlanEntity | null> =>
  db.getRepository(PlanEntity).findOneBy({ id });
export const findPlanBySlug = (db: Db, slug: string): Promise<PlanEntity | null> =>
  db.getRepository(PlanEntity).findOneBy({ slug });
export const findRevision = (db: Db, id: string): Promise<RevisionEntity | null> =>
  db.getRepository(RevisionEntity).findOneBy({ id });

/** All revisions of a plan, the newest first, without their documents. */
export const revisionsOf = (db: Db, planId: string): Promise<RevisionEntity[]> =>
  db.getRepository(RevisionEntity).find({
    where: { planId },
    order: { publishedAt: 'DESC' },
    select: {
      id: true,
      planId: true,
      letter: true,
      sha256: true,
      note: true,
      overrides: true,
      publishedAt: true,
    },
  });

export const revisionByLetter = (
  db: Db,
  planId: string,
  letter: string,
): Promise<Pick<RevisionEntity, 'id'> | null> =>
  db.getRepository(RevisionEntity).findOne({ where: { planId, letter }, select: { id: true } });

/** A row of the list as the query gives it. */
export interface CardRow {
  id: string;
  slug: string;
  letter: string;
  published_at: Date;
  title: string;
  summary: string;
  cover: string | null;
  cover_alt: string;
  category: string;
  skill: string;
  units: 'mm' | 'in';
  steps: number;
  hands_on: number;
  elapsed: number;
  machines: string[];
  clip_duration: number | null;
  bench_copies: number;
  maker_id: string;
  handle: string;
  display_name: string;
  shop_name: string | null;
}

const cardColumns = `p.id, p.slug, r.letter, r.published_at, c.title, c.summary, c.cover, c.cover_alt, c.category, c.skill, c.units,
  c.steps, c.hands_on, c.elapsed, c.machines, c.clip_duration, m.id AS maker_id, m.handle, m.display_name, m.shop_name,
  (SELECT count(*)::int FROM bench_copies b WHERE b.plan_id = p.id) AS bench_copies`;

const sorts = {
  newest: 'published_at DESC, id DESC',
  'most-built': 'bench_copies DESC, published_at DESC, id DESC',
  shortest: 'elapsed ASC, id ASC',
} as const;

/** The last word may be half typed: it matches as a prefix. */
export function toTsQuery(q: string): string {
  const words = q.toLowerCase().match(/[\p{L}\p{N}]+/gu) ?? [];
  return words.map((w, i) => (i === words.length - 1 ? `${w}:*` : w)).join(' & ');
}

type Query = z.output<typeof listPlansQuery>;

/** One page of published plans. The cursor is how many came before: lists are short-lived and small. */
export async function listCards(db: Db, query: Query, offset: number): Promise<CardRow[]> {
  const where: string[] = [`p.state = 'published'`];
  const values: unknown[] = [];
  const add = (sql: (n: string) => string, value: unknown) => {
    values.push(value);
    where.push(sql(`$${values.length}`));
  };
  const words = toTsQuery(query.q);
  if (words)
    add(
      (n) => `(c.words @@ to_tsquery('english', ${n}) OR c.words @@ to_tsquery('simple', ${n}))`,
      words,
    );
  if (query.maxMinutes) add((n) => `c.elapsed <= ${n}`, query.maxMinutes);
  if (query.machines !== undefined)
    add((n) => `c.machines <@ ${n}::text[]`, query.machines.split(',').filter(Boolean));
  if (query.skill) add((n) => `c.skill = ${n}`, query.skill);
  if (query.units) add((n) => `c.units = ${n}`, query.units);
  if (query.category) add((n) => `c.category = ${n}`, query.category);
  if (query.maker) add((n) => `m.handle = ${n}`, query.maker);
  const rank = words ? `ts_rank(words, to_tsquery('english', $1)) DESC, ` : '';
  values.push(query.limit + 1, offset);
  const sql = `SELECT * FROM (SELECT ${cardColumns}, c.words FROM plans p
    JOIN revisions r ON r.id = p.current_revision_id JOIN plan_cards c ON c.plan_id = p.id JOIN people m ON m.id = p.owner_id
    WHERE ${where.join(' AND ')}) found ORDER BY ${rank}${sorts[query.sort]} LIMIT $${values.length - 1} OFFSET $${values.length}`;
  return db.query(sql, values);
}

export interface TalkCounts {
  critiques: number;
  questions: number;
  bySteps: Record<string, number>;
}

/** How much is said, by kind and by step. */
export async function talkCounts(db: Db, planId: string): Promise<TalkCounts> {
  const rows: { kind: string; on: string; element: string | null; count: number }[] =
    await db.query(
      `SELECT kind, anchor_on AS on, anchor_element_id AS element, count(*)::int AS count FROM comments
     WHERE plan_id = $1 AND parent_id IS NULL AND state = 'shown' GROUP BY 1, 2, 3`,
      [planId],
    );
  const sum = (kind: string) =>
    rows.filter((r) => r.kind === kind).reduce((n, r) => n + r.count, 0);
  const bySteps: Record<string, number> = {};
  for (const row of rows)
    if (row.on === 'step' && row.element)
      bySteps[row.element] = (bySteps[row.element] ?? 0) + row.count;
  return { critiques: sum('critique'), questions: sum('question'), bySteps };
}

export async function copyCounts(
  db: Db,
  planId: string,
  personId: string | null,
): Promise<{ all: number; mine: string | null }> {
  const rows: { all: number; mine: string | null }[] = await db.query(
    `SELECT (SELECT count(*)::int FROM bench_copies WHERE plan_id = $1) AS all,
            (SELECT id FROM bench_copies WHERE plan_id = $1 AND person_id = $2 ORDER BY started_at DESC LIMIT 1) AS mine`,
    [planId, personId],
  );
  return rows[0] ?? { all: 0, mine: null };
}
