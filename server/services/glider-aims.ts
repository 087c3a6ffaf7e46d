import type { GliderAimDto } from '#shared/schemas/class-edition.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { GliderAim } from '#server/models/glider-aim.ts';
import { presentClassEdition } from '#server/presenters/class-edition.ts';
import { takeClassEdition } from './class-editions.ts';
import { allowOnGlider, lockGlider } from './glider-access.ts';
import { inTransaction } from './transaction.ts';

/** What a glider is built for. Who may see the glider sees this, whichever club the edition is of. */
export async function getGliderAim(actor: UserDto, gliderId: string): Promise<GliderAimDto> {
  await allowOnGlider(actor, gliderId, 'read');
  const aim = await GliderAim.findByPk(gliderId, { include: ['edition'] });
  return { edition: aim?.edition ? presentClassEdition(aim.edition, 'member') : null };
}

/** Aims a glider at an edition of a class; from now on that edition never changes. */
export async function aimGlider(actor: UserDto, gliderId: string, editionId: string): Promise<GliderAimDto> {
  await inTransaction(async (transaction) => {
    const { glider } = await lockGlider(actor, gliderId, 'edit', transaction);
    const { id } = await takeClassEdition(actor, editionId, transaction);
    await GliderAim.upsert(
      { ownerId: glider.ownerId, gliderId, classEditionId: id, aimedAt: new Date() },
      { transaction },
    );
  });
  return getGliderAim(actor, gliderId);
}

/** Builds a glider for no class in particular again. */
export function unaimGlider(actor: UserDto, gliderId: string): Promise<void> {
  return inTransaction(async (transaction) => {
    await lockGlider(actor, gliderId, 'edit', transaction);
    await GliderAim.destroy({ where: { gliderId }, transaction });
  });
}
