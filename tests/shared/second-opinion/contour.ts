import type { SectionSpec } from '#shared/core/plan.ts';

/** A section as two dense polylines from the nose to the trailing edge, x/c and z/c. */
export type FaceName = 'top' | 'bottom';
interface Line {
  x: number[];
  z: number[];
}
type Contour = Record<FaceName, Line>;

export const FACES: readonly FaceName[] = ['top', 'bottom'];
const DOTS = 3000;
const drawn = new Map<SectionSpec | string, Contour>();

/** Height of a face over the chord line, mm, at a share of the chord. */
export function heightOf(spec: SectionSpec, face: FaceName, share: number, chord: number): number {
  if ('flat' in spec) return (face === 'top' ? spec.flat : -spec.flat) / 2;
  const key = 'naca' in spec ? spec.naca : spec;
  let contour = drawn.get(key);
  if (!contour) {
    contour = 'naca' in spec ? drawFourDigits(spec.naca) : drawPoints(spec.points);
    drawn.set(key, contour);
  }
  return chord * read(contour[face], share);
}

/** Thickness laid off square to the camber line, NACA Report 460, open trailing edge. */
function drawFourDigits(digits: string): Contour {
  const m = Number(digits[0]) / 100;
  const p = Number(digits[1]) / 10;
  const t = Number(digits.slice(2)) / 100;
  const top: [number, number][] = [];
  const bottom: [number, number][] = [];
  for (let k = 0; k <= DOTS; k++) {
    const x = (1 - Math.cos((Math.PI * k) / DOTS)) / 2;
    const half =
      5 * t * (0.2969 * Math.sqrt(x) - 0.126 * x - 0.3516 * x ** 2 + 0.2843 * x ** 3 - 0.1015 * x ** 4);
    const fore = x < p;
    const bow = fore ? m / p ** 2 : m / (1 - p) ** 2;
    const camber = m === 0 ? 0 : bow * ((fore ? 0 : 1 - 2 * p) + 2 * p * x - x ** 2);
    const lean = m === 0 ? 0 : Math.atan(2 * bow * (p - x));
    top.push([x - half * Math.sin(lean), camber + half * Math.cos(lean)]);
    bottom.push([x + half * Math.sin(lean), camber - half * Math.cos(lean)]);
  }
  return { top: forward(top), bottom: forward(bottom) };
}

function drawPoints(points: [number, number][]): Contour {
  let nose = 0;
  points.forEach(([x], i) => {
    if (x < (points[nose]?.[0] ?? 0)) nose = i;
  });
  return { top: forward(points.slice(0, nose + 1).reverse()), bottom: forward(points.slice(nose)) };
}

/** From the nose point on, keeps what lies aft of it and of all before: a cambered nose bulges ahead of x = 0. */
function forward(dots: [number, number][]): Line {
  const [first, ...others] = dots;
  const line: Line = { x: [first?.[0] ?? 0], z: [first?.[1] ?? 0] };
  for (const [x, z] of others) {
    if (x <= (line.x.at(-1) ?? 0)) continue;
    line.x.push(x);
    line.z.push(z);
  }
  return line;
}

/** Straight between two dots; beyond the last one, along the last two. */
function read({ x, z }: Line, share: number): number {
  let low = 0;
  let high = x.length - 1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if ((x[middle] ?? 0) <= share) low = middle;
    else high = middle;
  }
  const [x0 = 0, x1 = 0, z0 = 0, z1 = 0] = [x[low], x[high], z[low], z[high]];
  return z0 + ((z1 - z0) * (Math.max(share, x[0] ?? 0) - x0)) / (x1 - x0);
}
