import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import {
  createDraft,
  deleteDraft,
  getDraft,
  listDrafts,
  publishPlan,
  republishPlan,
  saveDraft,
  unpublishPlan,
} from '../../shared/api/plans';
import { type PlanDocument } from '../../shared/plan/document';
import { call, type CallInput } from '../data/api-client';
import { keys, staleTimes } from '../data/query-client';

export const useDrafts = () =>
  useQuery({
    queryKey: keys.drafts,
    queryFn: ({ signal }) => call(listDrafts, { signal }),
    staleTime: staleTimes.list,
  });

export const useDraft = (planId: string) =>
  useQuery({
    queryKey: keys.draft(planId),
    queryFn: ({ signal }) => call(getDraft, { params: { planId }, signal }),
    staleTime: Infinity,
    refetchOnMount: 'always',
  });

export function useCreateDraft() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: {
      id: string;
      title: string;
      units: 'mm' | 'in';
      document?: PlanDocument;
    }) => call(createDraft, { body }),
    onSuccess: () => void client.invalidateQueries({ queryKey: keys.drafts, exact: true }),
  });
}

export const putDraft = (planId: string, version: number, document: PlanDocument) =>
  call(saveDraft, { params: { planId }, body: { version, document } });

export function usePublish(planId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: CallInput<typeof publishPlan>['body']) =>
      call(publishPlan, { params: { planId }, body }),
    onSuccess: () => void client.invalidateQueries(),
  });
}

export function useMovePlan(planId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (to: 'unpublish' | 'republish' | 'delete') =>
      to === 'delete'
        ? call(deleteDraft, { params: { planId } })
        : call(to === 'unpublish' ? unpublishPlan : republishPlan, { params: { planId } }),
    onSuccess: () => void client.invalidateQueries(),
  });
}
