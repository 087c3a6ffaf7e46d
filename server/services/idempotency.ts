import { randomUUID } from 'node:crypto';
import { QueryTypes, type Transaction } from 'sequelize';
import { AppError } from '#server/errors.ts';
import { IdempotencyKey } from '#server/models/idempotency-key.ts';
import { database } from './transaction.ts';

interface Creation {
  userId: string;
  /** sent by the client; without one every request makes a row */
  key: string | undefined;
  /** what is made, so that a key cannot be taken for something else */
  purpose: string;
  transaction: Transaction;
}

/**
 * Makes a row once for a user's key: its repetition, even at the same moment, gets the id of the row made first.
 * @throws AppError `key_reused` when the key was used for another purpose
 */
export async function makeOnce(
  { userId, key, purpose, transaction }: Creation,
  make: (id: string) => Promise<void>,
): Promise<string> {
  const id = randomUUID();
  if (key !== undefined) {
    // Waits here while another request with the same key is under way.
    const claimed = await database().query<{ key: string }>(
      `INSERT INTO idempotency_keys (user_id, key, purpose, made_id) VALUES ($1, $2, $3, $4)
       ON CONFLICT DO NOTHING RETURNING key`,
      { type: QueryTypes.SELECT, bind: [userId, key, purpose, id], transaction },
    );
    if (claimed.length === 0) return madeBefore({ userId, key, purpose, transaction });
  }
  await make(id);
  return id;
}

async function madeBefore({ userId, key, purpose, transaction }: Creation): Promise<string> {
  const row = await IdempotencyKey.findOne({ where: { userId, key }, transaction, rejectOnEmpty: true });
  if (row.purpose !== purpose) {
    throw new AppError('key_reused', 'This Idempotency-Key has made something else already. Take a new one.');
  }
  return row.madeId;
}
