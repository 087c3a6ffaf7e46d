import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import { weighingInput } from '#shared/schemas/weighing.ts';
import { BuildTerms } from '#server/models/build-terms.ts';
import { Glider } from '#server/models/glider.ts';
import type { User } from '#server/models/user.ts';
import { Weighing } from '#server/models/weighing.ts';
import { readDemoBuilt, SeedError } from './seed-files.ts';

const MINUTE_MS = 60_000;

/** What of the demo's half-built glider is on the scale already, and what it is to weigh. */
export async function seedDemoBuilt(
  users: ReadonlyMap<string, User>,
  gliderIds: ReadonlyMap<string, string>,
  transaction: Transaction,
): Promise<void> {
  const { glider: file, target, weighings } = await readDemoBuilt();
  const glider = await Glider.findByPk(gliderIds.get(file), { transaction });
  if (!glider) throw new SeedError(`data/demo/built.json names no glider of the demo: “${file}”.`);
  const of = { ownerId: glider.ownerId, gliderId: glider.id };
  const now = Date.now();
  for (const [i, { by, density, thickness, ...seen }] of weighings.entries()) {
    const user = users.get(by);
    if (!user) throw new SeedError(`data/demo/people.json has no person “${by}”.`);
    const body = weighingInput.parse({
      ...seen,
      tare: 0,
      x: null,
      density: density ?? null,
      thickness: thickness ?? null,
      photoId: null,
      note: '',
      gliderVersion: glider.version,
      weighedAt: new Date(now - (weighings.length - i) * MINUTE_MS).toISOString(),
      corrects: null,
      reason: '',
      withdraws: false,
    });
    const row = { id: randomUUID(), ...of, number: i + 1, body, corrects: null };
    await Weighing.create({ ...row, weighedBy: user.id, weighedByName: user.name }, { transaction });
  }
  const body = { target, least: null, most: null, pieces: [], ballastAt: null, ballastRoom: null };
  await BuildTerms.create({ ...of, body, version: 2, updatedBy: glider.ownerId }, { transaction });
}
