import type { Section } from './section.ts';

/** The face of a section that looks up, or down. */
export type FaceName = 'upper' | 'lower';

/** An area or a length with its first moments up to each node of a section of unit chord, from the nose on. */
export interface Running {
  amount: Float64Array;
  x: Float64Array;
  z: Float64Array;
}

const nothing = (n: number): Running => ({
  amount: new Float64Array(n),
  x: new Float64Array(n),
  z: new Float64Array(n),
});

/**
 * Grows a running integral by two intervals up to node i, by the trapezoid rule for each of them (`first`,
 * `second`) and for both in one (`whole`), extrapolated from the two (Richardson).
 */
function grow(into: Float64Array, i: number, first: number, second: number, whole: number): void {
  const correction = (first + second - whole) / 3;
  const before = into[i - 2] ?? 0;
  into[i - 1] = before + first + correction / 2;
  into[i] = before + first + second + correction;
}

/**
 * Area of a section of unit chord up to each of its nodes, ∫ thickness dx, with ∫ x and ∫ z over it. Where the
 * faces have crossed there is no area.
 * @example runningArea(readSection({ flat: 3 }, 100)).amount.at(-1).toFixed(6) // → '0.030000'
 */
export function runningArea({ x, upper, lower }: Section): Running {
  const run = nothing(x.length);
  for (let i = 2; i < x.length; i += 2) {
    const [x0, x1, x2] = [x[i - 2] ?? 0, x[i - 1] ?? 0, x[i] ?? 0];
    const [u0, u1, u2] = [upper[i - 2] ?? 0, upper[i - 1] ?? 0, upper[i] ?? 0];
    const [l0, l1, l2] = [lower[i - 2] ?? 0, lower[i - 1] ?? 0, lower[i] ?? 0];
    const [t0, t1, t2] = [Math.max(0, u0 - l0), Math.max(0, u1 - l1), Math.max(0, u2 - l2)];
    const [a, b, c] = [x1 - x0, x2 - x1, x2 - x0];
    grow(run.amount, i, (a * (t0 + t1)) / 2, (b * (t1 + t2)) / 2, (c * (t0 + t2)) / 2);
    grow(run.x, i, alongX(a, t0, t1, x0, x1), alongX(b, t1, t2, x1, x2), alongX(c, t0, t2, x0, x2));
    grow(run.z, i, upright(a, u0, u1, l0, l1), upright(b, u1, u2, l1, l2), upright(c, u0, u2, l0, l2));
  }
  return run;
}

const alongX = (dx: number, t0: number, t1: number, x0: number, x1: number) =>
  (dx * (t0 * (2 * x0 + x1) + t1 * (x0 + 2 * x1))) / 6;

const upright = (dx: number, u0: number, u1: number, l0: number, l1: number) =>
  (dx * (u0 * u0 + u0 * u1 + u1 * u1 - l0 * l0 - l0 * l1 - l1 * l1)) / 6;

/**
 * Length of a face of a section of unit chord up to each of its nodes, with ∫ x and ∫ z along it.
 * @example runningArc(readSection({ flat: 3 }, 100), 'upper').amount.at(-1) // → 1
 */
export function runningArc(section: Section, face: FaceName): Running {
  const { x, [face]: z } = section;
  const run = nothing(x.length);
  for (let i = 2; i < x.length; i += 2) {
    const [x0, x1, x2] = [x[i - 2] ?? 0, x[i - 1] ?? 0, x[i] ?? 0];
    const [z0, z1, z2] = [z[i - 2] ?? 0, z[i - 1] ?? 0, z[i] ?? 0];
    const [a, b, c] = [chord(x1 - x0, z1 - z0), chord(x2 - x1, z2 - z1), chord(x2 - x0, z2 - z0)];
    grow(run.amount, i, a, b, c);
    grow(run.x, i, (a * (x0 + x1)) / 2, (b * (x1 + x2)) / 2, (c * (x0 + x2)) / 2);
    grow(run.z, i, (a * (z0 + z1)) / 2, (b * (z1 + z2)) / 2, (c * (z0 + z2)) / 2);
  }
  return run;
}

const chord = (dx: number, dz: number) => Math.sqrt(dx ** 2 + dz ** 2);
