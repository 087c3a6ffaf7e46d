import { z } from 'zod';

/** The scale on the bench, as this browser remembers it. g */
export const scaleKept = z.object({
  resolution: z.number().min(0.001).max(100),
  tare: z.number().min(0).max(10_000),
});

/** A tenth of a gram, nothing under it. */
export const USUAL_SCALE = { resolution: 0.1, tare: 0 };
