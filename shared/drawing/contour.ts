import type { Section } from '#shared/core/section.ts';
import { ordinateAt } from '#shared/core/section-integrals.ts';
import type { FaceName } from '#shared/core/section-running.ts';
import type { Station } from '#shared/core/stations.ts';
import type { Point } from './shape.ts';

/** One face of a section at its size, from x/c `from` to `to` (from < to), mm behind the leading edge and above the chord line. */
export function faceLine(
  { section, chord }: Pick<Station, 'section' | 'chord'>,
  face: FaceName,
  from = 0,
  to = 1,
): Point[] {
  const at = (x: number): Point => [x * chord, ordinateAt(section, face, x) * chord];
  const [a, b] = [Math.max(0, from), Math.min(1, to)];
  const inside = nodesBetween(section, a, b).map(at);
  return [at(a), ...inside, at(b)];
}

/** Nodes of the section strictly between two x/c. */
function nodesBetween({ x }: Section, from: number, to: number): number[] {
  return [...x].filter((node) => node > from + 1e-9 && node < to - 1e-9);
}

/** Whole contour of the section, round from the trailing edge over the top, the nose and the underside. */
export function contourOf(station: Pick<Station, 'section' | 'chord'>): Point[] {
  const upper = faceLine(station, 'upper').reverse();
  const lower = faceLine(station, 'lower');
  return [...upper, ...lower];
}

/** Part of the section between two x/c, as a closed line. */
export function sliceOf(station: Pick<Station, 'section' | 'chord'>, from: number, to: number): Point[] {
  return [...faceLine(station, 'upper', from, to).reverse(), ...faceLine(station, 'lower', from, to)];
}

/**
 * A line moved to its left by `distance`, square to itself at its ends and mitred at its corners. Where it would
 * turn back on itself, as inside a nose sharper than the distance, the part that comes too near is left out.
 */
export function offsetLeft(points: readonly Point[], distance: number): Point[] {
  const line = points.filter((p, i) => i === 0 || length(points[i - 1] ?? p, p) > 1e-9);
  if (distance === 0 || line.length < 2) return [...line];
  const normals = line.slice(1).map((p, i): Point => {
    const before = line[i] ?? p;
    const run = length(before, p);
    return [-(p[1] - before[1]) / run, (p[0] - before[0]) / run];
  });
  const moved = line.map((p, i): Point => {
    const n = normals[i - 1] ?? normals[i] ?? [0, 0];
    const m = normals[i] ?? n;
    const scale = distance / Math.max(0.2, 1 + n[0] * m[0] + n[1] * m[1]);
    return [p[0] + (n[0] + m[0]) * scale, p[1] + (n[1] + m[1]) * scale];
  });
  return turnsBack(line, moved) ? moved.filter((p) => isClear(p, line, Math.abs(distance) * 0.995)) : moved;
}

/** True where some stretch of the moved line runs against its own. */
function turnsBack(line: readonly Point[], moved: readonly Point[]): boolean {
  return line.some((p, i) => {
    const [next, m, n] = [line[i + 1], moved[i], moved[i + 1]];
    if (!next || !m || !n) return false;
    return (next[0] - p[0]) * (n[0] - m[0]) + (next[1] - p[1]) * (n[1] - m[1]) < 0;
  });
}

const length = (a: Point, b: Point) => Math.hypot(b[0] - a[0], b[1] - a[1]);

/** True where a point is at least `distance` from every stretch of a line. */
function isClear(p: Point, line: readonly Point[], distance: number): boolean {
  for (let i = 1; i < line.length; i++) {
    const [a, b] = [line[i - 1] ?? p, line[i] ?? p];
    // Most stretches lie far off to one side, and that is told without a root.
    if (Math.min(a[0], b[0]) - p[0] > distance || p[0] - Math.max(a[0], b[0]) > distance) continue;
    if (distanceTo(p, a, b) < distance) return false;
  }
  return true;
}

/** Distance of a point from the stretch between two others. */
export function distanceTo(p: Point, a: Point, b: Point): number {
  const [dx, dy] = [b[0] - a[0], b[1] - a[1]];
  const square = dx * dx + dy * dy;
  const share = square > 0 ? ((p[0] - a[0]) * dx + (p[1] - a[1]) * dy) / square : 0;
  const f = Math.min(1, Math.max(0, share));
  return Math.hypot(p[0] - a[0] - f * dx, p[1] - a[1] - f * dy);
}
