import { createHash } from 'node:crypto';
import canonicalize from 'canonicalize';
import { type EntityManager } from 'typeorm';
import { v7 as uuid } from 'uuid';
import { type z } from 'zod';
import { type createDraft, type publishPlan } from '../../../shared/api/plans';
import { type BodyOf } from '../../../shared/api/contract';
import { mediaOf, nextLetter, planFacts, planWords } from '../../../shared/plan/facts';
import { emptyPlan, type PlanDocument } from '../../../shared/plan/document';
import { queueStretches } from '../media/work/queues';
import { readDocument } from '../../../shared/plan/upgrade';
import { checkSheet } from '../../../shared/plan/sheet';
import { type PersonEntity } from '../../db/entities/person';
import { PlanEntity, RevisionEntity, type Override } from '../../db/entities/plan';
import { type Deps } from '../../deps';
import { ApiError, missing } from '../../http/errors';
import { canDraft, canPublish } from '../plans/plans.policy';
import { addCorrection } from '../notices/corrections.service';
import { listedIds } from './element-ids';

/** The plan for its maker, or as if it were not there. */
export async function ownPlan(
  manager: EntityManager,
  planId: string,
  person: PersonEntity,
  lock = false,
): Promise<PlanEntity> {
  const plan = await manager.getRepository(PlanEntity).findOne({
    where: { id: planId },
    ...(lock ? { lock: { mode: 'pessimistic_write' as const } } : {}),
  });
  if (!plan || !canDraft(person, plan)) throw missing('That plan');
  return plan;
}

/** Every element has an id of its own. */
export function requireOwnIds(document: PlanDocument): void {
  const seen = new Set<string>();
  const issues = listedIds(document).flatMap(({ id, path }) => {
    if (!seen.has(id)) {
      seen.add(id);
      return [];
    }
    return [
      {
        path: ['document', ...path],
        code: 'duplicate_id',
        message: 'This id is used twice in the plan.',
      },
    ];
  });
  if (issues.length > 0)
    throw new ApiError('request/invalid', 'Some elements share an id. Nothing was changed.', {
      issues,
    });
}

export async function beginDraft(
  deps: Deps,
  person: PersonEntity,
  body: BodyOf<typeof createDraft>,
): Promise<PlanEntity> {
  const known = await deps.db.getRepository(PlanEntity).findOneBy({ id: body.id });
  if (known) {
    if (!canDraft(person, known))
      throw new ApiError('thing/exists', 'That id is taken. Nothing was changed.');
    return known;
  }
  const draft = body.document
    ? { ...body.document, id: body.id, title: body.title }
    : emptyPlan(body.id, body.title, body.units);
  requireOwnIds(draft);
  const plans = deps.db.getRepository(PlanEntity);
  return plans.save(
    plans.create({
      id: body.id,
      ownerId: person.id,
      slug: null,
      draft,
      version: 1,
      state: 'draft',
      currentRevisionId: null,
    }),
  );
}

export interface Saved {
  version: number;
  updatedAt: Date;
}

/** Compare and set: one statement, so of two savers exactly one wins. */
export async function keepDraft(
  deps: Deps,
  person: PersonEntity,
  planId: string,
  version: number,
  document: PlanDocument,
): Promise<Saved> {
  requireOwnIds(document);
  const [rows]: [{ version: number; updated_at: Date }[], number] = await deps.db.query(
    `UPDATE plans SET draft = $4, version = version + 1, updated_at = now() WHERE id = $1 AND owner_id = $2 AND version = $3 RETURNING version, updated_at`,
    [planId, person.id, version, JSON.stringify({ ...document, id: planId })],
  );
  const row = rows[0];
  if (row) return { version: row.version, updatedAt: row.updated_at };
  const plan = await ownPlan(deps.db.manager, planId, person);
  throw new ApiError(
    'drafts/stale-version',
    'Another window saved this plan first. What you have here is kept; choose which one goes on.',
    {
      meta: { version: plan.version, document: readDocument(plan.draft) },
    },
  );
}

/** Address of a plan: from its title, with a number when it is taken. */
async function freeSlug(manager: EntityManager, title: string): Promise<string> {
  const base =
    title
      .normalize('NFKD')
      .replace(/[\u0300-\u036f]/g, '')
      .toLowerCase()
      .replace(/[^a-z0-9]+/g, '-')
      .replace(/^-+|-+$/g, '')
      .slice(0, 80) || 'plan';
  for (let n = 1; ; n += 1) {
    const slug = n === 1 ? base : `${base}-${n}`;
    if (!(await manager.getRepository(PlanEntity).existsBy({ slug }))) return slug;
  }
}

type PublishBody = z.output<NonNullable<(typeof publishPlan)['body']>>;

/** Failing musts need a reason each; the rest is refused with the list. */
function overridesFor(document: PlanDocument, body: PublishBody): Override[] {
  const failing = checkSheet(document, undefined, 'publish').rows.filter(
    (row) => row.verdict === 'fails',
  );
  const reasonFor = (rule: string, elementId: string | null) =>
    body.overrides.find((o) => o.rule === rule && o.elementId === elementId)?.reason;
  const open = failing.filter((row) => reasonFor(row.rule, row.place.elementId) === undefined);
  if (open.length > 0) {
    throw new ApiError(
      'plans/check-sheet',
      'The check sheet fails. Nothing was published; mend it, or write a reason for each that readers will see.',
      {
        issues: open.map((row) => ({
          path: [row.rule, row.place.elementId ?? ''],
          code: row.rule,
          message: `${row.message} ${row.cure}`,
        })),
      },
    );
  }
  return failing.map((row) => ({
    rule: row.rule,
    elementId: row.place.elementId,
    message: row.message,
    reason: reasonFor(row.rule, row.place.elementId) ?? '',
  }));
}

/** Lists and search, derived from the revision. */
async function deriveCard(
  manager: EntityManager,
  planId: string,
  document: PlanDocument,
): Promise<void> {
  const facts = planFacts(document);
  const words = planWords(document);
  await manager.query(`DELETE FROM plan_cards WHERE plan_id = $1`, [planId]);
  await manager.query(
    `INSERT INTO plan_cards (plan_id, title, summary, cover, cover_alt, category, skill, units, steps, hands_on, elapsed, machines, clip_duration, words)
     VALUES ($1,$2,$3,$4,$5,$6,$7,$8,$9,$10,$11,$12,$13,
       setweight(to_tsvector('english', $14), 'A') || setweight(to_tsvector('simple', $14), 'A') || setweight(to_tsvector('english', $15), 'B') || setweight(to_tsvector('english', $16), 'C'))`,
    [
      planId,
      document.title,
      document.summary,
      document.cover ?? null,
      document.coverAlt,
      document.category,
      document.skill,
      document.units,
      facts.steps,
      facts.handsOn,
      facts.elapsed,
      facts.machines,
      facts.clipDuration,
      words.title,
      words.names,
      words.text,
    ],
  );
  for (const hash of mediaOf(document)) {
    await manager.query(
      `INSERT INTO media_uses (hash, plan_id) VALUES ($1,$2) ON CONFLICT DO NOTHING`,
      [hash, planId],
    );
  }
}

/** Freezes the draft as the next revision and puts the plan on the lists. */
export async function publishDraft(
  deps: Deps,
  person: PersonEntity,
  planId: string,
  body: PublishBody,
): Promise<{ plan: PlanEntity; revision: RevisionEntity }> {
  return deps.db.transaction(async (manager) => {
    const plan = await ownPlan(manager, planId, person, true);
    if (!canPublish(person, plan))
      throw new ApiError(
        'auth/not-allowed',
        'This plan was taken down by a ruling. The draft is kept; answer the letter to appeal.',
      );
    if (plan.version !== body.version) {
      throw new ApiError(
        'drafts/stale-version',
        'The draft changed since you looked. Nothing was published; look again and publish.',
        { meta: { version: plan.version } },
      );
    }
    const document = readDocument(plan.draft);
    const overrides = overridesFor(document, body);
    const revisions = manager.getRepository(RevisionEntity);
    const last = await revisions.findOne({ where: { planId }, order: { publishedAt: 'DESC' } });
    const revision = revisions.create({
      id: uuid(),
      planId,
      letter: nextLetter(last?.letter ?? null),
      document,
      sha256: createHash('sha256')
        .update(canonicalize(document) ?? '')
        .digest('hex'),
      note: body.note,
      overrides,
      publishedAt: deps.now(),
    });
    await revisions.insert(revision);
    plan.slug ??= await freeSlug(manager, document.title);
    plan.currentRevisionId = revision.id;
    plan.state = 'published';
    await manager.getRepository(PlanEntity).save(plan);
    await deriveCard(manager, planId, document);
    await queueStretches(deps, document, manager);
    if (body.correction && last)
      await addCorrection(deps, manager, planId, revision.id, body.correction);
    return { plan, revision };
  });
}
