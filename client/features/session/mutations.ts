import { useMutation, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import { command, request } from '#client/lib/api.ts';
import { user, type SessionDto, type SignIn, type SignUp } from '#shared/schemas/session.ts';
import { sessionQuery } from './queries.ts';

const signedIn = z.strictObject({ user });

/** What was fetched for one person must not be shown to the next. */
function useEnter() {
  const client = useQueryClient();
  return (session: SessionDto) => {
    client.removeQueries({ predicate: ({ queryKey }) => queryKey[0] !== sessionQuery.queryKey[0] });
    client.setQueryData(sessionQuery.queryKey, session);
  };
}

export function useSignIn() {
  const enter = useEnter();
  return useMutation({
    mutationFn: (body: SignIn) => request('/session', signedIn, { method: 'POST', body }),
    onSuccess: enter,
  });
}

export function useSignUp() {
  const enter = useEnter();
  return useMutation({
    mutationFn: (body: SignUp) => request('/users', signedIn, { method: 'POST', body }),
    onSuccess: enter,
  });
}

export function useSignOut() {
  const enter = useEnter();
  return useMutation({
    mutationFn: () => command('/session', { method: 'DELETE' }),
    onSuccess: () => enter({ user: null }),
  });
}
