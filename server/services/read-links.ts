import type { UserDto } from '#shared/schemas/session.ts';
import type { ReadLinkStateDto, SharedGliderDto } from '#shared/schemas/sharing.ts';
import { newToken } from '#server/auth/tokens.ts';
import { notFound } from '#server/errors.ts';
import { ReadLink } from '#server/models/read-link.ts';
import { presentReadLink, presentSharedGlider } from '#server/presenters/sharing.ts';
import { allowOnGlider, lockGlider } from './glider-access.ts';
import { inTransaction } from './transaction.ts';

export async function getReadLink(actor: UserDto, gliderId: string): Promise<ReadLinkStateDto> {
  await allowOnGlider(actor, gliderId, 'share');
  return presentReadLink(await ReadLink.findByPk(gliderId));
}

/** Switches the link on; the one that is there stays. */
export function switchReadLinkOn(actor: UserDto, gliderId: string): Promise<ReadLinkStateDto> {
  return inTransaction(async (transaction) => {
    const { glider } = await lockGlider(actor, gliderId, 'share', transaction);
    const [link] = await ReadLink.findOrCreate({
      where: { gliderId },
      defaults: { gliderId, ownerId: glider.ownerId, token: newToken() },
      transaction,
    });
    return presentReadLink(link);
  });
}

/** Switches the link off for good; one that is switched on later is another. */
export function switchReadLinkOff(actor: UserDto, gliderId: string): Promise<void> {
  return inTransaction(async (transaction) => {
    await lockGlider(actor, gliderId, 'share', transaction);
    await ReadLink.destroy({ where: { gliderId }, transaction });
  });
}

/** The glider behind a link. @throws AppError `not_found` for one that was never on or is off */
export async function readShared(token: string): Promise<SharedGliderDto> {
  const link = await ReadLink.findOne({
    where: { token },
    include: { association: 'glider', required: true },
  });
  if (!link?.glider) throw notFound('glider');
  return presentSharedGlider(link.glider);
}
