import { randomUUID } from 'node:crypto';
import type { UserDto } from '#shared/schemas/session.ts';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';
import { notFound } from '#server/errors.ts';
import { preparePhoto } from '#server/pictures/prepare-photo.ts';
import { findPiece, lockPiece, presentPiece } from './stock-access.ts';
import {
  readPicture,
  removeUnusedFiles,
  takePicture,
  writePicture,
  type PictureSize,
} from './stored-files.ts';
import { inTransaction } from './transaction.ts';

/** Gives a piece its photo, in place of one that it has. The version stays, for nothing that is typed has changed. */
export async function putPiecePhoto(actor: UserDto, id: string, bytes: Buffer): Promise<StockPieceDto> {
  await findPiece(actor, id, 'edit');
  const { image, thumbnail } = await preparePhoto(bytes, 'file');
  const file = randomUUID();
  await writePicture(file, { image, thumbnail });
  const piece = await inTransaction(async (transaction) => {
    const row = await lockPiece(actor, id, 'edit', transaction);
    await row.update({ photoFile: file }, { transaction });
    await takePicture(file, transaction);
    return presentPiece(row, transaction);
  });
  await removeUnusedFiles().catch(() => undefined);
  return piece;
}

/** A picture's bytes, and the tag under which they never change. */
export async function readPiecePhoto(
  actor: UserDto,
  id: string,
  size: PictureSize,
): Promise<{ bytes: Buffer; tag: string }> {
  const { photoFile } = await findPiece(actor, id, 'read');
  const bytes = photoFile === null ? null : await readPicture(photoFile, size);
  if (photoFile === null || !bytes) throw notFound('photo');
  return { bytes, tag: `${photoFile}-${size}` };
}

export async function deletePiecePhoto(actor: UserDto, id: string): Promise<StockPieceDto> {
  const piece = await inTransaction(async (transaction) => {
    const row = await lockPiece(actor, id, 'edit', transaction);
    await row.update({ photoFile: null }, { transaction });
    return presentPiece(row, transaction);
  });
  await removeUnusedFiles().catch(() => undefined);
  return piece;
}
