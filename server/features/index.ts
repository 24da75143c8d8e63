import { type Router } from 'express';
import { type Deps } from '../deps';
import { registerAccounts } from './accounts/accounts.routes';
import { registerBench } from './bench/bench.routes';
import { registerCases } from './cases/cases.routes';
import { registerDrafts } from './drafts/drafts.routes';
import { registerMedia } from './media/media.routes';
import { registerNotices } from './notices/notices.routes';
import { registerPeople } from './people/people.routes';
import { registerPlans } from './plans/plans.routes';
import { registerTalk } from './talk/talk.routes';
import { registerUploads } from './uploads/uploads.routes';

/** Mounts every feature's routes below /api. */
export function registerFeatures(router: Router, deps: Deps): void {
  for (const register of [
    registerAccounts,
    registerPlans,
    registerDrafts,
    registerMedia,
    registerUploads,
    registerBench,
    registerTalk,
    registerNotices,
    registerCases,
    registerPeople,
  ]) {
    register(router, deps);
  }
}
