import { z } from 'zod';
import type { Estimate } from '#shared/core/result.ts';
import { planSchema } from './plan.ts';

const nullable = z.number().nullable();
const vec3 = z.tuple([z.number(), z.number(), z.number()]);

export const estimateInput = z.strictObject({ plan: planSchema });

export const planform = z.strictObject({
  areaDeveloped: z.number(),
  areaProjected: z.number(),
  span: z.number(),
  aspectRatio: nullable,
  mac: z.number(),
  xLeMac: z.number(),
  yMac: z.number(),
});
export const line = z.strictObject({
  id: z.string(),
  name: z.string(),
  group: z.string(),
  surface: z.string().nullable(),
  material: z.string().nullable(),
  pieces: z.int(),
  length: nullable,
  area: nullable,
  volume: nullable,
  mass: z.number(),
  u: z.number(),
  at: vec3,
  moment: z.number(),
});
export const notice = z.looseObject({ code: z.string(), path: z.string() });

/** Answer of `POST /api/estimates`; also the frozen result in a sheet. */
export const estimate = z.strictObject({
  planform: z.record(z.string(), planform),
  lines: z.array(line),
  totals: z.strictObject({
    mass: z.number(),
    u: z.number(),
    at: vec3.nullable(),
    wingMass: z.number(),
    byGroup: z.record(z.string(), z.number()),
    inertia: z.strictObject({ xx: z.number(), yy: z.number(), zz: z.number() }).nullable(),
  }),
  balance: z.strictObject({
    x: nullable,
    u: nullable,
    percentMac: nullable,
    uPercentMac: nullable,
    neutralPoint: nullable,
    staticMargin: nullable,
  }),
  loading: z.strictObject({ wing: nullable, classArea: nullable, classLoading: nullable }),
  speeds: z.strictObject({ stall: nullable, reynolds: nullable }),
  spar: z.strictObject({
    stations: z.array(
      z.strictObject({ s: z.number(), moment: z.number(), stress: z.number(), margin: z.number() }),
    ),
    worst: nullable,
  }),
  notices: z.array(notice),
});
export type EstimateDto = z.infer<typeof estimate>;
export type EstimateInput = z.infer<typeof estimateInput>;
/** What the core answers is what the API promises; a difference is a compile error. */
export const estimateTypesAgree = (result: Estimate): EstimateDto => result;
