import { GRAVITY } from './frame.ts';
import { NOTHING } from './lump.ts';

/** Square millimetres in a square decimetre. */
const MM2_PER_DM2 = 10_000;

/**
 * Wing loading in g/dm² of a mass in g on an area in mm², or null without an area.
 * @example loadingOf(250, 220_000).toFixed(4) // → '11.3636'
 */
export function loadingOf(massG: number, areaMm2: number): number | null {
  return areaMm2 > NOTHING ? massG / (areaMm2 / MM2_PER_DM2) : null;
}

/** Area in dm² of one in mm². @example squareDecimetres(180_000) // → 18 */
export function squareDecimetres(areaMm2: number): number {
  return areaMm2 / MM2_PER_DM2;
}

/**
 * Speed in m/s of steady flight, lift equal to weight, at a lift coefficient: V = √(2·M·g/(ρ·S·C_L)); the stall
 * speed at C_Lmax. Mass g, area mm², air density kg/m³. Null without mass or area.
 * @example speedAt(120, 120_000, 1.0, 1.225).toFixed(4) // → '4.0014'
 */
export function speedAt(
  massG: number,
  areaMm2: number,
  liftCoefficient: number,
  density: number,
): number | null {
  if (areaMm2 < NOTHING || massG < NOTHING) return null;
  return Math.sqrt((2 * (massG / 1000) * GRAVITY) / (density * (areaMm2 / 1e6) * liftCoefficient));
}
