import { randomUUID } from 'node:crypto';
import { Op, type Transaction } from 'sequelize';
import type {
  ClubInvitationAcceptedDto,
  ClubInvitationDto,
  ClubInvitationInput,
  ClubInvitationListDto,
  ClubInvitationPreviewDto,
} from '#shared/schemas/club.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { hashToken, newToken } from '#server/auth/tokens.ts';
import { AppError, invalidInput, notFound } from '#server/errors.ts';
import { clubInvitationLetter } from '#server/mail/letters.ts';
import { post } from '#server/mail/outbox.ts';
import { ClubInvitation } from '#server/models/club-invitation.ts';
import { ClubMember } from '#server/models/club-member.ts';
import { Club } from '#server/models/club.ts';
import { authorizeClub } from '#server/policies/club.ts';
import { presentClubInvitation } from '#server/presenters/club.ts';
import { verifiedRow } from './account.ts';
import { allowInClub, clubRoleOf, lockClub } from './club-access.ts';
import { INVITATION_LIFE_MS } from './invitations.ts';
import { deadLink } from './mailed-links.ts';
import { inTransaction } from './transaction.ts';

const open = () => ({ expiresAt: { [Op.gt]: new Date() } });
const inviter = { association: 'inviter', attributes: ['name'], required: true };
const clubName = { association: 'club', attributes: ['name'], required: true };

/** What was sent and not answered yet, newest first. */
export async function listClubInvitations(actor: UserDto, clubId: string): Promise<ClubInvitationListDto> {
  await allowInClub(actor, clubId, 'keepMembers');
  const rows = await ClubInvitation.findAll({
    where: { clubId, ...open() },
    include: [inviter],
    order: [['invitedAt', 'DESC']],
  });
  return { invitations: rows.map(presentClubInvitation) };
}

/**
 * Invites by e-mail; inviting an address again sends a new link, and the old one no longer works.
 * @throws AppError `email_unverified` until the asker's own address is confirmed, `already_member`
 */
export async function inviteToClub(
  actor: UserDto,
  clubId: string,
  { email, role }: ClubInvitationInput,
): Promise<ClubInvitationDto> {
  await allowInClub(actor, clubId, 'keepMembers');
  const user = await verifiedRow(actor);
  const id = randomUUID();
  await inTransaction(async (transaction) => {
    const { club } = await lockClub(actor, clubId, 'keepMembers', transaction);
    await refuseMember(clubId, email, transaction);
    await ClubInvitation.destroy({ where: { clubId, email }, transaction });
    await refuseTooMany(clubId, transaction);
    const token = newToken();
    const expiresAt = new Date(Date.now() + INVITATION_LIFE_MS);
    await ClubInvitation.create(
      { id, clubId, email, role, invitedBy: actor.id, tokenHash: hashToken(token), expiresAt },
      { transaction },
    );
    const letter = clubInvitationLetter({ clubName: club.name, invitedBy: user.name, role, token });
    await post(email, letter, transaction);
  });
  const made = await ClubInvitation.findByPk(id, { include: [inviter] });
  if (!made) throw notFound('invitation');
  return presentClubInvitation(made);
}

async function refuseTooMany(clubId: string, transaction: Transaction): Promise<void> {
  const waiting = await ClubInvitation.count({ where: { clubId, ...open() }, transaction });
  const members = await ClubMember.count({ where: { clubId }, transaction });
  if (waiting + members < LIMITS.clubMembers.max) return;
  const detail = `A club has room for ${LIMITS.clubMembers.max} members and invitations.`;
  throw invalidInput([{ pointer: '#', detail }]);
}

async function refuseMember(clubId: string, email: string, transaction: Transaction): Promise<void> {
  const member = await ClubMember.findOne({
    where: { clubId },
    include: [{ association: 'user', where: { email }, required: true }],
    transaction,
  });
  if (member) throw new AppError('already_member', 'Somebody with this address is a member already.');
}

/** @throws AppError `not_found` also for an invitation to a club that the asker is not in */
export async function withdrawClubInvitation(actor: UserDto, id: string): Promise<void> {
  const invitation = await ClubInvitation.findByPk(id);
  if (!invitation) throw notFound('invitation');
  authorizeClub(await clubRoleOf(actor, invitation.clubId, 'invitation'), 'keepMembers');
  await invitation.destroy();
}

/** @throws AppError `link_dead` */
async function byToken(token: string, transaction?: Transaction): Promise<ClubInvitation> {
  const found = await ClubInvitation.findOne({
    where: { tokenHash: hashToken(token), ...open() },
    include: [inviter, clubName],
    ...(transaction && { transaction, lock: { level: transaction.LOCK.UPDATE, of: ClubInvitation } }),
  });
  if (!found) throw deadLink();
  return found;
}

/** What whoever holds the link is told before answering. */
export async function previewClubInvitation(token: string): Promise<ClubInvitationPreviewDto> {
  const { email, role, expiresAt, club, inviter: by } = await byToken(token);
  return {
    clubName: club?.name ?? '',
    invitedBy: by?.name ?? '',
    email,
    role,
    expiresAt: expiresAt.toISOString(),
  };
}

const RANK = { member: 0, director: 1, secretary: 2 } as const;

/** Makes the asker a member, whichever address is theirs: who has the link was meant. A member's role only grows. */
export async function acceptClubInvitation(
  actor: UserDto,
  token: string,
): Promise<ClubInvitationAcceptedDto> {
  const { clubId } = await byToken(token);
  return inTransaction(async (transaction) => {
    // The club is locked before the invitation, as everywhere, so that two changes never wait for each other.
    await Club.findByPk(clubId, { transaction, lock: transaction.LOCK.UPDATE });
    const invitation = await byToken(token, transaction);
    const { role } = invitation;
    const [member, isNew] = await ClubMember.findOrCreate({
      where: { clubId, userId: actor.id },
      defaults: { clubId, userId: actor.id, role },
      transaction,
    });
    if (!isNew && RANK[member.role] < RANK[role]) await member.update({ role }, { transaction });
    await invitation.destroy({ transaction });
    return { clubId, role: member.role };
  });
}

export async function declineClubInvitation(token: string): Promise<void> {
  await (await byToken(token)).destroy();
}

export async function forgetDeadClubInvitations(now: Date): Promise<void> {
  await ClubInvitation.destroy({ where: { expiresAt: { [Op.lte]: now } } });
}
