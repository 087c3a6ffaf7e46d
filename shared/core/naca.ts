/**
 * NACA four-digit sections: E. N. Jacobs, K. E. Ward, R. M. Pinkerton, NACA Report 460 (1933). Thickness is laid
 * off square to the camber line and the trailing edge is the report's open one (last coefficient −0.1015).
 */
export interface FourDigits {
  /** greatest camber, of the chord */
  camber: number;
  /** where it lies, of the chord */
  place: number;
  /** greatest thickness, of the chord */
  thickness: number;
}

/**
 * What the digits say: camber in hundredths of the chord, its place in tenths, thickness in hundredths. The plan's
 * schema sees to it that there are four digits.
 * @example fourDigits('4409') // → { camber: 0.04, place: 0.4, thickness: 0.09 }
 */
export function fourDigits(code: string): FourDigits {
  return {
    camber: Number(code[0]) / 100,
    place: Number(code[1]) / 10,
    thickness: Number(code.slice(2, 4)) / 100,
  };
}

/** Half thickness at a station of the camber line, of the chord, by its square root `u` (smooth at the nose). */
function halfThickness(thickness: number, u: number): number {
  const x = u * u;
  return 5 * thickness * (0.2969 * u + x * (-0.126 + x * (-0.3516 + x * (0.2843 - 0.1015 * x))));
}

function camberLine({ camber: m, place: p }: FourDigits, x: number): { z: number; slope: number } {
  if (m === 0 || p === 0) return { z: 0, slope: 0 };
  const fore = x < p;
  const k = fore ? m / (p * p) : m / ((1 - p) * (1 - p));
  return { z: fore ? k * (2 * p * x - x * x) : k * (1 - 2 * p + 2 * p * x - x * x), slope: 2 * k * (p - x) };
}

/** Point of the contour over the camber station u²; `face` +1 the upper, −1 the lower. */
function contourPoint(digits: FourDigits, u: number, face: 1 | -1): { x: number; z: number } {
  const { z, slope } = camberLine(digits, u * u);
  const t = halfThickness(digits.thickness, u);
  const length = Math.hypot(1, slope);
  return { x: u * u - (face * t * slope) / length, z: z + (face * t) / length };
}

/**
 * Ordinate z/c of one face (1 the upper, −1 the lower) on the vertical through x/c, 0 to 1. On a cambered section
 * that vertical meets the contour over another camber station, found by the secant rule in √x, which stays smooth
 * at the nose. The hair's breadth of nose in front of x = 0 (0.03 % of the chord on a 4412) has no ordinate:
 * `nacaNoseArc` measures it.
 * @example nacaOrdinate('0012', 0.3, 1).toFixed(5) // → '0.06002'
 */
export function nacaOrdinate(code: string, x: number, face: 1 | -1): number {
  const digits = fourDigits(code);
  if (digits.camber === 0 || digits.place === 0) return face * halfThickness(digits.thickness, Math.sqrt(x));
  const miss = (u: number) => contourPoint(digits, u, face).x - x;
  // The slope leans the upper face forward and the lower aft; the aft-most root is the contour's outer one.
  let a = Math.sqrt(x) + (face === 1 ? 0.08 : 0);
  let b = Math.max(0, a - 0.02);
  let fa = miss(a);
  let fb = miss(b);
  for (let i = 0; i < 40 && Math.abs(fb) > 1e-15 && fa !== fb; i++) {
    const next = Math.max(0, b - (fb * (b - a)) / (fb - fa));
    [a, fa] = [b, fb];
    b = next;
    fb = miss(b);
    if (a === b) break;
  }
  return contourPoint(digits, b, face).z;
}

/**
 * Developed length, of the chord, of the hair's breadth of nose that a cambered section has in front of x = 0:
 * from the camber line's start round to where the upper face comes back over x = 0. Skins run over it.
 * @example nacaNoseArc('0012') // → 0
 */
export function nacaNoseArc(code: string): number {
  const digits = fourDigits(code);
  if (digits.camber === 0 || digits.place === 0) return 0;
  // Past u = 0 the upper face starts forward; where its x is 0 again, t·sin of the slope equals u².
  let end = 0.02;
  for (let i = 0; i < 60; i++) end = Math.sqrt(Math.max(0, end * end - contourPoint(digits, end, 1).x));
  const steps = 32;
  let arc = 0;
  let previous = contourPoint(digits, 0, 1);
  for (let i = 1; i <= steps; i++) {
    const point = contourPoint(digits, (end * i) / steps, 1);
    arc += Math.hypot(point.x - previous.x, point.z - previous.z);
    previous = point;
  }
  return arc;
}
