import { GRAVITY } from './frame.ts';
import { halfOf } from './half.ts';
import type { Plan, Surface } from './plan.ts';
import { bendingMoment, spanLoadOf } from './span-load.ts';
import { bendingStiffness, carries, flangesAt, projected, worstOf } from './spar.ts';
import { samplesOver, stationAt, surfaceLine } from './stations.ts';

/** How a spar gives way under its load. */
export interface SparBend {
  /** how far the tip rises at load factor 1, mm; in proportion to the load factor while it is small */
  tip: number;
  /** bending stiffness at the root, N·mm² */
  rootStiffness: number;
  /** outermost station at which a strip carries, mm from the root; beyond it the wing is taken as straight */
  reach: number;
}

/**
 * Rise of a beam's free end from the curvature along it: δ = ∫κ·(L − y) ds, small angles. `curvature` in 1/mm at a
 * place `lever` mm from the end, holding over `ds` mm.
 * @example endRise([{ curvature: 0.001, lever: 50, ds: 100 }]) // → 5
 */
export function endRise(places: readonly { curvature: number; lever: number; ds: number }[]): number {
  return places.reduce((sum, { curvature, lever, ds }) => sum + curvature * lever * ds, 0);
}

/**
 * How the wing's spar bends at load factor 1 under the mass beside the wing, `carriedG` in g, shared as in
 * `sparOf`: curvature M/EI of the strips that carry, clamped at the root, shear and sheeting left out. Null where
 * there is no load, or where no strip carries somewhere between the root and the outermost that does.
 * @example bendOf(EXAMPLE_PLAN, EXAMPLE_WING, 10)?.reach // → 500
 */
export function bendOf(plan: Plan, wing: Surface, carriedG: number): SparBend | null {
  const line = surfaceLine(wing);
  const load = spanLoadOf(wing, line);
  if (!load || carriedG <= 0) return null;
  const half = halfOf(wing, line, 'starboard', () => undefined);
  const strips = half.strips.filter((strip) => carries(strip, plan.materials[strip.material]));
  const reach = Math.min(line.length, Math.max(0, ...strips.map(({ to }) => to)));
  const force = ((wing.mirrored ? 0.5 : 1) * carriedG * GRAVITY) / 1000;
  const breaks = [...strips.flatMap(({ from, to }) => [from, to]), ...half.skinEnds];
  const places = samplesOver(line, 0, reach, breaks).map(({ station, ds }) => {
    const y = projected(line, station.s);
    const stiffness = bendingStiffness(flangesAt(plan, half, station))?.stiffness ?? 0;
    return { curvature: bendingMoment(load, force, y) / stiffness, lever: load.semiSpan - y, ds };
  });
  const rootStiffness = bendingStiffness(flangesAt(plan, half, stationAt(line, 0)))?.stiffness;
  const tip = endRise(places);
  return rootStiffness && Number.isFinite(tip) && places.length > 0 ? { tip, rootStiffness, reach } : null;
}

/**
 * Id of the line of the strip that is nearest to its strength at a station, mm from the root, such as
 * `wing/spar-top`; null where none carries there. It does not hang on the load: all stresses grow together.
 * @example nearestToStrength(EXAMPLE_PLAN, EXAMPLE_WING, 0) // → 'wing/spar'
 */
export function nearestToStrength(plan: Plan, wing: Surface, s: number): string | null {
  const line = surfaceLine(wing);
  const half = halfOf(wing, line, 'starboard', () => undefined);
  const worst = worstOf(flangesAt(plan, half, stationAt(line, s)), 1);
  return worst && `${wing.key}/${worst.flange.part}`;
}
