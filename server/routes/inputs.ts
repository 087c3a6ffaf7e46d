import { z } from 'zod';
import { archivedFilter, gliderDirection, gliderOrder } from '#shared/schemas/glider.ts';
import { LIMITS } from '#shared/schemas/limits.ts';

/** Path and query of the endpoints. */
export const idParams = z.object({ id: z.uuid() });

export const versionParams = z.object({
  id: z.uuid(),
  version: z
    .string()
    .regex(/^\d{1,9}$/, 'Must be a version number.')
    .transform(Number),
});

export const pageQuery = z.strictObject({
  /** `nextCursor` of the page before */
  cursor: z.string().max(400).optional(),
  limit: z
    .string()
    .regex(/^\d{1,3}$/, 'Must be a number from 1 to 100.')
    .transform(Number)
    .pipe(z.number().min(1, 'Must be at least 1.').max(100, 'Must be at most 100.'))
    .default(50),
});

export const gliderQuery = z.strictObject({
  ...pageQuery.shape,
  /** part of the name, whatever its case and accents */
  search: z.string().trim().max(LIMITS.name.max).optional(),
  sort: gliderOrder.default('changed'),
  /** `up` from the first name, the least mass, the oldest change */
  direction: gliderDirection.optional(),
  archived: archivedFilter.default('no'),
});
