import { z } from 'zod';
import { LIMITS } from './limits.ts';
import { coordinate, identifier, positive, title, within } from './plan-parts.ts';

const grams = () => within(0, LIMITS.massG.max);
const doubt = () => within(0, LIMITS.lengthMm.max);

/** One scale under the model. */
const support = z.strictObject({
  name: title(),
  reading: grams(),
  tare: grams(),
  resolution: positive(LIMITS.massG.max),
  /** place, mm aft of the datum and to starboard, and its standard uncertainty */
  x: coordinate(),
  y: coordinate(),
  ux: doubt(),
});

/** How the balance was found: on scales, or on a finger with the mass from one scale. */
export const balanceMethod = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('supports'),
    supports: z.array(support).min(2, 'Name at least two supports.').max(LIMITS.supports.max),
  }),
  z.strictObject({
    kind: z.literal('finger'),
    mass: grams(),
    resolution: positive(LIMITS.massG.max),
    tipsForwardAt: coordinate(),
    tipsAftAt: coordinate(),
  }),
]);

/** Mass and balance with standard uncertainties, g and mm; null where it is not known. */
const massAndBalance = z.strictObject({
  mass: z.number(),
  u: z.number(),
  x: z.number().nullable(),
  ux: z.number().nullable(),
  percentMac: z.number().nullable(),
});

/** One line of the check before the flight. */
const check = z.strictObject({
  id: identifier(),
  /** as it was read by the pilot, so that the record stays what was signed */
  words: z.string().min(1).max(LIMITS.note.max),
  answer: z.enum(['yes', 'no', 'not_on_this_model']),
  note: z.string().trim().max(LIMITS.note.max),
});

/** One glide and what was done after it. */
const glide = z.strictObject({
  behaviour: z.enum(['level', 'dives', 'stalls', 'turns_port', 'turns_starboard', 'other']),
  note: z.string().trim().max(LIMITS.note.max),
});

const firstFlightFields = {
  /** made on the device, so that a record that is sent twice is kept once */
  id: z.uuid(),
  gliderVersion: z.int().min(1),
  forecast: massAndBalance,
  method: balanceMethod,
  /** what the balance is to lie in, mm aft of the datum; `basis` says by what */
  range: z.strictObject({
    from: coordinate(),
    to: coordinate(),
    basis: z.enum(['plan', 'static_margin', 'typed']),
  }),
  ballast: z
    .array(
      z.strictObject({ name: title(), mass: positive(LIMITS.massG.max), x: coordinate(), y: coordinate() }),
    )
    .max(LIMITS.ballastPieces.max),
  checks: z.array(check).min(1).max(LIMITS.checks.max),
  place: z.string().trim().max(LIMITS.name.max),
  /** m/s; null where it was not measured */
  wind: within(0, 60).nullable(),
  glides: z.array(glide).max(LIMITS.glides.max),
  note: z.string().trim().max(LIMITS.note.max),
  /** the name that the pilot signed with, and when by the clock of the device */
  signature: title(),
  signedAt: z.iso.datetime(),
  /** an earlier record that this one follows */
  follows: z.uuid().nullable(),
};

export const firstFlightInput = z.strictObject(firstFlightFields);

/** A signed record of a first flight; it never changes. */
export const firstFlight = z.strictObject({
  ...firstFlightFields,
  gliderId: z.uuid(),
  /** counts up per glider */
  number: z.int(),
  /** as the method gives it without and with the ballast, worked out by the service */
  measured: massAndBalance,
  flown: massAndBalance,
  signedBy: z.string(),
  receivedAt: z.iso.datetime(),
});
export const firstFlightList = z.strictObject({ firstFlights: z.array(firstFlight) });

export type BalanceMethod = z.infer<typeof balanceMethod>;
export type FirstFlightInput = z.infer<typeof firstFlightInput>;
export type FirstFlightDto = z.infer<typeof firstFlight>;
export type FirstFlightListDto = z.infer<typeof firstFlightList>;
