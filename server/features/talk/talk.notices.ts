import { type EntityManager } from 'typeorm';
import { type PersonEntity } from '../../db/entities/person';
import { type PlanEntity } from '../../db/entities/plan';
import { CommentEntity } from '../../db/entities/talk';
import { notify } from '../notices/notify';

const first = (text: string) => (text.length > 300 ? `${text.slice(0, 297)}…` : text);

/** Tells those whom a new comment concerns: the maker of the plan, and whoever is answered. */
export async function tellOfComment(
  manager: EntityManager,
  comment: CommentEntity,
  plan: PlanEntity,
  author: PersonEntity,
  now: Date,
): Promise<void> {
  const { title } = plan.draft;
  const base = {
    planId: plan.id,
    text: `${author.displayName}: ${first(comment.text)}`,
    path: `/plans/${plan.slug ?? ''}`,
  };
  const told = new Set([author.id]);
  if (comment.parentId) {
    const parent = await manager.getRepository(CommentEntity).findOneBy({ id: comment.parentId });
    if (parent && !told.has(parent.authorId)) {
      told.add(parent.authorId);
      const notice = { ...base, kind: 'answer' as const, title: `An answer on ${title}` };
      await notify(
        manager,
        { ...notice, personId: parent.authorId, cause: `comment ${comment.id}` },
        now,
      );
    }
  }
  if (told.has(plan.ownerId)) return;
  const what = { critique: 'A critique of', question: 'A question on', answer: 'An answer on' };
  const notice = { ...base, kind: 'talk' as const, title: `${what[comment.kind]} ${title}` };
  await notify(manager, { ...notice, personId: plan.ownerId, cause: `comment ${comment.id}` }, now);
}

/** Tells whoever asked that the maker settled it. */
export async function tellOfSettling(
  manager: EntityManager,
  comment: CommentEntity,
  plan: PlanEntity,
  now: Date,
): Promise<void> {
  if (comment.authorId === plan.ownerId || !comment.settledBy) return;
  await notify(
    manager,
    {
      personId: comment.authorId,
      kind: 'answer',
      planId: plan.id,
      cause: `settled ${comment.id} ${comment.settledBy}`,
      title: `Settled on ${plan.draft.title}`,
      text: first(comment.text),
      path: `/plans/${plan.slug ?? ''}`,
    },
    now,
  );
}
