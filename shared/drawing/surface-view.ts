import { halfOf, type Half } from '#shared/core/half.ts';
import type { Plan, Surface } from '#shared/core/plan.ts';
import { stationAt, surfaceLine, type SurfaceLine } from '#shared/core/stations.ts';
import { frameOf, isEdgeOn, sidesOf, type FrameName, type SideName } from './frames.ts';
import { frontShapes } from './front-view.ts';
import { halfOutline, tipLength } from './outline.ts';
import { contourOf } from './contour.ts';
import type { Shape, ShapeKind } from './shape.ts';
import { partShapes } from './surface-parts.ts';

/** What lies lowest is painted first. Skins lie under the lines of what they cover, so that all can be seen. */
const LAYERS: readonly ShapeKind[] = [
  'finish',
  'covering',
  'sheet',
  'skin',
  'tipBlock',
  'capStrips',
  'ribs',
  'web',
  'strip',
  'joint',
  'outline',
];

/** The layout that the estimate is made from, without its notices. */
export function layOut(surface: Surface, side: SideName, line: SurfaceLine = surfaceLine(surface)): Half {
  return halfOf(surface, line, side, () => undefined);
}

/** Shapes of a surface in one view, lowest first. `sides` are those to be drawn of a mirrored surface. */
export function surfaceShapes(
  surface: Surface,
  materials: Plan['materials'],
  name: FrameName,
  sides: readonly SideName[] = sidesOf(surface),
): Shape[] {
  const line = surfaceLine(surface);
  const edgeOn = isEdgeOn(name, line);
  const shapes = sides.flatMap((side) => {
    if (name === 'front') return frontShapes(line, tipLength(surface, side), side);
    if (edgeOn) return sectionsOf(line, name, side);
    const half = layOut(surface, side, line);
    const frame = frameOf(name, side);
    return [
      ...half.parts.flatMap((part) => partShapes(half, part, frame, materials)),
      ...jointsOf(line, name, side),
      outlineShape(halfOutline(line, tipLength(surface, side), frame)),
    ];
  });
  return shapes
    .map((shape, i) => ({ shape, i, layer: LAYERS.indexOf(shape.kind) }))
    .sort((a, b) => a.layer - b.layer || Number(b.shape.hidden) - Number(a.shape.hidden) || a.i - b.i)
    .map(({ shape }) => shape);
}

const outlineShape = (points: Shape['points']): Shape => ({
  kind: 'outline',
  line: null,
  points,
  closed: true,
  material: null,
  hidden: false,
});

/** A chord line where two panels meet. */
function jointsOf(line: SurfaceLine, name: FrameName, side: SideName): Shape[] {
  const frame = frameOf(name, side);
  return line.panels.slice(0, -1).map((panel): Shape => {
    const station = stationAt(line, panel.end, panel);
    const points = [frame(station, 0), frame(station, station.chord)];
    return { kind: 'joint', line: null, points, closed: false, material: null, hidden: false };
  });
}

/** A surface met edge on shows the sections at its root and its tip. */
function sectionsOf(line: SurfaceLine, name: FrameName, side: SideName): Shape[] {
  const frame = frameOf(name, side);
  return [0, line.length].map((s) => {
    const station = stationAt(line, s);
    return outlineShape(contourOf(station).map(([x, z]) => frame(station, x, z)));
  });
}
