import type { Transaction } from 'sequelize';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import type { WeighingDto, WeighingInput, WeighingListDto } from '#shared/schemas/weighing.ts';
import { AppError, invalidInput, notFound } from '#server/errors.ts';
import { GliderPhoto } from '#server/models/glider-photo.ts';
import { Weighing } from '#server/models/weighing.ts';
import { presentWeighing } from '#server/presenters/weighing.ts';
import { allowOnGlider, lockGlider } from './glider-access.ts';
import { makeOnce } from './idempotency.ts';
import { inTransaction } from './transaction.ts';

/** All weighings of a glider, corrected ones with them, in the order in which they were received. */
export async function listWeighings(actor: UserDto, gliderId: string): Promise<WeighingListDto> {
  await allowOnGlider(actor, gliderId, 'read');
  const rows = await Weighing.findAll({ where: { gliderId }, order: [['number', 'ASC']] });
  const later = new Map(rows.flatMap(({ id, corrects }) => (corrects === null ? [] : [[corrects, id]])));
  return { weighings: rows.map((row) => presentWeighing(row, later.get(row.id) ?? null)) };
}

/** Writes a weighing down; the same key of the same user writes it once. */
export async function addWeighing(
  actor: UserDto,
  gliderId: string,
  body: WeighingInput,
  key: string | undefined,
): Promise<WeighingDto> {
  await allowOnGlider(actor, gliderId, 'weigh');
  const id = await inTransaction(async (transaction) => {
    const { glider } = await lockGlider(actor, gliderId, 'weigh', transaction);
    const purpose = `weighing of ${gliderId}`;
    return makeOnce({ userId: actor.id, key, purpose, transaction }, async (newId) => {
      await checkReferences(gliderId, body, transaction);
      const last = await Weighing.max<number | null, Weighing>('number', {
        where: { gliderId },
        transaction,
      });
      if ((last ?? 0) >= LIMITS.weighings.max) {
        const detail = `A glider has at most ${LIMITS.weighings.max} weighings.`;
        throw invalidInput([{ pointer: '#', detail }]);
      }
      const row = { id: newId, ownerId: glider.ownerId, gliderId, number: (last ?? 0) + 1, body };
      const by = { corrects: body.corrects, weighedBy: actor.id, weighedByName: actor.name };
      await Weighing.create({ ...row, ...by }, { transaction });
    });
  });
  const row = await Weighing.findByPk(id);
  if (!row) throw notFound('weighing');
  const later = await Weighing.findOne({ where: { gliderId, corrects: id }, attributes: ['id'] });
  return presentWeighing(row, later?.id ?? null);
}

/** The glider is locked, so that two corrections of one weighing come one after the other. */
async function checkReferences(
  gliderId: string,
  { corrects, photoId, gliderVersion }: WeighingInput,
  transaction: Transaction,
): Promise<void> {
  if (photoId !== null && !(await GliderPhoto.findOne({ where: { id: photoId, gliderId }, transaction }))) {
    throw invalidInput([{ pointer: '#/photoId', detail: 'This glider has no such photo.' }]);
  }
  if (corrects === null) return;
  const corrected = await Weighing.findOne({ where: { id: corrects, gliderId }, transaction });
  if (!corrected) {
    throw invalidInput([{ pointer: '#/corrects', detail: 'This glider has no such weighing.' }]);
  }
  if (corrected.body.gliderVersion > gliderVersion) {
    throw invalidInput([{ pointer: '#/gliderVersion', detail: 'Is older than that of what it corrects.' }]);
  }
  if (corrected.body.withdraws || (await Weighing.findOne({ where: { corrects }, transaction }))) {
    throw new AppError('corrected_already', 'Somebody has corrected this weighing already; look at theirs.');
  }
}
