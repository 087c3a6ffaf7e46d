import { unavailable } from '#server/errors.ts';
import { database } from './transaction.ts';

const PATIENCE_MS = 2_000;

/** @throws AppError `unavailable` unless the database answers within two seconds */
export async function checkHealth(): Promise<{ status: 'ok' }> {
  let timer: NodeJS.Timeout | undefined;
  const patience = new Promise<never>((_, reject) => {
    timer = setTimeout(() => reject(new Error('The database is slow.')), PATIENCE_MS);
  });
  try {
    await Promise.race([database().query('SELECT 1'), patience]);
    return { status: 'ok' };
  } catch {
    throw unavailable('The database does not answer.');
  } finally {
    clearTimeout(timer);
  }
}
