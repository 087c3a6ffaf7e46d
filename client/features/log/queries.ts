import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query';
import { request } from '#client/lib/api.ts';
import { gliderSaveList, gliderState } from '#shared/schemas/glider-save.ts';
import { photoList } from '#shared/schemas/photo.ts';

const PAGE_SIZE = 50;
const at = (gliderId: string) => `/gliders/${encodeURIComponent(gliderId)}`;

/** Everything fetched for the log of a glider. */
export const logQueries = {
  saves: (gliderId: string) =>
    infiniteQueryOptions({
      queryKey: ['log', gliderId, 'saves'],
      queryFn: ({ pageParam, signal }) => {
        const query = new URLSearchParams({ limit: String(PAGE_SIZE) });
        if (pageParam !== null) query.set('cursor', pageParam);
        return request(`${at(gliderId)}/saves?${query.toString()}`, gliderSaveList, { signal });
      },
      initialPageParam: null as string | null,
      getNextPageParam: ({ nextCursor }) => nextCursor,
      select: ({ pages }) => pages.flatMap(({ saves }) => saves),
    }),
  state: (gliderId: string, version: number) =>
    queryOptions({
      queryKey: ['log', gliderId, 'state', version],
      queryFn: ({ signal }) => request(`${at(gliderId)}/saves/${version}`, gliderState, { signal }),
      // What was saved stays as it was; only its name may change, which is read from the list.
      staleTime: Infinity,
    }),
  photos: (gliderId: string) =>
    queryOptions({
      queryKey: ['log', gliderId, 'photos'],
      queryFn: ({ signal }) => request(`${at(gliderId)}/photos`, photoList, { signal }),
      select: ({ photos }) => photos,
    }),
};
