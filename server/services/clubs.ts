import { QueryTypes, type Transaction } from 'sequelize';
import type { ClubDto, ClubInput, ClubListDto, ClubRole } from '#shared/schemas/club.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { invalidInput, notFound } from '#server/errors.ts';
import { ClubMember } from '#server/models/club-member.ts';
import { Club } from '#server/models/club.ts';
import { authorizeSite } from '#server/policies/site.ts';
import { presentClub } from '#server/presenters/club.ts';
import { allowInClub, lockClub } from './club-access.ts';
import { makeOnce } from './idempotency.ts';
import { savedAlready } from './saved-already.ts';
import { database, inTransaction } from './transaction.ts';

async function memberCounts(
  clubIds: readonly string[],
  transaction?: Transaction,
): Promise<ReadonlyMap<string, number>> {
  const rows = await database().query<{ clubId: string; count: number }>(
    `SELECT club_id AS "clubId", count(*)::int AS count FROM club_members
     WHERE club_id = ANY($1::uuid[]) GROUP BY club_id`,
    { type: QueryTypes.SELECT, bind: [clubIds], ...(transaction && { transaction }) },
  );
  return new Map(rows.map(({ clubId, count }) => [clubId, count]));
}

/** The asker's clubs by name; nobody is in more than a few. */
export async function listClubs(actor: UserDto): Promise<ClubListDto> {
  const rows = await ClubMember.findAll({
    where: { userId: actor.id },
    include: [{ association: 'club', required: true }],
    order: [
      ['club', 'name', 'ASC'],
      ['clubId', 'ASC'],
    ],
  });
  const counts = await memberCounts(rows.map(({ clubId }) => clubId));
  return {
    clubs: rows.flatMap(({ club, role }) =>
      club ? [presentClub(club, role, counts.get(club.id) ?? 0)] : [],
    ),
  };
}

async function present(club: Club, role: ClubRole, transaction?: Transaction): Promise<ClubDto> {
  return presentClub(club, role, (await memberCounts([club.id], transaction)).get(club.id) ?? 0);
}

export async function getClub(actor: UserDto, clubId: string): Promise<ClubDto> {
  const role = await allowInClub(actor, clubId, 'read');
  const club = await Club.findByPk(clubId);
  if (!club) throw notFound('club');
  return present(club, role);
}

/** Founds a club; who founds it is its secretary. */
export async function foundClub(
  actor: UserDto,
  { name, place }: ClubInput,
  key: string | undefined,
): Promise<ClubDto> {
  authorizeSite(actor, 'addClub');
  const id = await inTransaction((transaction) =>
    makeOnce({ userId: actor.id, key, purpose: 'club', transaction }, async (made) => {
      if ((await ClubMember.count({ where: { userId: actor.id }, transaction })) >= LIMITS.clubs.max) {
        const detail = `You can be in at most ${LIMITS.clubs.max} clubs; leave one first.`;
        throw invalidInput([{ pointer: '#', detail }]);
      }
      await Club.create({ id: made, name, place, foundedBy: actor.id }, { transaction });
      await ClubMember.create({ clubId: made, userId: actor.id, role: 'secretary' }, { transaction });
    }),
  );
  return getClub(actor, id);
}

/** @throws AppError `stale_version` with the club as it is now when somebody saved in between */
export async function changeClub(
  actor: UserDto,
  clubId: string,
  version: number,
  { name, place }: ClubInput,
): Promise<ClubDto> {
  return inTransaction(async (transaction) => {
    const { club, role } = await lockClub(actor, clubId, 'edit', transaction);
    const current = await present(club, role, transaction);
    if (club.version !== version) {
      return savedAlready(current, { name, place }, 'This club was changed in the meantime.');
    }
    await club.update({ name, place, version: version + 1 }, { transaction });
    return { ...current, name, place, version: club.version };
  });
}
