import type { Cookie } from 'lucia';
import type { SessionDto, SignIn } from '#shared/schemas/session.ts';
import { deviceOf } from '#server/auth/device.ts';
import { lucia } from '#server/auth/lucia.ts';
import { passwordMatches } from '#server/auth/password.ts';
import { AppError } from '#server/errors.ts';
import { User } from '#server/models/user.ts';
import { presentSession } from '#server/presenters/account.ts';

export interface SignedIn {
  session: SessionDto;
  cookie: Cookie;
}

/** What a request says of the browser that sends it. */
export interface Browser {
  cookieHeader: string | undefined;
  userAgent: string | undefined;
}

/** Same answer after the same time, whether the address is unknown or the password wrong. */
export async function signIn({ email, password }: SignIn, from: Browser): Promise<SignedIn> {
  const user = await User.findOne({ where: { email, deletedAt: null } });
  const matches = await passwordMatches(user?.passwordHash, password);
  if (!user || !matches) throw new AppError('wrong_credentials', 'The address or the password is wrong.');
  return beginSession(user, from);
}

/** A new id for every sign-in; the session that the browser had before is over. */
export async function beginSession(user: User, { cookieHeader, userAgent }: Browser): Promise<SignedIn> {
  await endSession(cookieHeader);
  const session = await lucia.createSession(user.id, { device: deviceOf(userAgent), lastUsedAt: new Date() });
  return { session: presentSession(user), cookie: lucia.createSessionCookie(session.id) };
}

export async function endSession(cookieHeader: string | undefined): Promise<Cookie> {
  const sessionId = lucia.readSessionCookie(cookieHeader ?? '');
  if (sessionId) await lucia.invalidateSession(sessionId);
  return lucia.createBlankSessionCookie();
}

/** Who is signed in, with their preferences as they are now. */
export async function currentSession(actor: { id: string } | null): Promise<SessionDto> {
  const user = actor && (await User.findByPk(actor.id));
  return user ? presentSession(user) : { user: null };
}
