import { queryOptions } from '@tanstack/react-query';
import { request } from '#client/lib/api.ts';
import { rackList } from '#shared/schemas/rack.ts';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';

/** Pages of a hundred that are fetched at most: nobody cuts one glider from more. */
const MOST_PAGES = 20;

/** Every free piece of the reader's rack, page by page. */
export const freePieces = queryOptions({
  queryKey: ['rack', 'free'],
  queryFn: async ({ signal }) => {
    const pieces: StockPieceDto[] = [];
    let cursor: string | null = null;
    for (let page = 0; page < MOST_PAGES && (page === 0 || cursor !== null); page++) {
      const query = new URLSearchParams({ state: 'free', limit: '100', ...(cursor !== null && { cursor }) });
      const { pieces: more, nextCursor } = await request(`/rack?${query.toString()}`, rackList, { signal });
      pieces.push(...more);
      cursor = nextCursor;
    }
    return pieces;
  },
});
