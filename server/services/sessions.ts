import type { Cookie } from 'lucia';
import type { SignIn, UserDto } from '#shared/schemas/session.ts';
import { lucia } from '#server/auth/lucia.ts';
import { passwordMatches } from '#server/auth/password.ts';
import { AppError } from '#server/errors.ts';
import { User } from '#server/models/user.ts';
import { presentUser } from '#server/presenters/user.ts';

export interface SignedIn {
  user: UserDto;
  cookie: Cookie;
}

/** Same answer after the same time, whether the address is unknown or the password wrong. */
export async function signIn(
  { email, password }: SignIn,
  cookieHeader: string | undefined,
): Promise<SignedIn> {
  const user = await User.findOne({ where: { email } });
  const matches = await passwordMatches(user?.passwordHash, password);
  if (!user || !matches) throw new AppError('wrong_credentials', 'The address or the password is wrong.');
  return beginSession(user, cookieHeader);
}

/** A new id for every sign-in; the session that the browser had before is over. */
export async function beginSession(user: UserDto, cookieHeader: string | undefined): Promise<SignedIn> {
  await endSession(cookieHeader);
  const session = await lucia.createSession(user.id, {});
  return { user: presentUser(user), cookie: lucia.createSessionCookie(session.id) };
}

export async function endSession(cookieHeader: string | undefined): Promise<Cookie> {
  const sessionId = lucia.readSessionCookie(cookieHeader ?? '');
  if (sessionId) await lucia.invalidateSession(sessionId);
  return lucia.createBlankSessionCookie();
}
