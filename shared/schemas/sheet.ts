import { z } from 'zod';
import { estimate } from './estimate.ts';
import { LIMITS } from './limits.ts';
import { planSchema } from './plan.ts';

export const sheetInput = z.strictObject({ note: z.string().trim().max(LIMITS.note.max) });

const head = {
  id: z.uuid(),
  gliderId: z.uuid(),
  gliderName: z.string(),
  /** counts up per glider, never reused */
  number: z.int(),
  note: z.string(),
  savedAt: z.iso.datetime(),
  savedBy: z.string(),
  /** version of the calculator that made the result */
  calculator: z.string(),
  /** SHA-256, hex, over plan, result and calculator version in canonical JSON */
  sha256: z.string().length(64),
};

/** In a list: the headline figures only. */
export const sheetSummary = z.strictObject({
  ...head,
  mass: z.number(),
  percentMac: z.number().nullable(),
  wingLoading: z.number().nullable(),
});
export const sheetList = z.strictObject({ sheets: z.array(sheetSummary), nextCursor: z.string().nullable() });
/** A saved balance sheet: frozen plan and frozen result. */
export const sheet = z.strictObject({ ...head, plan: planSchema, result: estimate });

export type SheetInput = z.infer<typeof sheetInput>;
export type SheetSummaryDto = z.infer<typeof sheetSummary>;
export type SheetListDto = z.infer<typeof sheetList>;
export type SheetDto = z.infer<typeof sheet>;
