/**
 * Units and their exact factors. Each factor says how many of the dimension's first unit (mm, g, mm², …) one unit
 * holds; all of them follow from definitions that are exact: inch = 25.4 mm, foot = 12 in, yard = 3 ft, pound =
 * 0.45359237 kg, ounce = pound / 16, mile = 5280 ft (NIST SP 811, 2008 edition, appendix B), standard gravity
 * 9.80665 m/s² for the pound-force in psi.
 */
const INCH_MM = 25.4;
const FOOT_MM = 12 * INCH_MM;
const YARD_MM = 3 * FOOT_MM;
const MILE_MM = 5280 * FOOT_MM;
const POUND_G = 453.59237;
const OUNCE_G = POUND_G / 16;
const FOOT_M = FOOT_MM / 1000;
const YARD_M = YARD_MM / 1000;
const GRAVITY = 9.80665;
/** pound-force per square inch in N/mm² */
const PSI_MPA = ((POUND_G / 1000) * GRAVITY) / INCH_MM ** 2;

/** What units measure; only those of one dimension convert into each other. */
export type Dimension =
  | 'length'
  | 'area'
  | 'volume'
  | 'mass'
  | 'density'
  | 'massPerArea'
  | 'massPerLength'
  | 'moment'
  | 'inertia'
  | 'speed'
  | 'angle'
  | 'pressure'
  | 'ratio';

interface UnitDefinition {
  dimension: Dimension;
  factor: number;
  label: string;
}

/** Every unit by its key: what it measures, its factor to the dimension's first unit, and its sign. */
export const UNITS = {
  mm: { dimension: 'length', factor: 1, label: 'mm' },
  cm: { dimension: 'length', factor: 10, label: 'cm' },
  m: { dimension: 'length', factor: 1000, label: 'm' },
  in: { dimension: 'length', factor: INCH_MM, label: 'in' },
  ft: { dimension: 'length', factor: FOOT_MM, label: 'ft' },
  mm2: { dimension: 'area', factor: 1, label: 'mm²' },
  cm2: { dimension: 'area', factor: 100, label: 'cm²' },
  dm2: { dimension: 'area', factor: 10_000, label: 'dm²' },
  m2: { dimension: 'area', factor: 1_000_000, label: 'm²' },
  in2: { dimension: 'area', factor: INCH_MM ** 2, label: 'in²' },
  ft2: { dimension: 'area', factor: FOOT_MM ** 2, label: 'ft²' },
  mm3: { dimension: 'volume', factor: 1, label: 'mm³' },
  cm3: { dimension: 'volume', factor: 1000, label: 'cm³' },
  in3: { dimension: 'volume', factor: INCH_MM ** 3, label: 'in³' },
  g: { dimension: 'mass', factor: 1, label: 'g' },
  kg: { dimension: 'mass', factor: 1000, label: 'kg' },
  oz: { dimension: 'mass', factor: OUNCE_G, label: 'oz' },
  lb: { dimension: 'mass', factor: POUND_G, label: 'lb' },
  'kg/m3': { dimension: 'density', factor: 1, label: 'kg/m³' },
  'g/cm3': { dimension: 'density', factor: 1000, label: 'g/cm³' },
  'lb/ft3': { dimension: 'density', factor: POUND_G / 1000 / FOOT_M ** 3, label: 'lb/ft³' },
  'g/m2': { dimension: 'massPerArea', factor: 1, label: 'g/m²' },
  'g/dm2': { dimension: 'massPerArea', factor: 100, label: 'g/dm²' },
  'oz/ft2': { dimension: 'massPerArea', factor: OUNCE_G / FOOT_M ** 2, label: 'oz/ft²' },
  'oz/yd2': { dimension: 'massPerArea', factor: OUNCE_G / YARD_M ** 2, label: 'oz/yd²' },
  'g/m': { dimension: 'massPerLength', factor: 1, label: 'g/m' },
  'oz/ft': { dimension: 'massPerLength', factor: OUNCE_G / FOOT_M, label: 'oz/ft' },
  'g.mm': { dimension: 'moment', factor: 1, label: 'g·mm' },
  'oz.in': { dimension: 'moment', factor: OUNCE_G * INCH_MM, label: 'oz·in' },
  'g.mm2': { dimension: 'inertia', factor: 1, label: 'g·mm²' },
  'oz.in2': { dimension: 'inertia', factor: OUNCE_G * INCH_MM ** 2, label: 'oz·in²' },
  'm/s': { dimension: 'speed', factor: 1, label: 'm/s' },
  'km/h': { dimension: 'speed', factor: 1 / 3.6, label: 'km/h' },
  'ft/s': { dimension: 'speed', factor: FOOT_M, label: 'ft/s' },
  mph: { dimension: 'speed', factor: MILE_MM / 1000 / 3600, label: 'mph' },
  deg: { dimension: 'angle', factor: 1, label: '°' },
  rad: { dimension: 'angle', factor: 180 / Math.PI, label: 'rad' },
  MPa: { dimension: 'pressure', factor: 1, label: 'MPa' },
  GPa: { dimension: 'pressure', factor: 1000, label: 'GPa' },
  psi: { dimension: 'pressure', factor: PSI_MPA, label: 'psi' },
  ksi: { dimension: 'pressure', factor: 1000 * PSI_MPA, label: 'ksi' },
  one: { dimension: 'ratio', factor: 1, label: '' },
  percent: { dimension: 'ratio', factor: 0.01, label: '%' },
} as const satisfies Record<string, UnitDefinition>;

/** Key of a unit, in plain letters: `kg/m3`. */
export type Unit = keyof typeof UNITS;
/** The units that a value in `U` can be converted to. */
export type CompatibleUnit<U extends Unit> = {
  [V in Unit]: (typeof UNITS)[V]['dimension'] extends (typeof UNITS)[U]['dimension'] ? V : never;
}[Unit];

/**
 * The value in another unit of the same dimension, by their exact factors.
 * @throws RangeError when the two units measure different things
 * @example convert(1, 'in', 'mm') // → 25.4
 */
export function convert<U extends Unit>(value: number, from: U, to: CompatibleUnit<U>): number {
  const source: UnitDefinition = UNITS[from];
  const target: UnitDefinition = UNITS[to];
  if (source.dimension !== target.dimension)
    throw new RangeError(`${from} and ${to} measure different things.`);
  if (source === target) return value;
  // One rounding less where the factor of a small unit is written as a share: 62 % is 0.62, not 62 × 0.01.
  return source.factor < target.factor
    ? value / (target.factor / source.factor)
    : value * (source.factor / target.factor);
}
