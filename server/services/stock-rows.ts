import { randomUUID } from 'node:crypto';
import { QueryTypes, type Transaction } from 'sequelize';
import { volumeOfStock } from '#shared/core/stock.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { StockPieceInput } from '#shared/schemas/stock-piece.ts';
import { invalidInput } from '#server/errors.ts';
import { StockPiece } from '#server/models/stock-piece.ts';
import { database } from './transaction.ts';

/**
 * Figures are kept to so many digits, beyond any scale and rule: 3½ in is then 88.9 mm, and what is cut up adds up to
 * the last of them.
 */
const DIGITS = 12;
const kept = (value: number) => Number(value.toPrecision(DIGITS));

/** What a user says of a piece, as it is kept. */
export function keptFields(fields: StockPieceInput): StockPieceInput {
  const { length, width, thickness, wall, mass, resolution } = fields;
  return {
    ...fields,
    length: kept(length),
    width: kept(width),
    thickness: kept(thickness),
    // A solid rod stays one.
    wall: wall === null ? null : Math.min(kept(wall), kept(width) / 2),
    mass: mass === null ? null : kept(mass),
    resolution: resolution === null ? null : kept(resolution),
  };
}

/** The columns of what a user says of a piece. */
export function stockColumns(input: StockPieceInput) {
  const { material, ...fields } = keptFields(input);
  const { mass } = fields;
  return {
    ...fields,
    // A mass that is lighter than numbers go for its volume still has a density.
    density: mass === null ? null : Math.max((mass / volumeOfStock(fields)) * 1e6, Number.MIN_VALUE),
    materialKey: material.key,
    materialName: material.name,
    materialCategory: material.category,
  };
}

export interface NewPiece {
  fields: StockPieceInput;
  id?: string;
  /** read from a scale; as told by the mass where not given */
  weighed?: boolean;
  parent?: StockPiece;
  /** what it is reserved for */
  gliderId?: string | null;
}

/**
 * Puts pieces on a user's rack, numbered in their order.
 * @throws AppError `invalid_input` where the rack would hold too many
 */
export async function insertPieces(
  userId: string,
  pieces: readonly NewPiece[],
  transaction: Transaction,
): Promise<StockPiece[]> {
  if (pieces.length === 0) return [];
  const first = await takeNumbers(userId, pieces.length, transaction);
  return StockPiece.bulkCreate(
    pieces.map(({ fields, id, weighed, parent, gliderId }, i) => ({
      ...stockColumns(fields),
      id: id ?? randomUUID(),
      userId,
      number: first + i,
      weighed: weighed ?? fields.mass !== null,
      ...(parent && { parentId: parent.id, parentNumber: parent.number }),
      ...(gliderId && { gliderId, state: 'reserved' as const }),
    })),
    { transaction },
  );
}

/** Takes the next numbers of a user's labels; whoever else makes pieces for the same user waits. @returns the first */
async function takeNumbers(userId: string, count: number, transaction: Transaction): Promise<number> {
  const [counter] = await database().query<{ last: number }>(
    `INSERT INTO rack_counters (user_id, last_number) VALUES ($1, $2)
     ON CONFLICT (user_id) DO UPDATE SET last_number = rack_counters.last_number + $2
     RETURNING last_number AS last`,
    { type: QueryTypes.SELECT, bind: [userId, count], transaction },
  );
  const there = await StockPiece.count({ where: { userId }, transaction });
  if (!counter || there + count > LIMITS.rack.max) {
    const detail = `A rack holds at most ${LIMITS.rack.max} pieces, and yours has ${there}; delete some first.`;
    throw invalidInput([{ pointer: '#', detail }]);
  }
  return counter.last - count + 1;
}
