import { Op, Transaction } from 'sequelize';
import type { PlanDto } from '#shared/schemas/plan.ts';
import { GliderMaterial } from '#server/models/glider-material.ts';
import { Material } from '#server/models/material.ts';

interface Use {
  glider: { id: string; ownerId: string };
  plan: PlanDto;
  /** who saves: a builder may bring private rows into somebody else's glider */
  actorId: string;
  transaction: Transaction;
}

/**
 * Joins a glider to the rows that its plan's materials came from, so that none of them can be deleted. A key that
 * is in nobody's table, as in a plan from elsewhere, stands in the plan alone.
 */
export async function linkMaterials({ glider, plan, actorId, transaction }: Use): Promise<void> {
  const linked = await GliderMaterial.findAll({ where: { gliderId: glider.id }, transaction });
  const before = linked.map((row) => row.materialId);
  const used = await Material.findAll({
    attributes: ['id'],
    where: {
      key: Object.keys(plan.materials),
      [Op.or]: [{ ownerId: null }, { ownerId: [glider.ownerId, actorId] }, { id: before }],
    },
    transaction,
    // Nobody may delete one of them before this save is through.
    lock: Transaction.LOCK.KEY_SHARE,
  });
  const now = used.map((row) => row.id);
  await GliderMaterial.destroy({
    where: { gliderId: glider.id, materialId: before.filter((id) => !now.includes(id)) },
    transaction,
  });
  await GliderMaterial.bulkCreate(
    now
      .filter((id) => !before.includes(id))
      .map((materialId) => ({ ownerId: glider.ownerId, gliderId: glider.id, materialId })),
    { transaction },
  );
}
