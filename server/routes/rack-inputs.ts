import { z } from 'zod';
import { LIMITS } from '#shared/schemas/limits.ts';
import { rackKind, rackOrder, rackState } from '#shared/schemas/rack.ts';
import { pageQuery } from './inputs.ts';

export const rackQuery = z.strictObject({
  ...pageQuery.shape,
  order: rackOrder.default('number'),
  direction: z.enum(['asc', 'desc']).default('asc'),
  state: rackState.default('onRack'),
  kind: rackKind.optional(),
  /** part of the material’s name, the grade or the note; or the number on the label */
  search: z.string().trim().max(LIMITS.name.max).optional(),
});

export const exportQuery = z.strictObject({ state: rackState.default('onRack') });

export const photoQuery = z.strictObject({
  /** at most 320 pixels wide and high, or 2400 */
  size: z.enum(['thumb', 'full']).default('full'),
});
