import { useInfiniteQuery, useMutation, useQueryClient } from '@tanstack/react-query';
import { reportThing } from '../../shared/api/cases';
import {
  deleteComment,
  editComment,
  listTalk,
  postComment,
  settleComment,
  type CommentBody,
} from '../../shared/api/talk';
import { call, type CallInput } from '../data/api-client';
import { keys, staleTimes } from '../data/query-client';

export interface TalkFilter {
  kind?: 'critique' | 'question';
  elementId?: string;
  open?: 'true';
}

/** Critiques and questions of a plan, newest first, page by page. */
export const useTalk = (planId: string, filter: TalkFilter = {}) =>
  useInfiniteQuery({
    queryKey: keys.talk(planId, { ...filter }),
    queryFn: ({ pageParam, signal }) =>
      call(listTalk, {
        params: { planId },
        query: { ...filter, ...(pageParam ? { cursor: pageParam } : {}) },
        signal,
      }),
    initialPageParam: '',
    getNextPageParam: (last) => last.next ?? undefined,
    staleTime: staleTimes.talk,
  });

function useTalkChanged(planId: string) {
  const client = useQueryClient();
  return () => {
    void client.invalidateQueries({ queryKey: ['talk', planId] });
    void client.invalidateQueries({ queryKey: ['plan'] });
  };
}

export function usePostComment(planId: string) {
  const onSuccess = useTalkChanged(planId);
  return useMutation({
    mutationFn: (body: CommentBody) => call(postComment, { params: { planId }, body }),
    onSuccess,
  });
}

export function useEditComment(planId: string) {
  const onSuccess = useTalkChanged(planId);
  return useMutation({
    mutationFn: ({ commentId, ...body }: { commentId: string; text: string; why?: string }) =>
      call(editComment, { params: { commentId }, body }),
    onSuccess,
  });
}

export function useDeleteComment(planId: string) {
  const onSuccess = useTalkChanged(planId);
  return useMutation({
    mutationFn: (commentId: string) => call(deleteComment, { params: { commentId } }),
    onSuccess,
  });
}

export function useSettle(planId: string) {
  const onSuccess = useTalkChanged(planId);
  return useMutation({
    mutationFn: ({ commentId, answerId }: { commentId: string; answerId: string | null }) =>
      call(settleComment, { params: { commentId }, body: { answerId } }),
    onSuccess,
  });
}

export const useReport = () =>
  useMutation({
    mutationFn: (body: CallInput<typeof reportThing>['body']) => call(reportThing, { body }),
  });
