import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import {
  askReset,
  becomeCreator,
  confirmEmail,
  endSession,
  getMe,
  listPeople,
  listSessions,
  resendConfirmation,
  setPassword,
  setRoles,
  signIn,
  signOut,
  signUp,
  updateProfile,
  type Me,
  type Role,
} from '../../shared/api/accounts';
import { call, type CallInput } from './api-client';
import { lastPerson, noteLastPerson } from './last-person';
import { adoptPreferences } from './preferences';
import { keys, staleTimes } from './query-client';
import { useMounted } from '../ui/use-media';

/**
 * The person at this browser. With no signal the last known one counts (kept in IndexedDB), so guards
 * never send anybody to sign in because the network failed.
 */
export function useMe(): { me: Me | null; known: boolean; failed: boolean } {
  const query = useQuery({
    queryKey: keys.me,
    queryFn: async ({ signal }) => (await call(getMe, { signal })).me,
    staleTime: staleTimes.me,
  });
  // A route's chunk may hydrate after the answer came; until then the page must stay as pre-rendered.
  const mounted = useMounted();
  const me = mounted ? (query.data ?? null) : null;
  useEffect(() => {
    if (!me) return;
    adoptPreferences(me.preferences);
    noteLastPerson(me);
  }, [me]);
  return { me, known: mounted && query.data !== undefined, failed: mounted && query.isError };
}

function useSetMe() {
  const client = useQueryClient();
  return (me: Me | null) => client.setQueryData(keys.me, me);
}

export function useSignIn() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: CallInput<typeof signIn>['body']) => call(signIn, { body }),
    onSuccess: ({ me }) => {
      // What was kept of somebody else's is not for this person.
      const before = lastPerson();
      if (before && before.id !== me.id)
        client.removeQueries({ predicate: (q) => q.queryKey[0] !== 'me' });
      client.setQueryData(keys.me, me);
      // Lists asked for as somebody else, or as nobody, are asked again.
      void client.invalidateQueries({ predicate: (q) => q.queryKey[0] !== 'me' });
    },
  });
}

export function useSignOut() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => call(signOut, {}),
    onSuccess: () => {
      client.removeQueries({ predicate: (q) => q.queryKey[0] !== 'me' });
      client.setQueryData(keys.me, null);
    },
  });
}

export const useSignUp = () =>
  useMutation({ mutationFn: (body: CallInput<typeof signUp>['body']) => call(signUp, { body }) });
export const useAskReset = () =>
  useMutation({ mutationFn: (email: string) => call(askReset, { body: { email } }) });
export const useSetPassword = () =>
  useMutation({
    mutationFn: (body: { token: string; password: string }) => call(setPassword, { body }),
  });
export const useResendConfirmation = () =>
  useMutation({ mutationFn: () => call(resendConfirmation, {}) });

export function useConfirmEmail() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (token: string) => call(confirmEmail, { body: { token } }),
    onSuccess: () => client.invalidateQueries({ queryKey: keys.me }),
  });
}

export function useUpdateProfile() {
  const setMe = useSetMe();
  return useMutation({
    mutationFn: (body: CallInput<typeof updateProfile>['body']) => call(updateProfile, { body }),
    onSuccess: ({ me }) => setMe(me),
  });
}

export function useBecomeCreator() {
  const setMe = useSetMe();
  return useMutation({
    mutationFn: () => call(becomeCreator, { body: { acceptRules: true } }),
    onSuccess: ({ me }) => setMe(me),
  });
}

export const useSessions = () =>
  useQuery({
    queryKey: keys.sessions,
    queryFn: ({ signal }) => call(listSessions, { signal }),
    staleTime: 0,
  });

export function useEndSession() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (sessionId: string) => call(endSession, { params: { sessionId } }),
    onSuccess: () => client.invalidateQueries({ queryKey: keys.sessions }),
  });
}

export const usePeople = (q: string) =>
  useQuery({
    queryKey: keys.people(q),
    queryFn: ({ signal }) => call(listPeople, { query: { q }, signal }),
    staleTime: staleTimes.list,
  });

export function useSetRoles() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ personId, roles }: { personId: string; roles: Role[] }) =>
      call(setRoles, { params: { personId }, body: { roles } }),
    onSuccess: () => client.invalidateQueries({ queryKey: ['people'] }),
  });
}
