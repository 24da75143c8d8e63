import { type CommentEntity } from '../../db/entities/talk';
import { type PersonEntity } from '../../db/entities/person';
import { type PlanEntity } from '../../db/entities/plan';
import { isModerator } from '../../http/person';

type Actor = PersonEntity | null;

export const canEdit = (actor: Actor, c: CommentEntity): boolean =>
  actor?.id === c.authorId && (c.state === 'shown' || c.state === 'hidden');
export const canDelete = (actor: Actor, c: CommentEntity): boolean =>
  actor?.id === c.authorId && c.state === 'shown';
export const canSettle = (
  actor: Actor,
  c: CommentEntity,
  plan: Pick<PlanEntity, 'ownerId'>,
): boolean => actor?.id === plan.ownerId && c.parentId === null && c.state === 'shown';
export const canReport = (actor: Actor, c: CommentEntity): boolean =>
  c.state === 'shown' && actor?.id !== c.authorId;
/** Hidden words: their writer and moderators. Removed words: moderators. Taken-back words: nobody. */
export function canReadWords(actor: Actor, c: CommentEntity): boolean {
  if (c.state === 'shown') return true;
  if (c.state === 'deleted') return false;
  return isModerator(actor) || (c.state === 'hidden' && actor?.id === c.authorId);
}
