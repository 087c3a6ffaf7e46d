import { z } from 'zod';
import { LIMITS } from './limits.ts';

/** Building blocks of the plan's schema: numbers with their bounds, and every kind of part. */
const finite = () => z.number({ error: 'Must be a number.' });

export const coordinate = () =>
  finite()
    .min(LIMITS.coordinateMm.min, `Must be at least ${LIMITS.coordinateMm.min} mm.`)
    .max(LIMITS.coordinateMm.max, `Must be at most ${LIMITS.coordinateMm.max} mm.`);
export const length = () =>
  finite()
    .positive('Must be more than 0 mm.')
    .max(LIMITS.lengthMm.max, `Must be at most ${LIMITS.lengthMm.max} mm.`);
export const lengthOrNothing = () =>
  finite()
    .nonnegative('Must not be negative.')
    .max(LIMITS.lengthMm.max, `Must be at most ${LIMITS.lengthMm.max} mm.`);
export const positive = (max: number) =>
  finite().positive('Must be more than 0.').max(max, `Must be at most ${max}.`);
export const within = (min: number, max: number) =>
  finite().min(min, `Must be at least ${min}.`).max(max, `Must be at most ${max}.`);
const removedShare = () => within(0, LIMITS.share.max);
const chordShare = () => within(LIMITS.chordShare.min, LIMITS.chordShare.max);
const pair = <T extends z.ZodType>(value: () => T) => z.tuple([value(), value()]);

export const vec3 = () => z.tuple([coordinate(), coordinate(), coordinate()]);
export const identifier = () => z.string().min(1, 'Must not be empty.').max(LIMITS.key.max);
export const title = () => z.string().trim().min(1, 'Must not be empty.').max(LIMITS.name.max);

export const widthPair = () => pair(lengthOrNothing);

const base = {
  id: identifier(),
  name: title(),
  material: identifier(),
  group: title().optional(),
  side: z.enum(['both', 'port', 'starboard']).optional(),
};
const range = { from: lengthOrNothing(), to: lengthOrNothing() };
const face = z.enum(['top', 'bottom', 'both']);

export const ribs = z.strictObject({
  ...base,
  kind: z.literal('ribs'),
  stations: z.array(lengthOrNothing()).min(1).max(LIMITS.ribs.max).optional(),
  from: lengthOrNothing().optional(),
  to: lengthOrNothing().optional(),
  count: z.int().min(1).max(LIMITS.ribs.max).optional(),
  thickness: length(),
  lightening: removedShare(),
});

export const strip = z.strictObject({
  ...base,
  ...range,
  kind: z.literal('strip'),
  at: pair(chordShare).optional(),
  seat: z.enum(['top', 'bottom', 'middle', 'nose', 'tail']),
  width: widthPair(),
  height: widthPair(),
  profile: z.enum(['rectangle', 'triangle', 'round', 'tube']),
  wall: length().optional(),
  letIn: z.boolean().optional(),
});

export const skin = z.strictObject({
  ...base,
  ...range,
  kind: z.literal('skin'),
  start: chordShare(),
  end: chordShare(),
  seat: z.enum(['top', 'bottom', 'wrap']),
  thickness: length(),
});

export const capStrips = z.strictObject({
  ...base,
  ...range,
  kind: z.literal('capStrips'),
  start: chordShare(),
  end: chordShare(),
  seat: face,
  width: length(),
  thickness: length(),
});

export const web = z.strictObject({
  ...base,
  ...range,
  kind: z.literal('web'),
  at: pair(chordShare),
  thickness: length(),
});

export const tipBlock = z.strictObject({
  ...base,
  kind: z.literal('tipBlock'),
  length: length(),
  hollow: removedShare(),
});

export const sheet = z.strictObject({
  ...base,
  kind: z.literal('sheet'),
  thickness: length(),
  cutout: removedShare(),
});

export const covering = z.strictObject({
  ...base,
  ...range,
  kind: z.enum(['covering', 'finish']),
  seat: face,
  overlap: within(0, 1),
});

export const glue = z.strictObject({
  ...base,
  kind: z.literal('glue'),
  method: z.enum(['share', 'joints']),
  share: within(0, 1).optional(),
  layers: within(0, 20).optional(),
});

export const part = z.discriminatedUnion('kind', [
  ribs,
  strip,
  skin,
  capStrips,
  web,
  tipBlock,
  sheet,
  covering,
  glue,
]);
