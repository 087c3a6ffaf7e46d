import { Transaction } from 'sequelize';
import type { ClubRole } from '#shared/schemas/club.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { notFound, type Noun } from '#server/errors.ts';
import { ClubMember } from '#server/models/club-member.ts';
import { Club } from '#server/models/club.ts';
import { authorizeClub } from '#server/policies/club.ts';
import type { ClubAction } from '#server/policies/table.ts';

/**
 * The asker's role in a club.
 * @throws AppError `not_found` where there is none
 */
export async function clubRoleOf(
  actor: Pick<UserDto, 'id'>,
  clubId: string,
  noun: Noun = 'club',
  transaction?: Transaction,
): Promise<ClubRole> {
  const member = await ClubMember.findOne({
    where: { clubId, userId: actor.id },
    ...(transaction && { transaction }),
  });
  if (!member) throw notFound(noun);
  return member.role;
}

/** Refuses unless the asker may do this in the club. @returns what the asker is in it */
export async function allowInClub(actor: UserDto, clubId: string, action: ClubAction): Promise<ClubRole> {
  const role = await clubRoleOf(actor, clubId);
  authorizeClub(role, action);
  return role;
}

/**
 * A club locked for a change, so that two changes at once are made one after the other.
 * @throws AppError `not_found` for a club that the asker is not in, `forbidden` for too low a role
 */
export async function lockClub(
  actor: UserDto,
  clubId: string,
  action: ClubAction,
  transaction: Transaction,
): Promise<{ club: Club; role: ClubRole }> {
  const club = await Club.findByPk(clubId, { transaction, lock: Transaction.LOCK.UPDATE });
  if (!club) throw notFound('club');
  // Asked after the lock: who was put out of the club while this waited is out.
  const role = await clubRoleOf(actor, clubId, 'club', transaction);
  authorizeClub(role, action);
  return { club, role };
}
