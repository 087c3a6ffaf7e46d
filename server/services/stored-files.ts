import { QueryTypes } from 'sequelize';
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
