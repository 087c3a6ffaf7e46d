import type { UserDto } from '#shared/schemas/session.ts';
import type { StockPieceDto, StockPieceInput } from '#shared/schemas/stock-piece.ts';
import { AppError } from '#server/errors.ts';
import { StockPiece } from '#server/models/stock-piece.ts';
import { authorizeSite } from '#server/policies/site.ts';
import { makeOnce } from './idempotency.ts';
import { savedAlready } from './saved-already.ts';
import { findPiece, lockPiece, pieceNotAtHand, presentPiece, presentPieces } from './stock-access.ts';
import { insertPieces, keptFields, stockColumns } from './stock-rows.ts';
import { removeUnusedFiles } from './stored-files.ts';
import { inTransaction } from './transaction.ts';

const STALE = 'This piece was changed in the meantime.';

export async function getPiece(actor: UserDto, id: string): Promise<StockPieceDto> {
  return presentPiece(await findPiece(actor, id, 'read'));
}

/** Puts a piece on the rack; the same key of the same user puts it there once. */
export async function createPiece(
  actor: UserDto,
  fields: StockPieceInput,
  key: string | undefined,
): Promise<StockPieceDto> {
  authorizeSite(actor, 'addStockPiece');
  const id = await inTransaction((transaction) =>
    makeOnce({ userId: actor.id, key, purpose: 'stock piece', transaction }, async (newId) => {
      await insertPieces(actor.id, [{ id: newId, fields }], transaction);
    }),
  );
  return getPiece(actor, id);
}

/**
 * Saves what its owner says of a piece. A mass that was worked out counts as weighed once another is given, or the
 * scale's step with it.
 * @throws AppError `stale_version` with the current piece when it was changed in between
 */
export function savePiece(
  actor: UserDto,
  id: string,
  version: number,
  fields: StockPieceInput,
): Promise<StockPieceDto> {
  return inTransaction(async (transaction) => {
    const row = await lockPiece(actor, id, 'edit', transaction);
    if (row.version !== version) {
      return savedAlready<StockPieceDto>(await presentPiece(row, transaction), keptFields(fields), STALE);
    }
    const columns = stockColumns(fields);
    const weighed =
      columns.mass !== null && (row.weighed || columns.mass !== row.mass || columns.resolution !== null);
    await row.update({ ...columns, weighed, version: version + 1, updatedAt: new Date() }, { transaction });
    return presentPiece(row, transaction);
  });
}

/**
 * Takes a piece off the rack for good; its number is not given again.
 * @throws AppError `piece_in_use` for one that is reserved for, or used in, a glider that there still is
 */
export async function deletePiece(actor: UserDto, id: string, version: number): Promise<void> {
  await inTransaction(async (transaction) => {
    const row = await lockPiece(actor, id, 'delete', transaction);
    if (row.gliderId !== null) throw await pieceNotAtHand(row, transaction);
    if (row.version !== version) {
      throw new AppError('stale_version', STALE, {
        members: { current: await presentPiece(row, transaction) },
      });
    }
    await row.destroy({ transaction });
  });
  await removeUnusedFiles().catch(() => undefined);
}

/** Every piece of a user, those used and split up included, by number. */
export async function listPiecesOfUser(userId: string): Promise<StockPieceDto[]> {
  const rows = await StockPiece.findAll({ where: { userId }, order: [['number', 'ASC']] });
  return presentPieces(userId, rows);
}
