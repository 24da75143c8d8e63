import { type Comment } from '../../../shared/api/talk';
import { type PersonEntity } from '../../db/entities/person';
import { type PlanEntity } from '../../db/entities/plan';
import { type CommentEntity } from '../../db/entities/talk';
import { presentPerson } from '../accounts/accounts.presenter';
import { canDelete, canEdit, canReadWords, canReport, canSettle } from './talk.policy';

/** One comment as this reader may see it. */
export function presentComment(
  c: CommentEntity,
  author: PersonEntity,
  plan: Pick<PlanEntity, 'ownerId'>,
  reader: PersonEntity | null,
): Comment {
  const words = canReadWords(reader, c);
  return {
    id: c.id,
    planId: c.planId,
    letter: c.letter,
    kind: c.kind,
    anchor: { on: c.anchorOn, ...(c.anchorElementId ? { elementId: c.anchorElementId } : {}) },
    stance: c.stance,
    text: words ? c.text : '',
    why: words ? c.why : '',
    author: presentPerson(author),
    byMaker: c.authorId === plan.ownerId,
    parentId: c.parentId,
    settledBy: c.settledBy,
    createdAt: c.createdAt.toISOString(),
    editedAt: c.editedAt?.toISOString() ?? null,
    state: c.state,
    abilities: {
      edit: canEdit(reader, c),
      delete: canDelete(reader, c),
      settle: canSettle(reader, c, plan),
      report: canReport(reader, c),
    },
  };
}
