import type { Transaction } from 'sequelize';
import type { Estimate } from '#shared/core/result.ts';
import type { GliderDto } from '#shared/schemas/glider.ts';
import type { PlanDto } from '#shared/schemas/plan.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { AppError, notFound } from '#server/errors.ts';
import { estimatePlan } from '#server/estimating/estimate-plan.ts';
import { GliderMember } from '#server/models/glider-member.ts';
import { GliderSave } from '#server/models/glider-save.ts';
import { Glider } from '#server/models/glider.ts';
import { User } from '#server/models/user.ts';
import { authorizeGlider } from '#server/policies/glider.ts';
import { authorizeSite } from '#server/policies/site.ts';
import { presentGlider } from '#server/presenters/glider.ts';
import { canonicalJson } from './canonical-json.ts';
import { figuresOf } from './figures.ts';
import { allowOnGlider, gliderRoleOf, lockGlider } from './glider-access.ts';
import { linkMaterials } from './glider-materials.ts';
import { makeOnce } from './idempotency.ts';
import { planOutline } from '#shared/drawing/outline.ts';
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
  const result = await estimatePlan(plan);
  const id = await inTransaction((transaction) =>
    makeOnce({ userId: actor.id, key, purpose: 'glider', transaction }, (newId) =>
      insertGlider({ id: newId, ownerId: actor.id, plan, result, transaction }),
    ),
  );
  return getGlider(actor, id);
}

interface NewGlider {
  id: string;
  ownerId: string;
  plan: PlanDto;
  result: Estimate;
  transaction: Transaction;
}

/** A glider with its owner, its first save and its materials. */
export async function insertGlider({ id, ownerId, plan, result, transaction }: NewGlider): Promise<void> {
  const figures = figuresOf(result);
  const savedAt = new Date();
  await Glider.create(
    {
      id,
      ownerId,
      name: plan.name,
      plan,
      ...figures,
      outline: planOutline(plan),
      updatedBy: ownerId,
      updatedAt: savedAt,
    },
    { transaction },
  );
  await GliderMember.create({ ownerId, gliderId: id, userId: ownerId, role: 'owner' }, { transaction });
  await GliderSave.create(
    { ownerId, gliderId: id, version: 1, plan, ...figures, savedBy: ownerId, savedAt },
    { transaction },
  );
  await linkMaterials({ glider: { id, ownerId }, plan, actorId: ownerId, transaction });
}

/**
 * Saves a plan made from `version`.
 * @throws AppError `stale_version` with the current glider when somebody saved in between
 */
export async function saveGlider(
  actor: UserDto,
  id: string,
  version: number,
  plan: PlanDto,
): Promise<GliderDto> {
  await allowOnGlider(actor, id, 'edit');
  const figures = figuresOf(await estimatePlan(plan));
  return inTransaction(async (transaction) => {
    const { glider, role } = await lockGlider(actor, id, 'edit', transaction);
    if (glider.version !== version) {
      const editor = await User.findByPk(glider.updatedBy, { transaction, rejectOnEmpty: true });
      const current = presentGlider(glider, role, editor.name);
      // The answer to the save that made this state may have been lost: what was asked for is there (RFC 9110, 13.1.1).
      if (canonicalJson(plan) === canonicalJson(glider.plan)) return current;
      throw new AppError('stale_version', `${editor.name} has saved this glider in the meantime.`, {
        members: { current },
      });
    }
    const updatedAt = new Date();
    await glider.update(
      {
        name: plan.name,
        plan,
        version: version + 1,
        ...figures,
        outline: planOutline(plan),
        updatedBy: actor.id,
        updatedAt,
      },
      { transaction },
    );
    await GliderSave.create(
      {
        ownerId: glider.ownerId,
        gliderId: id,
        version: version + 1,
        plan,
        ...figures,
        savedBy: actor.id,
        savedAt: updatedAt,
      },
      { transaction },
    );
    await linkMaterials({ glider, plan, actorId: actor.id, transaction });
    return presentGlider(glider, role, actor.name);
  });
}

/** Deletes a glider with everything in it, its sheets and its log included. */
export function deleteGlider(actor: UserDto, id: string): Promise<void> {
  return inTransaction(async (transaction) => {
    const { glider } = await lockGlider(actor, id, 'delete', transaction);
    await glider.destroy({ transaction });
  });
}
