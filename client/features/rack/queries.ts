import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query';
import { request, requestFile } from '#client/lib/api.ts';
import { gliderList } from '#shared/schemas/glider.ts';
import { rackList } from '#shared/schemas/rack.ts';
import { stockPiece, type StockPieceDto } from '#shared/schemas/stock-piece.ts';
import { paramsOf, type RackView } from './rack-view.ts';

export const RACK_PAGE = 50;

/** Address of a piece, or of something of it. */
export const piecePath = (id: string, of = '') => `/rack/${encodeURIComponent(id)}${of}`;

/** Everything fetched about the rack. */
export const rackQueries = {
  all: ['rack'] as const,
  list: (view: RackView) =>
    infiniteQueryOptions({
      queryKey: ['rack', 'list', view],
      queryFn: ({ pageParam, signal }) => {
        const query = paramsOf(view);
        query.set('limit', String(RACK_PAGE));
        if (pageParam !== null) query.set('cursor', pageParam);
        return request(`/rack?${query.toString()}`, rackList, { signal });
      },
      initialPageParam: null as string | null,
      getNextPageParam: ({ nextCursor }) => nextCursor,
      select: ({ pages }) => pages.flatMap(({ pieces }) => pieces),
    }),
  piece: (id: string) =>
    queryOptions({
      queryKey: ['rack', 'piece', id],
      queryFn: ({ signal }) => request(piecePath(id), stockPiece, { signal }),
    }),
  /** of that version, for its address stays the same whatever the picture */
  photo: ({ id, version }: Pick<StockPieceDto, 'id' | 'version'>) =>
    queryOptions({
      queryKey: ['rack', 'photo', id, version],
      queryFn: ({ signal }) => requestFile(piecePath(id, '/photo?size=full'), { signal }),
      staleTime: Infinity,
    }),
  /** the reader's gliders by name, to reserve for */
  gliders: (search: string) =>
    queryOptions({
      queryKey: ['rack', 'gliders', search],
      queryFn: ({ signal }) =>
        request(
          `/gliders?${new URLSearchParams({ limit: '50', sort: 'name', direction: 'up', search }).toString()}`,
          gliderList,
          { signal },
        ),
      select: ({ gliders }) => gliders.filter(({ role }) => role === 'owner' || role === 'builder'),
    }),
};
