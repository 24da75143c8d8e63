import { cleanupOutdatedCaches, createHandlerBoundToURL } from 'workbox-precaching';
import { precacheAndRoute } from 'workbox-precaching/precacheAndRoute';
import { createPartialResponse } from 'workbox-range-requests';
import { NavigationRoute, registerRoute } from 'workbox-routing';
import { keptFilesCache } from '../data/kept-names';

/** The part of a worker's scope used here; its full types clash with those of a page. */
interface WorkerScope {
  /** Filled in by scripts/service-worker.mjs. */
  __WB_MANIFEST: { url: string; revision: string | null }[];
  location: Location;
  clients: {
    claim(): Promise<void>;
    matchAll(what: { type: 'window' }): Promise<{ url: string; focus(): Promise<unknown> }[]>;
  };
  skipWaiting(): Promise<void>;
  addEventListener(
    name: 'notificationclick',
    listener: (event: {
      notification: { close(): void };
      waitUntil(work: Promise<unknown>): void;
    }) => void,
  ): void;
  addEventListener(name: 'message', listener: (event: MessageEvent<unknown>) => void): void;
  addEventListener(
    name: 'activate',
    listener: (event: { waitUntil(work: Promise<unknown>): void }) => void,
  ): void;
}
declare const self: WorkerScope;

/** Pages whose address holds an id or a name: one pre-rendered file answers all of them. */
const dynamicPages: readonly [RegExp, string][] = [
  [/^\/plans\/[^/]+\/?$/, '/plans/[slug].html'],
  [/^\/bench\/[^/]+\/?$/, '/bench/[copyId].html'],
  [/^\/drafting\/[^/]+\/?$/, '/drafting/[planId].html'],
  [/^\/cases\/[^/]+\/?$/, '/cases/[caseId].html'],
  [/^\/aids\/[^/]+\/?$/, '/aids/[aid].html'],
];

/** Other spellings of an address under which its file may be kept: a folder's page, brackets as they are. */
function spellings({ url }: { url: URL }): URL[] {
  const folder = new URL(`${url.pathname.replace(/\/$/, '')}/index.html`, url);
  const brackets = new URL(url.pathname.replace(/%5B/gi, '[').replace(/%5D/gi, ']'), url);
  return [folder, brackets];
}

precacheAndRoute(self.__WB_MANIFEST, {
  // What follows the question mark is for the page, not for its file: /sign-in?next=…
  ignoreURLParametersMatching: [/.*/],
  urlManipulation: spellings,
});
cleanupOutdatedCaches();
for (const [address, file] of dynamicPages) {
  registerRoute(new NavigationRoute(createHandlerBoundToURL(file), { allowlist: [address] }));
}

/** A kept file, or the part of it a player asks for; what is not kept goes to the network untouched. */
registerRoute(
  ({ url, sameOrigin }) => sameOrigin && /^\/media\/[0-9a-f]{64}\/[\w.-]+$/.test(url.pathname),
  async ({ request, url }) => {
    // Copies opened with the first version hold their clip under its old name until they are measured again.
    const old = url.pathname.replace(/\/720$/, '/original');
    const kept =
      (await caches.match(url.pathname, { cacheName: keptFilesCache })) ??
      (await caches.match(old, { cacheName: keptFilesCache }));
    if (!kept) return fetch(request);
    return request.headers.has('range') ? createPartialResponse(request, kept) : kept;
  },
);

// A notice that rings leads back to the bench it rang for.
self.addEventListener('notificationclick', (event) => {
  event.notification.close();
  const shown = self.clients
    .matchAll({ type: 'window' })
    .then((pages) => pages.find((page) => page.url.includes('/bench/'))?.focus());
  event.waitUntil(shown);
});

// A new version waits until the person takes it; only then does it come in.
self.addEventListener('message', (event) => {
  const message = event.data as { type?: unknown } | null;
  if (message?.type === 'SKIP_WAITING') void self.skipWaiting();
});
// From the first visit on, so that what is kept during it can be shown during it.
self.addEventListener('activate', (event) => event.waitUntil(self.clients.claim()));
