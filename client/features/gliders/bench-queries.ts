import { infiniteQueryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { request } from '#client/lib/api.ts';
import { gliderCopies, gliderList, gliderSummary, type GliderSummaryDto } from '#shared/schemas/glider.ts';
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
    select: ({ pages }) => pages.flatMap(({ gliders }) => gliders),
  });
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
    onSettled: () => client.invalidateQueries({ queryKey: LIST }),
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
      }
    },
    onSettled: () => client.invalidateQueries({ queryKey: LIST }),
  });
}
