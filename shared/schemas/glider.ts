import { z } from 'zod';
import { planSchema } from './plan.ts';

export const gliderRole = z.enum(['owner', 'builder', 'pilot', 'reader']);
/** What the asking user may do, so that the client does not guess. */
export const gliderAbilities = z.strictObject({
  edit: z.boolean(),
  saveSheet: z.boolean(),
  delete: z.boolean(),
});

/** The figures of the last saved plan, kept beside it for the bench. */
export const gliderFigures = z.strictObject({
  mass: z.number(),
  percentMac: z.number().nullable(),
  wingLoading: z.number().nullable(),
});

export const gliderSummary = z.strictObject({
  id: z.uuid(),
  name: z.string(),
  role: gliderRole,
  ownerName: z.string(),
  version: z.int(),
  figures: gliderFigures,
  /** outline of the first wing in plan view, starboard half, mm: the picture on the bench */
  outline: z.array(z.tuple([z.number(), z.number()])),
  updatedAt: z.iso.datetime(),
});
export const gliderList = z.strictObject({
  gliders: z.array(gliderSummary),
  /** give it back as `?cursor=` for the next page; null on the last */
  nextCursor: z.string().nullable(),
});

export const glider = z.strictObject({
  id: z.uuid(),
  name: z.string(),
  role: gliderRole,
  can: gliderAbilities,
  /** counts saves; also the ETag, to be sent back as `If-Match` */
  version: z.int(),
  plan: planSchema,
  updatedAt: z.iso.datetime(),
  updatedBy: z.string(),
});

export const gliderInput = z.strictObject({ plan: planSchema });

/** One save in the log. */
export const gliderSave = z.strictObject({
  version: z.int(),
  savedAt: z.iso.datetime(),
  savedBy: z.string(),
  figures: gliderFigures,
});
export const gliderSaveList = z.strictObject({
  saves: z.array(gliderSave),
  nextCursor: z.string().nullable(),
});

export type GliderRole = z.infer<typeof gliderRole>;
export type GliderAbilities = z.infer<typeof gliderAbilities>;
export type GliderFigures = z.infer<typeof gliderFigures>;
export type GliderSummaryDto = z.infer<typeof gliderSummary>;
export type GliderListDto = z.infer<typeof gliderList>;
export type GliderDto = z.infer<typeof glider>;
export type GliderInput = z.infer<typeof gliderInput>;
export type GliderSaveDto = z.infer<typeof gliderSave>;
export type GliderSaveListDto = z.infer<typeof gliderSaveList>;
