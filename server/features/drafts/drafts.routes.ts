import { type Router } from 'express';
import * as api from '../../../shared/api/plans';
import { readDocument } from '../../../shared/plan/upgrade';
import { PlanEntity } from '../../db/entities/plan';
import { type Deps } from '../../deps';
import { ApiError } from '../../http/errors';
import { route, signedIn } from '../../http/route';
import { presentDraftCard, presentRevision } from '../plans/plans.presenter';
import { revisionsOf } from '../plans/plans.repository';
import { beginDraft, keepDraft, ownPlan, publishDraft } from './drafts.service';

async function presentDraft(deps: Deps, plan: PlanEntity): Promise<api.Draft> {
  const revisions = await revisionsOf(deps.db, plan.id);
  return {
    id: plan.id,
    version: plan.version,
    updatedAt: plan.updatedAt.toISOString(),
    document: readDocument(plan.draft),
    slug: plan.slug,
    revisions: revisions.map(presentRevision),
    state: plan.state,
  };
}

async function card(deps: Deps, plan: PlanEntity) {
  const [newest] = await revisionsOf(deps.db, plan.id);
  return presentDraftCard(plan, newest?.letter ?? null);
}

function listRoutes(router: Router, deps: Deps): void {
  route(router, deps, api.listDrafts, async ({ person }) => {
    const plans = await deps.db
      .getRepository(PlanEntity)
      .find({ where: { ownerId: signedIn(person).id }, order: { updatedAt: 'DESC' } });
    return { items: await Promise.all(plans.map((plan) => card(deps, plan))) };
  });
  route(router, deps, api.createDraft, async ({ body, person }) =>
    presentDraft(deps, await beginDraft(deps, signedIn(person), body)),
  );
  route(router, deps, api.getDraft, async ({ params, person }) =>
    presentDraft(deps, await ownPlan(deps.db.manager, params.planId, signedIn(person))),
  );
  route(router, deps, api.saveDraft, async ({ params, body, person }) => {
    const saved = await keepDraft(
      deps,
      signedIn(person),
      params.planId,
      body.version,
      body.document,
    );
    return { version: saved.version, updatedAt: saved.updatedAt.toISOString() };
  });
  route(router, deps, api.deleteDraft, async ({ params, person }) => {
    const plan = await ownPlan(deps.db.manager, params.planId, signedIn(person));
    if (plan.currentRevisionId)
      throw new ApiError(
        'drafts/published',
        'This plan was published; builders may have bench copies of it. Unpublish it instead.',
      );
    await deps.db.getRepository(PlanEntity).delete({ id: plan.id });
  });
}

export function registerDrafts(router: Router, deps: Deps): void {
  listRoutes(router, deps);
  route(router, deps, api.publishPlan, async ({ params, body, person }) => {
    const { plan, revision } = await publishDraft(deps, signedIn(person), params.planId, body);
    return { revision: presentRevision(revision), slug: plan.slug ?? '' };
  });
  const move = (
    contract: typeof api.unpublishPlan,
    from: 'published' | 'unpublished',
    to: 'published' | 'unpublished',
  ) =>
    route(router, deps, contract, async ({ params, person }) => {
      const plan = await ownPlan(deps.db.manager, params.planId, signedIn(person));
      if (plan.state === to) return card(deps, plan);
      if (plan.state !== from)
        throw new ApiError(
          'auth/not-allowed',
          'That cannot be done with this plan as it stands. Nothing was changed.',
        );
      plan.state = to;
      await deps.db.getRepository(PlanEntity).save(plan);
      return card(deps, plan);
    });
  move(api.unpublishPlan, 'published', 'unpublished');
  move(api.republishPlan, 'unpublished', 'published');
}
