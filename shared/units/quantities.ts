import type { Unit } from './units.ts';

/** The units of what is measured. */
interface QuantityDefinition {
  /** unit of the plan, the core and the database */
  base: Unit;
  /** unit on screen for those who work in mm and g */
  shown: Unit;
  /** unit on screen for those who work in inches and ounces */
  inch: Unit;
  /** everything that may be typed or chosen */
  units: readonly Unit[];
}

const AREAL_UNITS = ['g/m2', 'g/dm2', 'oz/ft2', 'oz/yd2'] as const;
const PRESSURE_UNITS = ['MPa', 'GPa', 'psi', 'ksi'] as const;
const SHARE_UNITS = ['percent', 'one'] as const;

/** What is measured: the unit that the plan and the core keep it in, the one shown, and those offered. */
export const QUANTITIES = {
  length: { base: 'mm', shown: 'mm', inch: 'in', units: ['mm', 'cm', 'm', 'in', 'ft'] },
  area: { base: 'mm2', shown: 'dm2', inch: 'in2', units: ['mm2', 'cm2', 'dm2', 'm2', 'in2', 'ft2'] },
  /** area that the result gives in dm² */
  classArea: { base: 'dm2', shown: 'dm2', inch: 'in2', units: ['dm2', 'm2', 'in2', 'ft2'] },
  volume: { base: 'mm3', shown: 'cm3', inch: 'in3', units: ['mm3', 'cm3', 'in3'] },
  mass: { base: 'g', shown: 'g', inch: 'oz', units: ['g', 'kg', 'oz', 'lb'] },
  density: { base: 'kg/m3', shown: 'kg/m3', inch: 'lb/ft3', units: ['kg/m3', 'g/cm3', 'lb/ft3'] },
  airDensity: { base: 'kg/m3', shown: 'kg/m3', inch: 'lb/ft3', units: ['kg/m3', 'lb/ft3'] },
  /** mass of sheet, covering or finish by area */
  areal: { base: 'g/m2', shown: 'g/m2', inch: 'oz/ft2', units: AREAL_UNITS },
  /** dry glue by area of joint */
  spread: { base: 'g/m2', shown: 'g/m2', inch: 'oz/ft2', units: AREAL_UNITS },
  loading: { base: 'g/dm2', shown: 'g/dm2', inch: 'oz/ft2', units: ['g/dm2', 'g/m2', 'oz/ft2'] },
  massPerLength: { base: 'g/m', shown: 'g/m', inch: 'oz/ft', units: ['g/m', 'oz/ft'] },
  moment: { base: 'g.mm', shown: 'g.mm', inch: 'oz.in', units: ['g.mm', 'oz.in'] },
  inertia: { base: 'g.mm2', shown: 'g.mm2', inch: 'oz.in2', units: ['g.mm2', 'oz.in2'] },
  speed: { base: 'm/s', shown: 'm/s', inch: 'ft/s', units: ['m/s', 'km/h', 'ft/s', 'mph'] },
  angle: { base: 'deg', shown: 'deg', inch: 'deg', units: ['deg', 'rad'] },
  modulus: { base: 'GPa', shown: 'GPa', inch: 'ksi', units: PRESSURE_UNITS },
  strength: { base: 'MPa', shown: 'MPa', inch: 'psi', units: PRESSURE_UNITS },
  /** kept in per cent, as in `target.percentMac` */
  percentMac: { base: 'percent', shown: 'percent', inch: 'percent', units: ['percent'] },
  /** share of a whole, kept as a fraction, shown in per cent: lightening, cutout, x/c, share of the mass */
  share: { base: 'one', shown: 'percent', inch: 'percent', units: SHARE_UNITS },
  /** static margin, relative spread and moisture: fractions shown with one more digit than a share */
  fineShare: { base: 'one', shown: 'percent', inch: 'percent', units: SHARE_UNITS },
  /** aspect ratio, load factor, lift coefficient */
  ratio: { base: 'one', shown: 'one', inch: 'one', units: ['one'] },
  reynolds: { base: 'one', shown: 'one', inch: 'one', units: ['one'] },
  count: { base: 'one', shown: 'one', inch: 'one', units: ['one'] },
} as const satisfies Record<string, QuantityDefinition>;

/** Key of what is measured. */
export type Quantity = keyof typeof QUANTITIES;
/** The units that a quantity may be typed and shown in. */
export type UnitOf<Q extends Quantity> = (typeof QUANTITIES)[Q]['units'][number];

/**
 * The unit to show beside a field: inches for one typed in mm, mm for one typed in inches; null where none differs.
 * @example otherUnit('length', 'mm') // → 'in'
 */
export function otherUnit(quantity: Quantity, unit: Unit): Unit | null {
  const { shown, inch } = QUANTITIES[quantity];
  const other = isInchUnit(unit) ? shown : inch;
  return other === unit || shown === inch ? null : other;
}

/**
 * Whether a unit belongs to those who work in inches, ounces and their kin.
 * @example isInchUnit('oz') // → true
 */
export function isInchUnit(unit: Unit): boolean {
  return INCH_UNITS.has(unit);
}

const INCH_UNITS: ReadonlySet<Unit> = new Set<Unit>([
  'in',
  'ft',
  'in2',
  'ft2',
  'in3',
  'oz',
  'lb',
  'lb/ft3',
  'oz/ft2',
  'oz/yd2',
  'oz/ft',
  'oz.in',
  'oz.in2',
  'ft/s',
  'mph',
  'psi',
  'ksi',
]);
