import type { Response } from 'express';
import type { Cookie } from 'lucia';

const LOOPBACK = new Set(['localhost', '127.0.0.1', '[::1]']);

/** Sends the session's cookie: for this host only, out of reach of scripts, and over TLS except on loopback. */
export function setSessionCookie(res: Response, cookie: Cookie): void {
  res.cookie(cookie.name, cookie.value, {
    path: '/',
    httpOnly: true,
    sameSite: 'lax',
    secure: !LOOPBACK.has(res.req.hostname),
    maxAge: (cookie.attributes.maxAge ?? 0) * 1000,
  });
}
