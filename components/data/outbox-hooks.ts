import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useMemo, useSyncExternalStore } from 'react';
import { type BenchCopy } from '../../shared/api/bench';
import { dropSent, flushOutbox, outboxStore, type OutboxJob } from './outbox';
import { keptText, keys } from './query-client';
import { useMe } from './me-queries';

const none: readonly OutboxJob[] = [];
const again = 20_000;

const useJobs = () => useSyncExternalStore(outboxStore.subscribe, outboxStore.snapshot, () => none);

/** Entries that wait or were refused: all, or one bench copy's. */
export function useOutbox(copyId?: string): readonly OutboxJob[] {
  const all = useJobs();
  return useMemo(
    () => all.filter((job) => job.state !== 'sent' && (!copyId || job.copyId === copyId)),
    [all, copyId],
  );
}

/** Everything this device still holds of a bench copy, sent or not. */
export function useHeldEntries(copyId: string): readonly OutboxJob[] {
  const all = useJobs();
  return useMemo(() => all.filter((job) => job.copyId === copyId), [all, copyId]);
}

/** Adds entries the server now has to the cached copy, so that nothing flickers before the next fetch. */
export function withStored(copy: BenchCopy | undefined, job: OutboxJob): BenchCopy | undefined {
  if (!copy || copy.entries.some((e) => e.entry.id === job.entry.id)) return copy;
  const stored = {
    entry: job.entry,
    sequence: job.sequence ?? 0,
    receivedAt: new Date().toISOString(),
  };
  return { ...copy, entries: [...copy.entries, stored] };
}

/** Sends what waits: at start, when the signal returns, when the page is looked at again, and by a timer. */
export function useOutboxFlusher(): void {
  useSentDropper();
  const { me } = useMe();
  const client = useQueryClient();
  const waiting = useOutbox().filter(
    (job) => job.personId === me?.id && job.state === 'waiting',
  ).length;
  const personId = me?.id;
  useEffect(() => {
    if (!personId || waiting === 0) return;
    const flush = () => {
      void flushOutbox(personId, (job) =>
        client.setQueryData<BenchCopy>(keys.copy(job.copyId), (copy) => withStored(copy, job)),
      ).then((result) => {
        if (result.sent.length > 0)
          void client.invalidateQueries({ queryKey: keys.copies, exact: true });
        if (result.stopped === 'signed-out') void client.invalidateQueries({ queryKey: keys.me });
      });
    };
    flush();
    const timer = setInterval(flush, again);
    const seen = () => document.visibilityState === 'visible' && flush();
    window.addEventListener('online', flush);
    document.addEventListener('visibilitychange', seen);
    return () => {
      clearInterval(timer);
      window.removeEventListener('online', flush);
      document.removeEventListener('visibilitychange', seen);
    };
  }, [personId, waiting, client]);
}

/** Lets go of sent entries once the kept answers hold them. */
function useSentDropper(): void {
  const sent = useJobs().filter((job) => job.state === 'sent').length;
  useEffect(() => {
    if (sent === 0) return;
    const drop = () => void keptText().then(dropSent);
    const timer = setInterval(drop, 3000);
    return () => clearInterval(timer);
  }, [sent]);
}

const subscribeOnline = (listener: () => void) => {
  window.addEventListener('online', listener);
  window.addEventListener('offline', listener);
  return () => {
    window.removeEventListener('online', listener);
    window.removeEventListener('offline', listener);
  };
};

/** Whether the browser believes it has a signal. */
export function useOnline(): boolean {
  return useSyncExternalStore(
    subscribeOnline,
    () => navigator.onLine,
    () => true,
  );
}
