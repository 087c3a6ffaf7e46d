import type { GliderRole } from '#shared/schemas/glider.ts';
import type { InvitationDto, MemberDto, ReadLinkStateDto, SharedGliderDto } from '#shared/schemas/sharing.ts';
import type { GliderMember } from '#server/models/glider-member.ts';
import type { Glider } from '#server/models/glider.ts';
import type { Invitation } from '#server/models/invitation.ts';
import type { ReadLink } from '#server/models/read-link.ts';
import { presentFigures } from './figures.ts';

export function presentMember(
  row: GliderMember,
  { viewer, viewerRole }: { viewer: string; viewerRole: GliderRole },
): MemberDto {
  return {
    userId: row.userId,
    name: row.user?.name ?? '',
    email: viewerRole === 'owner' || row.userId === viewer ? (row.user?.email ?? null) : null,
    role: row.role,
    joinedAt: row.joinedAt.toISOString(),
    you: row.userId === viewer,
  };
}

export function presentInvitation(row: Invitation): InvitationDto {
  return {
    id: row.id,
    gliderId: row.gliderId,
    email: row.email,
    role: row.role,
    invitedBy: row.inviter?.name ?? '',
    invitedAt: row.invitedAt.toISOString(),
    expiresAt: row.expiresAt.toISOString(),
  };
}

export function presentReadLink(row: ReadLink | null): ReadLinkStateDto {
  if (!row) return { link: null };
  const { token, createdAt } = row;
  return { link: { token, path: `/shared/${token}`, createdAt: createdAt.toISOString() } };
}

export function presentSharedGlider(row: Glider): SharedGliderDto {
  return {
    name: row.name,
    plan: row.plan,
    figures: presentFigures(row),
    updatedAt: row.updatedAt.toISOString(),
  };
}
