import type { SectionSpec, Surface } from '#shared/core/plan.ts';
import { heightOf, type FaceName } from './contour.ts';

/** What a surface's starboard half looks like at one station. mm, radians. */
export interface Place {
  chord: number;
  nose: number;
  y: number;
  z: number;
  dihedral: number;
  /** 0 at the panel's root, 1 at its tip */
  blend: number;
  root: SectionSpec;
  tip: SectionSpec;
}

export const NEAR = 1e-9;
const ARC_STEPS = 80;

export function tipOf(surface: Surface): number {
  return surface.panels.reduce((sum, panel) => sum + panel.span, 0);
}

export const cosine = (radians: number) => (Math.abs(Math.cos(radians)) < 1e-12 ? 0 : Math.cos(radians));

export function placeAt(surface: Surface, s: number): Place {
  let [nose, y, z] = surface.apex;
  let inner = 0;
  for (const [i, panel] of surface.panels.entries()) {
    const dihedral = (panel.dihedral * Math.PI) / 180;
    if (s <= inner + panel.span + NEAR || i === surface.panels.length - 1) {
      const along = s - inner;
      const blend = along / panel.span;
      return {
        chord: panel.rootChord + (panel.tipChord - panel.rootChord) * blend,
        nose: nose + panel.sweep * blend,
        y: y + along * cosine(dihedral),
        z: z + along * Math.sin(dihedral),
        dihedral,
        blend,
        root: panel.rootSection,
        tip: panel.tipSection,
      };
    }
    inner += panel.span;
    nose += panel.sweep;
    y += panel.span * cosine(dihedral);
    z += panel.span * Math.sin(dihedral);
  }
  throw new Error('A surface has at least one panel.');
}

/** Height of a face over the chord line, mm, the two sections of the panel blended. */
export function rise(place: Place, face: FaceName, share: number): number {
  const root = heightOf(place.root, face, share, place.chord);
  if (place.blend === 0) return root;
  const tip = heightOf(place.tip, face, share, place.chord);
  return root + (tip - root) * place.blend;
}

export const depth = (place: Place, share: number) =>
  rise(place, 'top', share) - rise(place, 'bottom', share);
export const middle = (place: Place, share: number) =>
  (rise(place, 'top', share) + rise(place, 'bottom', share)) / 2;

/** A short piece of a face: its length, and its middle, x behind the nose and rise over the chord line. mm */
export interface Bit {
  length: number;
  x: number;
  rise: number;
}

/** A face between two shares of the chord, in short straight pieces. */
export function walk(
  place: Place,
  face: FaceName,
  start: number,
  end: number,
  visit: (bit: Bit) => void,
): void {
  const from = Math.max(0, start);
  const to = Math.min(1, end);
  if (to <= from) return;
  let x0 = from * place.chord;
  let z0 = rise(place, face, from);
  for (let k = 1; k <= ARC_STEPS; k++) {
    const share = from + ((to - from) * (1 - Math.cos((Math.PI * k) / ARC_STEPS))) / 2;
    const x1 = share * place.chord;
    const z1 = rise(place, face, share);
    const length = Math.hypot(x1 - x0, z1 - z0);
    visit({ length, x: (x0 + x1) / 2, rise: (z0 + z1) / 2 });
    x0 = x1;
    z0 = z1;
  }
}
