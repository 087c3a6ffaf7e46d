import { Session } from '#server/models/session.ts';
import { lucia } from './lucia.ts';
import { hashSessionId } from './session-adapter.ts';

/** Whose session a cookie is of, whether or not it has run out; null for none. For counting only, not for trusting. */
export async function userIdOf(cookieHeader: string | undefined): Promise<string | null> {
  const sessionId = lucia.readSessionCookie(cookieHeader ?? '');
  if (!sessionId) return null;
  const row = await Session.findByPk(hashSessionId(sessionId), { attributes: ['userId'] });
  return row?.userId ?? null;
}
