import { randomUUID } from 'node:crypto';
import type { ClassEditionInput } from '#shared/schemas/class-edition.ts';
import type { ClubRole } from '#shared/schemas/club.ts';
import { hashToken, newToken } from '#server/auth/tokens.ts';
import { ClassEdition } from '#server/models/class-edition.ts';
import { ClubGlider } from '#server/models/club-glider.ts';
import { ClubInvitation } from '#server/models/club-invitation.ts';
import { ClubMember } from '#server/models/club-member.ts';
import { Club } from '#server/models/club.ts';
import type { Glider } from '#server/models/glider.ts';
import type { User } from '#server/models/user.ts';

/** A club with its secretary. */
export async function makeClub(secretary: User): Promise<Club> {
  const row = { id: randomUUID(), name: 'Tarn Side Flyers', place: 'Tarn Side', foundedBy: secretary.id };
  const club = await Club.create(row);
  await joinClub(club, secretary, 'secretary');
  return club;
}

export async function joinClub(
  { id: clubId }: Pick<Club, 'id'>,
  { id: userId }: User,
  role: ClubRole,
): Promise<void> {
  await ClubMember.create({ clubId, userId, role });
}

export async function showGlider({ id: clubId }: Club, { id: gliderId, ownerId }: Glider): Promise<void> {
  await ClubGlider.create({ clubId, ownerId, gliderId });
}

/** An invitation that waits for an answer; nobody knows its link. */
export function makeClubInvitation({ id: clubId }: Club, by: User): Promise<ClubInvitation> {
  return ClubInvitation.create({
    id: randomUUID(),
    clubId,
    email: 'finch@larkmoor.example',
    role: 'member',
    tokenHash: hashToken(newToken()),
    invitedBy: by.id,
    expiresAt: new Date(Date.now() + 86_400_000),
  });
}

/** An edition with one limit, invented. */
export function editionBody(changes: Partial<ClassEditionInput> = {}): ClassEditionInput {
  return {
    key: 'tarn-1',
    name: 'Tarn towline',
    issuedBy: 'Tarn Side Flyers',
    edition: '2026',
    note: '',
    limits: [
      {
        quantity: 'mass',
        bound: 'min',
        value: '300',
        unit: 'g',
        inclusive: true,
        areaBasis: 'wing_and_tail',
        massBasis: 'extreme',
        clause: '2',
        source: 'club rules',
        sure: 'compared with the current book',
      },
    ],
    ...changes,
  };
}

/** An edition of a club's own, or everybody's. */
export function makeEdition(
  club: Club | null,
  changes: Partial<ClassEditionInput> = {},
): Promise<ClassEdition> {
  const unique = { edition: `2026 ${randomUUID()}` };
  return ClassEdition.create({
    id: randomUUID(),
    clubId: club?.id ?? null,
    ...editionBody({ ...unique, ...changes }),
  });
}
