import { queryOptions, useQuery } from '@tanstack/react-query';
import { checked, requestJson } from '#client/lib/api.ts';
import type { SessionDto } from '#shared/schemas/session.ts';

/** The one source of who is signed in. */
export const sessionQuery = queryOptions({
  queryKey: ['session'],
  queryFn: async ({ signal }) => sessionOf(await requestJson('/session', { signal })),
  staleTime: 5 * 60_000,
});

/** A visitor's answer is told at sight, so that the first page of a visitor does without schemas. */
export async function sessionOf(answer: unknown): Promise<SessionDto> {
  if (isVisitor(answer)) return { user: null };
  const { session } = await import('#shared/schemas/session.ts');
  return checked(answer, session);
}

function isVisitor(answer: unknown): boolean {
  return typeof answer === 'object' && answer !== null && 'user' in answer && answer.user === null;
}

export function useSession() {
  return useQuery(sessionQuery);
}

/** The signed-in user; null for a visitor, undefined while not known. */
export function useUser() {
  const { data } = useSession();
  return data === undefined ? undefined : data.user;
}
