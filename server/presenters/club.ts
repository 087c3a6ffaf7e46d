import type {
  ClubDto,
  ClubGliderDto,
  ClubInvitationDto,
  ClubMemberDto,
  ClubRole,
} from '#shared/schemas/club.ts';
import type { ClubGlider } from '#server/models/club-glider.ts';
import type { ClubInvitation } from '#server/models/club-invitation.ts';
import type { ClubMember } from '#server/models/club-member.ts';
import type { Club } from '#server/models/club.ts';
import { clubAbilities, mayInClub } from '#server/policies/club.ts';

export function presentClub(row: Club, role: ClubRole, members: number): ClubDto {
  const { id, name, place, version } = row;
  return { id, name, place, role, can: clubAbilities(role), members, version };
}

/** Addresses are for who invites, and everybody's own. */
export function presentClubMember(
  row: ClubMember,
  { viewer, viewerRole }: { viewer: string; viewerRole: ClubRole },
): ClubMemberDto {
  const knows = mayInClub(viewerRole, 'keepMembers') || row.userId === viewer;
  return {
    userId: row.userId,
    name: row.user?.name ?? '',
    email: knows ? (row.user?.email ?? null) : null,
    role: row.role,
    joinedAt: row.joinedAt.toISOString(),
    you: row.userId === viewer,
  };
}

export function presentClubInvitation(row: ClubInvitation): ClubInvitationDto {
  return {
    id: row.id,
    clubId: row.clubId,
    email: row.email,
    role: row.role,
    invitedBy: row.inviter?.name ?? '',
    invitedAt: row.invitedAt.toISOString(),
    expiresAt: row.expiresAt.toISOString(),
  };
}

export function presentClubGlider(row: ClubGlider, viewer: string): ClubGliderDto {
  return {
    gliderId: row.gliderId,
    name: row.glider?.name ?? '',
    ownerName: row.glider?.owner?.name ?? '',
    yours: row.ownerId === viewer,
    sharedAt: row.sharedAt.toISOString(),
  };
}
