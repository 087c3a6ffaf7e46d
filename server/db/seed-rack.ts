import type { Transaction } from 'sequelize';
import { stockPieceInput } from '#shared/schemas/stock-piece.ts';
import type { User } from '#server/models/user.ts';
import { changeState } from '#server/services/stock-access.ts';
import { buildIn, cutUp } from '#server/services/stock-cutting.ts';
import { insertPieces } from '#server/services/stock-rows.ts';
import { readDemoRack, readSeedMaterials, SeedError } from './seed-files.ts';

/** Fills the rack of one of the demo's people. `gliderIds` by the files of their plans. */
export async function seedDemoRack(
  users: ReadonlyMap<string, User>,
  gliderIds: ReadonlyMap<string, string>,
  transaction: Transaction,
): Promise<void> {
  const { owner, pieces } = await readDemoRack();
  const materials = new Map((await readSeedMaterials()).map((material) => [material.key, material]));
  const known = <T>(found: T | undefined, name: string): T => {
    if (found === undefined) throw new SeedError(`data/demo/rack.json names “${name}”, which there is not.`);
    return found;
  };
  const gliderOf = (file: string) => known(gliderIds.get(file), file);
  const rows = await insertPieces(
    known(users.get(owner), owner).id,
    pieces.map(({ material: key, reservedFor: _, used: __, split: ___, ...fields }) => {
      const { name, category } = known(materials.get(key), key);
      return { fields: stockPieceInput.parse({ ...fields, material: { key, name, category } }) };
    }),
    transaction,
  );
  for (const [i, { reservedFor, used, split }] of pieces.entries()) {
    const row = rows[i];
    if (!row) continue;
    if (reservedFor !== undefined) await changeState(row, 'reserved', gliderOf(reservedFor), transaction);
    if (used) {
      await buildIn(row, { gliderId: gliderOf(used.in), leftovers: used.leftovers }, transaction);
    }
    if (split) await cutUp(row, split, transaction);
  }
}
