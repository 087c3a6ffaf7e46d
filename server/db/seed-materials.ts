import { createHash } from 'node:crypto';
import { QueryTypes, type Transaction } from 'sequelize';
import { Material } from '#server/models/material.ts';
import { canonicalJson } from '#server/services/canonical-json.ts';
import { database, inTransaction } from '#server/services/transaction.ts';
import { readSeedMaterials, type SeedMaterial } from './seed-files.ts';

/** The same number in every copy of the server, so that two that start at once seed one after the other. */
export const SEED_LOCK = 4_310_002;

interface Seed {
  key: string;
  digest: string;
  version: number;
}

const digestOf = (material: SeedMaterial) =>
  createHash('sha256').update(canonicalJson(material)).digest('hex');

/**
 * Brings everybody's materials up to `data/materials.json`: adds new ones, renews those whose row there changed.
 * What an admin edited or deleted since stays as the admin left it.
 */
export async function seedMaterials(): Promise<{ added: number; renewed: number }> {
  const materials = await readSeedMaterials();
  return inTransaction(async (transaction) => {
    await database().query(`SELECT pg_advisory_xact_lock(${SEED_LOCK})`, { transaction });
    const rows = await database().query<Seed>('SELECT key, digest, version FROM material_seeds', {
      type: QueryTypes.SELECT,
      transaction,
    });
    const seeds = new Map(rows.map((seed) => [seed.key, seed]));
    const done = { added: 0, renewed: 0 };
    for (const material of materials) {
      const seed = seeds.get(material.key);
      if (!seed && (await add(material, transaction))) done.added += 1;
      if (seed && seed.digest !== digestOf(material) && (await renew(material, seed, transaction)))
        done.renewed += 1;
    }
    return done;
  });
}

async function add(material: SeedMaterial, transaction: Transaction): Promise<boolean> {
  // An admin may have taken the key for a row of his own; that one stays.
  const isNew = (await Material.count({ where: { key: material.key }, transaction })) === 0;
  if (isNew) await Material.create({ ...material, ownerId: null }, { transaction });
  await remember(material, isNew ? 1 : 0, transaction);
  return isNew;
}

async function renew(material: SeedMaterial, seed: Seed, transaction: Transaction): Promise<boolean> {
  const version = seed.version + 1;
  const [changed] = await Material.update(
    { ...material, version, updatedAt: new Date() },
    { where: { key: material.key, version: seed.version }, transaction },
  );
  await remember(material, changed === 1 ? version : seed.version, transaction);
  return changed === 1;
}

async function remember(material: SeedMaterial, version: number, transaction: Transaction): Promise<void> {
  await database().query(
    `INSERT INTO material_seeds (key, digest, version) VALUES ($1, $2, $3)
     ON CONFLICT (key) DO UPDATE SET digest = excluded.digest, version = excluded.version`,
    { bind: [material.key, digestOf(material), version], transaction },
  );
}
