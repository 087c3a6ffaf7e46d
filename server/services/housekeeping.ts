import { Op } from 'sequelize';
import { lucia } from '#server/auth/lucia.ts';
import { IdempotencyKey } from '#server/models/idempotency-key.ts';
import { forgetOldMails } from '#server/mail/outbox.ts';
import { forgetDeadClubInvitations } from './club-invitations.ts';
import { forgetDeadInvitations } from './invitations.ts';
import { forgetDeadLinks } from './mailed-links.ts';
import { removeUnusedFiles } from './stored-files.ts';
import { database } from './transaction.ts';

const HOUR_MS = 3_600_000;
/** A client that was away keeps trying to send what it made; a month is as long as its session lives. */
const KEY_LIFE_MS = 30 * 24 * HOUR_MS;

/** Deletes what has had its time: sessions, counters, idempotency keys, files. */
export async function tidy(now = new Date()): Promise<void> {
  await lucia.deleteExpiredSessions();
  const keptSince = new Date(now.getTime() - KEY_LIFE_MS);
  await IdempotencyKey.destroy({ where: { createdAt: { [Op.lt]: keptSince } } });
  await database().query('DELETE FROM rack_imports WHERE made_at < $1', { bind: [keptSince] });
  await forgetDeadLinks(now);
  await forgetDeadInvitations(now);
  await forgetDeadClubInvitations(now);
  await forgetOldMails(now);
  await removeUnusedFiles();
  await database().query('DELETE FROM rate_counters WHERE resets_at < now()');
}

/** Tidies every hour. @returns what stops it */
export function tidyHourly(failed: (error: unknown) => void): () => void {
  const timer = setInterval(() => void tidy().catch(failed), HOUR_MS);
  timer.unref();
  return () => clearInterval(timer);
}
