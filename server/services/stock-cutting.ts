import type { Transaction } from 'sequelize';
import { volumeOfStock } from '#shared/core/stock.ts';
import { divideMeasure, shareMass } from '#shared/core/stock-split.ts';
import type { SplitInput, SplitResultDto, UseInput, UseResultDto } from '#shared/schemas/rack.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { invalidInput } from '#server/errors.ts';
import type { StockPiece } from '#server/models/stock-piece.ts';
import { presentStockFields } from '#server/presenters/stock-piece.ts';
import {
  changeState,
  findPiece,
  lockPiece,
  pieceNotAtHand,
  presentPiece,
  presentPieces,
} from './stock-access.ts';
import { lockGliderForStock } from './stock-gliders.ts';
import { insertPieces } from './stock-rows.ts';
import { inTransaction } from './transaction.ts';

interface Blank {
  length: number;
  width: number;
  thickness: number;
}

/** Pieces cut from a whole: of its material and cut, with masses worked out and not weighed. */
function cutFrom(whole: StockPiece, blanks: readonly Blank[], gliderId: string | null) {
  const fields = presentStockFields(whole);
  const volumes = blanks.map((blank) => volumeOfStock({ ...fields, ...blank }));
  const { masses, lost } = shareMass(whole.mass, volumes, volumeOfStock(fields));
  const pieces = blanks.map((blank, i) => ({
    fields: { ...fields, ...blank, mass: masses[i] ?? null, resolution: null },
    weighed: false,
    parent: whole,
    gliderId,
  }));
  return { pieces, lost };
}

/** Refuses a piece that was cut up or built in already. */
async function requireWhole(row: StockPiece, transaction: Transaction): Promise<void> {
  if (row.state === 'split' || row.state === 'used') throw await pieceNotAtHand(row, transaction);
}

/**
 * Cuts a piece up. Masses go by volume and add up with the loss to that of the whole; the whole stays as `split`, and
 * what it was reserved for its pieces are.
 * @throws AppError `invalid_input` where it is too short, `piece_in_use` where it was cut up or used already
 */
export function splitPiece(actor: UserDto, id: string, cuts: SplitInput): Promise<SplitResultDto> {
  return inTransaction(async (transaction) => {
    const whole = await lockPiece(actor, id, 'cut', transaction);
    const { made, lost } = await cutUp(whole, cuts, transaction);
    return { pieces: await presentPieces(actor.id, made, transaction), lost };
  });
}

/** `whole` is locked. */
export async function cutUp(
  whole: StockPiece,
  { along, wanted, kerf }: SplitInput,
  transaction: Transaction,
): Promise<{ made: StockPiece[]; lost: number | null }> {
  await requireWhole(whole, transaction);
  if (along === 'width' && whole.kind === 'tube') {
    throw invalidInput([{ pointer: '#/along', detail: 'A tube is cut across only.' }]);
  }
  const cuts = divideMeasure({ whole: whole[along], wanted, kerf });
  if ('missing' in cuts) {
    const detail = `The piece is ${Number(cuts.missing.toPrecision(6))} mm too short for these with their cuts.`;
    throw invalidInput([{ pointer: '#/wanted', detail }]);
  }
  const { length, width, thickness, gliderId } = whole;
  const blanks = cuts.pieces.map((measure) => ({ length, width, thickness, [along]: measure }));
  const { pieces, lost } = cutFrom(whole, blanks, gliderId);
  await changeState(whole, 'split', null, transaction);
  return { made: await insertPieces(whole.userId, pieces, transaction), lost };
}

/**
 * Builds a piece into a glider or something else, and puts what is left of it back on the rack.
 * @throws AppError `invalid_input` for leftovers that are more than the piece, `piece_in_use` for a piece that was cut
 * up or used already, or is reserved for another glider
 */
export async function buildPieceIn(actor: UserDto, id: string, use: UseInput): Promise<UseResultDto> {
  await findPiece(actor, id, 'cut');
  return inTransaction(async (transaction) => {
    if (use.gliderId !== null) await lockGliderForStock(actor, use.gliderId, transaction);
    const piece = await lockPiece(actor, id, 'cut', transaction);
    const leftovers = await buildIn(piece, use, transaction);
    return {
      piece: await presentPiece(piece, transaction),
      leftovers: await presentPieces(actor.id, leftovers, transaction),
    };
  });
}

/** `whole` is locked, and so is the glider. */
export async function buildIn(
  whole: StockPiece,
  { gliderId, leftovers }: UseInput,
  transaction: Transaction,
): Promise<StockPiece[]> {
  await requireWhole(whole, transaction);
  if (whole.state === 'reserved' && whole.gliderId !== gliderId) {
    throw await pieceNotAtHand(whole, transaction);
  }
  checkLeftovers(whole, leftovers);
  const { thickness } = whole;
  const blanks = leftovers.map((leftover) => ({ ...leftover, thickness }));
  const { pieces } = cutFrom(whole, blanks, null);
  await changeState(whole, 'used', gliderId, transaction);
  return insertPieces(whole.userId, pieces, transaction);
}

/** Measures that came from inches may be this much too large, as a share. */
const SLACK = 1 + 1e-9;

function checkLeftovers(whole: StockPiece, leftovers: UseInput['leftovers']): void {
  const problems = leftovers.flatMap(({ length, width }, i) => [
    ...(length > whole.length * SLACK
      ? [{ pointer: `#/leftovers/${i}/length`, detail: `The piece is ${whole.length} mm long.` }]
      : []),
    ...(width > whole.width * SLACK
      ? [{ pointer: `#/leftovers/${i}/width`, detail: `The piece is ${whole.width} mm wide.` }]
      : []),
    ...(whole.kind === 'tube' && width * SLACK < whole.width
      ? [{ pointer: `#/leftovers/${i}/width`, detail: `A tube stays ${whole.width} mm across.` }]
      : []),
  ]);
  const area = leftovers.reduce((sum, { length, width }) => sum + length * width, 0);
  if (problems.length === 0 && area > whole.length * whole.width * SLACK) {
    problems.push({ pointer: '#/leftovers', detail: 'More is left over than there was.' });
  }
  if (problems.length > 0) throw invalidInput(problems);
}
