import { del, get, set } from 'idb-keyval';
import { type PlanDocument } from '../../shared/plan/document';

/** What is not on the server yet, with the version it was made from. */
export interface KeptDraft {
  version: number;
  document: PlanDocument;
}

const key = (planId: string) => `scantling-draft-2-${planId}`;

const pause = 150;
const waiting = new Map<string, KeptDraft>();
let timer: ReturnType<typeof setTimeout> | undefined;

function writeWaiting(): void {
  clearTimeout(timer);
  timer = undefined;
  for (const [planId, kept] of waiting) void set(key(planId), kept).catch(() => undefined);
  waiting.clear();
}

// The last moment a page is sure to get, closed, reloaded or put away.
if (typeof document !== 'undefined')
  document.addEventListener('visibilitychange', () => {
    if (document.visibilityState === 'hidden') writeWaiting();
  });

/**
 * Keeps a draft's unsaved state in the browser, so that a closed tab loses nothing: at once after a pause, then a moment
 * after the last of quick changes, since a large plan takes milliseconds to write, and at once when the page goes.
 */
export function keepLocal(planId: string, kept: KeptDraft): void {
  waiting.set(planId, kept);
  if (timer !== undefined) return;
  writeWaiting();
  timer = setTimeout(writeWaiting, pause);
}
export const readLocal = (planId: string): Promise<KeptDraft | undefined> =>
  get<KeptDraft>(key(planId)).catch(() => undefined);
export function dropLocal(planId: string): Promise<void> {
  waiting.delete(planId);
  return del(key(planId)).catch(() => undefined);
}
