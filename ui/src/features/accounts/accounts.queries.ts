import { SessionView, type MembershipChoice, type SignInInput } from '@brimgate/rules';
import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import * as v from 'valibot';
import { api } from '../../lib/api-client';

const MINUTES = 60_000;

export const sessionQuery = queryOptions({
  queryKey: ['session'],
  queryFn: ({ signal }) => api.get('/session', SessionView, signal),
  staleTime: 5 * MINUTES,
});

/** Signs in; whatever was fetched for somebody else is forgotten. */
export function useSignIn() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (input: SignInInput) => api.send('POST', '/session', SessionView, { body: input }),
    onSuccess: (session) => {
      queryClient.clear();
      queryClient.setQueryData(sessionQuery.queryKey, session);
    },
  });
}

/** Signs the same person in again, under the membership they were working in, and keeps what is on the page. */
export function useSignInAgain(membershipId: string) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: async (input: SignInInput) => {
      const session = await api.send('POST', '/session', SessionView, { body: input });
      if (session.membership.id === membershipId) return session;
      const choice: MembershipChoice = { membershipId };
      return api.send('PUT', '/session/membership', SessionView, { body: choice });
    },
    onSuccess: (session) => queryClient.setQueryData(sessionQuery.queryKey, session),
  });
}

export function useChooseMembership() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (choice: MembershipChoice) => api.send('PUT', '/session/membership', SessionView, { body: choice }),
    onSuccess: (session) => {
      // Another firm's rows must not stay on screen for a moment.
      queryClient.clear();
      queryClient.setQueryData(sessionQuery.queryKey, session);
    },
  });
}

export function useSignOut() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: () => api.send('DELETE', '/session', v.undefined()),
    onSuccess: () => queryClient.clear(),
  });
}
