import type { Unit } from './units.ts';

/** For screen readers and the titles of abbreviations. */
const NAMES: Record<Unit, string> = {
  mm: 'millimetres',
  cm: 'centimetres',
  m: 'metres',
  in: 'inches',
  ft: 'feet',
  mm2: 'square millimetres',
  cm2: 'square centimetres',
  dm2: 'square decimetres',
  m2: 'square metres',
  in2: 'square inches',
  ft2: 'square feet',
  mm3: 'cubic millimetres',
  cm3: 'cubic centimetres',
  in3: 'cubic inches',
  g: 'grams',
  kg: 'kilograms',
  oz: 'ounces',
  lb: 'pounds',
  'kg/m3': 'kilograms per cubic metre',
  'g/cm3': 'grams per cubic centimetre',
  'lb/ft3': 'pounds per cubic foot',
  'g/m2': 'grams per square metre',
  'g/dm2': 'grams per square decimetre',
  'oz/ft2': 'ounces per square foot',
  'oz/yd2': 'ounces per square yard',
  'g/m': 'grams per metre',
  'oz/ft': 'ounces per foot',
  'g.mm': 'gram millimetres',
  'oz.in': 'ounce inches',
  'g.mm2': 'gram square millimetres',
  'oz.in2': 'ounce square inches',
  'm/s': 'metres per second',
  'km/h': 'kilometres per hour',
  'ft/s': 'feet per second',
  mph: 'miles per hour',
  deg: 'degrees',
  rad: 'radians',
  MPa: 'megapascals',
  GPa: 'gigapascals',
  psi: 'pounds per square inch',
  ksi: 'thousand pounds per square inch',
  one: '',
  percent: 'per cent',
};

/**
 * The unit in words, plural; empty for plain numbers.
 * @example unitName('oz/ft2') // → 'ounces per square foot'
 */
export function unitName(unit: Unit): string {
  return NAMES[unit];
}
