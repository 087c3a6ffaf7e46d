import { z } from 'zod';
import { LIMITS } from './limits.ts';
import { planSchema } from './plan.ts';

export const gliderRole = z.enum(['owner', 'builder', 'pilot', 'reader']);
/** What the asking user may do, so that the client does not guess. */
export const gliderAbilities = z.strictObject({
  edit: z.boolean(),
  saveSheet: z.boolean(),
  delete: z.boolean(),
  /** name saved states */
  nameSave: z.boolean(),
  addPhoto: z.boolean(),
  captionPhoto: z.boolean(),
  deletePhoto: z.boolean(),
  archive: z.boolean(),
  /** invite, change roles, remove members, make and switch off the read-only link */
  share: z.boolean(),
  /** hand the glider over to a member */
  transfer: z.boolean(),
  leave: z.boolean(),
  weigh: z.boolean(),
  signFlight: z.boolean(),
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
  /** since when it is out of the way; null for one in use */
  archivedAt: z.iso.datetime().nullable(),
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
  /** since when it is out of the way; null for one in use */
  archivedAt: z.iso.datetime().nullable(),
});

export const gliderInput = z.strictObject({ plan: planSchema });

/** What a list of gliders may be ordered by; names and masses begin with the first, changes with the last. */
export const gliderOrder = z.enum(['changed', 'name', 'mass']);
export const gliderDirection = z.enum(['up', 'down']);
export const archivedFilter = z.enum(['no', 'only']);

export const archiveInput = z.strictObject({ archived: z.boolean() });
export const copiesInput = z.strictObject({
  ids: z
    .array(z.uuid())
    .min(1, 'Name at least one glider.')
    .max(LIMITS.copies.max, `Copy at most ${LIMITS.copies.max} gliders at once.`)
    .refine((ids) => new Set(ids).size === ids.length, 'Names a glider twice.'),
});
/** The copies, in the order in which they were asked for. */
export const gliderCopies = z.strictObject({ gliders: z.array(gliderSummary) });

export type GliderRole = z.infer<typeof gliderRole>;
export type GliderAbilities = z.infer<typeof gliderAbilities>;
export type GliderFigures = z.infer<typeof gliderFigures>;
export type GliderSummaryDto = z.infer<typeof gliderSummary>;
export type GliderListDto = z.infer<typeof gliderList>;
export type GliderDto = z.infer<typeof glider>;
export type GliderInput = z.infer<typeof gliderInput>;
export type GliderOrder = z.infer<typeof gliderOrder>;
export type GliderDirection = z.infer<typeof gliderDirection>;
export type ArchivedFilter = z.infer<typeof archivedFilter>;
export type GliderCopiesDto = z.infer<typeof gliderCopies>;
