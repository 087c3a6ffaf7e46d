import type { Transaction } from 'sequelize';
import { fieldAccount } from '#shared/core/field/field-account.ts';
import { wingReference } from '#shared/core/wing-reference.ts';
import type { FirstFlightDto, FirstFlightInput, FirstFlightListDto } from '#shared/schemas/first-flight.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { PlanDto } from '#shared/schemas/plan.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { AppError, invalidInput, notFound } from '#server/errors.ts';
import { FirstFlight } from '#server/models/first-flight.ts';
import { GliderSave } from '#server/models/glider-save.ts';
import { presentFirstFlight } from '#server/presenters/first-flight.ts';
import { canonicalJson } from './canonical-json.ts';
import { allowOnGlider, lockGlider } from './glider-access.ts';
import { inTransaction } from './transaction.ts';

/** Signed records of a glider, newest first. */
export async function listFirstFlights(actor: UserDto, gliderId: string): Promise<FirstFlightListDto> {
  await allowOnGlider(actor, gliderId, 'read');
  const rows = await FirstFlight.findAll({ where: { gliderId }, order: [['number', 'DESC']] });
  return { firstFlights: rows.map(presentFirstFlight) };
}

/**
 * Keeps a signed record once under the id that the device gave it, however often it is sent.
 * @throws AppError `signed_already` for another record under the same id
 */
export async function keepFirstFlight(
  actor: UserDto,
  gliderId: string,
  body: FirstFlightInput,
): Promise<FirstFlightDto> {
  await allowOnGlider(actor, gliderId, 'signFlight');
  return inTransaction(async (transaction) => {
    const { glider } = await lockGlider(actor, gliderId, 'signFlight', transaction);
    const kept = await FirstFlight.findByPk(body.id, { transaction });
    if (kept) {
      if (kept.gliderId === gliderId && canonicalJson(kept.body) === canonicalJson(body)) {
        return presentFirstFlight(kept);
      }
      throw new AppError('signed_already', 'A record that was signed stays as it is; sign a new one.');
    }
    const plan = await planOf(gliderId, body, transaction);
    await checkFollows(gliderId, body, transaction);
    const account = fieldAccount(body.method, body.ballast, wingReference(plan));
    if (!account) {
      throw invalidInput([
        { pointer: '#/method', detail: 'The scales carry nothing; check readings and tares.' },
      ]);
    }
    const last = await FirstFlight.max<number | null, FirstFlight>('number', {
      where: { gliderId },
      transaction,
    });
    if ((last ?? 0) >= LIMITS.firstFlights.max) {
      throw invalidInput([
        { pointer: '#', detail: `A glider has at most ${LIMITS.firstFlights.max} records.` },
      ]);
    }
    const row = { id: body.id, ownerId: glider.ownerId, gliderId, number: (last ?? 0) + 1, body, ...account };
    const by = { follows: body.follows, signedBy: actor.id, signedByName: actor.name };
    await FirstFlight.create({ ...row, ...by }, { transaction });
    const made = await FirstFlight.findByPk(body.id, { transaction });
    if (!made) throw notFound('record');
    return presentFirstFlight(made);
  });
}

/** The plan that the record was made with: what is measured is told in % of its mean chord. */
async function planOf(
  gliderId: string,
  { gliderVersion }: FirstFlightInput,
  transaction: Transaction,
): Promise<PlanDto> {
  const save = await GliderSave.findOne({ where: { gliderId, version: gliderVersion }, transaction });
  if (save) return save.plan;
  throw invalidInput([{ pointer: '#/gliderVersion', detail: 'This glider has no such saved state.' }]);
}

async function checkFollows(
  gliderId: string,
  { follows }: FirstFlightInput,
  transaction: Transaction,
): Promise<void> {
  if (follows === null) return;
  if (await FirstFlight.findOne({ where: { id: follows, gliderId }, transaction })) return;
  throw invalidInput([{ pointer: '#/follows', detail: 'This glider has no such record.' }]);
}
