import { Transaction } from 'sequelize';
import type { UserDto } from '#shared/schemas/session.ts';
import type { StockPieceDto, StockState } from '#shared/schemas/stock-piece.ts';
import { AppError, notFound } from '#server/errors.ts';
import { GliderMember } from '#server/models/glider-member.ts';
import { StockPiece } from '#server/models/stock-piece.ts';
import { authorizeStockPiece } from '#server/policies/stock-piece.ts';
import type { StockPieceAction } from '#server/policies/table.ts';
import { presentStockPiece } from '#server/presenters/stock-piece.ts';

/** @throws AppError `not_found` also for somebody else's piece */
export async function findPiece(actor: UserDto, id: string, action: StockPieceAction): Promise<StockPiece> {
  const row = await StockPiece.findByPk(id);
  if (!row) throw notFound('piece');
  authorizeStockPiece(actor, row, action);
  return row;
}

/** A piece locked for a change, so that two changes at once are made one after the other. */
export async function lockPiece(
  actor: UserDto,
  id: string,
  action: StockPieceAction,
  transaction: Transaction,
): Promise<StockPiece> {
  const row = await StockPiece.findByPk(id, { transaction, lock: Transaction.LOCK.UPDATE });
  if (!row) throw notFound('piece');
  authorizeStockPiece(actor, row, action);
  return row;
}

/** What becomes of a locked piece, and for which glider. */
export async function changeState(
  row: StockPiece,
  state: StockState,
  gliderId: string | null,
  transaction: Transaction,
): Promise<void> {
  await row.update({ state, gliderId, version: row.version + 1, updatedAt: new Date() }, { transaction });
}

/** Pieces of one user as they are shown, each with the name of its glider where that user sees it. */
export async function presentPieces(
  userId: string,
  rows: readonly StockPiece[],
  transaction?: Transaction,
): Promise<StockPieceDto[]> {
  const ids = [...new Set(rows.flatMap(({ gliderId }) => gliderId ?? []))];
  const members =
    ids.length === 0
      ? []
      : await GliderMember.findAll({
          where: { userId, gliderId: ids },
          include: [{ association: 'glider', attributes: ['id', 'name'], required: true }],
          ...(transaction && { transaction }),
        });
  const names = new Map(members.flatMap(({ glider }) => (glider ? [[glider.id, glider.name] as const] : [])));
  return rows.map((row) => presentStockPiece(row, names));
}

export async function presentPiece(row: StockPiece, transaction?: Transaction): Promise<StockPieceDto> {
  const [piece] = await presentPieces(row.userId, [row], transaction);
  if (!piece) throw new Error('One piece is presented as one.');
  return piece;
}

/** The refusal of what cannot be done with a piece as it stands. */
export function pieceInUse({ id, number }: StockPiece, detail: string): AppError {
  return new AppError('piece_in_use', detail, { members: { pieces: [{ id, number, detail }] } });
}

/** The refusal of a piece that is not at hand, saying where it is as far as its owner may know. */
export async function pieceNotAtHand(row: StockPiece, transaction: Transaction): Promise<AppError> {
  const { state, reservedFor, usedIn } = await presentPiece(row, transaction);
  return pieceInUse(row, `Piece ${row.number} ${WHEREABOUTS[state]((reservedFor ?? usedIn)?.name)}.`);
}

const WHEREABOUTS: Record<StockState, (glider: string | undefined) => string> = {
  free: () => 'is free',
  reserved: (glider = 'a glider that you do not see any more') => `is reserved for ${glider}; free it first`,
  used: (glider) => `was used${glider === undefined ? '' : ` in ${glider}`}; take it back to the rack first`,
  split: () => 'was split already',
};
