import { literal, Transaction } from 'sequelize';
import type { AssignmentEntry } from '#shared/schemas/assignment.ts';
import type { FieldProblem } from '#shared/schemas/problem.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { invalidInput } from '#server/errors.ts';
import { StockPiece } from '#server/models/stock-piece.ts';
import { pieceNotAtHand } from './stock-access.ts';

interface Hold {
  actor: UserDto;
  gliderId: string;
  entries: readonly AssignmentEntry[];
  /** pieces that the assignment named before */
  before: ReadonlySet<string>;
  transaction: Transaction;
}

const MOST_PROBLEMS = 100;

/**
 * Reserves for a glider what its entries name, and frees what they name no more.
 * @throws AppError `invalid_input` pointing at every piece that cannot be had
 */
export async function holdPieces({ actor, gliderId, entries, before, transaction }: Hold): Promise<void> {
  const now = new Set(entries.flatMap(({ pieceId }) => pieceId ?? []));
  const rows = await StockPiece.findAll({
    where: { id: [...new Set([...before, ...now])] },
    // Everybody locks in the same order, so that nobody waits for each other.
    order: ['id'],
    transaction,
    lock: Transaction.LOCK.UPDATE,
  });
  const named = rows.filter(({ id }) => now.has(id));
  const refusals = await refusalsOf(named, { actor, gliderId, transaction });
  const known = new Set(named.map(({ id }) => id));
  const problems = entries.flatMap(({ pieceId }, i): FieldProblem[] => {
    const detail = pieceId !== null && !known.has(pieceId) ? NOT_YOURS : refusals.get(pieceId ?? '');
    return detail === undefined ? [] : [{ pointer: `#/entries/${i}/pieceId`, detail }];
  });
  if (problems.length > 0) throw invalidInput(problems.slice(0, MOST_PROBLEMS));

  const change = (state: 'free' | 'reserved', pieces: readonly StockPiece[]) =>
    StockPiece.update(
      {
        state,
        gliderId: state === 'free' ? null : gliderId,
        version: literal('version + 1'),
        updatedAt: new Date(),
      },
      { where: { id: pieces.map(({ id }) => id) }, transaction },
    );
  await change(
    'reserved',
    named.filter(({ state }) => state === 'free'),
  );
  await change(
    'free',
    rows.filter((row) => !now.has(row.id) && row.state === 'reserved' && row.gliderId === gliderId),
  );
}

const NOT_YOURS = 'Is neither in your rack nor held for this glider.';

/** Why pieces cannot be had, by their ids. */
async function refusalsOf(
  rows: readonly StockPiece[],
  { actor, gliderId, transaction }: Pick<Hold, 'actor' | 'gliderId' | 'transaction'>,
): Promise<Map<string, string>> {
  const refusals = new Map<string, string>();
  for (const row of rows) {
    if (row.gliderId === gliderId) continue;
    if (row.userId !== actor.id) refusals.set(row.id, NOT_YOURS);
    else if (row.state !== 'free') refusals.set(row.id, (await pieceNotAtHand(row, transaction)).message);
  }
  return refusals;
}
