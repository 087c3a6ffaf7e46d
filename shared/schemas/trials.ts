import { z } from 'zod';
import type { Trial } from '#shared/core/wood-trial.ts';
import { LIMITS } from './limits.ts';
import { coordinate, identifier, positive, title } from './plan-parts.ts';
import { planMaterial } from './plan.ts';

/** A group of parts, `ribs`, or a single part, `wing/ribs`. */
const woodKey = z
  .string()
  .min(1, 'Must not be empty.')
  .max(2 * LIMITS.key.max + 1)
  .refine((key) => key !== '__proto__', 'Is no group of parts.');

export const trial = z.strictObject({
  name: title(),
  /** by group or part; what is not named stays as drawn */
  materials: z
    .record(woodKey, z.strictObject({ key: identifier(), material: planMaterial }))
    .refine(
      (materials) => Object.keys(materials).length <= LIMITS.trialWoods.max,
      `Must name at most ${LIMITS.trialWoods.max} groups and parts.`,
    ),
});

/** What all trials of a glider are compared at. */
const trialTerms = z.strictObject({
  /** of the ballast, mm aft of the datum; null as usual */
  arm: coordinate().nullable(),
  /** class minimum, g; null where none is set */
  minimumMass: positive(LIMITS.massG.max).nullable(),
});

const trialFields = {
  trials: z.array(trial).max(LIMITS.trials.max, `Keep at most ${LIMITS.trials.max} trials.`),
  terms: trialTerms,
};

/** The whole list in its order. */
export const trialsInput = z.strictObject(trialFields);
export const gliderTrials = z.strictObject({
  ...trialFields,
  /** 1 while nobody has kept any; also the ETag */
  version: z.int(),
  /** null while nobody has kept any */
  updatedAt: z.iso.datetime().nullable(),
  updatedBy: z.string().nullable(),
});

export type TrialDto = z.infer<typeof trial>;
/** Holds schema and core type together, both ways; a difference is a compile error. */
export const trialTypesAgree = (dto: TrialDto): Trial => dto;
export type TrialsInput = z.infer<typeof trialsInput>;
export type GliderTrialsDto = z.infer<typeof gliderTrials>;
