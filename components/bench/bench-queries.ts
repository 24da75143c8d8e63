import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useCallback, useMemo } from 'react';
import { v7 as uuid } from 'uuid';
import {
  getCopy,
  getShopCard,
  listCopies,
  removeCopy,
  saveShopCard,
  startCopy,
  type BenchCopy,
  type ShopCard,
} from '../../shared/api/bench';
import { type Entry } from '../../shared/plan/bench/entry';
import { foldEntries, type BenchState } from '../../shared/plan/bench/fold';
import { call } from '../data/api-client';
import { keepEntry, nextDeviceMark } from '../data/outbox';
import { useHeldEntries } from '../data/outbox-hooks';
import { keys, staleTimes } from '../data/query-client';

/** One's bench copies; kept for offline. */
export const useCopies = () =>
  useQuery({
    queryKey: keys.copies,
    queryFn: ({ signal }) => call(listCopies, { signal }),
    staleTime: staleTimes.bench,
  });

/** One bench copy with its frozen plan and entries; kept for offline from the first opening. */
export const useCopy = (copyId: string) =>
  useQuery({
    queryKey: keys.copy(copyId),
    queryFn: ({ signal }) => call(getCopy, { params: { copyId }, signal }),
    // Kept in the browser, but always asked again: what was sent just before a reload must show.
    staleTime: 0,
    refetchOnMount: 'always',
  });

export function useStartCopy() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { planId: string; revisionId: string }) =>
      call(startCopy, { params: { copyId: uuid() }, body }),
    onSuccess: (copy) => {
      client.setQueryData(keys.copy(copy.id), copy);
      void client.invalidateQueries({ queryKey: keys.copies, exact: true });
      void client.invalidateQueries({ queryKey: ['plan'] });
    },
  });
}

export function useRemoveCopy() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (copyId: string) => call(removeCopy, { params: { copyId } }),
    onSuccess: () => void client.invalidateQueries({ queryKey: keys.copies }),
  });
}

/** The state of a copy now: what the server has and what still waits on this device. */
export function useBenchState(copy: BenchCopy): BenchState {
  const held = useHeldEntries(copy.id);
  return useMemo(
    () =>
      foldEntries([
        ...copy.entries.map(({ entry, sequence }) => ({ entry, sequence })),
        ...held.map((job) => ({ entry: job.entry, sequence: job.sequence ?? null })),
      ]),
    [copy.entries, held],
  );
}

type WithoutMarks<E> = E extends Entry
  ? Omit<E, 'id' | 'revisionId' | 'device' | 'deviceSequence' | 'deviceTime'>
  : never;
export type NewEntry = WithoutMarks<Entry>;

/** Adds an entry: kept in the browser first, then sent by the outbox. Resolves when it is kept. */
export function useAddEntry(copy: BenchCopy, personId: string) {
  return useCallback(
    async (entry: NewEntry): Promise<Entry> => {
      const mark = await nextDeviceMark(uuid);
      const whole = {
        ...entry,
        ...mark,
        id: uuid(),
        revisionId: copy.revision.id,
        deviceTime: new Date().toISOString(),
      };
      await keepEntry(personId, copy.id, whole);
      return whole;
    },
    [copy.id, copy.revision.id, personId],
  );
}

export const useShopCard = () =>
  useQuery({
    queryKey: keys.shopCard,
    queryFn: ({ signal }) => call(getShopCard, { signal }),
    staleTime: staleTimes.bench,
  });

export function useSaveShopCard() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { version: number; card: ShopCard }) => call(saveShopCard, { body }),
    onSuccess: (saved) => client.setQueryData(keys.shopCard, saved),
  });
}
