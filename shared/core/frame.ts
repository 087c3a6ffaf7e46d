/**
 * The frame that every function of the core refers to.
 *
 * Body axes, datum at the wing's root leading edge on the plane of symmetry unless the plan says otherwise:
 * **x grows aft, y to starboard, z up**. An arm forward of the datum is negative. Lengths are mm, masses g,
 * angles degrees in the plan and radians inside, density kg/m³, areal mass g/m². A surface is given for its
 * starboard half; `mirrored` makes the port half. Stations `s` run along a surface from its root, mm, over all
 * its panels.
 */
export type Vec3 = [x: number, y: number, z: number];

/** Standard gravity, m/s² (exact; 3rd CGPM 1901, quoted in NIST SP 811). */
export const GRAVITY = 9.80665;

/** Angle in radians of one in degrees. @example radians(180) // → 3.141592653589793 */
export function radians(degrees: number): number {
  return (degrees * Math.PI) / 180;
}

/**
 * Cosine of an angle in degrees, exactly 0 at ±90, so that an upright fin has no projected area.
 * @example cosDegrees(90) // → 0
 */
export function cosDegrees(degrees: number): number {
  return Math.abs(degrees % 180) === 90 ? 0 : Math.cos(radians(degrees));
}

/**
 * Grams of a volume in mm³ at a density in kg/m³ (1 kg/m³ = 1e-6 g/mm³).
 * @example gramsOfVolume(1_000_000, 112) // → 112
 */
export function gramsOfVolume(volumeMm3: number, densityKgM3: number): number {
  return volumeMm3 * densityKgM3 * 1e-6;
}

/**
 * Grams of an area in mm² at an areal mass in g/m².
 * @example gramsOfArea(1_000_000, 12.5) // → 12.5
 */
export function gramsOfArea(areaMm2: number, arealGM2: number): number {
  return areaMm2 * arealGM2 * 1e-6;
}
