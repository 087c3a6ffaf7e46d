import { request } from '#client/lib/api.ts';
import { rackList } from '#shared/schemas/rack.ts';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';

/** Pages of each state that are looked through, a hundred pieces on each. */
const PAGES = 5;

/**
 * The pieces cut from one. They were numbered after it, so each list is walked from its newest back to it; `whole` is
 * false where that was too far.
 */
export async function fetchOffcuts(
  { id, number }: Pick<StockPieceDto, 'id' | 'number'>,
  signal?: AbortSignal,
): Promise<{ found: StockPieceDto[]; whole: boolean }> {
  const lists = await Promise.all(
    ['onRack', 'used', 'split'].map((state) => newerThan(number, state, signal)),
  );
  const found = lists
    .flatMap(({ pieces }) => pieces)
    .filter(({ parent }) => parent?.id === id)
    .sort((a, b) => a.number - b.number);
  return { found, whole: lists.every(({ whole }) => whole) };
}

async function newerThan(number: number, state: string, signal: AbortSignal | undefined) {
  const pieces: StockPieceDto[] = [];
  let cursor: string | null = null;
  for (let page = 0; page < PAGES; page++) {
    const query = new URLSearchParams({ state, order: 'number', direction: 'desc', limit: '100' });
    if (cursor !== null) query.set('cursor', cursor);
    const list = await request(`/rack?${query.toString()}`, rackList, { signal });
    pieces.push(...list.pieces);
    cursor = list.nextCursor;
    const oldest = list.pieces.at(-1);
    if (cursor === null || oldest === undefined || oldest.number <= number) return { pieces, whole: true };
  }
  return { pieces, whole: false };
}
