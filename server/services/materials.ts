import { randomBytes } from 'node:crypto';
import { Op, Transaction } from 'sequelize';
import type {
  MaterialDto,
  MaterialInput,
  MaterialListDto,
  MaterialUsesDto,
} from '#shared/schemas/material.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { isForeignKeyViolation, isUniqueViolation } from '#server/db/failure.ts';
import { AppError, invalidInput, notFound } from '#server/errors.ts';
import { Material } from '#server/models/material.ts';
import { authorizeMaterial, materialStanding } from '#server/policies/material.ts';
import { authorizeSite } from '#server/policies/site.ts';
import type { MaterialAction, MaterialStanding } from '#server/policies/table.ts';
import { presentMaterial } from '#server/presenters/material.ts';
import { countUses, findUses, wordUses } from './material-uses.ts';
import { inTransaction } from './transaction.ts';

/** A list is answered whole; with the shared rows this keeps it near two thousand. */
const MOST_OWN = 1_000;

interface Found {
  row: Material;
  standing: MaterialStanding;
}

async function findMaterial(
  actor: UserDto | null,
  id: string,
  action: MaterialAction,
  transaction?: Transaction,
): Promise<Found> {
  const row = await Material.findByPk(id, transaction && { transaction, lock: Transaction.LOCK.UPDATE });
  const standing = row && materialStanding(actor, row);
  if (!row || !standing) throw notFound('material');
  authorizeMaterial(standing, action);
  return { row, standing };
}

/** Everybody's rows and the asker's own, by name. */
export async function listMaterials(actor: UserDto | null): Promise<MaterialListDto> {
  const rows = await Material.findAll({
    where: { [Op.or]: [{ ownerId: null }, ...(actor ? [{ ownerId: actor.id }] : [])] },
    order: [
      ['name', 'ASC'],
      ['id', 'ASC'],
    ],
    limit: 2_000,
  });
  const uses = await countUses(rows.map((row) => row.id));
  return {
    materials: rows.flatMap((row) => {
      const standing = materialStanding(actor, row);
      return standing ? [presentMaterial(row, standing, uses.get(row.id) ?? 0)] : [];
    }),
  };
}

export async function getMaterial(actor: UserDto | null, id: string): Promise<MaterialDto> {
  const { row, standing } = await findMaterial(actor, id, 'read');
  return presentMaterial(row, standing, (await countUses([id])).get(id) ?? 0);
}

export async function getMaterialUses(actor: UserDto, id: string): Promise<MaterialUsesDto> {
  await findMaterial(actor, id, 'readUses');
  return findUses(actor, id);
}

export async function createMaterial(actor: UserDto, input: MaterialInput): Promise<MaterialDto> {
  const { shared, ...fields } = input;
  authorizeSite(actor, shared ? 'addSharedMaterial' : 'addOwnMaterial');
  const ownerId = shared ? null : actor.id;
  if (!shared && (await Material.count({ where: { ownerId } })) >= MOST_OWN) {
    throw invalidInput([
      { pointer: '#', detail: `You have ${MOST_OWN} materials of your own; delete one first.` },
    ]);
  }
  const row = await insertMaterial(slug(input.name), shared, { ...fields, ownerId });
  return getMaterial(actor, row.id);
}

type NewRow = Omit<MaterialInput, 'shared'> & { ownerId: string | null };

/** Keys are everybody's: a private row never takes the plain one, which the shared table may want. */
async function insertMaterial(plainKey: string, mayBePlain: boolean, row: NewRow): Promise<Material> {
  const key = mayBePlain ? plainKey : `${plainKey}-${randomBytes(4).toString('hex')}`;
  try {
    return await Material.create({ ...row, key });
  } catch (error) {
    if (mayBePlain && isUniqueViolation(error, 'materials_key_key'))
      return insertMaterial(plainKey, false, row);
    throw error;
  }
}

function slug(name: string): string {
  const plain = name
    .normalize('NFKD')
    .toLowerCase()
    .replace(/\p{M}/gu, '')
    .replace(/[^a-z0-9]+/g, '-');
  return plain.replace(/^-|-$/g, '').slice(0, 40).replace(/-$/, '') || 'material';
}

/** @throws AppError `stale_version` with the current row when somebody changed it in between */
export function saveMaterial(
  actor: UserDto,
  id: string,
  version: number,
  { shared, ...fields }: MaterialInput,
): Promise<MaterialDto> {
  return inTransaction(async (transaction) => {
    const { row, standing } = await findMaterial(actor, id, 'edit', transaction);
    const usedBy = (await countUses([id])).get(id) ?? 0;
    if (row.version !== version) {
      throw new AppError('stale_version', 'This material was changed in the meantime.', {
        members: { current: presentMaterial(row, standing, usedBy) },
      });
    }
    if (!shared && row.ownerId === null) {
      throw invalidInput([{ pointer: '#/shared', detail: 'A material in everybody’s table stays there.' }]);
    }
    if (shared && row.ownerId !== null) authorizeSite(actor, 'addSharedMaterial');
    await row.update(
      { ...fields, ownerId: shared ? null : row.ownerId, version: version + 1, updatedAt: new Date() },
      { transaction },
    );
    return presentMaterial(row, materialStanding(actor, row) ?? standing, usedBy);
  });
}

/** @throws AppError `material_in_use` saying where */
export async function deleteMaterial(actor: UserDto, id: string): Promise<void> {
  try {
    await inTransaction(async (transaction) => {
      const { row } = await findMaterial(actor, id, 'delete', transaction);
      await row.destroy({ transaction });
    });
  } catch (error) {
    if (!isForeignKeyViolation(error, 'glider_materials_material')) throw error;
    const uses = await findUses(actor, id);
    throw new AppError('material_in_use', wordUses(uses), { members: { uses } });
  }
}
