import type { Transaction } from 'sequelize';
import type { Estimate } from '#shared/core/result.ts';
import type { GliderDto, GliderRole } from '#shared/schemas/glider.ts';
import type { PlanDto } from '#shared/schemas/plan.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { AppError, notFound } from '#server/errors.ts';
import { estimatePlan } from '#server/estimating/estimate-plan.ts';
import { GliderSave } from '#server/models/glider-save.ts';
import type { Glider } from '#server/models/glider.ts';
import { User } from '#server/models/user.ts';
import { presentGlider } from '#server/presenters/glider.ts';
import { canonicalJson } from './canonical-json.ts';
import { headlineOf, figuresOf } from './figures.ts';
import { allowOnGlider, lockGlider } from './glider-access.ts';
import { linkMaterials } from './glider-materials.ts';
import { saveChanges } from './save-changes.ts';
import { inTransaction } from './transaction.ts';

interface Save {
  /** the version that the plan was made from */
  version: number;
  plan: PlanDto;
  /** the version that the plan is of, where an older state is brought back */
  restoredFrom?: number;
}

/**
 * Saves a plan.
 * @throws AppError `stale_version` with the current glider when somebody saved in between
 */
export async function saveGlider(actor: UserDto, id: string, save: Save): Promise<GliderDto> {
  await allowOnGlider(actor, id, 'edit');
  const result = await estimatePlan(save.plan);
  return inTransaction(async (transaction) => {
    const { glider, role } = await lockGlider(actor, id, 'edit', transaction);
    if (glider.version !== save.version) return savedBefore(glider, role, save.plan, transaction);
    await keepState(glider, { ...save, result, actor, transaction });
    return presentGlider(glider, role, actor.name);
  });
}

/** Brings an older state back as a new save. */
export async function restoreGlider(
  actor: UserDto,
  id: string,
  restored: number,
  version: number,
): Promise<GliderDto> {
  await allowOnGlider(actor, id, 'edit');
  const save = await GliderSave.findOne({ where: { gliderId: id, version: restored } });
  if (!save) throw notFound('saved state');
  return saveGlider(actor, id, { version, plan: save.plan, restoredFrom: restored });
}

/** The answer to the save that made this state may have been lost: what was asked for is there (RFC 9110, 13.1.1). */
async function savedBefore(
  glider: Glider,
  role: GliderRole,
  plan: PlanDto,
  transaction: Transaction,
): Promise<GliderDto> {
  const editor = await User.findByPk(glider.updatedBy, { transaction, rejectOnEmpty: true });
  const current = presentGlider(glider, role, editor.name);
  if (canonicalJson(plan) === canonicalJson(glider.plan)) return current;
  throw new AppError('stale_version', `${editor.name} has saved this glider in the meantime.`, {
    members: { current },
  });
}

interface State extends Save {
  result: Estimate;
  actor: UserDto;
  transaction: Transaction;
}

async function keepState(
  glider: Glider,
  { plan, result, restoredFrom, actor, transaction }: State,
): Promise<void> {
  const headline = headlineOf(plan, result);
  const changes = saveChanges(glider, { plan, ...headline });
  const [version, savedAt] = [glider.version + 1, new Date()];
  await glider.update(
    {
      name: plan.name,
      plan,
      version,
      ...headline,
      updatedBy: actor.id,
      updatedAt: savedAt,
    },
    { transaction },
  );
  await GliderSave.create(
    {
      ownerId: glider.ownerId,
      gliderId: glider.id,
      version,
      plan,
      ...figuresOf(result),
      savedBy: actor.id,
      savedAt,
      changes,
      ...(restoredFrom !== undefined && { restoredFrom }),
    },
    { transaction },
  );
  await linkMaterials({ glider, plan, actorId: actor.id, transaction });
}
