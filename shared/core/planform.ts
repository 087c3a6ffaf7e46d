import { NOTHING } from './lump.ts';
import type { Surface } from './plan.ts';
import type { Planform } from './result.ts';
import { areaBetween } from './section-integrals.ts';
import { stationAt, surfaceLine, type SurfaceLine } from './stations.ts';

/**
 * Integrals of the chord over a planform, one half. `MAC = ∫c² ds / ∫c ds` (Houghton & Carpenter, Aerodynamics
 * for Engineering Students); on a cranked wing xLE(MAC) is the chord-weighted mean, not the local leading edge.
 */
export interface ChordIntegrals {
  /** ∫c ds, mm² */
  area: number;
  /** ∫c cos(dihedral) ds, mm² */
  projected: number;
  /** ∫c² ds, mm³ */
  square: number;
  /** ∫ xLE c ds, mm³ */
  leadingEdge: number;
  /** ∫ y c ds, mm³ */
  y: number;
}

const nothing = (): ChordIntegrals => ({ area: 0, projected: 0, square: 0, leadingEdge: 0, y: 0 });

/**
 * Sum of the chord integrals of several surfaces or panels; noughts for none.
 * @example addChords([chordIntegrals(EXAMPLE_WING), chordIntegrals(EXAMPLE_WING)]).area // → 100_000
 */
export function addChords(parts: readonly ChordIntegrals[]): ChordIntegrals {
  return parts.reduce(
    (sum, p) => ({
      area: sum.area + p.area,
      projected: sum.projected + p.projected,
      square: sum.square + p.square,
      leadingEdge: sum.leadingEdge + p.leadingEdge,
      y: sum.y + p.y,
    }),
    nothing(),
  );
}

/**
 * ∫f g over a run on which both are linear, f from `f0` to `f1` and g from `g0` to `g1`; exact.
 * @example linearProduct(6, 1, 1, 2, 2) // → 12
 */
export function linearProduct(run: number, f0: number, f1: number, g0: number, g1: number): number {
  return (run * (f0 * (2 * g0 + g1) + f1 * (g0 + 2 * g1))) / 6;
}

/**
 * Chord integrals of one half, exact for each panel and for tip blocks (half ellipses on the last chord). A block
 * on one side only of a mirrored surface counts by half, so that twice the half is the whole.
 * @example chordIntegrals(EXAMPLE_WING) // → { area: 50_000, projected: 50_000, square: 5_000_000, leadingEdge: 0, y: 12_500_000 }
 */
export function chordIntegrals(surface: Surface, line: SurfaceLine = surfaceLine(surface)): ChordIntegrals {
  const panels = line.panels.map((panel): ChordIntegrals => {
    const span = panel.end - panel.start;
    const [c0, c1] = panel.chord;
    const area = (span * (c0 + c1)) / 2;
    return {
      area,
      projected: area * Math.abs(panel.cos),
      square: linearProduct(span, c0, c1, c0, c1),
      leadingEdge: linearProduct(span, c0, c1, ...panel.leadingEdge),
      y: linearProduct(span, c0, c1, panel.y, panel.y + span * panel.cos),
    };
  });
  return addChords([...panels, ...tipChords(surface, line)]);
}

function tipChords(surface: Surface, line: SurfaceLine): ChordIntegrals[] {
  const last = stationAt(line, line.length);
  const section = areaBetween(last.section, 0, 1);
  const middle = section.amount > 0 ? (section.x / section.amount) * last.chord : last.chord / 2;
  const c = last.chord;
  const { cos } = last.panel;
  const y = last.panel.y + (last.panel.end - last.panel.start) * cos;
  return surface.parts.flatMap((part) => {
    if (part.kind !== 'tipBlock' || c <= 0) return [];
    // c·√(1−(s/l)²) shrinks towards the section's centroid: ∫c = π/4·c·l, ∫c² = 2/3·c²·l, ∫c·s = c·l²/3.
    const l = part.length;
    const half = (part.side ?? 'both') === 'both' || !surface.mirrored ? 1 : 0.5;
    const area = (half * Math.PI * c * l) / 4;
    const square = (half * 2 * c * c * l) / 3;
    return [
      {
        area,
        projected: area * Math.abs(cos),
        square,
        leadingEdge: (last.leadingEdge + middle) * area - (middle / c) * square,
        y: y * area + (half * cos * c * l * l) / 3,
      },
    ];
  });
}

/** Span from tip to tip (or of the one half, if not mirrored), projected, the tip blocks of each side in. */
function spanOf(surface: Surface, line: SurfaceLine): number {
  const cos = Math.abs(line.panels.at(-1)?.cos ?? 1);
  const panels = line.panels.reduce((sum, p) => sum + (p.end - p.start) * Math.abs(p.cos), 0);
  const longest = (side: 'port' | 'starboard') =>
    surface.parts.reduce((most, part) => {
      const there =
        part.kind === 'tipBlock' && (part.side ?? 'both') !== (side === 'port' ? 'starboard' : 'port');
      return there ? Math.max(most, part.length) : most;
    }, 0);
  if (!surface.mirrored) return panels + longest('starboard') * cos;
  return 2 * (Math.max(0, surface.apex[1]) + panels) + (longest('port') + longest('starboard')) * cos;
}

/**
 * Mean aerodynamic chord and its place, mm, from chord integrals. The caller sees to it that there is an area.
 * @example meanChord(chordIntegrals(EXAMPLE_WING)) // → { mac: 100, xLeMac: 0, yMac: 250 }
 */
export function meanChord(chords: ChordIntegrals): Pick<Planform, 'mac' | 'xLeMac' | 'yMac'> {
  return {
    mac: chords.square / chords.area,
    xLeMac: chords.leadingEdge / chords.area,
    yMac: chords.y / chords.area,
  };
}

/**
 * Planform figures of a surface, mm and mm², both halves of a mirrored one. The plan's schema sees to it that a
 * surface has a chord, so an area.
 * @example planformOf(EXAMPLE_WING) // → { areaDeveloped: 100_000, areaProjected: 100_000, span: 1000, aspectRatio: 10, mac: 100, xLeMac: 0, yMac: 250 }
 */
export function planformOf(surface: Surface, line: SurfaceLine = surfaceLine(surface)): Planform {
  const chords = chordIntegrals(surface, line);
  const halves = surface.mirrored ? 2 : 1;
  const areaProjected = halves * chords.projected;
  const span = spanOf(surface, line);
  return {
    areaDeveloped: halves * chords.area,
    areaProjected,
    span,
    aspectRatio: areaProjected > NOTHING ? span ** 2 / areaProjected : null,
    ...meanChord(chords),
  };
}

/**
 * Projected area, mm², that a class counts: both halves, and between them the root chord carried through the
 * fuselage to the plane of symmetry.
 * @example classAreaOf({ ...EXAMPLE_WING, apex: [0, 20, 0] }) // → 104_000
 */
export function classAreaOf(surface: Surface, line: SurfaceLine = surfaceLine(surface)): number {
  const { areaProjected } = planformOf(surface, line);
  const root = surface.panels[0]?.rootChord ?? 0;
  const carried = surface.mirrored ? 2 * Math.max(0, surface.apex[1]) * root : 0;
  return areaProjected + carried;
}
