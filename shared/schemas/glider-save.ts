import { z } from 'zod';
import type { PlanChange } from '#shared/core/field-changes.ts';
import { gliderFigures } from './glider.ts';
import { LIMITS } from './limits.ts';
import { planSchema } from './plan.ts';

const changeValue = z.union([z.number(), z.string(), z.boolean(), z.array(z.number())]).nullable();

/** One difference between two plans, as `shared/core/plan-changes.ts` tells it. */
export const planChange = z.strictObject({
  path: z.string(),
  name: z.string(),
  field: z.string().nullable(),
  from: changeValue,
  to: changeValue,
  unit: z.string().nullable(),
});
/** Holds schema and core type together; a difference is a compile error. */
export const planChangeTypesAgree = (change: PlanChange): z.infer<typeof planChange> => change;

/** What a save changed. */
export const saveChanges = z.strictObject({
  /** the first `LIMITS.changes.max` of them */
  list: z.array(planChange),
  /** how many more there are */
  more: z.int(),
  /** g */
  massBy: z.number().nullable(),
  /** mm aft; null where one of the two has no balance point */
  balanceBy: z.number().nullable(),
});

/** One save in the log. */
export const gliderSave = z.strictObject({
  version: z.int(),
  savedAt: z.iso.datetime(),
  savedBy: z.string(),
  figures: gliderFigures,
  /** given by a builder, to find the state again; null for most */
  name: z.string().nullable(),
  /** the version that this save brought back */
  restoredFrom: z.int().nullable(),
  /** against the save before; null for the first */
  changes: saveChanges.nullable(),
});
export const gliderSaveList = z.strictObject({
  saves: z.array(gliderSave),
  nextCursor: z.string().nullable(),
});
/** One saved state with its plan. */
export const gliderState = z.strictObject({ ...gliderSave.shape, plan: planSchema });

/** Empty takes the name away. */
export const saveNameInput = z.strictObject({ name: z.string().trim().max(LIMITS.name.max) });

export type PlanChangeDto = z.infer<typeof planChange>;
export type SaveChanges = z.infer<typeof saveChanges>;
export type GliderSaveDto = z.infer<typeof gliderSave>;
export type GliderSaveListDto = z.infer<typeof gliderSaveList>;
export type GliderStateDto = z.infer<typeof gliderState>;
