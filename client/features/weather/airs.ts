import { z } from 'zod';
import { inAir, type DampAir, type InAir } from '#shared/core/humidity.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';

/** What the moisture equation is made for, and models are flown in: °C, and relative humidity as a share. */
export const TEMPERATURE = { min: -10, max: 60 };
export const HUMIDITY = { min: 0, max: 0.98 };

const air = z.object({
  temperature: z.number().min(TEMPERATURE.min).max(TEMPERATURE.max),
  humidity: z.number().min(HUMIDITY.min).max(HUMIDITY.max),
});

/** The two airs as they are kept for one person. */
export const keptAirs = z.object({ workshop: air, field: air });
export type KeptAirs = z.infer<typeof keptAirs>;
/** A heated room, and a mild morning outside. */
export const USUAL_AIRS: KeptAirs = {
  workshop: { temperature: 20, humidity: 0.45 },
  field: { temperature: 15, humidity: 0.7 },
};

/** A dry and a damp day of a temperate country, at the temperature of the field. */
export const DRY = 0.3;
export const DAMP = 0.9;

export type AirKey = 'workshop' | 'field' | 'dry' | 'damp';

export interface AirRow extends InAir {
  key: AirKey;
  name: string;
  air: DampAir;
}

/** The model in each air, in the order of the table; an air that the moisture equation says nothing of is left out. */
export function airRows(plan: Plan, result: Estimate, { workshop, field }: KeptAirs): AirRow[] {
  const airs: [AirKey, string, DampAir][] = [
    ['workshop', 'Workshop', workshop],
    ['field', 'Field', field],
    ['dry', 'Dry day', { ...field, humidity: DRY }],
    ['damp', 'Damp day', { ...field, humidity: DAMP }],
  ];
  return airs.flatMap(([key, name, here]) => {
    const found = inAir(plan, result, here, workshop);
    return found ? [{ key, name, air: here, ...found }] : [];
  });
}

/** How a mass stands to the least that a class asks for; both compared unrounded. */
export function overMinimum(mass: number, minimum: number): { over: number; short: boolean } {
  return { over: mass - minimum, short: mass < minimum };
}
