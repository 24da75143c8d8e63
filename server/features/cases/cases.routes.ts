import { type Router } from 'express';
import * as api from '../../../shared/api/cases';
import { CaseEntity } from '../../db/entities/cases';
import { type Deps } from '../../deps';
import { route, signedIn } from '../../http/route';
import { presentCase, presentWholeCase } from './cases.presenter';
import { report, rule, take } from './cases.service';

export function registerCases(router: Router, deps: Deps): void {
  route(router, deps, api.reportThing, async ({ body, person }) => ({
    receipt: await report(deps, body, person),
  }));
  route(router, deps, api.listCases, async ({ query }) => {
    const offset = /^\d{1,6}$/.test(query.cursor ?? '') ? Number(query.cursor) : 0;
    const found = await deps.db.getRepository(CaseEntity).find({
      where: { state: query.state },
      order: { harm: 'ASC', openedAt: 'ASC', number: 'ASC' },
      skip: offset,
      take: query.limit + 1,
    });
    const items = await Promise.all(found.slice(0, query.limit).map((c) => presentCase(deps, c)));
    return { items, next: found.length > query.limit ? String(offset + query.limit) : null };
  });
  route(router, deps, api.getCase, ({ params, person }) =>
    presentWholeCase(deps, params.caseId, signedIn(person)),
  );
  route(router, deps, api.takeCase, async ({ params, body, person }) => {
    await take(deps, params.caseId, signedIn(person), body.over);
    return presentWholeCase(deps, params.caseId, signedIn(person));
  });
  route(router, deps, api.giveRuling, async ({ params, body, person }) => {
    await rule(deps, params.caseId, body, signedIn(person));
    return presentWholeCase(deps, params.caseId, signedIn(person));
  });
}
