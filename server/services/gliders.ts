import type { Transaction } from 'sequelize';
import type { GliderDto } from '#shared/schemas/glider.ts';
import type { PlanDto } from '#shared/schemas/plan.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { notFound } from '#server/errors.ts';
import { estimatePlan } from '#server/estimating/estimate-plan.ts';
import { GliderMember } from '#server/models/glider-member.ts';
import { GliderSave } from '#server/models/glider-save.ts';
import { Glider } from '#server/models/glider.ts';
import { authorizeGlider } from '#server/policies/glider.ts';
import { authorizeSite } from '#server/policies/site.ts';
import { presentGlider } from '#server/presenters/glider.ts';
import { headlineOf, type Headline } from './figures.ts';
import { gliderRoleOf, lockGlider } from './glider-access.ts';
import { linkMaterials } from './glider-materials.ts';
import { makeOnce } from './idempotency.ts';
import { removeUnusedFiles } from './stored-files.ts';
import { inTransaction } from './transaction.ts';

export async function getGlider(actor: UserDto, id: string): Promise<GliderDto> {
  const role = await gliderRoleOf(actor, id);
  authorizeGlider(role, 'read');
  const glider = await Glider.findByPk(id, { include: 'editor' });
  if (!glider) throw notFound('glider');
  return presentGlider(glider, role, glider.editor?.name ?? '');
}

/** Makes a glider; the same key of the same user makes it once. */
export async function createGlider(
  actor: UserDto,
  plan: PlanDto,
  key: string | undefined,
): Promise<GliderDto> {
  authorizeSite(actor, 'addGlider');
  const headline = headlineOf(plan, await estimatePlan(plan));
  const id = await inTransaction((transaction) =>
    makeOnce({ userId: actor.id, key, purpose: 'glider', transaction }, (newId) =>
      insertGlider({ id: newId, ownerId: actor.id, plan, headline, transaction }),
    ),
  );
  return getGlider(actor, id);
}

interface NewGlider {
  id: string;
  ownerId: string;
  plan: PlanDto;
  headline: Headline;
  transaction: Transaction;
}

/** A glider with its owner, its first save and its materials. */
export async function insertGlider({ id, ownerId, plan, headline, transaction }: NewGlider): Promise<void> {
  const { mass, percentMac, wingLoading } = headline;
  const savedAt = new Date();
  await Glider.create(
    {
      id,
      ownerId,
      name: plan.name,
      plan,
      ...headline,
      updatedBy: ownerId,
      updatedAt: savedAt,
    },
    { transaction },
  );
  await GliderMember.create({ ownerId, gliderId: id, userId: ownerId, role: 'owner' }, { transaction });
  await GliderSave.create(
    { ownerId, gliderId: id, version: 1, plan, mass, percentMac, wingLoading, savedBy: ownerId, savedAt },
    { transaction },
  );
  await linkMaterials({ glider: { id, ownerId }, plan, actorId: ownerId, transaction });
}

/** Deletes a glider with everything in it, its sheets, its log and its photos included. */
export async function deleteGlider(actor: UserDto, id: string): Promise<void> {
  await inTransaction(async (transaction) => {
    const { glider } = await lockGlider(actor, id, 'delete', transaction);
    await glider.destroy({ transaction });
  });
  await removeUnusedFiles().catch(() => undefined);
}
