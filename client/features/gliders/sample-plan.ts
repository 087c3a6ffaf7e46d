import dunlin from '#data/demo/gliders/dunlin.json';
import type { Plan } from '#shared/core/plan.ts';
import { planSchema } from '#shared/schemas/plan.ts';

/** The glider that a visitor may try without an account. */
export const samplePlan: Plan = planSchema.parse(dunlin);
