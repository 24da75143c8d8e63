import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { getMedia, workAgain, type Media } from '../../shared/api/media';
import { call } from '../data/api-client';
import { keys } from '../data/query-client';

export const underWork = (media: Pick<Media, 'state'>): boolean =>
  media.state === 'waiting' || media.state === 'working';

/** One of one's own files, asked for again while the work on it goes on. */
export const useOwnMedia = (hash: string | undefined) =>
  useQuery({
    queryKey: keys.ownMedia(hash ?? ''),
    queryFn: async ({ signal }) =>
      (await call(getMedia, { params: { hash: hash ?? '' }, signal })).media,
    enabled: hash !== undefined,
    staleTime: 0,
    refetchInterval: ({ state }) => (state.data && underWork(state.data) ? 1500 : false),
  });

export function useWorkAgain() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (hash: string) => call(workAgain, { params: { hash } }),
    onSuccess: ({ media }) => client.setQueryData(keys.ownMedia(media.hash), media),
  });
}
