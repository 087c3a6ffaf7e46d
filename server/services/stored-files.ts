import { QueryTypes, type Transaction } from 'sequelize';
import { surroundings } from '#server/surroundings.ts';
import { database, inTransaction } from './transaction.ts';

/** Longer than any upload takes to be kept. */
const GRACE = '1 hour';
const AT_ONCE = 100;

/**
 * Names files that are about to be written, so that they are removed again unless their row comes to be. Whoever
 * keeps the row takes the names off in the same transaction.
 */
export async function announceFiles(keys: readonly string[]): Promise<void> {
  await database().query(
    `INSERT INTO unused_files (key, remove_after) SELECT unnest($1::text[]), now() + interval '${GRACE}'`,
    { bind: [keys] },
  );
}

export type PictureSize = 'image' | 'thumbnail';

const pictureKey = (file: string, size: PictureSize) =>
  `photos/${file}${size === 'image' ? '' : '.small'}.jpg`;
const pictureKeys = (file: string) => [pictureKey(file, 'image'), pictureKey(file, 'thumbnail')];

/** Writes a picture in both sizes; it is removed again unless a row takes it. */
export async function writePicture(file: string, sizes: Record<PictureSize, Buffer>): Promise<void> {
  await announceFiles(pictureKeys(file));
  await surroundings().files.write(pictureKey(file, 'image'), sizes.image);
  await surroundings().files.write(pictureKey(file, 'thumbnail'), sizes.thumbnail);
}

/** To be called in the transaction that keeps the picture's row. */
export async function takePicture(file: string, transaction: Transaction): Promise<void> {
  const bind = [pictureKeys(file)];
  await database().query('DELETE FROM unused_files WHERE key = ANY($1)', { bind, transaction });
}

/** null where there is no such file */
export const readPicture = (file: string, size: PictureSize): Promise<Buffer | null> =>
  surroundings().files.read(pictureKey(file, size));

/** Removes the files of rows that are gone or never came to be; what fails is tried again at the next tidying. */
export async function removeUnusedFiles(): Promise<void> {
  let removed: number;
  do {
    removed = await inTransaction(async (transaction) => {
      const rows = await database().query<{ key: string }>(
        'SELECT key FROM unused_files WHERE remove_after <= now() LIMIT $1 FOR UPDATE SKIP LOCKED',
        { type: QueryTypes.SELECT, bind: [AT_ONCE], transaction },
      );
      const keys = rows.map(({ key }) => key);
      await Promise.all(keys.map((key) => surroundings().files.remove(key)));
      await database().query('DELETE FROM unused_files WHERE key = ANY($1)', { bind: [keys], transaction });
      return keys.length;
    });
  } while (removed === AT_ONCE);
}
