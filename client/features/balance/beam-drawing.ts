import { layHung } from '#shared/core/beam-layout.ts';
import type { HungPlace } from '#shared/core/beam-places.ts';
import { TILT_LIMIT, type Beam, type HungMass } from '#shared/core/beam.ts';
import { radians } from '#shared/core/frame.ts';
import { rulerOf, type Ruler } from '#shared/core/ruler.ts';
import type { Units } from '#shared/format/units.ts';
import { convert } from '#shared/units/units.ts';

/** A weight with its place in the drawing, CSS px. */
export interface DrawnMass {
  mass: HungMass;
  x: number;
  radius: number;
  place: HungPlace;
  figure: string;
}

export interface BeamDrawing {
  /** ends of the bar, mm */
  from: number;
  to: number;
  toX: (arm: number) => number;
  pivotX: number;
  /** the bar at the pivot */
  barY: number;
  /** the bar falls by so much per px to the right */
  slope: number;
  hung: DrawnMass[];
  /** marks in the reader's unit of length */
  ruler: Ruler;
  /** mm in one mark's unit */
  perMark: number;
  rulerY: number;
  /** the mean aerodynamic chord on the ruler */
  chordX: [number, number] | null;
  height: number;
}

/** Widest letters and figures of the labels, px: 13 px name over 12 px figure. */
const NAME_LETTER = 7;
const FIGURE_LETTER = 6.4;
const LABEL_HEIGHT = 31;
/** Ruler under the lowest weight. */
const ABOVE_RULER = 14;
const UNDER_RULER = 40;
const SMALLEST = 5;

/** Lays the beam out in a width. Depths do not depend on the tilt, so that nothing jumps while figures change. */
export function drawBeam(beam: Beam, width: number, units: Units): BeamDrawing {
  const largest = width < 600 ? 17 : 24;
  const heaviest = Math.max(...beam.masses.map(({ mass }) => mass));
  const radiusOf = (mass: number) => Math.max(SMALLEST, largest * Math.sqrt(mass / heaviest));
  const marks = [
    ...beam.masses.map(({ x }) => x),
    beam.pivot,
    beam.balance.x,
    ...(beam.chord ? [beam.chord.from, beam.chord.to] : []),
    ...(beam.neutralPoint === null ? [] : [beam.neutralPoint]),
  ];
  const [least, most] = [Math.min(...marks), Math.max(...marks)];
  const side = largest + 12;
  const perMm = (width - 2 * side) / Math.max(1, most - least);
  const toX = (arm: number) => side + (arm - least) * perMm;

  const pivotX = toX(beam.pivot);
  const labels = beam.masses.map((mass) => {
    const figure = units.format(mass.mass, 'mass');
    const letters = Math.max(mass.name.length * NAME_LETTER, figure.length * FIGURE_LETTER);
    return {
      mass,
      figure,
      x: toX(mass.x),
      radius: radiusOf(mass.mass),
      width: letters,
      height: LABEL_HEIGHT,
    };
  });
  const places = layHung(
    labels.map(({ mass, x, radius, width: w, height }) => ({ key: mass.key, x, radius, width: w, height })),
    width,
    [pivotX],
  );
  const hung = labels.flatMap(({ mass, figure, x, radius }, i): DrawnMass[] => {
    const place = places[i];
    return place ? [{ mass, figure, x, radius, place }] : [];
  });

  const perMark = convert(1, units.unit('length'), 'mm');
  const overhang = 10 / perMm;
  const [from, to] = [least - overhang, most + overhang];
  const steepest = Math.tan(radians(TILT_LIMIT));
  const rise = steepest * Math.max(pivotX - toX(from), toX(to) - pivotX);
  const barY = Math.round(rise) + 6;
  const lowest = Math.max(60, ...hung.map(({ place, x }) => place.bottom + Math.abs(x - pivotX) * steepest));
  const rulerY = Math.round(barY + lowest + ABOVE_RULER);
  return {
    from,
    to,
    toX,
    pivotX,
    barY,
    slope: Math.tan(radians(beam.tilt)),
    hung,
    perMark,
    ruler: rulerOf(
      (least - (side - 16) / perMm) / perMark,
      (most + (side - 16) / perMm) / perMark,
      width - 32,
      width < 600 ? 54 : 76,
    ),
    rulerY,
    chordX: beam.chord && [toX(beam.chord.from), toX(beam.chord.to)],
    height: rulerY + UNDER_RULER,
  };
}
