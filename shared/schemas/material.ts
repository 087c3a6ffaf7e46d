import { z } from 'zod';
import { LIMITS } from './limits.ts';
import { positive, title, within } from './plan-parts.ts';

export const materialCategory = z.enum([
  'wood',
  'composite',
  'metal',
  'sheet',
  'covering',
  'finish',
  'adhesive',
]);
/** How sure a figure is: read in a published source, common practice of the trade, or remembered. */
export const materialBasis = z.enum(['published', 'common practice', 'from memory', 'own measurement']);

const figure = <T extends z.ZodType>(schema: T) => schema.nullable();

const fields = {
  name: title(),
  category: materialCategory,
  /** kg/m³ */
  density: figure(positive(LIMITS.density.max)),
  /** g/m² */
  areal: figure(positive(LIMITS.areal.max)),
  /** dry g per m² of joint */
  spread: figure(positive(LIMITS.spread.max)),
  /** relative standard deviation */
  cv: within(0, LIMITS.cv.max),
  /** GPa, bending */
  modulus: figure(positive(LIMITS.modulus.max)),
  /** MPa, bending */
  strength: figure(positive(LIMITS.strength.max)),
  /** moisture fraction at which the figures hold */
  moisture: figure(within(0, 1)),
  /** grain cut, thickness or form, where it matters to the choice */
  form: z.string().trim().max(LIMITS.note.max),
  source: z.string().trim().min(1, 'Say where the figure comes from.').max(LIMITS.note.max),
  basis: materialBasis,
};

export const materialInput = z
  .strictObject({ ...fields, shared: z.boolean() })
  .refine((m) => m.density !== null || m.areal !== null || m.spread !== null, {
    path: ['density'],
    message: 'Give a density, an areal mass or a spread.',
  });

export const material = z.strictObject({
  ...fields,
  id: z.uuid(),
  /** key under which plans hold their snapshot */
  key: z.string(),
  /** in everybody's table, or private to the asking user */
  shared: z.boolean(),
  version: z.int(),
  /** number of gliders that use it */
  usedBy: z.int(),
  can: z.strictObject({ edit: z.boolean(), delete: z.boolean() }),
});
export const materialList = z.strictObject({ materials: z.array(material) });

/** Where a material is used: gliders that the asking user may see, and how many others. */
export const materialUses = z.strictObject({
  gliders: z.array(z.strictObject({ id: z.uuid(), name: z.string() })),
  others: z.int(),
});

export type MaterialInput = z.infer<typeof materialInput>;
export type MaterialDto = z.infer<typeof material>;
export type MaterialListDto = z.infer<typeof materialList>;
export type MaterialUsesDto = z.infer<typeof materialUses>;
