import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import { hashToken, newToken } from '#server/auth/tokens.ts';
import { ClassEdition } from '#server/models/class-edition.ts';
import { ClubGlider } from '#server/models/club-glider.ts';
import { ClubInvitation } from '#server/models/club-invitation.ts';
import { ClubMember } from '#server/models/club-member.ts';
import { Club } from '#server/models/club.ts';
import { GliderAim } from '#server/models/glider-aim.ts';
import type { User } from '#server/models/user.ts';
import { INVITATION_LIFE_MS } from '#server/services/invitations.ts';
import { SeedError, type People } from './seed-files.ts';

interface Demo {
  people: People;
  users: ReadonlyMap<string, User>;
  /** by file */
  gliderIds: ReadonlyMap<string, string>;
}

function named<T>(rows: ReadonlyMap<string, T>, key: string): T {
  const row = rows.get(key);
  if (row === undefined) throw new SeedError(`data/demo/people.json has no “${key}”.`);
  return row;
}

/** The demo's club with its members, an invitation that waits, and what is shown to it and aimed at a class. */
export async function seedDemoClub(demo: Demo, transaction: Transaction): Promise<Club> {
  const { club, people } = demo.people;
  const founder = people.find(({ inClub }) => inClub === 'secretary');
  const foundedBy = founder ? named(demo.users, founder.key).id : null;
  const { name, place } = club;
  const row = await Club.create({ id: randomUUID(), name, place, foundedBy }, { transaction });
  const members = people.map(({ key, inClub: role }) => ({
    clubId: row.id,
    userId: named(demo.users, key).id,
    role,
  }));
  await ClubMember.bulkCreate(members, { transaction });
  const expiresAt = new Date(Date.now() + INVITATION_LIFE_MS);
  const invitations = club.invited.map(({ email, role, by }) => ({
    id: randomUUID(),
    clubId: row.id,
    email,
    role,
    // Nobody knows the link: the demo sends no mail.
    tokenHash: hashToken(newToken()),
    invitedBy: named(demo.users, by).id,
    expiresAt,
  }));
  await ClubInvitation.bulkCreate(invitations, { transaction });
  for (const glider of demo.people.gliders) await placeGlider(glider, row, demo, transaction);
  return row;
}

async function placeGlider(
  { file, owner, shownToClub, aim }: People['gliders'][number],
  { id: clubId }: Club,
  { users, gliderIds }: Demo,
  transaction: Transaction,
): Promise<void> {
  const { id: ownerId } = named(users, owner);
  const gliderId = named(gliderIds, file);
  if (shownToClub) await ClubGlider.create({ clubId, ownerId, gliderId }, { transaction });
  if (!aim) return;
  const where = { clubId: null, key: aim.key, edition: aim.edition };
  const edition = await ClassEdition.findOne({ where, transaction });
  if (!edition) throw new SeedError(`data/classes.json has no ${aim.key} of “${aim.edition}”.`);
  if (edition.usedAt === null) await edition.update({ usedAt: new Date() }, { transaction });
  await GliderAim.create({ ownerId, gliderId, classEditionId: edition.id }, { transaction });
}
