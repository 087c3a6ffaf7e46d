import { z } from 'zod';
import type { FirstFlightInput } from '#shared/schemas/first-flight.ts';

const missing = z.number().nullable();

/** One scale under the model, as far as it is filled in. */
const support = z.object({
  name: z.string(),
  reading: missing,
  tare: z.number(),
  x: missing,
  y: z.number(),
});
const piece = z.object({ id: z.string(), name: z.string(), mass: z.number(), divisible: z.boolean() });
const answer = z.object({ answer: z.enum(['yes', 'no', 'not_on_this_model']).nullable(), note: z.string() });

/** A record that is being made: everything that was typed, kept on the device until it is signed. */
export const draft = z.object({
  /** of the record to come, so that it is kept once however often it is sent */
  id: z.uuid(),
  kind: z.enum(['supports', 'finger']),
  supports: z.array(support).min(2),
  /** smallest step of the scales, g, and how well a place is known, mm */
  resolution: z.number(),
  ux: z.number(),
  sideways: z.boolean(),
  finger: z.object({ mass: missing, tipsForwardAt: missing, tipsAftAt: missing }),
  /** what the range is taken from; null for the plan's own where it has one */
  basis: z.enum(['plan', 'static_margin', 'typed']).nullable(),
  margins: z.object({ least: z.number(), most: z.number() }),
  typed: z.object({ from: missing, to: missing }),
  /** lead and putty at hand, and where they go; null for what is kept with the glider */
  pieces: z.array(piece).nullable(),
  at: missing,
  /** fitted since the model was weighed */
  ballast: z.array(z.object({ name: z.string(), mass: z.number(), x: z.number(), y: z.number() })),
  checks: z.record(z.string(), answer),
  place: z.string(),
  wind: missing,
  glides: z.array(
    z.object({
      behaviour: z.enum(['level', 'dives', 'stalls', 'turns_port', 'turns_starboard', 'other']),
      note: z.string(),
    }),
  ),
  note: z.string(),
  signature: z.string(),
  follows: z.uuid().nullable(),
});
export type FlightDraft = z.infer<typeof draft>;
export type CheckAnswer = FlightDraft['checks'][string];

/** A tenth of a gram and half a millimetre, until told otherwise. */
const USUAL = { resolution: 0.1, ux: 0.5 };

/** A record with nothing in it yet; scale, places and pieces stay from the one before. */
export function freshDraft(before?: FlightDraft, follows: string | null = null): FlightDraft {
  const empty = (name: string) => ({ name, reading: null, tare: 0, x: null, y: 0 });
  return {
    id: crypto.randomUUID(),
    kind: before?.kind ?? 'supports',
    supports: before?.supports.map((one) => ({ ...one, reading: null })) ?? [empty('Front'), empty('Rear')],
    resolution: before?.resolution ?? USUAL.resolution,
    ux: before?.ux ?? USUAL.ux,
    sideways: before?.sideways ?? false,
    finger: { mass: null, tipsForwardAt: null, tipsAftAt: null },
    basis: before?.basis ?? null,
    margins: before?.margins ?? { least: 0.05, most: 0.15 },
    typed: before?.typed ?? { from: null, to: null },
    pieces: before?.pieces ?? null,
    at: before?.at ?? null,
    ballast: [],
    checks: {},
    place: before?.place ?? '',
    wind: null,
    glides: [],
    note: '',
    signature: '',
    follows,
  };
}

/** How the balance was found, once every figure of it is there. */
export function methodOf({
  kind,
  supports,
  finger,
  resolution,
  ux,
  sideways,
}: FlightDraft): FirstFlightInput['method'] | null {
  if (kind === 'finger') {
    const { mass, tipsForwardAt, tipsAftAt } = finger;
    if (mass === null || mass <= 0 || tipsForwardAt === null || tipsAftAt === null) return null;
    return { kind, mass, resolution, tipsForwardAt, tipsAftAt };
  }
  const full = supports.flatMap(({ name, reading, tare, x, y }) =>
    reading === null || x === null ? [] : [{ name, reading, tare, x, y: sideways ? y : 0, resolution, ux }],
  );
  return full.length < supports.length ? null : { kind, supports: full };
}
