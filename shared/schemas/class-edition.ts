import { z } from 'zod';
import type { Limit } from '#shared/core/contest/limit.ts';
import { LIMITS } from './limits.ts';
import { title } from './plan-parts.ts';

/** How sure a limit is: only what was compared with the current book is to be judged by without a look at it. */
export const limitSureness = z.enum([
  'compared with the current book',
  'read in a copy',
  'read in a secondary summary',
  'from memory',
]);

const UNITS: Record<Limit['quantity'], readonly Limit['unit'][]> = {
  mass: ['g', 'kg', 'oz', 'lb'],
  loading: ['g/dm2', 'oz/ft2'],
  area: ['dm2', 'in2'],
  span: ['mm', 'cm', 'm', 'in'],
  nose_radius: ['mm', 'cm', 'm', 'in'],
};

/** Decimal text as the rule prints it: it is compared digit by digit. */
const limitText = z
  .string()
  .trim()
  .max(20, 'Must have at most 20 characters.')
  .regex(/^\d{1,9}(\.\d{1,9})?$/, { error: 'Write a number such as 410 or 12.5.', abort: true })
  .refine((text) => Number(text) > 0, 'Must be more than 0.');

const words = z.string().trim().max(LIMITS.name.max, `Must have at most ${LIMITS.name.max} characters.`);

/** One limit of a class as its rule words it, and where it was read. */
export const classLimit = z
  .strictObject({
    quantity: z.enum(['mass', 'loading', 'area', 'span', 'nose_radius']),
    bound: z.enum(['min', 'max']),
    value: limitText,
    unit: z.enum(['g', 'kg', 'oz', 'lb', 'g/dm2', 'oz/ft2', 'dm2', 'in2', 'mm', 'cm', 'm', 'in']),
    /** whether the value itself is allowed: “12 to 75” is, “less than 75” is not */
    inclusive: z.boolean(),
    areaBasis: z.enum(['wing', 'wing_and_tail']),
    massBasis: z.enum(['extreme', 'without_battery']),
    clause: words,
    source: words,
    sure: limitSureness,
  })
  .refine(({ quantity, unit }) => UNITS[quantity].includes(unit), {
    path: ['unit'],
    message: 'Is no unit of this quantity.',
  });

const key = z
  .string()
  .trim()
  .min(1, 'Must not be empty.')
  .max(LIMITS.key.max, `Must have at most ${LIMITS.key.max} characters.`)
  .regex(/^[A-Za-z0-9-]+$/, 'May hold letters, digits and hyphens.');

const fields = {
  /** short sign of the class, the same in all of its editions */
  key,
  name: title(),
  /** who issues the rule */
  issuedBy: title(),
  edition: title(),
  note: z.string().trim().max(LIMITS.note.max, `Must have at most ${LIMITS.note.max} characters.`),
  limits: z.array(classLimit).max(LIMITS.classLimits.max, `Write at most ${LIMITS.classLimits.max} limits.`),
};

export const classEditionInput = z.strictObject(fields);
export const classEdition = z.strictObject({
  ...fields,
  id: z.uuid(),
  /** whose own it is; null for everybody’s */
  clubId: z.uuid().nullable(),
  /** counts changes; also the ETag */
  version: z.int(),
  /** something is aimed at it or was measured against it: it never changes again */
  inUse: z.boolean(),
  can: z.strictObject({ edit: z.boolean() }),
});
export const classEditionList = z.strictObject({ editions: z.array(classEdition) });

/** What a glider is built for; null for nothing in particular. */
export const gliderAimInput = z.strictObject({ editionId: z.uuid() });
export const gliderAim = z.strictObject({ edition: classEdition.nullable() });

export type ClassLimitDto = z.infer<typeof classLimit>;
/** Holds schema and core type together; a difference is a compile error. */
export const limitTypesAgree = (dto: ClassLimitDto): Limit => dto;
export type ClassEditionInput = z.infer<typeof classEditionInput>;
export type ClassEditionDto = z.infer<typeof classEdition>;
export type ClassEditionListDto = z.infer<typeof classEditionList>;
export type GliderAimDto = z.infer<typeof gliderAim>;
