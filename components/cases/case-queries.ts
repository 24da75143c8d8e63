import { useInfiniteQuery, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { getCase, giveRuling, listCases, takeCase, type CaseView } from '../../shared/api/cases';
import { call, type CallInput } from '../data/api-client';
import { keys, staleTimes } from '../data/query-client';

/** The queue, gravest first. */
export const useCases = (state: 'open' | 'ruled') =>
  useInfiniteQuery({
    queryKey: keys.cases(state),
    queryFn: ({ pageParam, signal }) =>
      call(listCases, { query: { state, ...(pageParam ? { cursor: pageParam } : {}) }, signal }),
    initialPageParam: '',
    getNextPageParam: (last) => last.next ?? undefined,
    staleTime: staleTimes.cases,
  });

export const useCase = (caseId: string) =>
  useQuery({
    queryKey: keys.case(caseId),
    queryFn: ({ signal }) => call(getCase, { params: { caseId }, signal }),
    staleTime: staleTimes.cases,
  });

function useCaseChanged(caseId: string) {
  const client = useQueryClient();
  return (view: CaseView) => {
    client.setQueryData(keys.case(caseId), view);
    void client.invalidateQueries({ queryKey: ['cases'] });
    void client.invalidateQueries({ queryKey: keys.me, exact: true });
  };
}

export function useTakeCase(caseId: string) {
  const onSuccess = useCaseChanged(caseId);
  return useMutation({
    mutationFn: (over: boolean) => call(takeCase, { params: { caseId }, body: { over } }),
    onSuccess,
  });
}

export function useGiveRuling(caseId: string) {
  const onSuccess = useCaseChanged(caseId);
  return useMutation({
    mutationFn: (body: CallInput<typeof giveRuling>['body']) =>
      call(giveRuling, { params: { caseId }, body }),
    onSuccess,
  });
}
