import type { Transaction } from 'sequelize';
import type { AssignmentInput, GliderAssignmentDto } from '#shared/schemas/assignment.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { invalidInput, notFound } from '#server/errors.ts';
import { GliderAssignment } from '#server/models/glider-assignment.ts';
import { Glider } from '#server/models/glider.ts';
import { StockPiece } from '#server/models/stock-piece.ts';
import { presentGliderAssignment } from '#server/presenters/glider-assignment.ts';
import { holdPieces } from './assigned-pieces.ts';
import { allowOnGlider, lockGlider } from './glider-access.ts';
import { savedAlready } from './saved-already.ts';
import { inTransaction } from './transaction.ts';

/** Which part of a glider is cut from which piece; nothing placed while nobody has kept anything. */
export async function getGliderAssignment(actor: UserDto, gliderId: string): Promise<GliderAssignmentDto> {
  await allowOnGlider(actor, gliderId, 'read');
  const glider = await Glider.findByPk(gliderId, { attributes: ['id', 'version'] });
  if (!glider) throw notFound('glider');
  return present(actor, glider, await findAssignment(gliderId));
}

function findAssignment(gliderId: string, transaction?: Transaction): Promise<GliderAssignment | null> {
  return GliderAssignment.findByPk(gliderId, {
    include: [{ association: 'editor', attributes: ['name'] }],
    ...(transaction && { transaction }),
  });
}

async function present(
  actor: UserDto,
  glider: Glider,
  row: GliderAssignment | null,
  transaction?: Transaction,
): Promise<GliderAssignmentDto> {
  const ids = namedIn(row?.entries ?? []);
  const pieces = await StockPiece.findAll({
    where: { id: [...ids] },
    include: [{ association: 'user', attributes: ['name'] }],
    order: ['number', 'id'],
    ...(transaction && { transaction }),
  });
  return presentGliderAssignment(row, { glider, pieces, actorId: actor.id });
}

const namedIn = (entries: AssignmentInput['entries']) =>
  new Set(entries.flatMap(({ pieceId }) => pieceId ?? []));

/**
 * Keeps the whole assignment: reserves the asker's free pieces that it names, and frees those that it named before and
 * names no more.
 * @throws AppError `stale_version` with the current one when somebody saved in between, `invalid_input` for pieces that
 * are neither at the asker's hand nor held for this glider
 */
export function saveGliderAssignment(
  actor: UserDto,
  gliderId: string,
  version: number,
  { entries, terms, gliderVersion }: AssignmentInput,
): Promise<GliderAssignmentDto> {
  return inTransaction(async (transaction) => {
    const { glider } = await lockGlider(actor, gliderId, 'edit', transaction);
    const row = await findAssignment(gliderId, transaction);
    if ((row?.version ?? 1) !== version) {
      return savedAlready<GliderAssignmentDto>(
        await present(actor, glider, row, transaction),
        { entries, terms, gliderVersion },
        'This assignment was changed in the meantime.',
      );
    }
    if (gliderVersion > glider.version) {
      const detail = `The glider is saved up to version ${glider.version}.`;
      throw invalidInput([{ pointer: '#/gliderVersion', detail }]);
    }
    await holdPieces({ actor, gliderId, entries, before: namedIn(row?.entries ?? []), transaction });
    const { ownerId } = glider;
    const kept = { ownerId, gliderId, entries, terms, gliderVersion };
    await GliderAssignment.upsert(
      { ...kept, version: version + 1, updatedBy: actor.id, updatedAt: new Date() },
      { transaction },
    );
    return present(actor, glider, await findAssignment(gliderId, transaction), transaction);
  });
}
