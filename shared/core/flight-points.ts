import { neutralPoint } from './aero.ts';
import { addChords, chordIntegrals, meanChord, type ChordIntegrals } from './planform.ts';
import { NOTHING } from './lump.ts';
import type { Surface, SurfaceRole } from './plan.ts';
import type { Planform } from './result.ts';
import type { SurfaceLine } from './stations.ts';

/** What balance and flight need of all wings and all tailplanes together. */
export interface Lifts {
  /** mm², projected */
  wingArea: number;
  /** mean aerodynamic chord, mm */
  mac: number;
  /** its leading edge, mm aft of the datum */
  xLeMac: number;
  /** mm aft of the datum; null where there is no tailplane */
  neutralPoint: number | null;
}

interface Laid {
  surface: Surface;
  line: SurfaceLine;
  planform: Planform;
}

/**
 * Area, mean chord and neutral point of all wings and all tailplanes together; null without a wing, or where the
 * wing casts no shadow.
 * @example liftsOf([{ surface: EXAMPLE_WING, line: EXAMPLE_LINE, planform: planformOf(EXAMPLE_WING) }]) // → { wingArea: 100_000, mac: 100, xLeMac: 0, neutralPoint: null }
 */
export function liftsOf(laid: readonly Laid[]): Lifts | null {
  const wing = together(laid, 'wing');
  if (!wing) return null;
  const tail = together(laid, 'tailplane');
  const { mac, xLeMac, area: wingArea } = wing;
  if (!tail) return { wingArea, mac, xLeMac, neutralPoint: null };
  const h = neutralPoint({
    wingArea,
    tailArea: tail.area,
    wingAspectRatio: wing.span ** 2 / wingArea,
    tailAspectRatio: tail.span ** 2 / tail.area,
    tailPlace: (tail.xLeMac + tail.mac / 4 - xLeMac) / mac,
  });
  return { wingArea, mac, xLeMac, neutralPoint: xLeMac + h * mac };
}

/** Surfaces of one role as one: areas and moments add, the span is the widest. */
function together(laid: readonly Laid[], role: SurfaceRole) {
  const of = laid.filter(({ surface }) => surface.role === role);
  const chords: ChordIntegrals = addChords(
    of.flatMap(({ surface, line }) => {
      const half = chordIntegrals(surface, line);
      return surface.mirrored ? [half, half] : [half];
    }),
  );
  if (chords.projected < NOTHING) return null;
  const span = Math.max(...of.map(({ planform }) => planform.span));
  return { area: chords.projected, span, ...meanChord(chords) };
}
