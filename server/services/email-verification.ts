import { isUniqueViolation } from '#server/db/failure.ts';
import { User } from '#server/models/user.ts';
import { AppError } from '#server/errors.ts';
import { useLink } from './mailed-links.ts';
import { inTransaction } from './transaction.ts';

/**
 * Makes the address of a mailed link its user's.
 * @throws AppError `link_dead`, `email_taken` where somebody else has taken the address in the meantime
 */
export async function verifyEmail(token: string): Promise<{ email: string }> {
  try {
    return await inTransaction(async (transaction) => {
      const { userId, email } = await useLink(token, 'verify', transaction);
      await User.update({ email, verifiedAt: new Date() }, { where: { id: userId }, transaction });
      return { email };
    });
  } catch (error) {
    if (!isUniqueViolation(error, 'users_email_key')) throw error;
    throw new AppError('email_taken', 'This address has an account of its own in the meantime.');
  }
}
