import { Op, UniqueConstraintError, type Transaction, type WhereOptions } from 'sequelize';
import type {
  ClassEditionDto,
  ClassEditionInput,
  ClassEditionListDto,
} from '#shared/schemas/class-edition.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { AppError, forbidden, invalidInput, notFound } from '#server/errors.ts';
import { ClassEdition } from '#server/models/class-edition.ts';
import { ClubMember } from '#server/models/club-member.ts';
import { mayWithEdition } from '#server/policies/club.ts';
import { authorizeSite } from '#server/policies/site.ts';
import type { ClassEditionStanding } from '#server/policies/table.ts';
import { presentClassEdition } from '#server/presenters/class-edition.ts';
import { lockClub, clubRoleOf } from './club-access.ts';
import { makeOnce } from './idempotency.ts';
import { savedAlready } from './saved-already.ts';
import { inTransaction } from './transaction.ts';

/** What the asker is to an edition. @throws AppError `not_found` for one of a club that the asker is not in */
async function standingTo(actor: UserDto, { clubId }: ClassEdition): Promise<ClassEditionStanding> {
  return clubId === null ? actor.role : clubRoleOf(actor, clubId, 'edition');
}

/** Everybody's editions and those of the asker's clubs, by class and then by edition. */
export async function listClassEditions(actor: UserDto): Promise<ClassEditionListDto> {
  const memberships = await ClubMember.findAll({ where: { userId: actor.id } });
  const roles = new Map(memberships.map(({ clubId, role }) => [clubId, role]));
  const where: WhereOptions = { [Op.or]: [{ clubId: null }, { clubId: [...roles.keys()] }] };
  const rows = await ClassEdition.findAll({
    where,
    order: [
      ['name', 'ASC'],
      ['edition', 'ASC'],
      ['id', 'ASC'],
    ],
  });
  return {
    editions: rows.map((row) =>
      presentClassEdition(row, row.clubId === null ? actor.role : (roles.get(row.clubId) ?? 'member')),
    ),
  };
}

export async function getClassEdition(actor: UserDto, id: string): Promise<ClassEditionDto> {
  const row = await ClassEdition.findByPk(id);
  if (!row) throw notFound('edition');
  return presentClassEdition(row, await standingTo(actor, row));
}

/**
 * Adds an edition to everybody's table, or to a club's own where one is named.
 * @throws AppError `edition_exists`
 */
export async function addClassEdition(
  actor: UserDto,
  clubId: string | null,
  input: ClassEditionInput,
  key: string | undefined,
): Promise<ClassEditionDto> {
  if (clubId === null) authorizeSite(actor, 'addClassEdition');
  const id = await inTransaction((transaction) =>
    makeOnce({ userId: actor.id, key, purpose: 'class edition', transaction }, async (made) => {
      if (clubId !== null) {
        await lockClub(actor, clubId, 'keepClasses', transaction);
        await refuseTooMany(clubId, transaction);
      }
      await ClassEdition.create({ id: made, clubId, ...input }, { transaction });
    }),
  ).catch(tellTwice);
  return getClassEdition(actor, id);
}

async function refuseTooMany(clubId: string, transaction: Transaction): Promise<void> {
  if ((await ClassEdition.count({ where: { clubId }, transaction })) < LIMITS.classEditions.max) return;
  const detail = `A club has room for ${LIMITS.classEditions.max} editions.`;
  throw invalidInput([{ pointer: '#', detail }]);
}

function tellTwice(error: unknown): never {
  if (!(error instanceof UniqueConstraintError)) throw error;
  throw new AppError('edition_exists', 'There is an edition of this class with this name already.');
}

/** @throws AppError `edition_in_use`, `edition_exists`, `stale_version` with the edition as it is now */
export function changeClassEdition(
  actor: UserDto,
  id: string,
  version: number,
  input: ClassEditionInput,
): Promise<ClassEditionDto> {
  return inTransaction(async (transaction) => {
    const { row, standing } = await lockUnused(actor, id, transaction);
    const current = presentClassEdition(row, standing);
    if (row.version !== version) {
      return savedAlready(current, input, 'This edition was changed in the meantime.');
    }
    await row.update({ ...input, version: version + 1 }, { transaction });
    return presentClassEdition(row, standing);
  }).catch(tellTwice);
}

/** @throws AppError `edition_in_use` */
export function deleteClassEdition(actor: UserDto, id: string): Promise<void> {
  return inTransaction(async (transaction) => {
    const { row } = await lockUnused(actor, id, transaction);
    await row.destroy({ transaction });
  });
}

async function lockUnused(
  actor: UserDto,
  id: string,
  transaction: Transaction,
): Promise<{ row: ClassEdition; standing: ClassEditionStanding }> {
  const row = await ClassEdition.findByPk(id, { transaction, lock: transaction.LOCK.UPDATE });
  if (!row) throw notFound('edition');
  const standing = await standingTo(actor, row);
  if (!mayWithEdition(standing, 'edit')) {
    throw forbidden('Only who keeps these limits may change them.');
  }
  if (row.usedAt === null) return { row, standing };
  throw new AppError('edition_in_use', 'This edition is in use and never changes; add another one.');
}

/**
 * An edition that the asker may use, marked as used from now on: it never changes again.
 * @throws AppError `not_found` for one of a club that the asker is not in
 */
export async function takeClassEdition(
  actor: UserDto,
  id: string,
  transaction: Transaction,
): Promise<ClassEdition> {
  const row = await ClassEdition.findByPk(id, { transaction, lock: transaction.LOCK.UPDATE });
  if (!row) throw notFound('edition');
  await standingTo(actor, row);
  if (row.usedAt === null) await row.update({ usedAt: new Date() }, { transaction });
  return row;
}
