import type { Surface } from '#shared/core/plan.ts';
import type { Planform } from '#shared/core/result.ts';
import { halvesOf, tipBlockOf, type Half } from './half.ts';
import { cosine, placeAt } from './place.ts';
import { sectionCentroid } from './sheets.ts';
import { slicesOf, tipSlices } from './slices.ts';

/** Planform of a surface as sums over its slices; of several, all of them together, as wide as the widest. */
export function slicePlanform(...surfaces: Surface[]): Planform {
  const sum = { area: 0, shadow: 0, square: 0, nose: 0, y: 0 };
  const add = (chord: number, nose: number, y: number, ds: number, cos: number) => {
    sum.area += chord * ds;
    sum.shadow += chord * ds * cos;
    sum.square += chord ** 2 * ds;
    sum.nose += nose * chord * ds;
    sum.y += y * chord * ds;
  };
  const spans = surfaces.map((surface) =>
    halvesOf(surface).reduce((span, half) => span + sliceHalf(half, add), 0),
  );
  const span = Math.max(...spans);
  return {
    areaDeveloped: sum.area,
    areaProjected: sum.shadow,
    span,
    aspectRatio: sum.shadow === 0 ? null : span ** 2 / sum.shadow,
    mac: sum.square / sum.area,
    xLeMac: sum.nose / sum.area,
    yMac: sum.y / sum.area,
  };
}

type Add = (chord: number, nose: number, y: number, ds: number, cos: number) => void;

/** Adds the slices of one half and tells how far it reaches, projected, from the plane of symmetry or its root. */
function sliceHalf(half: Half, add: Add): number {
  for (const { ds, place } of slicesOf(half, { from: 0, to: half.tip })) {
    add(place.chord, place.nose, place.y, ds, cosine(place.dihedral));
  }
  const place = placeAt(half.surface, half.tip);
  const cos = cosine(place.dihedral);
  const root = half.surface.mirrored ? 0 : half.surface.apex[1];
  const block = tipBlockOf(half);
  if (!block) return place.y - root;
  const { x } = sectionCentroid(half);
  for (const { beyond, ds, scale } of tipSlices(block.length)) {
    add(place.chord * scale, place.nose + x * (1 - scale), place.y + beyond * cos, ds, cos);
  }
  return place.y - root + block.length * cos;
}

/** mm² of a surface for a class: its shadow, carried through the fuselage at the root chord. */
export function classArea(surface: Surface, planform: Planform): number {
  const gap = surface.mirrored ? 2 * Math.abs(surface.apex[1]) : 0;
  return planform.areaProjected + gap * (surface.panels[0]?.rootChord ?? 0);
}

/** Helmbold's lift slope, per radian. */
const slope = (aspectRatio: number) => (2 * Math.PI * aspectRatio) / (2 + Math.sqrt(aspectRatio ** 2 + 4));

/** Neutral point of wing and tail together, mm from the datum; null where one of them has no shadow. */
export function neutralPoint(wing: Planform | undefined, tail: Planform | undefined): number | null {
  if (!wing?.aspectRatio || !tail?.aspectRatio) return null;
  const quarterOf = (p: Planform) => (p.xLeMac + p.mac / 4 - wing.xLeMac) / wing.mac;
  const [wingSlope, tailSlope] = [slope(wing.aspectRatio), slope(tail.aspectRatio)];
  const downwash = (2 * wingSlope) / (Math.PI * wing.aspectRatio);
  const k = 0.9 * (tail.areaProjected / wing.areaProjected) * (tailSlope / wingSlope) * (1 - downwash);
  return wing.xLeMac + (wing.mac * (quarterOf(wing) + k * quarterOf(tail))) / (1 + k);
}
