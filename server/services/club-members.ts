import type { Transaction } from 'sequelize';
import type { ClubMemberDto, ClubMemberListDto, ClubRole } from '#shared/schemas/club.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { AppError, notFound } from '#server/errors.ts';
import { ClubGlider } from '#server/models/club-glider.ts';
import { ClubMember } from '#server/models/club-member.ts';
import { presentClubMember } from '#server/presenters/club.ts';
import { allowInClub, lockClub } from './club-access.ts';
import { inTransaction } from './transaction.ts';

const withUser = { association: 'user', attributes: ['name', 'email'], required: true };
const ORDER: Record<ClubRole, number> = { secretary: 0, director: 1, member: 2 };

/** Who is what in a club: secretaries, directors, members, each as they came. */
export async function listClubMembers(actor: UserDto, clubId: string): Promise<ClubMemberListDto> {
  const viewerRole = await allowInClub(actor, clubId, 'read');
  const rows = await ClubMember.findAll({
    where: { clubId },
    include: [withUser],
    order: [
      ['joinedAt', 'ASC'],
      ['userId', 'ASC'],
    ],
  });
  const sorted = rows.toSorted((a, b) => ORDER[a.role] - ORDER[b.role]);
  return { members: sorted.map((row) => presentClubMember(row, { viewer: actor.id, viewerRole })) };
}

/**
 * Gives a member another role, oneself included.
 * @throws AppError `last_secretary` where nobody would be left to keep the club
 */
export function changeClubMember(
  actor: UserDto,
  clubId: string,
  userId: string,
  role: ClubRole,
): Promise<ClubMemberDto> {
  return inTransaction(async (transaction) => {
    const { role: viewerRole } = await lockClub(actor, clubId, 'keepMembers', transaction);
    const member = await memberOf(clubId, userId, transaction);
    if (role !== 'secretary') await refuseLastSecretary(member, transaction);
    await member.update({ role }, { transaction });
    const stillKeeps = userId === actor.id ? role : viewerRole;
    return presentClubMember(member, { viewer: actor.id, viewerRole: stillKeeps });
  });
}

/** Puts a member out of the club; what that member showed to it is shown no longer. */
export function removeClubMember(actor: UserDto, clubId: string, userId: string): Promise<void> {
  return inTransaction(async (transaction) => {
    await lockClub(actor, clubId, 'keepMembers', transaction);
    await part(await memberOf(clubId, userId, transaction), transaction);
  });
}

/** @throws AppError `last_secretary` while others are in the club */
export function leaveClub(actor: UserDto, clubId: string): Promise<void> {
  return inTransaction(async (transaction) => {
    await lockClub(actor, clubId, 'leave', transaction);
    await part(await memberOf(clubId, actor.id, transaction), transaction);
  });
}

/** Takes a member out of a club that is locked. */
export async function part(member: ClubMember, transaction: Transaction): Promise<void> {
  const { clubId, userId } = member;
  const others = (await ClubMember.count({ where: { clubId }, transaction })) - 1;
  if (others > 0) await refuseLastSecretary(member, transaction);
  await ClubGlider.destroy({ where: { clubId, ownerId: userId }, transaction });
  await member.destroy({ transaction });
}

async function memberOf(clubId: string, userId: string, transaction: Transaction): Promise<ClubMember> {
  const member = await ClubMember.findOne({ where: { clubId, userId }, include: [withUser], transaction });
  if (!member) throw notFound('member');
  return member;
}

async function refuseLastSecretary({ clubId, role }: ClubMember, transaction: Transaction): Promise<void> {
  if (role !== 'secretary') return;
  if ((await ClubMember.count({ where: { clubId, role }, transaction })) > 1) return;
  throw new AppError('last_secretary', 'A club needs a secretary: make somebody else one first.');
}
