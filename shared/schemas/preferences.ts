import { z } from 'zod';
import { QUANTITIES, type Quantity, type UnitOf } from '#shared/units/quantities.ts';

const choice = <Q extends Quantity>(quantity: Q) => {
  const units: readonly UnitOf<Q>[] = QUANTITIES[quantity].units;
  return z.enum(units).optional();
};

/** The unit of each quantity that the reader wants; one that is not named is shown as usual. */
export const unitChoices = z.strictObject({
  length: choice('length'),
  area: choice('area'),
  classArea: choice('classArea'),
  volume: choice('volume'),
  mass: choice('mass'),
  density: choice('density'),
  airDensity: choice('airDensity'),
  areal: choice('areal'),
  spread: choice('spread'),
  loading: choice('loading'),
  massPerLength: choice('massPerLength'),
  moment: choice('moment'),
  inertia: choice('inertia'),
  speed: choice('speed'),
  angle: choice('angle'),
  modulus: choice('modulus'),
  strength: choice('strength'),
});
export const theme = z.enum(['system', 'light', 'dark']);
/** How somebody wants to see everything; kept with the account, so that it follows to every machine. */
export const preferences = z.strictObject({ units: unitChoices, theme });

export type UnitChoices = z.infer<typeof unitChoices>;
export type Theme = z.infer<typeof theme>;
export type Preferences = z.infer<typeof preferences>;
