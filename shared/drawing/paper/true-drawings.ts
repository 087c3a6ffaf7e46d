import { ribStations, type Half } from '#shared/core/half.ts';
import type { Plan, Ribs, Surface } from '#shared/core/plan.ts';
import { stationAt } from '#shared/core/stations.ts';
import type { SideName } from '../frames.ts';
import { ribNumbers } from '../marks.ts';
import { frontView, planView, sideView } from '../plan-view.ts';
import type { Point } from '../shape.ts';
import { layOut, surfaceShapes } from '../surface-view.ts';
import { ribPattern } from './rib-pattern.ts';
import { onPaper, strokesOf, type Lettering, type Stroke, type TrueDrawing } from './true-size.ts';

/** Words that stand on a drawing: lengths as the reader wants them. */
export interface Words {
  /** a length with its unit */
  length: (mm: number) => string;
}

const SMALL = 3;
/** A rib's chord line sticks out so far at either end, mm. */
const BEYOND = 4;

/** One rib, its number and where it stands; null where no rib stands, or nothing is left of it. */
export function ribDrawing(
  plan: Pick<Plan, 'name'>,
  surface: Surface,
  side: SideName,
  s: number,
  words: Words,
): TrueDrawing | null {
  const half = layOut(surface, side);
  const ribs = ribsAt(half, s);
  const number = ribNumbers(surface).findIndex((station) => Math.abs(station - s) < 1e-6) + 1;
  const pattern = ribs && ribPattern(half, stationAt(half.line, s), ribs.lightening);
  if (!ribs || !pattern) return null;
  // On paper z runs down.
  const flip = (points: readonly Point[]) => points.map(([x, z]): Point => [x, -z]);
  const stroke = (points: readonly Point[], pen: Stroke['pen'], closed = true): Stroke => ({
    points: flip(points),
    closed,
    pen,
  });
  const chordLine: Point[] = [
    [-BEYOND, 0],
    [pattern.chord + BEYOND, 0],
  ];
  const lowest = Math.max(0, ...flip(pattern.outline).map(([, y]) => y));
  const label = `${plan.name} · ${surface.key} · rib ${number} · ${words.length(s)} from the root · ${words.length(ribs.thickness)}`;
  return onPaper(
    `${plan.name}, ${surface.key}, rib ${number}`,
    [
      stroke(chordLine, 'help', false),
      stroke(pattern.outline, 'cut'),
      ...pattern.holes.map((hole) => stroke(hole, 'cut')),
      ...(pattern.lightening.length > 0 ? [stroke(pattern.lightening, 'hidden')] : []),
    ],
    [{ at: [0, lowest + 2 + SMALL], text: label, size: SMALL, anchor: 'start' }],
  );
}

/** The ribs of which one stands at a station. */
function ribsAt(half: Half, s: number): Ribs | null {
  const found = half.ribs.find(({ part }) =>
    ribStations(part).some((station) => Math.abs(station - s) < 1e-6),
  );
  return found?.part ?? null;
}

/** All ribs of a half, root to tip, each once. */
export function ribDrawings(
  plan: Pick<Plan, 'name'>,
  surface: Surface,
  side: SideName,
  words: Words,
): TrueDrawing[] {
  return ribNumbers(surface).flatMap((s) => ribDrawing(plan, surface, side, s, words) ?? []);
}

/**
 * One half of a surface laid flat, to be built on: the span runs along the paper, the nose lies up. Where the model
 * balances, mm aft of the datum, is drawn across it.
 */
export function boardDrawing(
  plan: Plan,
  surface: Surface,
  side: SideName,
  balance: number | null = null,
): TrueDrawing {
  const place = ([x, s]: Point): Point => [s, x];
  const { line } = layOut(surface, side);
  const sign = side === 'port' ? -1 : 1;
  const strokes = surfaceShapes(surface, plan.materials, 'board', [side]).flatMap((shape) =>
    strokesOf(shape, place),
  );
  const numbers = ribNumbers(surface).map((s, i): Lettering => {
    const { leadingEdge, chord } = stationAt(line, s);
    return {
      at: [sign * s, leadingEdge + chord + 2 + SMALL],
      text: `${i + 1}`,
      size: SMALL,
      anchor: 'middle',
    };
  });
  const edges = strokes.flatMap(({ points }) => points.map(([, y]) => y));
  const crosses = balance !== null && balance > Math.min(...edges) && balance < Math.max(...edges);
  if (crosses) {
    const points: Point[] = [place([balance, 0]), place([balance, sign * line.length])];
    strokes.push({ points, closed: false, pen: 'help' });
    numbers.push({
      at: [sign * 2, balance - 1],
      text: 'balance',
      size: SMALL,
      anchor: sign === 1 ? 'start' : 'end',
    });
  }
  const half = surface.mirrored ? `, ${side} half` : '';
  return onPaper(`${plan.name}, ${surface.key}${half}, laid flat`, strokes, numbers);
}

const MODEL_VIEWS = {
  whole: {
    shapes: (plan: Plan) => planView(plan),
    place: ([x, y]: Point): Point => [y, x],
    words: 'from above',
  },
  side: { shapes: sideView, place: ([x, z]: Point): Point => [x, -z], words: 'from the side' },
  front: { shapes: frontView, place: ([y, z]: Point): Point => [y, -z], words: 'from ahead' },
} as const;

/** The whole model in one of its views. */
export function modelDrawing(plan: Plan, view: keyof typeof MODEL_VIEWS): TrueDrawing {
  const { shapes, place, words } = MODEL_VIEWS[view];
  return onPaper(
    `${plan.name}, ${words}`,
    shapes(plan).flatMap((shape) => strokesOf(shape, place)),
    [],
  );
}
