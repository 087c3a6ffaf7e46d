import { setTimeout as pause } from 'node:timers/promises';
import type { PasswordReset } from '#shared/schemas/account.ts';
import { commonPassword, isCommonPassword } from '#server/auth/common-passwords.ts';
import { hashPassword } from '#server/auth/password.ts';
import { invalidInput } from '#server/errors.ts';
import { passwordChangedLetter, resetLetter } from '#server/mail/letters.ts';
import { post } from '#server/mail/outbox.ts';
import { User } from '#server/models/user.ts';
import { endOtherSessions } from './account-sessions.ts';
import { makeLink, useLink } from './mailed-links.ts';
import { inTransaction } from './transaction.ts';

/** Longer than the work takes, so that the time of the answer does not tell who has an account. */
const ANSWER_AFTER_MS = 300;

/** Mails a link to set a new password by, where the address has an account; the answer is the same where it has none. */
export async function forgetPassword(email: string): Promise<void> {
  await Promise.all([mailResetLink(email), pause(ANSWER_AFTER_MS)]);
}

async function mailResetLink(email: string): Promise<void> {
  const user = await User.findOne({ where: { email, deletedAt: null } });
  if (!user) return;
  await inTransaction(async (transaction) => {
    const token = await makeLink({ userId: user.id, purpose: 'reset', email, transaction });
    await post(email, resetLetter(user.name, token), transaction);
  });
}

/**
 * Sets a new password by a mailed link, which shows that the address is the user's, and signs every browser out.
 * @throws AppError `link_dead`, `invalid_input` for a common password, which leaves the link as it was
 */
export async function resetPassword({ token, password }: PasswordReset): Promise<void> {
  const passwordHash = await hashPassword(password);
  await inTransaction(async (transaction) => {
    const { user, email } = await useLink(token, 'reset', transaction);
    if (!user) return;
    if (isCommonPassword(password, user)) throw invalidInput([commonPassword]);
    const isOwn = user.email === email;
    await user.update(
      { passwordHash, ...(isOwn && { verifiedAt: user.verifiedAt ?? new Date() }) },
      { transaction },
    );
    await endOtherSessions(user.id, null, transaction);
    await post(user.email, passwordChangedLetter(user.name), transaction);
  });
}
