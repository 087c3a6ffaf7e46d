import type { Request } from 'express';
import { z } from 'zod';
import { AppError, invalidInput } from '#server/errors.ts';

/**
 * The version that a write was made from. `*` would overwrite whatever is there, so it counts as missing; a tag
 * that is not of ours matches no version. A proxy that packs answers may have marked the tag as weak.
 */
export function readIfMatch(req: Request): number {
  const header = req.get('If-Match')?.trim();
  if (header === undefined || header === '' || header === '*') {
    throw new AppError(
      'if_match_required',
      'Send the version that you changed as If-Match, as it came in the ETag.',
    );
  }
  const version = /^(?:W\/)?"(\d{1,9})"$/.exec(header)?.[1];
  return version === undefined ? -1 : Number(version);
}

/** Key of a creation that may be sent twice on a bad line. */
export function readIdempotencyKey(req: Request): string | undefined {
  const header = req.get('Idempotency-Key');
  if (header === undefined) return undefined;
  const key = z.uuid().safeParse(header.trim().toLowerCase());
  if (!key.success) throw invalidInput([{ pointer: '#/Idempotency-Key', detail: 'Must be a UUID.' }]);
  return key.data;
}
