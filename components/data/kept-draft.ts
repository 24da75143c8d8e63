import { del, get, set } from 'idb-keyval';
import { type PlanDocument } from '../../shared/plan/document';

/** What is not on the server yet, with the version it was made from. */
export interface KeptDraft {
  version: number;
  document: PlanDocument;
}

const key = (planId: string) => `scantling-draft-2-${planId}`;

/** Keeps a draft's unsaved state in the browser, so that a closed tab loses nothing. */
export const keepLocal = (planId: string, kept: KeptDraft): Promise<void> =>
  set(key(planId), kept).catch(() => undefined);
export const readLocal = (planId: string): Promise<KeptDraft | undefined> =>
  get<KeptDraft>(key(planId)).catch(() => undefined);
export const dropLocal = (planId: string): Promise<void> => del(key(planId)).catch(() => undefined);
