import type { RequestHandler } from 'express';
import { forbidden } from '#server/errors.ts';

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Refuses to change anything for a page of another origin. Browsers say where a request comes from in
 * `Sec-Fetch-Site`, older ones in `Origin`; a program sends neither, and has no cookie that it was not given.
 */
export const sameOrigin: RequestHandler = (req, _res, next) => {
  if (SAFE.has(req.method) || comesFromHere(req.get('Sec-Fetch-Site'), req.get('Origin'), req.get('Host'))) {
    next();
  } else {
    next(forbidden('This request comes from a page of another site.'));
  }
};

function comesFromHere(
  site: string | undefined,
  origin: string | undefined,
  host: string | undefined,
): boolean {
  if (site !== undefined) return site === 'same-origin' || site === 'none';
  if (origin === undefined) return true;
  return URL.canParse(origin) && new URL(origin).host === host;
}
