import { covers, halfOf, type Half } from './half.ts';
import { heightsAt } from './fit.ts';
import type { Plan, Skin, Surface, Web } from './plan.ts';
import { areaBetween, wrapArc } from './section-integrals.ts';
import { pairAt, samplesOver, stationAt, surfaceLine, type Station } from './stations.ts';

/** One wall of a closed tube. */
export interface TubeWall {
  /** developed, mm */
  length: number;
  /** mm */
  thickness: number;
  /** shear modulus in its own plane, MPa */
  shear: number;
}

/**
 * Torsional stiffness GJ of a thin-walled closed tube, N·mm²: Bredt's second formula, GJ = 4A²/Σ(s/(G·t)) (R.
 * Bredt, VDI-Zeitschrift 40, 1896). `area` is the one that the walls enclose, mm². Null for a tube that is not
 * closed.
 * @example bredtStiffness(100, [{ length: 40, thickness: 1, shear: 200 }]) // → 200_000
 */
export function bredtStiffness(area: number, walls: readonly TubeWall[]): number | null {
  const give = walls.reduce(
    (sum, { length, thickness, shear }) => sum + (length > 0 ? length / (shear * thickness) : 0),
    0,
  );
  return area > 0 && give > 0 && Number.isFinite(give) ? (4 * area * area) / give : null;
}

/**
 * Shear modulus in the plane of balsa sheet over its modulus along the grain, and the latter over the modulus found
 * in bending: G_LT/E_L and E_L/E of the Wood Handbook (FPL-GTR-190, 2010), Table 5-1, from memory. It is the lowest
 * ratio of the light woods there, so that other woods come out stiffer than told.
 */
const SHEAR_RATIO = 0.037 * 1.1;

/** A skin's edge this near to a web, x/c, is closed by it: skins end on a spar's width. */
const NEAR = 0.03;

/** A nose closed by sheeting and a web, along one stretch of the wing. */
export interface ClosedNose {
  /** mm from the root */
  from: number;
  to: number;
  /** at the inboard end, N·mm² */
  stiffness: number;
  /** twist of the outer end against the inner for a couple of 1 N·mm, radians */
  twistPerCouple: number;
}

interface Cell {
  top: Skin;
  bottom: Skin;
  web: Web;
}

function cellAt({ skins, parts }: Half, s: number): Cell | null {
  const here = skins.filter((skin) => covers(skin, s));
  const webs = parts.filter((part): part is Web => part.kind === 'web' && covers(part, s));
  for (const web of webs) {
    const x = pairAt(web.at, web.from, web.to, s);
    const reaches = (edge: number) => Math.abs(edge - x) <= NEAR;
    const wrap = here.find(({ seat, start, end }) => seat === 'wrap' && reaches(start) && reaches(end));
    if (wrap) return { top: wrap, bottom: wrap, web };
    const face = (seat: 'top' | 'bottom') =>
      here.find((skin) => skin.seat === seat && skin.start <= 0 && reaches(skin.end));
    const [top, bottom] = [face('top'), face('bottom')];
    if (top && bottom) return { top, bottom, web };
  }
  return null;
}

function stiffnessAt(plan: Plan, half: Half, station: Station): number | null {
  const cell = cellAt(half, station.s);
  if (!cell) return null;
  const { section, chord, s } = station;
  const x = pairAt(cell.web.at, cell.web.from, cell.web.to, s);
  const wall = (part: Skin | Web, length: number): TubeWall => ({
    length,
    thickness: part.thickness,
    shear: (plan.materials[part.material]?.modulus ?? 0) * 1000 * SHEAR_RATIO,
  });
  return bredtStiffness(areaBetween(section, 0, x).amount * chord ** 2, [
    wall(cell.top, wrapArc(section, x, 0).amount * chord),
    wall(cell.bottom, (wrapArc(section, x, x).amount - wrapArc(section, x, 0).amount) * chord),
    wall(cell.web, heightsAt(half, station, x).section),
  ]);
}

/**
 * Torsional stiffness of the nose that sheeting and a web close, from the root to the first place where they do
 * not: an extra beside bending, for a rough comparison. Ribs, covering and the rest of the section are left out.
 * Null where no closed nose begins at the root, or a wall's material has no modulus.
 * @example closedNoseOf(EXAMPLE_PLAN, EXAMPLE_WING) // → null
 */
export function closedNoseOf(plan: Plan, wing: Surface): ClosedNose | null {
  const line = surfaceLine(wing);
  const half = halfOf(wing, line, 'starboard', () => undefined);
  const webs = half.parts.filter((part): part is Web => part.kind === 'web');
  const ends = [...half.skins, ...webs].flatMap(({ from, to }) => [from, to]);
  const edges = [...new Set([0, ...ends, line.length])].filter((s) => s >= 0 && s <= line.length);
  edges.sort((a, b) => a - b);
  const rootStiffness = stiffnessAt(plan, half, stationAt(line, 0));
  if (rootStiffness === null) return null;
  let [to, twistPerCouple] = [0, 0];
  for (const edge of edges) {
    const places = samplesOver(line, to, edge).map(({ station, ds }) => ({
      stiffness: stiffnessAt(plan, half, station),
      ds,
    }));
    if (places.some(({ stiffness }) => stiffness === null)) break;
    for (const { stiffness, ds } of places) twistPerCouple += ds / (stiffness ?? Infinity);
    to = edge;
  }
  return to > 0 ? { from: 0, to, stiffness: rootStiffness, twistPerCouple } : null;
}
