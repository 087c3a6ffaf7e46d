import { queryOptions } from '@tanstack/react-query';
import { request } from '#client/lib/api.ts';
import { gliderSaveList } from '#shared/schemas/glider-save.ts';
import { glider } from '#shared/schemas/glider.ts';

/** Everything fetched about gliders, under one key each. */
export const gliderQueries = {
  all: ['gliders'] as const,
  detail: (id: string) =>
    queryOptions({
      queryKey: ['gliders', 'detail', id],
      queryFn: ({ signal }) => request(`/gliders/${encodeURIComponent(id)}`, glider, { signal }),
      // The desk keeps its own state and is told of newer ones; an old copy must not open it.
      gcTime: 0,
      // It watches the version itself, which is lighter.
      refetchOnWindowFocus: false,
      refetchOnReconnect: false,
    }),
};

/** The version that the server holds, without its plan. */
export async function latestVersion(id: string): Promise<number> {
  const { saves } = await request(`/gliders/${encodeURIComponent(id)}/saves?limit=1`, gliderSaveList);
  return saves[0]?.version ?? 0;
}
