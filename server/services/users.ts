import type { SignUp } from '#shared/schemas/session.ts';
import { hashPassword } from '#server/auth/password.ts';
import { isUniqueViolation } from '#server/db/failure.ts';
import { AppError } from '#server/errors.ts';
import { User } from '#server/models/user.ts';
import { verifyLetter } from '#server/mail/letters.ts';
import { post } from '#server/mail/outbox.ts';
import { makeLink } from './mailed-links.ts';
import { beginSession, type Browser, type SignedIn } from './sessions.ts';
import { inTransaction } from './transaction.ts';

/** @throws AppError `email_taken` */
export async function signUp({ name, email, password }: SignUp, from: Browser): Promise<SignedIn> {
  const passwordHash = await hashPassword(password);
  try {
    const user = await inTransaction(async (transaction) => {
      const made = await User.create({ name, email, passwordHash }, { transaction });
      const token = await makeLink({ userId: made.id, purpose: 'verify', email, transaction });
      await post(email, verifyLetter(name, token), transaction);
      return made;
    });
    return await beginSession(user, from);
  } catch (error) {
    if (!isUniqueViolation(error, 'users_email_key')) throw error;
    throw new AppError('email_taken', 'This address has an account already. Sign in instead.');
  }
}
