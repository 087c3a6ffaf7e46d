import type { UserDto } from '#shared/schemas/session.ts';
import { notFound } from '#server/errors.ts';
import { POLICY, type StockPieceAction, type StockPieceStanding } from './table.ts';

/** What the asker is to a piece; null where it is somebody else's, for a rack is nobody's business but its owner's. */
export function stockPieceStanding(
  actor: Pick<UserDto, 'id'>,
  row: { userId: string },
): StockPieceStanding | null {
  return row.userId === actor.id ? 'keeper' : null;
}

/** @throws AppError `not_found` for somebody else's piece */
export function authorizeStockPiece(
  actor: Pick<UserDto, 'id'>,
  row: { userId: string },
  action: StockPieceAction,
): void {
  const standing = stockPieceStanding(actor, row);
  if (standing === null || !POLICY.stockPiece[action].includes(standing)) throw notFound('piece');
}
