import { get, set, update } from 'idb-keyval';
import { putEntry } from '../../shared/api/bench';
import { type Entry } from '../../shared/plan/bench/entry';
import { call } from './api-client';
import { ApiProblem, passing } from './problems';

/** One entry on its way to the server. The entry's own id makes sending it twice harmless. */
export interface OutboxJob {
  copyId: string;
  /** Whose entry it is: a queue is never sent under another person's sign-in. */
  personId: string;
  entry: Entry;
  /** `sent`: the server has it, but the kept copy of the bench may not; it still counts on this device. */
  state: 'waiting' | 'refused' | 'sent';
  /** The server's sequence, once sent. */
  sequence?: number;
  /** Why the server refused it, as a sentence, with its code. */
  reason?: string;
  code?: string;
}

const storeKey = 'scantling-outbox';
const lockName = 'scantling-outbox';
const listeners = new Set<() => void>();
let jobs: readonly OutboxJob[] = [];
let loaded = false;

const tell = () => listeners.forEach((listener) => listener());

async function reload(): Promise<void> {
  jobs = (await get<OutboxJob[]>(storeKey)) ?? [];
  loaded = true;
  tell();
}

/** Changes the kept list in one IndexedDB transaction, then tells the screens. */
async function change(fn: (list: OutboxJob[]) => OutboxJob[]): Promise<void> {
  await update<OutboxJob[]>(storeKey, (list) => fn(list ?? []));
  await reload();
  channel()?.postMessage('changed');
}

let sharedChannel: BroadcastChannel | null | undefined;
function channel(): BroadcastChannel | null {
  if (sharedChannel === undefined) {
    sharedChannel = typeof BroadcastChannel === 'undefined' ? null : new BroadcastChannel(storeKey);
    if (sharedChannel) sharedChannel.onmessage = () => void reload();
  }
  return sharedChannel;
}

/** For `useSyncExternalStore`. */
export const outboxStore = {
  subscribe: (listener: () => void): (() => void) => {
    listeners.add(listener);
    channel();
    if (!loaded && typeof indexedDB !== 'undefined') void reload();
    return () => listeners.delete(listener);
  },
  snapshot: (): readonly OutboxJob[] => jobs,
};

/** Keeps an entry in the browser. Await it before the screen confirms; then it cannot be lost by a reload. */
export async function keepEntry(personId: string, copyId: string, entry: Entry): Promise<void> {
  await change((list) => [
    ...list.filter((job) => job.entry.id !== entry.id),
    { copyId, personId, entry, state: 'waiting' },
  ]);
}

/** Drops entries for good: after the server has them, or because the person said so. */
export async function dropEntries(ids: readonly string[]): Promise<void> {
  const gone = new Set(ids);
  await change((list) => list.filter((job) => !gone.has(job.entry.id)));
}

/** Gives refused entries another try. */
export async function retryRefused(personId: string): Promise<void> {
  await change((list) =>
    list.map((job) =>
      job.personId === personId && job.state === 'refused'
        ? { copyId: job.copyId, personId, entry: job.entry, state: 'waiting' as const }
        : job,
    ),
  );
}

async function markRefused(id: string, problem: ApiProblem): Promise<void> {
  await change((list) =>
    list.map((job) =>
      job.entry.id === id
        ? { ...job, state: 'refused' as const, reason: problem.message, code: problem.code }
        : job,
    ),
  );
}

export interface FlushResult {
  sent: string[];
  /** Why it stopped before the end, if it did: no signal, or the session is over. */
  stopped: 'no' | 'no-signal' | 'signed-out';
}

async function flushLocked(
  personId: string,
  onSent: (job: OutboxJob) => void,
): Promise<FlushResult> {
  const sent: string[] = [];
  for (;;) {
    const list = (await get<OutboxJob[]>(storeKey)) ?? [];
    const job = list.find((j) => j.personId === personId && j.state === 'waiting');
    if (!job) return { sent, stopped: 'no' };
    let sequence: number;
    try {
      const stored = await call(putEntry, {
        params: { copyId: job.copyId, entryId: job.entry.id },
        body: job.entry,
      });
      sequence = stored.sequence;
    } catch (error) {
      if (passing(error)) return { sent, stopped: 'no-signal' };
      if (error instanceof ApiProblem && error.status === 401)
        return { sent, stopped: 'signed-out' };
      if (!(error instanceof ApiProblem)) throw error;
      await markRefused(job.entry.id, error);
      continue;
    }
    sent.push(job.entry.id);
    await change((all) =>
      all.map((j) =>
        j.entry.id === job.entry.id ? { ...j, state: 'sent' as const, sequence } : j,
      ),
    );
    onSent({ ...job, state: 'sent', sequence });
  }
}

/** Sends one person's waiting entries in order, one flusher at a time across tabs. */
export async function flushOutbox(
  personId: string,
  onSent: (job: OutboxJob) => void = () => undefined,
): Promise<FlushResult> {
  if (typeof navigator === 'undefined' || !navigator.locks) return flushLocked(personId, onSent);
  return navigator.locks.request(lockName, { ifAvailable: true }, async (lock) =>
    lock ? flushLocked(personId, onSent) : { sent: [], stopped: 'no' as const },
  );
}

/**
 * Lets go of sent entries that the kept answers hold as well: from then on a reload with no signal finds
 * them there. `kept` is the text of what is kept.
 */
export async function dropSent(kept: string | undefined): Promise<void> {
  const sent = ((await get<OutboxJob[]>(storeKey)) ?? []).filter((job) => job.state === 'sent');
  const held = sent.filter((job) => kept?.includes(job.entry.id)).map((job) => job.entry.id);
  if (held.length > 0) await dropEntries(held);
}

/** For tests and for signing out: everything kept for a person is cleared. */
export async function clearOutbox(personId: string): Promise<void> {
  await change((list) => list.filter((job) => job.personId !== personId));
}

const deviceKey = 'scantling-device';
/** This browser's opaque id and the next number of its own. */
export async function nextDeviceMark(
  makeId: () => string,
): Promise<{ device: string; deviceSequence: number }> {
  let mark = { device: '', deviceSequence: 0 };
  await update<{ device: string; next: number }>(deviceKey, (known) => {
    const device = known?.device ?? makeId();
    const next = known?.next ?? 1;
    mark = { device, deviceSequence: next };
    return { device, next: next + 1 };
  });
  return mark;
}

/** Only for tests: start from an empty store. */
export async function resetOutbox(): Promise<void> {
  await set(storeKey, []);
  await reload();
}
