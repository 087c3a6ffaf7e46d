import type { Request } from 'express';
import type { Browser } from '#server/services/sessions.ts';

/** What a request says of the browser that sends it. */
export const browserOf = (req: Request): Browser => ({
  cookieHeader: req.get('Cookie'),
  userAgent: req.get('User-Agent'),
});
