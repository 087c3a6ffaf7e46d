import { z } from 'zod';

/** How sticks are bought and cut; kept in this browser. Lengths mm. */
export const cutTerms = z.object({
  /** length of a stick as a shop sells it */
  bought: z.number().min(50).max(6_000),
  kerf: z.number().min(0).max(10),
  shortestOffcut: z.number().min(0).max(2_000),
  /** length of a scarf over its thickness */
  slope: z.number().min(8).max(30),
});

export type CutTerms = z.infer<typeof cutTerms>;

/** A metre of stick, a fine saw, what is still good for a rib’s cap, the steepest scarf (common practice, no source). */
export const USUAL_TERMS: CutTerms = { bought: 1000, kerf: 0.5, shortestOffcut: 60, slope: 8 };
