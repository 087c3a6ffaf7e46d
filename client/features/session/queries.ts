import { queryOptions, useQuery } from '@tanstack/react-query';
import { request } from '#client/lib/api.ts';
import { session } from '#shared/schemas/session.ts';

/** The one source of who is signed in. */
export const sessionQuery = queryOptions({
  queryKey: ['session'],
  queryFn: ({ signal }) => request('/session', session, { signal }),
  staleTime: 5 * 60_000,
});

export function useSession() {
  return useQuery(sessionQuery);
}

/** The signed-in user; null for a visitor, undefined while not known. */
export function useUser() {
  const { data } = useSession();
  return data === undefined ? undefined : data.user;
}
