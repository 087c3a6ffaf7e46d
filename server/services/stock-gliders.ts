import { Transaction } from 'sequelize';
import type { UserDto } from '#shared/schemas/session.ts';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';
import { invalidInput } from '#server/errors.ts';
import { GliderMember } from '#server/models/glider-member.ts';
import { Glider } from '#server/models/glider.ts';
import { StockPiece } from '#server/models/stock-piece.ts';
import { authorizeGlider } from '#server/policies/glider.ts';
import {
  changeState,
  findPiece,
  lockPiece,
  pieceInUse,
  pieceNotAtHand,
  presentPiece,
} from './stock-access.ts';
import { inTransaction } from './transaction.ts';

/**
 * Keeps a glider from being deleted until wood is put to it. Gliders are locked before pieces everywhere.
 * @throws AppError `invalid_input` for one that the asker does not see, `forbidden` for too low a role
 */
export async function lockGliderForStock(
  actor: UserDto,
  gliderId: string,
  transaction: Transaction,
): Promise<void> {
  const member = await GliderMember.findOne({ where: { gliderId, userId: actor.id }, transaction });
  const glider =
    member &&
    (await Glider.findByPk(gliderId, {
      attributes: ['id'],
      transaction,
      lock: Transaction.LOCK.KEY_SHARE,
    }));
  if (!member || !glider) {
    throw invalidInput([{ pointer: '#/gliderId', detail: 'Is no glider that you see.' }]);
  }
  authorizeGlider(member.role, 'edit');
}

/**
 * Reserves a piece for a glider that its owner builds; one that is reserved for another goes over to this one.
 * @throws AppError `piece_in_use` where it was cut up or used already
 */
export async function reservePiece(actor: UserDto, id: string, gliderId: string): Promise<StockPieceDto> {
  await findPiece(actor, id, 'reserve');
  return inTransaction(async (transaction) => {
    await lockGliderForStock(actor, gliderId, transaction);
    const row = await lockPiece(actor, id, 'reserve', transaction);
    if (row.state === 'split' || row.state === 'used') throw await pieceNotAtHand(row, transaction);
    if (row.gliderId !== gliderId) await changeState(row, 'reserved', gliderId, transaction);
    return presentPiece(row, transaction);
  });
}

/**
 * Puts a piece back on the rack as free. Also one that was marked as used or split by mistake, as long as nothing that
 * was cut from it is left there.
 * @throws AppError `piece_in_use` where something is
 */
export function freePiece(actor: UserDto, id: string): Promise<StockPieceDto> {
  return inTransaction(async (transaction) => {
    const row = await lockPiece(actor, id, 'reserve', transaction);
    if (row.state === 'split' || row.state === 'used') {
      const cut = await StockPiece.findAll({
        where: { userId: row.userId, parentId: row.id },
        order: ['number'],
        transaction,
      });
      if (cut.length > 0) throw pieceInUse(row, wordOffcuts(row, cut));
    }
    if (row.state !== 'free') await changeState(row, 'free', null, transaction);
    return presentPiece(row, transaction);
  });
}

const naming = new Intl.ListFormat('en', { type: 'conjunction' });
const MOST_NAMED = 5;

function wordOffcuts({ number }: StockPiece, cut: readonly StockPiece[]): string {
  const named = cut.slice(0, MOST_NAMED).map((piece) => String(piece.number));
  if (cut.length > MOST_NAMED) named.push(`${cut.length - MOST_NAMED} more`);
  const there = cut.length === 1 ? 'is' : 'are';
  return `${cut.length === 1 ? 'Piece' : 'Pieces'} ${naming.format(named)} ${there} cut from piece ${number}. Delete ${cut.length === 1 ? 'it' : 'them'} first.`;
}
