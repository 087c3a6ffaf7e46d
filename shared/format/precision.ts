import type { Quantity, UnitOf } from '#shared/units/quantities.ts';

type Digits<Q extends Quantity> = { readonly [U in UnitOf<Q>]: number };

/**
 * How many decimals each quantity is shown with, in each unit that it may be shown in: the one place that decides.
 * A negative number rounds to tens, hundreds, thousands.
 */
export const DIGITS: { readonly [Q in Quantity]: Digits<Q> } = {
  length: { mm: 1, cm: 2, m: 3, in: 3, ft: 2 },
  area: { mm2: 0, cm2: 1, dm2: 2, m2: 4, in2: 1, ft2: 2 },
  classArea: { dm2: 2, m2: 4, in2: 1, ft2: 2 },
  volume: { mm3: 0, cm3: 2, in3: 3 },
  mass: { g: 1, kg: 3, oz: 2, lb: 3 },
  density: { 'kg/m3': 0, 'g/cm3': 3, 'lb/ft3': 1 },
  airDensity: { 'kg/m3': 3, 'lb/ft3': 4 },
  areal: { 'g/m2': 1, 'g/dm2': 3, 'oz/ft2': 3, 'oz/yd2': 2 },
  spread: { 'g/m2': 0, 'g/dm2': 2, 'oz/ft2': 2, 'oz/yd2': 1 },
  loading: { 'g/dm2': 1, 'g/m2': 0, 'oz/ft2': 1 },
  massPerLength: { 'g/m': 2, 'oz/ft': 3 },
  moment: { 'g.mm': 0, 'oz.in': 2 },
  inertia: { 'g.mm2': 0, 'oz.in2': 1 },
  speed: { 'm/s': 1, 'km/h': 1, 'ft/s': 1, mph: 1 },
  angle: { deg: 1, rad: 3 },
  modulus: { MPa: 0, GPa: 2, psi: -3, ksi: 0 },
  strength: { MPa: 1, GPa: 4, psi: -1, ksi: 2 },
  percentMac: { percent: 1 },
  share: { percent: 0, one: 2 },
  fineShare: { percent: 1, one: 3 },
  ratio: { one: 2 },
  reynolds: { one: -3 },
  count: { one: 0 },
};

/** Decimals of a small mass: a rib, a glue joint, a scale that reads hundredths. */
export const FINE_EXTRA_DIGITS = 1;
