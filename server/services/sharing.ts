import type { MemberDto, MemberListDto, MemberRole } from '#shared/schemas/sharing.ts';
import type { GliderDto } from '#shared/schemas/glider.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { AppError, notFound } from '#server/errors.ts';
import { GliderMember } from '#server/models/glider-member.ts';
import { presentMember } from '#server/presenters/sharing.ts';
import { lockGlider, gliderRoleOf } from './glider-access.ts';
import { authorizeGlider } from '#server/policies/glider.ts';
import { getGlider } from './gliders.ts';
import { inTransaction } from './transaction.ts';

const withUser = { association: 'user', attributes: ['name', 'email'], required: true };

/** Who is what to a glider, the owner first; addresses are for the owner’s eyes. */
export async function listMembers(actor: UserDto, gliderId: string): Promise<MemberListDto> {
  const role = await gliderRoleOf(actor, gliderId);
  authorizeGlider(role, 'read');
  const rows = await GliderMember.findAll({
    where: { gliderId },
    include: [withUser],
    order: [
      ['joinedAt', 'ASC'],
      ['userId', 'ASC'],
    ],
  });
  const isOwner = (row: GliderMember) => row.role === 'owner';
  const sorted = [...rows.filter(isOwner), ...rows.filter((row) => !isOwner(row))];
  return { members: sorted.map((row) => presentMember(row, { viewer: actor.id, viewerRole: role })) };
}

/** Gives a member another role. @throws AppError `not_found` for nobody’s row and for the owner’s */
export function changeMember(
  actor: UserDto,
  gliderId: string,
  userId: string,
  role: MemberRole,
): Promise<MemberDto> {
  return inTransaction(async (transaction) => {
    const { role: viewerRole } = await lockGlider(actor, gliderId, 'share', transaction);
    const member = await GliderMember.findOne({
      where: { gliderId, userId },
      include: [withUser],
      transaction,
    });
    if (!member || member.role === 'owner') throw notFound('member');
    await member.update({ role }, { transaction });
    return presentMember(member, { viewer: actor.id, viewerRole });
  });
}

export function removeMember(actor: UserDto, gliderId: string, userId: string): Promise<void> {
  return inTransaction(async (transaction) => {
    await lockGlider(actor, gliderId, 'share', transaction);
    const member = await GliderMember.findOne({ where: { gliderId, userId }, transaction });
    if (!member || member.role === 'owner') throw notFound('member');
    await member.destroy({ transaction });
  });
}

/** The asker is no longer a member; an owner has to hand the glider over first. */
export function leaveGlider(actor: UserDto, gliderId: string): Promise<void> {
  return inTransaction(async (transaction) => {
    await lockGlider(actor, gliderId, 'leave', transaction);
    const left = await GliderMember.destroy({ where: { gliderId, userId: actor.id }, transaction });
    // Who sees it by a club is no member of it.
    if (left === 0) throw notFound('member');
  });
}

/**
 * Makes a member the owner; who was it becomes a builder. All rows of the glider follow.
 * @throws AppError `not_found` for somebody who is no member
 */
export async function handOver(actor: UserDto, gliderId: string, userId: string): Promise<GliderDto> {
  await inTransaction(async (transaction) => {
    const { glider } = await lockGlider(actor, gliderId, 'transfer', transaction);
    const next = await GliderMember.findOne({ where: { gliderId, userId }, transaction });
    if (!next) throw notFound('member');
    if (userId === actor.id) throw new AppError('already_member', 'It is yours already.');
    await glider.update({ ownerId: userId }, { transaction, silent: true });
    await GliderMember.update({ role: 'builder' }, { where: { gliderId, userId: actor.id }, transaction });
    await GliderMember.update({ role: 'owner' }, { where: { gliderId, userId }, transaction });
  });
  return getGlider(actor, gliderId);
}
