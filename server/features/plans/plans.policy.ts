import { type PersonEntity } from '../../db/entities/person';
import { type PlanEntity } from '../../db/entities/plan';
import { isModerator } from '../../http/person';

type Actor = PersonEntity | null;
type Plan = Pick<PlanEntity, 'ownerId' | 'state'>;

export const ownsPlan = (actor: Actor, plan: Plan): boolean => actor?.id === plan.ownerId;

/** Published plans are everybody's; the rest only the maker's and the moderators'. */
export function canSeePlan(actor: Actor, plan: Plan): boolean {
  if (plan.state === 'published') return true;
  if (plan.state === 'draft') return false;
  return ownsPlan(actor, plan) || isModerator(actor);
}

/** Only the maker drafts; a removed plan stays removed. */
export const canDraft = (actor: Actor, plan: Plan): boolean => ownsPlan(actor, plan);
export const canPublish = (actor: Actor, plan: Plan): boolean =>
  ownsPlan(actor, plan) && plan.state !== 'removed' && plan.state !== 'hidden';
export const canTalkOn = (actor: Actor, plan: Plan): boolean =>
  actor !== null && actor.emailConfirmedAt !== null && plan.state === 'published';
