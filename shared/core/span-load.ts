import type { Surface } from './plan.ts';
import { chordIntegrals, linearProduct } from './planform.ts';
import type { SurfaceLine } from './stations.ts';

/**
 * Lift along one half of a wing by O. Schrenk (NACA TM 948, 1940): the mean of the real chord and the ellipse of
 * equal area. Twist and aspect ratio are left out, as in the memorandum. Lengths along the projected span.
 */
export interface SpanLoad {
  /** root to tip, tip block in, projected, mm */
  semiSpan: number;
  /** projected area of the half, mm² */
  area: number;
  /** chord panels: projected place of their ends and the chords there */
  panels: { from: number; to: number; chord: [number, number] }[];
  /** half-elliptical tip: its first station, chord and length, projected; length 0 without one */
  tip: { from: number; chord: number; length: number };
}

/**
 * The half's planform as the load sees it; null for a wing that casts no shadow.
 * @example spanLoadOf(EXAMPLE_WING, EXAMPLE_LINE).semiSpan // → 500
 */
export function spanLoadOf(surface: Surface, line: SurfaceLine): SpanLoad | null {
  let at = 0;
  const panels = line.panels.map((panel) => {
    const from = at;
    at += (panel.end - panel.start) * Math.abs(panel.cos);
    return { from, to: at, chord: panel.chord };
  });
  const last = line.panels.at(-1);
  const longest = surface.parts.reduce(
    (most, p) => (p.kind === 'tipBlock' ? Math.max(most, p.length) : most),
    0,
  );
  const tip = { from: at, chord: last?.chord[1] ?? 0, length: longest * Math.abs(last?.cos ?? 1) };
  const area = chordIntegrals(surface, line).projected;
  const semiSpan = at + tip.length;
  return semiSpan > 1e-6 && area > 1e-6 ? { semiSpan, area, panels, tip } : null;
}

/**
 * Moment of an elliptic load about a station, as a share of that about the root (η = y/semi-span).
 * @example ellipticMoment(0.5).toFixed(6) // → '0.188880'
 */
export function ellipticMoment(eta: number): number {
  const root = Math.sqrt(Math.max(0, 1 - eta * eta));
  return root ** 3 - ((3 * eta) / 2) * (Math.PI / 2 - Math.asin(Math.min(1, eta)) - eta * root);
}

/**
 * Local lift per length over its mean, Schrenk: ½[c/c̄ + (4/π)√(1 − η²)].
 * @example schrenkLoad(4 / 3, 0).toFixed(6) // → '1.303286'
 */
export function schrenkLoad(chordOverMean: number, eta: number): number {
  return (chordOverMean + (4 / Math.PI) * Math.sqrt(Math.max(0, 1 - eta * eta))) / 2;
}

/** First moment of the chord outboard of `y` about `y`, mm³. */
function chordMoment({ panels, tip }: SpanLoad, y: number): number {
  const inPanels = panels.reduce((sum, { from, to, chord }) => {
    const start = Math.max(from, y);
    if (to <= start) return sum;
    const slope = (chord[1] - chord[0]) / (to - from);
    const chordAtStart = chord[0] + slope * (start - from);
    return sum + linearProduct(to - start, chordAtStart, chord[1], start - y, to - y);
  }, 0);
  if (tip.length <= 0) return inPanels;
  const inTip =
    y <= tip.from
      ? (Math.PI / 4) * tip.chord * tip.length * (tip.from - y + (4 * tip.length) / (3 * Math.PI))
      : ((tip.chord * tip.length ** 2) / 3) * ellipticMoment((y - tip.from) / tip.length);
  return inPanels + inTip;
}

/**
 * Bending moment at `y` mm from the root, projected, for a force on the half, N: N·mm. Half of the load goes with
 * the chord, half with the ellipse. Never negative.
 * @example bendingMoment(spanLoadOf(EXAMPLE_WING, EXAMPLE_LINE), 1, 0).toFixed(4) // → '231.1033'
 */
export function bendingMoment(load: SpanLoad, force: number, y: number): number {
  const byChord = (force / load.area) * chordMoment(load, y);
  const byEllipse = ((force * load.semiSpan * 4) / (3 * Math.PI)) * ellipticMoment(y / load.semiSpan);
  return Math.max(0, (byChord + byEllipse) / 2);
}
