import { areaBetween } from '#shared/core/section-integrals.ts';
import { stationAt, type Station, type SurfaceLine } from '#shared/core/stations.ts';
import { frameOf, type SideName } from './frames.ts';
import { TIP_STEPS } from './outline.ts';
import type { Point, Shape } from './shape.ts';

/** Highest and lowest ordinate of a station's section, mm from its chord line. */
function reachOf({ section, chord }: Station): { top: number; bottom: number } {
  return { top: Math.max(...section.upper) * chord, bottom: Math.min(...section.lower) * chord };
}

/**
 * One half of a surface from ahead: its greatest thickness along the span, leaning with the dihedral, the tip block's
 * half ellipse at its end, and a line where two panels meet.
 */
export function frontShapes(line: SurfaceLine, tip: number, side: SideName): Shape[] {
  const frame = frameOf('front', side);
  const top: Point[] = [];
  const bottom: Point[] = [];
  const joints: Shape[] = [];
  for (const panel of line.panels) {
    for (const s of [panel.start, panel.end]) {
      const station = stationAt(line, s, panel);
      const reach = reachOf(station);
      top.push(frame(station, 0, reach.top));
      bottom.push(frame(station, 0, reach.bottom));
    }
    if (panel === line.panels.at(-1)) continue;
    const ends = [top.at(-1), bottom.at(-1)].flatMap((point) => (point ? [point] : []));
    joints.push(drawn('joint', ends, false));
  }
  const round = tip > 0 ? tipProfile(stationAt(line, line.length), tip, side) : [];
  return [...joints, drawn('outline', [...top, ...round, ...bottom.reverse()], true)];
}

/** A tip block from ahead, top to bottom: it shrinks towards the centroid of the last section. */
function tipProfile(last: Station, length: number, side: SideName): Point[] {
  const frame = frameOf('front', side);
  const area = areaBetween(last.section, 0, 1);
  const middle = (area.amount > 0 ? area.z / area.amount : 0) * last.chord;
  const { top, bottom } = reachOf(last);
  const at = (step: number, edge: number) => {
    const angle = (step * Math.PI) / 2 / TIP_STEPS;
    return frame(last, 0, middle + (edge - middle) * Math.cos(angle), length * Math.sin(angle));
  };
  const steps = Array.from({ length: TIP_STEPS }, (_, i) => i + 1);
  const back = steps.slice(0, -1).reverse();
  return [...steps.map((step) => at(step, top)), ...back.map((step) => at(step, bottom))];
}

const drawn = (kind: 'joint' | 'outline', points: Point[], closed: boolean): Shape => ({
  kind,
  line: null,
  points,
  closed,
  material: null,
  hidden: false,
});
