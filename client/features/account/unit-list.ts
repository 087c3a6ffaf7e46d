import type { ChosenUnits } from '#shared/format/units.ts';
import { INCH_CHOICES } from '#shared/format/units.ts';
import { QUANTITIES, type Quantity } from '#shared/units/quantities.ts';

/** What a reader may choose a unit for, with a figure to see it by, in the quantity's base unit. */
interface UnitRow {
  quantity: Quantity;
  label: string;
  example: number;
}

export const UNIT_ROWS: readonly UnitRow[] = [
  { quantity: 'length', label: 'Lengths and arms', example: 88.9 },
  { quantity: 'mass', label: 'Masses', example: 221.4 },
  { quantity: 'area', label: 'Areas', example: 181_300 },
  { quantity: 'volume', label: 'Volumes', example: 92_080 },
  { quantity: 'loading', label: 'Wing loading', example: 12.2 },
  { quantity: 'moment', label: 'Moments', example: 2_400 },
  { quantity: 'speed', label: 'Speeds', example: 4.4 },
  { quantity: 'density', label: 'Density of wood', example: 112 },
  { quantity: 'airDensity', label: 'Density of air', example: 1.225 },
  { quantity: 'areal', label: 'Covering and sheet by area', example: 12.5 },
  { quantity: 'spread', label: 'Glue by area of joint', example: 60 },
  { quantity: 'modulus', label: 'Stiffness of wood', example: 3.4 },
  { quantity: 'strength', label: 'Strength of wood', example: 19 },
];

export type UnitPreset = 'metric' | 'inch' | 'mixed';

/** Which of the two usual sets somebody's choices are, or a set of their own. */
export function presetOf(chosen: ChosenUnits): UnitPreset {
  const differs = (other: ChosenUnits) =>
    UNIT_ROWS.some(({ quantity }) => unitIn(chosen, quantity) !== unitIn(other, quantity));
  if (!differs({})) return 'metric';
  return differs(INCH_CHOICES) ? 'mixed' : 'inch';
}

/** The choices with one more; what is as usual is not kept. */
export function withUnit(chosen: ChosenUnits, quantity: Quantity, unit: string): ChosenUnits {
  const { [quantity]: _, ...rest } = chosen;
  return unit === QUANTITIES[quantity].shown ? rest : { ...rest, [quantity]: unit };
}

export function unitIn(chosen: ChosenUnits, quantity: Quantity): string {
  return chosen[quantity] ?? QUANTITIES[quantity].shown;
}
