import { type Workbox } from 'workbox-window';

/** What is known of a newer version: none, one that waits, or one that another tab has brought in. */
export type NewVersion = 'none' | 'waiting' | 'taken';

let state: NewVersion = 'none';
let worker: Workbox | undefined;
let started = false;
const listeners = new Set<() => void>();

function set(next: NewVersion): void {
  state = next;
  listeners.forEach((listener) => listener());
}

/** For `useSyncExternalStore`. */
export const newVersionStore = {
  subscribe: (listener: () => void): (() => void) => {
    listeners.add(listener);
    return () => listeners.delete(listener);
  },
  snapshot: (): NewVersion => state,
};

/** Asked again this often while a page stays open. */
const askEvery = 60 * 60 * 1000;

async function register(): Promise<void> {
  try {
    const { Workbox } = await import('workbox-window');
    worker = new Workbox('/sw.js');
    worker.addEventListener('waiting', () => set('waiting'));
    let wasControlled = navigator.serviceWorker.controller !== null;
    navigator.serviceWorker.addEventListener('controllerchange', () => {
      // The first worker of all takes over without anything having changed.
      if (wasControlled) {
        if (state === 'waiting' && taking) window.location.reload();
        else set('taken');
      }
      wasControlled = true;
    });
    await worker.register();
    setInterval(() => void worker?.update().catch(() => undefined), askEvery);
  } catch {
    // Blocked by the browser's settings, or no signal: everything works, only not without signal.
  }
}

let taking = false;

/** Brings the waiting version in and loads the page with it. */
export function takeNewVersion(): void {
  if (state === 'taken' || !worker) {
    window.location.reload();
    return;
  }
  taking = true;
  worker.messageSkipWaiting();
}

/** Starts the service worker once the page has loaded and has nothing better to do. */
export function startServiceWorker(): void {
  if (started || process.env.NODE_ENV !== 'production' || !('serviceWorker' in navigator)) return;
  started = true;
  const begin = () => {
    if ('requestIdleCallback' in window)
      requestIdleCallback(() => void register(), { timeout: 4000 });
    else setTimeout(() => void register(), 1000);
  };
  if (document.readyState === 'complete') begin();
  else window.addEventListener('load', begin, { once: true });
}
