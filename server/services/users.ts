import type { SignUp } from '#shared/schemas/session.ts';
import { hashPassword } from '#server/auth/password.ts';
import { isUniqueViolation } from '#server/db/failure.ts';
import { AppError } from '#server/errors.ts';
import { User } from '#server/models/user.ts';
import { beginSession, type SignedIn } from './sessions.ts';

/** @throws AppError `email_taken` */
export async function signUp(
  { name, email, password }: SignUp,
  cookieHeader: string | undefined,
): Promise<SignedIn> {
  const passwordHash = await hashPassword(password);
  try {
    const user = await User.create({ name, email, passwordHash });
    return await beginSession(user, cookieHeader);
  } catch (error) {
    if (!isUniqueViolation(error, 'users_email_key')) throw error;
    throw new AppError('email_taken', 'This address has an account already. Sign in instead.');
  }
}
