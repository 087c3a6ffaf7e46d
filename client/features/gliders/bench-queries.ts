import {
  infiniteQueryOptions,
  useMutation,
  useQueryClient,
  type InfiniteData,
  type QueryClient,
} from '@tanstack/react-query';
import { request } from '#client/lib/api.ts';
import {
  gliderCopies,
  gliderList,
  gliderSummary,
  type GliderListDto,
  type GliderSummaryDto,
} from '#shared/schemas/glider.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { BenchView } from './bench-view.ts';

export const PAGE_SIZE = 50;
const LIST = ['gliders', 'list'] as const;

/** The gliders of a view, a page at a time; the next one is asked for by the last row of the one before. */
export function benchQuery(view: BenchView) {
  return infiniteQueryOptions({
    queryKey: [...LIST, view],
    queryFn: ({ pageParam, signal }) => {
      const query = new URLSearchParams({
        limit: String(PAGE_SIZE),
        sort: view.sort,
        direction: view.direction,
        archived: view.archived,
      });
      if (view.search !== '') query.set('search', view.search);
      if (pageParam !== null) query.set('cursor', pageParam);
      return request(`/gliders?${query.toString()}`, gliderList, { signal });
    },
    initialPageParam: null as string | null,
    getNextPageParam: ({ nextCursor }) => nextCursor,
    // Pages stay the objects that they are; comparing thousands of outlines point by point would take its time.
    structuralSharing: false,
    select: ({ pages }) => pages.flatMap(({ gliders }) => gliders),
  });
}

type Pages = InfiniteData<GliderListDto, string | null>;
/** More pages than this are not all asked for again; the list begins anew at its top. */
const REFRESHED = 4;

/** Asks for what is shown anew, because something has come to it. */
function refreshLists(client: QueryClient): Promise<void> {
  client.setQueriesData<Pages>({ queryKey: LIST }, (list) =>
    list && list.pages.length > REFRESHED
      ? { pages: list.pages.slice(0, 1), pageParams: list.pageParams.slice(0, 1) }
      : list,
  );
  return client.invalidateQueries({ queryKey: LIST });
}

/** Takes gliders out of what is shown; of a long list nothing has to be asked for again. */
export function dropFromLists(client: QueryClient, ids: readonly string[]): void {
  const gone = new Set(ids);
  client.setQueriesData<Pages>(
    { queryKey: LIST },
    (list) =>
      list && {
        ...list,
        pages: list.pages.map((page) => ({
          ...page,
          gliders: page.gliders.filter(({ id }) => !gone.has(id)),
        })),
      },
  );
  // Other views are asked for when they are looked at.
  void client.invalidateQueries({ queryKey: LIST, refetchType: 'none' });
}

interface CopyWish {
  ids: readonly string[];
  /** Made once per wish, so that a retry on a bad line copies once. */
  wish: string;
}

/** Copies gliders as the reader's own, as many at once as the server takes. */
export function useCopyGliders() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async ({ ids, wish }: CopyWish): Promise<GliderSummaryDto[]> => {
      const copies: GliderSummaryDto[] = [];
      for (let from = 0; from < ids.length; from += LIMITS.copies.max) {
        const some = ids.slice(from, from + LIMITS.copies.max);
        const answer = await request('/gliders/copies', gliderCopies, {
          method: 'POST',
          body: { ids: some },
          headers: { 'Idempotency-Key': from === 0 ? wish : crypto.randomUUID() },
        });
        copies.push(...answer.gliders);
      }
      return copies;
    },
    onSettled: () => refreshLists(client),
  });
}

interface ArchiveWish {
  ids: readonly string[];
  archived: boolean;
}

/** Puts gliders out of the way, or back in use. */
export function useArchiveGliders() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async ({ ids, archived }: ArchiveWish): Promise<void> => {
      for (const id of ids) {
        await request(`/gliders/${encodeURIComponent(id)}/archived`, gliderSummary, {
          method: 'PUT',
          body: { archived },
        });
        dropFromLists(client, [id]);
      }
    },
  });
}
