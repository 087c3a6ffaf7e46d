import { useMutation, useQueryClient } from '@tanstack/react-query';
import { command, requestJson } from '#client/lib/api.ts';
import type { SessionDto, SignIn, SignUp } from '#shared/schemas/session.ts';
import { withDeviceChoices } from './device-choices.ts';
import { sessionOf, sessionQuery } from './queries.ts';

/** What was fetched for one person must not be shown to the next. */
export function useEnter() {
  const client = useQueryClient();
  return (session: SessionDto) => {
    client.removeQueries({ predicate: ({ queryKey }) => queryKey[0] !== sessionQuery.queryKey[0] });
    client.setQueryData(sessionQuery.queryKey, session);
  };
}

export function useSignIn() {
  const enter = useEnter();
  return useMutation({
    mutationFn: async (body: SignIn) => sessionOf(await requestJson('/session', { method: 'POST', body })),
    onSuccess: enter,
  });
}

/** Units and theme that were chosen as a visitor become the new account's. */
export function useSignUp() {
  const enter = useEnter();
  return useMutation({
    mutationFn: async (body: SignUp) =>
      withDeviceChoices(await sessionOf(await requestJson('/users', { method: 'POST', body }))),
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
