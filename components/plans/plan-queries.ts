import { keepPreviousData, useInfiniteQuery, useQuery } from '@tanstack/react-query';
import { getPlan, listPlans } from '../../shared/api/plans';
import { call } from '../data/api-client';
import { keys, staleTimes } from '../data/query-client';

export interface PlanFilter {
  q: string;
  maxMinutes?: number;
  skill?: 'first' | 'some' | 'practised';
  units?: 'mm' | 'in';
  machines?: string;
  sort: 'newest' | 'most-built' | 'shortest';
}

/** Published plans, page by page. */
export const usePlans = (filter: PlanFilter) =>
  useInfiniteQuery({
    queryKey: keys.plans({ ...filter }),
    queryFn: ({ pageParam, signal }) =>
      call(listPlans, {
        query: { ...filter, ...(pageParam ? { cursor: pageParam } : {}) },
        signal,
      }),
    initialPageParam: '',
    getNextPageParam: (last) => last.next ?? undefined,
    staleTime: staleTimes.list,
    placeholderData: keepPreviousData,
  });

/** One plan's page, its newest or the named revision. */
export const usePlan = (slug: string, rev?: string) =>
  useQuery({
    queryKey: keys.plan(slug, rev),
    queryFn: ({ signal }) => call(getPlan, { params: { slug }, query: rev ? { rev } : {}, signal }),
    staleTime: staleTimes.plan,
  });
