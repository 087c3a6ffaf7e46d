import type { Request, Response } from 'express';
import type { UserDto } from '#shared/schemas/session.ts';
import { lucia } from '#server/auth/lucia.ts';
import { touchSession } from '#server/auth/session-adapter.ts';
import { signedOut } from '#server/errors.ts';
import { setSessionCookie } from './session-cookie.ts';

const HOUR_MS = 3_600_000;

/** Who asks, by the session's cookie; null for a visitor. A long-used session is prolonged, a dead one cleared. */
export async function actorOf(req: Request, res: Response): Promise<UserDto | null> {
  const sessionId = lucia.readSessionCookie(req.get('Cookie') ?? '');
  if (!sessionId) return null;
  const { session, user } = await lucia.validateSession(sessionId);
  if (session?.fresh) setSessionCookie(res, lucia.createSessionCookie(session.id));
  if (session && Date.now() - session.lastUsedAt.getTime() > HOUR_MS) await touchSession(session.id);
  if (!session) setSessionCookie(res, lucia.createBlankSessionCookie());
  return user;
}

/** @throws AppError `signed_out` for a visitor */
export async function signedInActorOf(req: Request, res: Response): Promise<UserDto> {
  const actor = await actorOf(req, res);
  if (!actor) throw signedOut();
  return actor;
}
