import { z } from 'zod';
import type { Plan } from '#shared/core/plan.ts';
import { LIMITS } from './limits.ts';
import {
  coordinate,
  identifier,
  length,
  lengthOrNothing,
  part,
  positive,
  title,
  vec3,
  widthPair,
  within,
} from './plan-parts.ts';
import { referenceIssues } from './plan-references.ts';

/** Four digits, camber, its place, and thickness; a section without thickness is no section. */
const naca = z.strictObject({
  naca: z.string().regex(/^\d\d(0[1-9]|[1-9]\d)$/, 'Must be a four-digit section such as 4409.'),
});
const flat = z.strictObject({ flat: length() });
const points = z.strictObject({
  name: title(),
  points: z
    .array(z.tuple([within(-0.5, 1.5), within(-1, 1)]))
    .min(LIMITS.sectionPoints.min, `Must have at least ${LIMITS.sectionPoints.min} points.`)
    .max(LIMITS.sectionPoints.max, `Must have at most ${LIMITS.sectionPoints.max} points.`),
});
export const sectionSpec = z.union([naca, flat, points], {
  error: 'Must be { naca }, { flat } or { name, points }.',
});

export const panel = z.strictObject({
  span: length(),
  rootChord: length(),
  tipChord: lengthOrNothing(),
  sweep: coordinate(),
  dihedral: within(-90, 90),
  rootSection: sectionSpec,
  tipSection: sectionSpec,
});

export const surface = z.strictObject({
  key: identifier(),
  role: z.enum(['wing', 'tailplane', 'fin']),
  apex: vec3(),
  mirrored: z.boolean(),
  panels: z.array(panel).min(1, 'Must have at least one panel.').max(LIMITS.panels.max),
  parts: z.array(part).max(LIMITS.parts.max, `Must have at most ${LIMITS.parts.max} parts.`),
});

export const item = z.strictObject({
  id: identifier(),
  name: title(),
  group: title(),
  mass: within(0, LIMITS.massG.max),
  u: within(0, LIMITS.massG.max).optional(),
  at: vec3(),
});

const solidBase = { id: identifier(), name: title(), group: title(), material: identifier() };
export const bar = z.strictObject({
  ...solidBase,
  shape: z.literal('bar'),
  from: vec3(),
  to: vec3(),
  width: widthPair(),
  height: widthPair(),
  profile: z.enum(['rectangle', 'round', 'tube']),
  wall: length().optional(),
});
export const plate = z.strictObject({
  ...solidBase,
  shape: z.literal('plate'),
  outline: z
    .array(z.tuple([coordinate(), coordinate()]))
    .min(LIMITS.outlinePoints.min, `Must have at least ${LIMITS.outlinePoints.min} points.`)
    .max(LIMITS.outlinePoints.max),
  thickness: length(),
  count: z.int().min(1).max(LIMITS.ribs.max),
  y: coordinate(),
  cutout: within(0, LIMITS.share.max),
});
export const solid = z.discriminatedUnion('shape', [bar, plate]);

export const planMaterial = z.strictObject({
  name: title(),
  category: z.enum(['wood', 'composite', 'metal', 'sheet', 'covering', 'finish', 'adhesive']),
  density: positive(LIMITS.density.max).optional(),
  areal: positive(LIMITS.areal.max).optional(),
  spread: positive(LIMITS.spread.max).optional(),
  cv: within(0, LIMITS.cv.max),
  moistureAtDensity: within(0, 1).optional(),
  modulus: positive(LIMITS.modulus.max).optional(),
  strength: positive(LIMITS.strength.max).optional(),
  source: z.string().max(LIMITS.note.max).optional(),
});

const planShape = z.strictObject({
  version: z.literal(1),
  name: title(),
  materials: z
    .record(identifier(), planMaterial)
    .refine(
      (materials) => Object.keys(materials).length <= LIMITS.materials.max,
      `Must have at most ${LIMITS.materials.max} materials.`,
    ),
  surfaces: z.array(surface).max(LIMITS.surfaces.max),
  items: z.array(item).max(LIMITS.items.max),
  solids: z.array(solid).max(LIMITS.solids.max),
  target: z.strictObject({ percentMac: within(-500, 500), tolerance: within(0, 100) }).optional(),
  flight: z
    .strictObject({
      clMax: positive(5).optional(),
      airDensity: positive(3).optional(),
      loadFactor: positive(100).optional(),
    })
    .optional(),
});

/**
 * The plan: body of `POST /api/estimates`, JSON export, saved state. Unknown keys are refused. What one field
 * says of another (a material that exists, an `at` for a spar) is checked even where the shape is wrong
 * elsewhere, so that all errors are told at once.
 */
export const planSchema = planShape.check(
  z.superRefine((value, ctx) => {
    for (const issue of referenceIssues(value)) ctx.addIssue({ code: 'custom', ...issue });
  }),
);
// Refinements are skipped once the shape is wrong; here they must speak all the same.
const crossCheck = planSchema._zod.def.checks?.at(-1);
if (crossCheck) crossCheck._zod.def.when = () => true;

export type PlanDto = z.infer<typeof planSchema>;
/** Holds schema and core type together, both ways; a difference is a compile error. */
export const planTypesAgree = (dto: PlanDto): Plan => dto;
export const planTypesAgreeBack = (plan: Plan): PlanDto => plan;
