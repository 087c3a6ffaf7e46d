import type { Vec3 } from './frame.ts';
import { NOTHING } from './lump.ts';

/** A mass, g, at a place, mm; `u` its standard uncertainty, g. */
export interface PlacedMass {
  mass: number;
  at: Vec3;
  u?: number;
}

/**
 * Balance point Σm·r / Σm, mm, or null where there is no mass (FAA-H-8083-1B, Weight and Balance Handbook, ch. 2).
 * @example balancePoint([{ mass: 1, at: [0, 0, 0] }, { mass: 3, at: [40, 0, 0] }]) // → [30, 0, 0]
 */
export function balancePoint(masses: readonly PlacedMass[]): Vec3 | null {
  const total = masses.reduce((sum, m) => sum + m.mass, 0);
  if (total === 0) return null;
  const mean = (axis: 0 | 1 | 2) => masses.reduce((sum, m) => sum + m.mass * m.at[axis], 0) / total;
  return [mean(0), mean(1), mean(2)];
}

/** A mass at its arm with what is not known of either: what the propagation of uncertainty is made of. */
export interface Weighed {
  /** g */
  mass: number;
  /** mm */
  x: number;
  /** standard uncertainty of the mass, g */
  u: number;
  /** standard uncertainty of the arm, mm */
  ux?: number;
  /** masses of one name come from one weighed piece and are wrong together; they add linearly */
  together?: string;
}

/**
 * Standard uncertainty of the balance point, mm, to first order (JCGM 100:2008, 5.1.2): ∂x/∂mᵢ = (xᵢ − x)/M and
 * ∂x/∂xᵢ = mᵢ/M, in quadrature but for masses that move together. Null where there is no mass.
 * @example balanceUncertainty([{ mass: 1, x: -10, u: 0.1 }, { mass: 1, x: 10, u: 0 }]) // → 0.5
 */
export function balanceUncertainty(masses: readonly Weighed[]): number | null {
  const total = masses.reduce((sum, m) => sum + m.mass, 0);
  if (total < NOTHING) return null;
  const x = masses.reduce((sum, m) => sum + m.mass * m.x, 0) / total;
  return rootOfSquares(
    masses.map((m) => ({ value: ((m.x - x) / total) * m.u, together: m.together })),
    masses.map((m) => (m.mass / total) * (m.ux ?? 0)),
  );
}

/**
 * Standard uncertainty of a sum of masses, g: in quadrature, but linear for masses of one name in `together`
 * (JCGM 100:2008, 5.1.2 and 5.2.2).
 * @example massUncertainty([{ u: 3 }, { u: 4 }]) // → 5
 */
export function massUncertainty(masses: readonly { u: number; together?: string }[]): number {
  return rootOfSquares(
    masses.map((m) => ({ value: m.u, together: m.together })),
    [],
  );
}

function rootOfSquares(
  terms: readonly { value: number; together: string | undefined }[],
  others: readonly number[],
): number {
  const joint = new Map<string, number>();
  let square = others.reduce((sum, value) => sum + value * value, 0);
  for (const { value, together } of terms) {
    if (together === undefined) square += value * value;
    else joint.set(together, (joint.get(together) ?? 0) + value);
  }
  for (const value of joint.values()) square += value * value;
  return Math.sqrt(square);
}

/**
 * Place in % of mean aerodynamic chord: 100·(x − xLE)/MAC, all lengths mm from one datum; `mac` above 0.
 * @example percentOfMac(945, 900, 180) // → 25
 */
export function percentOfMac(x: number, xLeMac: number, mac: number): number {
  return (100 * (x - xLeMac)) / mac;
}

/**
 * Place in mm from the datum of a percentage of mean aerodynamic chord: the inverse of `percentOfMac`.
 * @example positionOfPercent(32.5, 900, 180) // → 958.5
 */
export function positionOfPercent(percent: number, xLeMac: number, mac: number): number {
  return xLeMac + (percent / 100) * mac;
}
