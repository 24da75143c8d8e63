import { In } from 'typeorm';
import {
  type Comment,
  type CommentBody,
  type listTalk,
  type Thread,
} from '../../../shared/api/talk';
import { type QueryOf } from '../../../shared/api/contract';
import { CommentEntity, CommentVersionEntity } from '../../db/entities/talk';
import { PersonEntity } from '../../db/entities/person';
import { type PlanEntity } from '../../db/entities/plan';
import { type Deps } from '../../deps';
import { ApiError, missing } from '../../http/errors';
import { frozenRevision, type FrozenRevision } from '../plans/frozen';
import { canSeePlan, canTalkOn } from '../plans/plans.policy';
import { findPlan } from '../plans/plans.repository';
import { canDelete, canEdit, canSettle } from './talk.policy';
import { tellOfComment, tellOfSettling } from './talk.notices';
import { presentComment } from './talk.presenter';

export async function visiblePlan(
  deps: Deps,
  planId: string,
  person: PersonEntity | null,
): Promise<PlanEntity> {
  const plan = await findPlan(deps.db, planId);
  if (!plan || !canSeePlan(person, plan)) throw missing('That plan');
  return plan;
}

/** A comment with its plan, for somebody who may see the plan. */
export async function commentOf(
  deps: Deps,
  id: string,
  person: PersonEntity | null,
): Promise<{ comment: CommentEntity; plan: PlanEntity }> {
  const comment = await deps.db.getRepository(CommentEntity).findOneBy({ id });
  if (!comment) throw missing('That comment');
  return { comment, plan: await visiblePlan(deps, comment.planId, person) };
}

async function presentAll(
  deps: Deps,
  comments: CommentEntity[],
  plan: PlanEntity,
  person: PersonEntity | null,
): Promise<Map<string, Comment>> {
  const authors = await deps.db
    .getRepository(PersonEntity)
    .findBy({ id: In([...new Set(comments.map((c) => c.authorId))]) });
  const byId = new Map(authors.map((a) => [a.id, a]));
  return new Map(
    comments.flatMap((c) =>
      byId.has(c.authorId)
        ? [[c.id, presentComment(c, byId.get(c.authorId)!, plan, person)] as const]
        : [],
    ),
  );
}

export async function presentOne(
  deps: Deps,
  comment: CommentEntity,
  plan: PlanEntity,
  person: PersonEntity | null,
): Promise<Comment> {
  const shown = (await presentAll(deps, [comment], plan, person)).get(comment.id);
  if (!shown) throw missing('That comment');
  return shown;
}

/** One page of threads, the newest first; answers are fetched for the page as a set. */
export async function listThreads(
  deps: Deps,
  planId: string,
  query: QueryOf<typeof listTalk>,
  person: PersonEntity | null,
): Promise<{ items: Thread[]; next: string | null }> {
  const plan = await visiblePlan(deps, planId, person);
  const select = deps.db
    .getRepository(CommentEntity)
    .createQueryBuilder('c')
    .where('c.planId = :planId AND c.parentId IS NULL', { planId })
    .andWhere(
      `(c.state <> 'deleted' OR EXISTS (SELECT 1 FROM comments a WHERE a.parent_id = c.id))`,
    )
    .orderBy('c.createdAt', 'DESC')
    .addOrderBy('c.id', 'DESC')
    .take(query.limit + 1);
  if (query.kind) select.andWhere('c.kind = :kind', { kind: query.kind });
  if (query.elementId)
    select.andWhere('c.anchorElementId = :elementId', { elementId: query.elementId });
  if (query.open) select.andWhere('c.settledBy IS NULL');
  const [at, id] = (query.cursor ?? '').split('_');
  if (at && id && !Number.isNaN(Date.parse(at)) && /^[0-9a-f-]{36}$/.test(id))
    select.andWhere('(c.createdAt, c.id) < (:at, :id)', { at, id });
  const found = await select.getMany();
  const page = found.slice(0, query.limit);
  const answers = page.length
    ? await deps.db
        .getRepository(CommentEntity)
        .find({ where: { parentId: In(page.map((c) => c.id)) }, order: { createdAt: 'ASC' } })
    : [];
  const shown = await presentAll(deps, [...page, ...answers], plan, person);
  const items = page.flatMap((c) => {
    const thread = shown.get(c.id);
    return thread
      ? [
          {
            ...thread,
            answers: answers
              .filter((a) => a.parentId === c.id && a.state !== 'deleted')
              .flatMap((a) => shown.get(a.id) ?? []),
          },
        ]
      : [];
  });
  const last = page[page.length - 1];
  return {
    items,
    next: found.length > query.limit && last ? `${last.createdAt.toISOString()}_${last.id}` : null,
  };
}

function requireAnchor(
  body: Exclude<CommentBody, { kind: 'answer' }>,
  revision: FrozenRevision,
): void {
  const { on, elementId } = body.anchor;
  if (on === 'plan') return;
  const { document } = revision;
  const list =
    on === 'step' ? document.steps : on === 'part' ? document.parts : document.dimensions;
  if (!list.some((element) => element.id === elementId)) {
    throw new ApiError(
      'talk/anchor',
      'That place is not in the newest revision. Nothing was sent; choose another place.',
      {
        issues: [
          {
            path: ['anchor', 'elementId'],
            code: 'unknown',
            message: 'Not in the newest revision.',
          },
        ],
      },
    );
  }
}

async function anchorFor(
  deps: Deps,
  body: CommentBody,
  plan: PlanEntity,
  revision: FrozenRevision,
): Promise<Pick<CommentEntity, 'anchorOn' | 'anchorElementId' | 'parentId'>> {
  if (body.kind !== 'answer') {
    requireAnchor(body, revision);
    return {
      anchorOn: body.anchor.on,
      anchorElementId: body.anchor.elementId ?? null,
      parentId: null,
    };
  }
  const parent = await deps.db
    .getRepository(CommentEntity)
    .findOneBy({ id: body.parentId, planId: plan.id });
  if (!parent || parent.parentId !== null || parent.state !== 'shown')
    throw missing('What you answer');
  return {
    anchorOn: parent.anchorOn,
    anchorElementId: parent.anchorElementId,
    parentId: parent.id,
  };
}

export async function post(
  deps: Deps,
  planId: string,
  body: CommentBody,
  person: PersonEntity,
): Promise<Comment> {
  const plan = await visiblePlan(deps, planId, person);
  const comments = deps.db.getRepository(CommentEntity);
  const known = await comments.findOneBy({ id: body.id });
  if (known) {
    if (known.authorId !== person.id || known.planId !== planId)
      throw new ApiError('thing/exists', 'That id is taken. Nothing was sent.');
    return presentOne(deps, known, plan, person);
  }
  const revision = plan.currentRevisionId
    ? await frozenRevision(deps.db, plan.currentRevisionId)
    : null;
  if (!revision || !canTalkOn(person, plan))
    throw new ApiError(
      'auth/not-allowed',
      'This plan is not open for talk now. Your words were not sent; keep a copy.',
    );
  const place = await anchorFor(deps, body, plan, revision);
  const comment = comments.create({
    id: body.id,
    planId,
    letter: revision.row.letter,
    kind: body.kind,
    ...place,
    stance: body.kind === 'critique' ? body.stance : null,
    text: body.text,
    why: body.kind === 'critique' ? body.why : '',
    authorId: person.id,
    settledBy: null,
    state: 'shown',
    editedAt: null,
  });
  comment.createdAt = deps.now();
  await deps.db.transaction(async (manager) => {
    await manager.getRepository(CommentEntity).insert(comment);
    await tellOfComment(manager, comment, plan, person, deps.now());
  });
  return presentOne(deps, comment, plan, person);
}

export async function edit(
  deps: Deps,
  id: string,
  words: { text: string; why?: string | undefined },
  person: PersonEntity,
): Promise<Comment> {
  const { comment, plan } = await commentOf(deps, id, person);
  if (!canEdit(person, comment))
    throw new ApiError(
      'auth/not-allowed',
      'Only its writer can change a comment. Nothing was changed.',
    );
  const before = { commentId: comment.id, text: comment.text, why: comment.why };
  comment.text = words.text;
  if (words.why !== undefined) comment.why = words.why;
  comment.editedAt = deps.now();
  await deps.db.transaction(async (manager) => {
    await manager.getRepository(CommentVersionEntity).insert(before);
    await manager.getRepository(CommentEntity).save(comment);
  });
  return presentOne(deps, comment, plan, person);
}

export async function takeBack(deps: Deps, id: string, person: PersonEntity): Promise<void> {
  const { comment } = await commentOf(deps, id, person);
  if (comment.state === 'deleted' && comment.authorId === person.id) return;
  if (!canDelete(person, comment))
    throw new ApiError(
      'auth/not-allowed',
      'Only its writer can take a comment back. Nothing was changed.',
    );
  comment.state = 'deleted';
  await deps.db.getRepository(CommentEntity).save(comment);
}

export async function settle(
  deps: Deps,
  id: string,
  answerId: string | null,
  person: PersonEntity,
): Promise<Comment> {
  const { comment, plan } = await commentOf(deps, id, person);
  if (!canSettle(person, comment, plan))
    throw new ApiError(
      'auth/not-allowed',
      'Only the plan’s maker says what settles a question. Nothing was changed.',
    );
  if (
    answerId &&
    !(await deps.db
      .getRepository(CommentEntity)
      .existsBy({ id: answerId, parentId: comment.id, state: 'shown' }))
  )
    throw missing('That answer');
  comment.settledBy = answerId;
  await deps.db.transaction(async (manager) => {
    await manager.getRepository(CommentEntity).save(comment);
    await tellOfSettling(manager, comment, plan, deps.now());
  });
  return presentOne(deps, comment, plan, person);
}
