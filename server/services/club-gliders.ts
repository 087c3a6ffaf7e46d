import type { ClubGliderListDto } from '#shared/schemas/club.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { invalidInput, notFound } from '#server/errors.ts';
import { ClubGlider } from '#server/models/club-glider.ts';
import { mayInClub } from '#server/policies/club.ts';
import { presentClubGlider } from '#server/presenters/club.ts';
import { allowInClub, lockClub } from './club-access.ts';
import { lockGlider } from './glider-access.ts';
import { inTransaction } from './transaction.ts';

/** Gliders that members let the club see, the newest first. */
export async function listClubGliders(actor: UserDto, clubId: string): Promise<ClubGliderListDto> {
  await allowInClub(actor, clubId, 'read');
  const rows = await ClubGlider.findAll({
    where: { clubId },
    include: [
      {
        association: 'glider',
        attributes: ['name'],
        required: true,
        include: [{ association: 'owner', attributes: ['name'], required: true }],
      },
    ],
    order: [
      ['sharedAt', 'DESC'],
      ['gliderId', 'ASC'],
    ],
  });
  return { gliders: rows.map((row) => presentClubGlider(row, actor.id)) };
}

/** Lets the whole club see a glider of the asker's own; done twice it is done once. */
export function showToClub(actor: UserDto, clubId: string, gliderId: string): Promise<void> {
  return inTransaction(async (transaction) => {
    await lockClub(actor, clubId, 'shareGlider', transaction);
    const { glider } = await lockGlider(actor, gliderId, 'share', transaction);
    if ((await ClubGlider.count({ where: { clubId }, transaction })) >= LIMITS.clubGliders.max) {
      const detail = `A club has room for ${LIMITS.clubGliders.max} gliders.`;
      throw invalidInput([{ pointer: '#', detail }]);
    }
    const row = { clubId, ownerId: glider.ownerId, gliderId };
    await ClubGlider.findOrCreate({ where: { clubId, gliderId }, defaults: row, transaction });
  });
}

/** Takes a glider back from a club; its owner may, and who keeps the club. */
export async function hideFromClub(actor: UserDto, clubId: string, gliderId: string): Promise<void> {
  const role = await allowInClub(actor, clubId, 'read');
  const row = await ClubGlider.findOne({ where: { clubId, gliderId } });
  if (!row || (row.ownerId !== actor.id && !mayInClub(role, 'keepMembers'))) throw notFound('glider');
  await row.destroy();
}
