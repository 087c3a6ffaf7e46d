import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import { positionOfPercent } from '#shared/core/balance.ts';
import { fieldAccount } from '#shared/core/field/field-account.ts';
import { wingReference } from '#shared/core/wing-reference.ts';
import { firstFlightInput } from '#shared/schemas/first-flight.ts';
import { estimatePlan } from '#server/estimating/estimate-plan.ts';
import { FirstFlight } from '#server/models/first-flight.ts';
import { Glider } from '#server/models/glider.ts';
import type { User } from '#server/models/user.ts';
import { readDemoFlight, SeedError } from './seed-files.ts';

const DAY_MS = 86_400_000;

/** The demo's flown glider: what its pilot signed on the field. */
export async function seedDemoFlight(
  users: ReadonlyMap<string, User>,
  gliderIds: ReadonlyMap<string, string>,
  transaction: Transaction,
): Promise<void> {
  const { glider: file, by, daysAgo, record } = await readDemoFlight();
  const glider = await Glider.findByPk(gliderIds.get(file), { transaction });
  const pilot = users.get(by);
  if (!glider || !pilot)
    throw new SeedError('data/demo/flight.json names a glider or person that is not there.');
  const { plan } = glider;
  const wing = wingReference(plan);
  const account = fieldAccount(record.method, record.ballast, wing);
  if (!wing || !plan.target || !account)
    throw new SeedError('data/demo/flight.json weighs nothing to balance.');
  const { totals, balance } = await estimatePlan(plan);
  const { percentMac, tolerance } = plan.target;
  const at = (percent: number) => positionOfPercent(percent, wing.xLeMac, wing.mac);
  const body = firstFlightInput.parse({
    ...record,
    id: randomUUID(),
    gliderVersion: glider.version,
    forecast: { mass: totals.mass, u: totals.u, x: balance.x, ux: balance.u, percentMac: balance.percentMac },
    range: { from: at(percentMac - tolerance), to: at(percentMac + tolerance), basis: 'plan' },
    signature: pilot.name,
    signedAt: new Date(Date.now() - daysAgo * DAY_MS).toISOString(),
    follows: null,
  });
  const of = { id: body.id, ownerId: glider.ownerId, gliderId: glider.id, number: 1 };
  const signed = { follows: null, signedBy: pilot.id, signedByName: pilot.name };
  await FirstFlight.create({ ...of, body, ...account, ...signed }, { transaction });
}
