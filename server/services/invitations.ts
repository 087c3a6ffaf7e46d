import { randomUUID } from 'node:crypto';
import { Op, type Transaction } from 'sequelize';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import type {
  InvitationAcceptedDto,
  InvitationDto,
  InvitationInput,
  InvitationListDto,
  InvitationPreviewDto,
} from '#shared/schemas/sharing.ts';
import { hashToken, newToken } from '#server/auth/tokens.ts';
import { AppError, invalidInput, notFound } from '#server/errors.ts';
import { invitationLetter } from '#server/mail/letters.ts';
import { post } from '#server/mail/outbox.ts';
import { GliderMember } from '#server/models/glider-member.ts';
import { Invitation } from '#server/models/invitation.ts';
import { authorizeGlider } from '#server/policies/glider.ts';
import { presentInvitation } from '#server/presenters/sharing.ts';
import { verifiedRow } from './account.ts';
import { allowOnGlider, gliderRoleOf, lockGlider } from './glider-access.ts';
import { deadLink } from './mailed-links.ts';
import { inTransaction } from './transaction.ts';

/** How long an invitation waits for its answer. */
export const INVITATION_LIFE_MS = 14 * 86_400_000;

const open = () => ({ expiresAt: { [Op.gt]: new Date() } });
const inviter = { association: 'inviter', attributes: ['name'], required: true };
const gliderName = { association: 'glider', attributes: ['name'], required: true };

/** What was sent and not answered yet, newest first. */
export async function listInvitations(actor: UserDto, gliderId: string): Promise<InvitationListDto> {
  await allowOnGlider(actor, gliderId, 'share');
  const rows = await Invitation.findAll({
    where: { gliderId, ...open() },
    include: [inviter],
    order: [['invitedAt', 'DESC']],
  });
  return { invitations: rows.map(presentInvitation) };
}

/**
 * Invites by e-mail; inviting an address again sends a new link, and the old one no longer works.
 * @throws AppError `email_unverified` until the asker's own address is confirmed, `already_member`
 */
export async function invite(
  actor: UserDto,
  gliderId: string,
  { email, role }: InvitationInput,
): Promise<InvitationDto> {
  await allowOnGlider(actor, gliderId, 'share');
  const user = await verifiedRow(actor);
  const id = randomUUID();
  await inTransaction(async (transaction) => {
    const { glider } = await lockGlider(actor, gliderId, 'share', transaction);
    await refuseMember(gliderId, email, transaction);
    await Invitation.destroy({ where: { gliderId, email }, transaction });
    if ((await Invitation.count({ where: { gliderId, ...open() }, transaction })) >= LIMITS.invitations.max) {
      const detail = `At most ${LIMITS.invitations.max} invitations may wait for an answer; withdraw one first.`;
      throw invalidInput([{ pointer: '#', detail }]);
    }
    const token = newToken();
    const row = { id, ownerId: glider.ownerId, gliderId, email, role, invitedBy: actor.id };
    const expiresAt = new Date(Date.now() + INVITATION_LIFE_MS);
    await Invitation.create({ ...row, tokenHash: hashToken(token), expiresAt }, { transaction });
    const letter = invitationLetter({ gliderName: glider.name, invitedBy: user.name, role, token });
    await post(email, letter, transaction);
  });
  const made = await Invitation.findByPk(id, { include: [inviter] });
  if (!made) throw notFound('invitation');
  return presentInvitation(made);
}

async function refuseMember(gliderId: string, email: string, transaction: Transaction): Promise<void> {
  const member = await GliderMember.findOne({
    where: { gliderId },
    include: [{ association: 'user', where: { email }, required: true }],
    transaction,
  });
  if (member) throw new AppError('already_member', 'Somebody with this address is a member already.');
}

/** @throws AppError `not_found` also for an invitation to a glider that the asker has no role on */
export async function withdrawInvitation(actor: UserDto, id: string): Promise<void> {
  const invitation = await Invitation.findByPk(id);
  if (!invitation) throw notFound('invitation');
  authorizeGlider(await gliderRoleOf(actor, invitation.gliderId, 'invitation'), 'share');
  await invitation.destroy();
}

/** @throws AppError `link_dead` */
async function byToken(token: string, transaction?: Transaction): Promise<Invitation> {
  const found = await Invitation.findOne({
    where: { tokenHash: hashToken(token), ...open() },
    include: [inviter, gliderName],
    ...(transaction && { transaction, lock: { level: transaction.LOCK.UPDATE, of: Invitation } }),
  });
  if (!found) throw deadLink();
  return found;
}

/** What whoever holds the link is told before answering. */
export async function previewInvitation(token: string): Promise<InvitationPreviewDto> {
  const { email, role, expiresAt, glider, inviter: by } = await byToken(token);
  return {
    gliderName: glider?.name ?? '',
    invitedBy: by?.name ?? '',
    email,
    role,
    expiresAt: expiresAt.toISOString(),
  };
}

/** Makes the asker a member, whichever address is theirs: who has the link was meant. A member's role only grows. */
export function acceptInvitation(actor: UserDto, token: string): Promise<InvitationAcceptedDto> {
  return inTransaction(async (transaction) => {
    const invitation = await byToken(token, transaction);
    const { gliderId, ownerId, role } = invitation;
    const [member, isNew] = await GliderMember.findOrCreate({
      where: { gliderId, userId: actor.id },
      defaults: { gliderId, ownerId, userId: actor.id, role },
      transaction,
    });
    if (!isNew && RANK[member.role] < RANK[role]) await member.update({ role }, { transaction });
    await invitation.destroy({ transaction });
    return { gliderId, role: member.role };
  });
}

const RANK = { reader: 0, pilot: 1, builder: 2, owner: 3 } as const;

export async function declineInvitation(token: string): Promise<void> {
  await (await byToken(token)).destroy();
}

export async function forgetDeadInvitations(now: Date): Promise<void> {
  await Invitation.destroy({ where: { expiresAt: { [Op.lte]: now } } });
}
