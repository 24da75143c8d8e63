import { useEffect, useState, useSyncExternalStore } from 'react';
import { type BenchCopy } from '../../shared/api/bench';
import { mediaPath, stretchName, wholeSeconds } from '../../shared/api/media';
import { dropStrays, keptStore, openKept, type KeptState } from '../data/kept-files';
import { askToStay } from '../data/storage-room';

/** Keeps an opened copy's pictures and clip, or asks; tries again when the signal is back. */
export function useKept({ id, document }: Pick<BenchCopy, 'id' | 'document'>): KeptState {
  useEffect(() => {
    const open = () => void openKept(id, document);
    open();
    window.addEventListener('online', open);
    return () => window.removeEventListener('online', open);
  }, [id, document]);
  return useSyncExternalStore(
    keptStore.subscribe,
    () => keptStore.of(id),
    () => keptStore.of(id),
  );
}

/** The file cut for a stretch of a clip, when it is on this device; `from` is the second it begins at. */
export function useKeptCut(
  media: string,
  stretch: { start: number; end: number },
): { path: string; from: number } | null {
  const path = mediaPath(media, stretchName(stretch));
  const there = useSyncExternalStore(
    keptStore.subscribe,
    () => keptStore.isHere(path),
    () => false,
  );
  return there ? { path, from: wholeSeconds(stretch).start } : null;
}

/** Whether the browser promised not to clear what is stored here; null until it has answered. */
export function usePromise(): boolean | null {
  const [promised, setPromised] = useState<boolean | null>(null);
  useEffect(() => {
    let gone = false;
    void askToStay().then((answer) => {
      if (!gone) setPromised(answer);
    });
    return () => {
      gone = true;
    };
  }, []);
  return promised;
}

/** Removes what is kept of copies that are on the bench no more; `copies` only as the server just gave it. */
export function useDropStrays(copies: readonly { id: string }[] | undefined): void {
  useEffect(() => {
    if (copies) void dropStrays(copies.map((copy) => copy.id));
  }, [copies]);
}
