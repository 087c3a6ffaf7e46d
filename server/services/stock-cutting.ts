import type { Transaction } from 'sequelize';
import { volumeOfStock } from '#shared/core/stock.ts';
import { divideMeasure, shareMass } from '#shared/core/stock-split.ts';
import type { SplitInput, SplitResultDto, UseInput, UseResultDto } from '#shared/schemas/rack.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { invalidInput } from '#server/errors.ts';
import type { StockPiece } from '#server/models/stock-piece.ts';
import { presentStockFields } from '#server/presenters/stock-piece.ts';
import { findPiece, lockPiece, pieceNotAtHand, presentPiece, presentPieces } from './stock-access.ts';
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
export function splitPiece(
  actor: UserDto,
  id: string,
  { along, wanted, kerf }: SplitInput,
): Promise<SplitResultDto> {
  return inTransaction(async (transaction) => {
    const whole = await lockPiece(actor, id, 'cut', transaction);
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
    await whole.update(
      { state: 'split', gliderId: null, version: whole.version + 1, updatedAt: new Date() },
      { transaction },
    );
    const made = await insertPieces(actor.id, pieces, transaction);
    return { pieces: await presentPieces(actor.id, made, transaction), lost };
  });
}

/**
 * Builds a piece into a glider or something else, and puts what is left of it back on the rack.
 * @throws AppError `invalid_input` for leftovers that are more than the piece, `piece_in_use` for a piece that was cut
 * up or used already, or is reserved for another glider
 */
export async function buildPieceIn(
  actor: UserDto,
  id: string,
  { gliderId, leftovers }: UseInput,
): Promise<UseResultDto> {
  await findPiece(actor, id, 'cut');
  return inTransaction(async (transaction) => {
    if (gliderId !== null) await lockGliderForStock(actor, gliderId, transaction);
    const whole = await lockPiece(actor, id, 'cut', transaction);
    await requireWhole(whole, transaction);
    if (whole.state === 'reserved' && whole.gliderId !== gliderId) {
      throw await pieceNotAtHand(whole, transaction);
    }
    checkLeftovers(whole, leftovers);
    const { thickness } = whole;
    const { pieces } = cutFrom(
      whole,
      leftovers.map((leftover) => ({ ...leftover, thickness })),
      null,
    );
    await whole.update(
      { state: 'used', gliderId, version: whole.version + 1, updatedAt: new Date() },
      { transaction },
    );
    const made = await insertPieces(actor.id, pieces, transaction);
    return {
      piece: await presentPiece(whole, transaction),
      leftovers: await presentPieces(actor.id, made, transaction),
    };
  });
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
