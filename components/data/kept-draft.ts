import { del, get, set } from 'idb-keyval';
import { type PlanDocument } from '../../shared/plan/document';

const key = (planId: string) => `scantling-draft-${planId}`;

/** Keeps a draft's unsaved state in the browser, so that a closed tab loses nothing. */
export const keepLocal = (planId: string, document: PlanDocument): Promise<void> =>
  set(key(planId), document).catch(() => undefined);
export const readLocal = (planId: string): Promise<PlanDocument | undefined> =>
  get<PlanDocument>(key(planId)).catch(() => undefined);
export const dropLocal = (planId: string): Promise<void> => del(key(planId)).catch(() => undefined);
