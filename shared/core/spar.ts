import { stripZ } from './fit.ts';
import { GRAVITY } from './frame.ts';
import { covers, halfOf, stripAt, type Half } from './half.ts';
import { stripProfile } from './parts/strip.ts';
import type { Plan, PlanMaterial, Strip, Surface } from './plan.ts';
import type { Spar, SparStation } from './result.ts';
import { bendingMoment, spanLoadOf, type SpanLoad } from './span-load.ts';
import { stationAt, type Station, type SurfaceLine } from './stations.ts';

/** A spar strip where a station cuts it. Lengths mm. */
export interface Flange {
  /** mm² */
  area: number;
  /** of its middle above the chord line */
  z: number;
  height: number;
  /** bending modulus, MPa */
  modulus: number;
  /** bending strength, MPa */
  strength: number;
}

/**
 * Composite bending stiffness of strips about their common axis (transformed section, stiffnesses as weights):
 * EI = ΣE·A·((z − z_axis)² + h²/12) in N·mm² and the z of the axis, mm; null where nothing carries.
 * @example bendingStiffness([{ area: 60, z: 0, height: 6, modulus: 1000, strength: 25 }]) // → { stiffness: 180_000, axis: 0 }
 */
export function bendingStiffness(flanges: readonly Flange[]): { stiffness: number; axis: number } | null {
  const weight = flanges.reduce((sum, f) => sum + f.modulus * f.area, 0);
  if (weight <= 0) return null;
  const axis = flanges.reduce((sum, f) => sum + f.modulus * f.area * f.z, 0) / weight;
  const stiffness = flanges.reduce(
    (sum, f) => sum + f.modulus * f.area * ((f.z - axis) ** 2 + f.height ** 2 / 12),
    0,
  );
  return stiffness > 0 ? { stiffness, axis } : null;
}

/**
 * The flange that is nearest to its strength under a moment (N·mm): its outer-fibre stress M·E·e/EI, MPa, and its
 * margin, strength over stress. Null where nothing carries, or where there is no moment to carry.
 * @example worstFlange([{ area: 60, z: 0, height: 6, modulus: 1000, strength: 25 }], 600) // → { stress: 10, margin: 2.5 }
 */
export function worstFlange(
  flanges: readonly Flange[],
  moment: number,
): { stress: number; margin: number } | null {
  const worst = worstOf(flanges, moment);
  return worst && { stress: worst.stress, margin: worst.margin };
}

/**
 * The same with the flange itself, so that it can be named.
 * @example worstOf([{ area: 60, z: 0, height: 6, modulus: 1000, strength: 25 }], 600)?.flange.height // → 6
 */
export function worstOf<F extends Flange>(
  flanges: readonly F[],
  moment: number,
): { stress: number; margin: number; flange: F } | null {
  const section = bendingStiffness(flanges);
  if (!section || moment <= 0) return null;
  return flanges.reduce<{ stress: number; margin: number; flange: F } | null>((worst, flange) => {
    const arm = Math.abs(flange.z - section.axis) + flange.height / 2;
    const stress = (moment * flange.modulus * arm) / section.stiffness;
    if (stress <= 0) return worst;
    const margin = flange.strength / stress;
    return worst && worst.margin <= margin ? worst : { stress, margin, flange };
  }, null);
}

/** Places along the half span that are looked at, root and tip included. */
const STATIONS = 21;

function isSeated({ seat }: Strip): boolean {
  return seat === 'top' || seat === 'bottom';
}

/**
 * True of a strip that is reckoned to carry bending: seated `top` or `bottom`, of a material whose modulus and
 * strength the plan knows.
 * @example carries(EXAMPLE_SPAR, EXAMPLE_PLAN.materials['balsa']) // → true
 */
export function carries(strip: Strip, material: PlanMaterial | undefined): boolean {
  return isSeated(strip) && material?.modulus !== undefined && material.strength !== undefined;
}

/** A top or bottom strip where a station cuts it, whatever it is made of. Lengths mm, area mm². */
type Seated = Pick<Flange, 'area' | 'z' | 'height'> & { part: string; strip: Strip };

function seatedAt(half: Half, station: Station): Seated[] {
  return half.strips.flatMap((strip) => {
    if (!covers(strip, station.s) || !isSeated(strip)) return [];
    const place = stripAt(strip, station);
    const { area } = stripProfile(strip.profile, place.width, place.height, strip.wall);
    if (area <= 0) return [];
    return [{ part: strip.id, strip, area, z: stripZ(half, strip, station, place), height: place.height }];
  });
}

function flangesOf(
  seated: readonly Seated[],
  materialOf: (strip: Strip) => PlanMaterial | undefined,
): (Flange & { part: string })[] {
  return seated.flatMap(({ part, strip, area, z, height }) => {
    const material = materialOf(strip);
    if (!carries(strip, material)) return [];
    const [modulus, strength] = [(material?.modulus ?? 0) * 1000, material?.strength ?? 0];
    return [{ part, area, z, height, modulus, strength }];
  });
}

/**
 * The strips that carry bending where a station cuts them, each with its part's id.
 * @example flangesAt(EXAMPLE_PLAN, EXAMPLE_HALF, EXAMPLE_STATION)[0].part // → 'spar'
 */
export function flangesAt(plan: Plan, half: Half, station: Station): (Flange & { part: string })[] {
  return flangesOf(seatedAt(half, station), ({ material }) => plan.materials[material]);
}

/** Distance of a station from the root along the projected span, mm. @example projected(EXAMPLE_LINE, 120) // → 120 */
export function projected(line: SurfaceLine, s: number): number {
  return line.panels.reduce((sum, p) => sum + Math.max(0, Math.min(s, p.end) - p.start) * Math.abs(p.cos), 0);
}

/** A wing's bending as far as it depends neither on what the strips are made of nor on the mass carried. */
export interface SparFrame {
  load: SpanLoad | null;
  /** N for each g carried, on the half span */
  forcePerGram: number;
  stations: { s: number; y: number; seated: Seated[] }[];
}

/**
 * The wing's spars cut at their stations, for `sparIn` to tell what they bear in one wood or another.
 * @example sparFrame(EXAMPLE_PLAN, EXAMPLE_WING, EXAMPLE_LINE).stations.length // → 21
 */
export function sparFrame(plan: Plan, wing: Surface, line: SurfaceLine): SparFrame {
  const load = spanLoadOf(wing, line);
  const half = halfOf(wing, line, 'starboard', () => {});
  const share = wing.mirrored ? 0.5 : 1;
  return {
    load,
    forcePerGram: (share / 1000) * GRAVITY * (plan.flight?.loadFactor ?? 1),
    stations: Array.from({ length: load ? STATIONS : 0 }, (_, i) => {
      const s = (line.length * i) / (STATIONS - 1);
      return { s, y: projected(line, s), seated: seatedAt(half, stationAt(line, s)) };
    }),
  };
}

/**
 * Bending of a wing cut at its stations, its strips of the materials that `materialOf` names, under `carriedG` g;
 * figures as of `sparOf`.
 * @example sparIn(sparFrame(EXAMPLE_PLAN, EXAMPLE_WING, EXAMPLE_LINE), () => EXAMPLE_PLAN.materials['balsa'], 10).worst // → 0
 */
export function sparIn(
  { load, forcePerGram, stations }: SparFrame,
  materialOf: (strip: Strip) => PlanMaterial | undefined,
  carriedG: number,
): Spar {
  if (!load || carriedG <= 0) return { stations: [], worst: null };
  const borne = stations.flatMap(({ s, y, seated }): SparStation[] => {
    const moment = bendingMoment(load, forcePerGram * carriedG, y);
    const worst = worstFlange(flangesOf(seated, materialOf), moment);
    return worst ? [{ s, moment, ...worst }] : [];
  });
  const least = borne.reduce<SparStation | null>((a, b) => (a && a.margin <= b.margin ? a : b), null);
  return { stations: borne, worst: least?.s ?? null };
}

/**
 * Bending along the half span of a wing: load by Schrenk for `carriedG`, the model's mass less the wing's own, g,
 * times the plan's load factor (1 where none is asked for). Top and bottom strips carry as far as the plan knows
 * modulus and strength of their material; without any, or without a load, there are no stations. `moment` in N·mm,
 * `stress` in MPa, `margin` = strength over stress; `worst` is the station, mm from the root, with the least
 * margin. Strengths are averages by density: an estimate, and no licence to launch hard.
 * @example sparOf(EXAMPLE_PLAN, EXAMPLE_WING, EXAMPLE_LINE, 10).worst // → 0
 */
export function sparOf(plan: Plan, wing: Surface, line: SurfaceLine, carriedG: number): Spar {
  return sparIn(sparFrame(plan, wing, line), ({ material }) => plan.materials[material], carriedG);
}
