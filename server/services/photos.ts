import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { PhotoDto, PhotoListDto } from '#shared/schemas/photo.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { invalidInput, notFound } from '#server/errors.ts';
import { GliderPhoto } from '#server/models/glider-photo.ts';
import { preparePhoto } from '#server/pictures/prepare-photo.ts';
import { authorizeGlider } from '#server/policies/glider.ts';
import type { GliderAction } from '#server/policies/table.ts';
import { presentPhoto } from '#server/presenters/photo.ts';
import { allowOnGlider, gliderRoleOf, lockGlider } from './glider-access.ts';
import { makeOnce } from './idempotency.ts';
import {
  readPicture,
  removeUnusedFiles,
  takePicture,
  writePicture,
  type PictureSize,
} from './stored-files.ts';
import { inTransaction } from './transaction.ts';

const adder = { association: 'adder', attributes: ['name'] };

/** @throws AppError `not_found` also for a photo of a glider that the asker has no role on */
async function findPhoto(
  actor: UserDto,
  id: string,
  action: GliderAction,
  transaction?: Transaction,
): Promise<GliderPhoto> {
  const photo = await GliderPhoto.findByPk(id, { include: [adder], ...(transaction && { transaction }) });
  if (!photo) throw notFound('photo');
  authorizeGlider(await gliderRoleOf(actor, photo.gliderId, 'photo', transaction), action);
  return photo;
}

/** All photos of a glider, newest first. */
export async function listPhotos(actor: UserDto, gliderId: string): Promise<PhotoListDto> {
  await allowOnGlider(actor, gliderId, 'read');
  const rows = await GliderPhoto.findAll({
    where: { gliderId },
    include: [adder],
    order: [
      ['addedAt', 'DESC'],
      ['id', 'DESC'],
    ],
  });
  return { photos: rows.map((row) => presentPhoto(row, row.adder?.name ?? '')) };
}

interface NewPhoto {
  gliderId: string;
  bytes: Buffer;
  caption: string;
  key: string | undefined;
}

/** Keeps a photo; the same key of the same user keeps it once. */
export async function addPhoto(
  actor: UserDto,
  { gliderId, bytes, caption, key }: NewPhoto,
): Promise<PhotoDto> {
  await allowOnGlider(actor, gliderId, 'addPhoto');
  const { image, thumbnail, width, height } = await preparePhoto(bytes);
  const file = randomUUID();
  await writePicture(file, { image, thumbnail });
  const id = await inTransaction(async (transaction) => {
    const { glider } = await lockGlider(actor, gliderId, 'addPhoto', transaction);
    return makeOnce(
      { userId: actor.id, key, purpose: `photo of ${gliderId}`, transaction },
      async (newId) => {
        if ((await GliderPhoto.count({ where: { gliderId }, transaction })) >= LIMITS.photos.max) {
          const detail = `A glider has at most ${LIMITS.photos.max} photos; delete one first.`;
          throw invalidInput([{ pointer: '#', detail }]);
        }
        const row = { id: newId, ownerId: glider.ownerId, gliderId, file, caption, width, height };
        await GliderPhoto.create({ ...row, addedBy: actor.id }, { transaction });
        await takePicture(file, transaction);
      },
    );
  });
  const photo = await findPhoto(actor, id, 'read');
  return presentPhoto(photo, photo.adder?.name ?? '');
}

/** A picture's bytes, and the tag under which they never change. */
export async function readPhoto(
  actor: UserDto,
  id: string,
  size: PictureSize,
): Promise<{ bytes: Buffer; tag: string }> {
  const { file } = await findPhoto(actor, id, 'read');
  const bytes = await readPicture(file, size);
  if (!bytes) throw notFound('photo');
  return { bytes, tag: `${file}-${size}` };
}

export function captionPhoto(actor: UserDto, id: string, caption: string): Promise<PhotoDto> {
  return inTransaction(async (transaction) => {
    const photo = await findPhoto(actor, id, 'captionPhoto', transaction);
    await photo.update({ caption }, { transaction });
    return presentPhoto(photo, photo.adder?.name ?? '');
  });
}

export async function deletePhoto(actor: UserDto, id: string): Promise<void> {
  await inTransaction(async (transaction) => {
    const photo = await findPhoto(actor, id, 'deletePhoto', transaction);
    await photo.destroy({ transaction });
  });
  await removeUnusedFiles().catch(() => undefined);
}
