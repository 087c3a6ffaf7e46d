import { z } from 'zod';
import { LIMITS } from './limits.ts';

const caption = z.string().trim().max(LIMITS.caption.max, `Use at most ${LIMITS.caption.max} characters.`);

/** Beside the picture itself, which is the file `photo` of the form. */
export const photoForm = z.strictObject({ caption: caption.default('') });
export const photoInput = z.strictObject({ caption });

export const photo = z.strictObject({
  id: z.uuid(),
  gliderId: z.uuid(),
  caption: z.string(),
  /** px, as kept */
  width: z.int(),
  height: z.int(),
  addedAt: z.iso.datetime(),
  addedBy: z.string(),
});
/** All of a glider, newest first: there are at most `LIMITS.photos.max`. */
export const photoList = z.strictObject({ photos: z.array(photo) });

export type PhotoForm = z.infer<typeof photoForm>;
export type PhotoDto = z.infer<typeof photo>;
export type PhotoListDto = z.infer<typeof photoList>;
