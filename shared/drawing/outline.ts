import type { Plan, Surface } from '#shared/core/plan.ts';
import { areaBetween } from '#shared/core/section-integrals.ts';
import { stationAt, surfaceLine, type Station, type SurfaceLine } from '#shared/core/stations.ts';
import { frameOf, type Frame, type SideName } from './frames.ts';
import type { Point } from './shape.ts';

/** Steps of a quarter turn in which a tip's half ellipse is drawn. */
export const TIP_STEPS = 24;
const COARSE_TIP_STEPS = 8;

/**
 * The half ellipse of a tip block beyond the last station: chord c·√(1 − (s/length)²), shrinking towards the
 * section's centroid. From the leading edge at the last station round to the trailing edge.
 */
export function tipCurve(last: Station, length: number, frame: Frame, steps = TIP_STEPS): Point[] {
  const section = areaBetween(last.section, 0, 1);
  const middle = (section.amount > 0 ? section.x / section.amount : 0.5) * last.chord;
  const at = (angle: number, edge: number) =>
    frame(last, middle + (edge - middle) * Math.cos(angle), 0, length * Math.sin(angle));
  const angles = Array.from({ length: steps + 1 }, (_, i) => (i * Math.PI) / 2 / steps);
  const leading = angles.map((angle) => at(angle, 0));
  const trailing = angles.slice(0, -1).map((angle) => at(angle, last.chord));
  return [...leading, ...trailing.reverse()];
}

/** Length of the longest tip block on one side of a surface; 0 where there is none. */
export function tipLength(surface: Surface, side: SideName): number {
  return surface.parts.reduce((longest, part) => {
    const here = part.kind === 'tipBlock' && ((part.side ?? 'both') === 'both' || part.side === side);
    return here ? Math.max(longest, part.length) : longest;
  }, 0);
}

/** Planform of one half, tip block in: root, out along the leading edge, back along the trailing edge. */
export function halfOutline(line: SurfaceLine, tip: number, frame: Frame, steps = TIP_STEPS): Point[] {
  const leading: Point[] = [];
  const trailing: Point[] = [];
  for (const panel of line.panels) {
    for (const s of [panel.start, panel.end]) {
      const station = stationAt(line, s, panel);
      leading.push(frame(station, 0));
      trailing.push(frame(station, station.chord));
    }
  }
  const last = stationAt(line, line.length);
  const round = tip > 0 && last.chord > 0 ? tipCurve(last, tip, frame, steps).slice(1, -1) : [];
  return [...leading, ...round, ...trailing.reverse()].filter(isNew);
}

const isNew = (point: Point, i: number, points: Point[]) => {
  const before = points[i - 1];
  return !before || before[0] !== point[0] || before[1] !== point[1];
};

/** Hundredths of a mm are finer than any picture of a whole wing. */
const hundredths = (value: number) => Math.round(value * 100) / 100;

/**
 * Outline of the first wing's starboard half seen from above, mm, x aft and y to starboard: out along the leading
 * edge, round the tip, back along the trailing edge. Empty where there is no wing. For small pictures.
 */
export function planOutline(plan: Plan): [x: number, y: number][] {
  const wing = plan.surfaces.find((surface) => surface.role === 'wing');
  if (!wing) return [];
  const outline = halfOutline(
    surfaceLine(wing),
    tipLength(wing, 'starboard'),
    frameOf('above'),
    COARSE_TIP_STEPS,
  );
  return outline.map(([x, y]) => [hundredths(x), hundredths(y)]);
}
