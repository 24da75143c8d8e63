import { type Router } from 'express';
import * as api from '../../../shared/api/notices';
import { compareRevisions } from '../../../shared/plan/compare';
import { PersonEntity } from '../../db/entities/person';
import { type Deps } from '../../deps';
import { ApiError, missing } from '../../http/errors';
import { route, signedIn } from '../../http/route';
import { ownPlan } from '../drafts/drafts.service';
import { frozenRevision } from '../plans/frozen';
import { canSeePlan } from '../plans/plans.policy';
import { findPlan, revisionByLetter } from '../plans/plans.repository';
import { notesBetween, previewOf } from './corrections.service';
import {
  countUnread,
  keepSetting,
  markRead,
  noticesPage,
  settingsOf,
  type NoticeRow,
} from './notices.repository';
import { readUnsubscribeToken } from './unsubscribe';

const present = (row: NoticeRow): api.NoticeView => ({
  id: row.id,
  kind: row.kind,
  title: row.title,
  text: row.text,
  path: row.path,
  createdAt: row.created_at.toISOString(),
  readAt: row.read_at?.toISOString() ?? null,
});

function comparing(router: Router, deps: Deps): void {
  route(router, deps, api.previewCorrection, async ({ params, person }) =>
    previewOf(deps, await ownPlan(deps.db.manager, params.planId, signedIn(person))),
  );
  route(router, deps, api.compareLetters, async ({ params, query, person }) => {
    const plan = await findPlan(deps.db, params.planId);
    if (!plan || !canSeePlan(person, plan)) throw missing('That plan');
    const [from, to] = await Promise.all(
      [query.from, query.to].map(async (letter) => {
        const id = (await revisionByLetter(deps.db, plan.id, letter))?.id;
        const revision = id ? await frozenRevision(deps.db, id) : null;
        if (!revision) throw missing(`Revision ${letter}`);
        return revision;
      }),
    );
    if (!from || !to) throw missing('That revision');
    return {
      changes: compareRevisions(from.document, to.document).changes,
      notes: await notesBetween(deps, plan.id, from.row.id, to.row.id),
    };
  });
}

export function registerNotices(router: Router, deps: Deps): void {
  comparing(router, deps);
  route(router, deps, api.listNotices, async ({ query, person }) => {
    const { id } = signedIn(person);
    const { rows, next } = await noticesPage(deps.db, id, query.cursor, query.limit);
    return { items: rows.map(present), next, unread: await countUnread(deps.db, id) };
  });
  route(router, deps, api.readNotices, async ({ body, person }) => {
    await markRead(deps.db, signedIn(person).id, body.ids, deps.now());
    return { ok: true as const };
  });
  route(router, deps, api.getNoticeSettings, async ({ person }) => ({
    items: await settingsOf(deps.db, signedIn(person).id),
  }));
  route(router, deps, api.saveNoticeSetting, async ({ body, person }) => {
    const { id } = signedIn(person);
    await keepSetting(deps.db, id, body);
    return { items: await settingsOf(deps.db, id) };
  });
  route(router, deps, api.unsubscribe, async ({ query }) => {
    const read = readUnsubscribeToken(deps.env, query.token);
    const known =
      read && (await deps.db.getRepository(PersonEntity).existsBy({ id: read.personId }));
    if (!read || !known)
      throw new ApiError(
        'auth/token',
        'This link is broken. Nothing was changed; sign in and look under You, Notices.',
      );
    const settings = await settingsOf(deps.db, read.personId);
    for (const setting of settings)
      if (read.kinds.includes(setting.kind))
        await keepSetting(deps.db, read.personId, { ...setting, mail: false });
    return { kinds: read.kinds };
  });
}
