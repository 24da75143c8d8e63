import { type Router } from 'express';
import { getPlan, listPlans, type PlanPage } from '../../../shared/api/plans';
import { type PersonEntity } from '../../db/entities/person';
import { type PlanEntity } from '../../db/entities/plan';
import { type Deps } from '../../deps';
import { missing } from '../../http/errors';
import { isModerator } from '../../http/person';
import { route } from '../../http/route';
import { frozenRevision } from './frozen';
import { findPersonById } from '../accounts/accounts.repository';
import { presentPerson } from '../accounts/accounts.presenter';
import { canDraft, canSeePlan, canTalkOn } from './plans.policy';
import { presentCard, presentRevision } from './plans.presenter';
import {
  copyCounts,
  findPlanBySlug,
  listCards,
  revisionByLetter,
  revisionsOf,
  talkCounts,
} from './plans.repository';

/** The plan page of one revision for whoever asks. */
async function planPage(
  deps: Deps,
  plan: PlanEntity,
  letter: string | undefined,
  person: PersonEntity | null,
): Promise<PlanPage> {
  const revisionId = letter
    ? (await revisionByLetter(deps.db, plan.id, letter))?.id
    : plan.currentRevisionId;
  const revision = revisionId ? await frozenRevision(deps.db, revisionId) : null;
  if (!revision) throw missing(letter ? `Revision ${letter}` : 'That plan');
  const [maker, revisions, talk, copies] = await Promise.all([
    findPersonById(deps.db, plan.ownerId),
    revisionsOf(deps.db, plan.id),
    talkCounts(deps.db, plan.id),
    copyCounts(deps.db, plan.id, person?.id ?? null),
  ]);
  if (!maker) throw missing('That plan');
  return {
    id: plan.id,
    slug: plan.slug ?? '',
    maker: presentPerson(maker),
    revision: presentRevision(revision.row),
    document: revision.document,
    revisions: revisions.map(presentRevision),
    talk,
    benchCopies: copies.all,
    myCopyId: copies.mine,
    abilities: {
      draft: canDraft(person, plan),
      talk: canTalkOn(person, plan),
      moderate: isModerator(person),
    },
    state: plan.state === 'draft' ? 'unpublished' : plan.state,
  };
}

export function registerPlans(router: Router, deps: Deps): void {
  route(router, deps, listPlans, async ({ query }) => {
    const offset = /^\d{1,6}$/.test(query.cursor ?? '') ? Number(query.cursor) : 0;
    const rows = await listCards(deps.db, query, offset);
    const next = rows.length > query.limit ? String(offset + query.limit) : null;
    return { items: rows.slice(0, query.limit).map(presentCard), next };
  });
  route(router, deps, getPlan, async ({ params, query, person }) => {
    const plan = await findPlanBySlug(deps.db, params.slug);
    if (!plan || !canSeePlan(person, plan)) throw missing('That plan');
    return planPage(deps, plan, query.rev, person);
  });
}
