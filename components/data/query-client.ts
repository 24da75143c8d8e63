import { createAsyncStoragePersister } from '@tanstack/query-async-storage-persister';
import { onlineManager, QueryClient } from '@tanstack/react-query';
import { del, get, set } from 'idb-keyval';
import { passing } from './problems';

const minute = 60_000;

/** How long an answer counts as fresh, by kind. */
export const staleTimes = {
  me: 5 * minute,
  list: minute,
  plan: 5 * minute,
  draft: 0,
  bench: minute,
  talk: minute / 2,
  cases: minute / 2,
} as const;

/** Keys of everything asked for; the first word is the resource. */
export const keys = {
  me: ['me'] as const,
  sessions: ['me', 'sessions'] as const,
  plans: (query: Record<string, unknown> = {}) => ['plans', query] as const,
  plan: (slug: string, rev?: string) => ['plan', slug, rev ?? 'newest'] as const,
  drafts: ['drafts'] as const,
  draft: (planId: string) => ['drafts', planId] as const,
  copies: ['bench'] as const,
  copy: (copyId: string) => ['bench', copyId] as const,
  shopCard: ['shop-card'] as const,
  talk: (planId: string, filter: Record<string, unknown> = {}) => ['talk', planId, filter] as const,
  cases: (state: string) => ['cases', state] as const,
  case: (caseId: string) => ['case', caseId] as const,
  person: (handle: string) => ['person', handle] as const,
  people: (q: string) => ['people', q] as const,
  captions: (hash: string) => ['captions', hash] as const,
  uploads: ['uploads'] as const,
  ownMedia: (hash: string) => ['own-media', hash] as const,
};

/** What must open with no signal is kept in the browser. */
const kept = new Set(['me', 'bench', 'shop-card', 'captions']);
export const keepsOffline = (key: readonly unknown[]): boolean =>
  typeof key[0] === 'string' && kept.has(key[0]);

/** One client per page load. */
export function makeQueryClient(): QueryClient {
  if (typeof navigator !== 'undefined') onlineManager.setOnline(navigator.onLine);
  return new QueryClient({
    defaultOptions: {
      queries: {
        // Asked even with no signal: the service worker or the cache may answer, and the error is honest.
        networkMode: 'always',
        retry: (count, error) => passing(error) && count < 2,
        // As long as the page lives: a timer of 30 days overflows setTimeout and would end at once.
        gcTime: Infinity,
        refetchOnWindowFocus: false,
      },
      mutations: { networkMode: 'always', retry: false },
    },
  });
}

const keptKey = 'scantling-queries';
/** The text of all kept answers. */
export const keptText = (): Promise<string | undefined> => get<string>(keptKey);

export const persister = createAsyncStoragePersister({
  key: keptKey,
  throttleTime: 0,
  storage: {
    getItem: (key: string) => get<string>(key).then((v) => v ?? null),
    setItem: (key: string, value: string) => set(key, value),
    removeItem: (key: string) => del(key),
  },
});
