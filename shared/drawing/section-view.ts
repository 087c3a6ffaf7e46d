import { covers, ribExtent, type Half } from '#shared/core/half.ts';
import type { Part, Plan, Ribs, Strip, Surface } from '#shared/core/plan.ts';
import { heightAt } from '#shared/core/section-integrals.ts';
import { polygonIntegrals } from '#shared/core/polygon.ts';
import { stationAt, type Station } from '#shared/core/stations.ts';
import { contourOf, sliceOf } from './contour.ts';
import type { SideName } from './frames.ts';
import { bandUnder, contourLines, depthOf } from './section-skins.ts';
import { rectangle, sanded, stripSection } from './section-strips.ts';
import { webPieces } from './section-web.ts';
import { shapeMaterial, type Point, type Shape, type ShapeKind } from './shape.ts';
import { layOut } from './surface-view.ts';

/** A surface cut at a station, looked at from the tip of the half: x mm aft of the leading edge there, z up. */
export interface SectionView {
  s: number;
  chord: number;
  /** greatest thickness, mm, and where it lies, x/c */
  thickness: number;
  thicknessAt: number;
  /** id of the ribs of which one stands here; null between ribs */
  rib: string | null;
  /** lowest first */
  shapes: Shape[];
}

const LAYERS: readonly ShapeKind[] = [
  'ribs',
  'sheet',
  'lightening',
  'skin',
  'capStrips',
  'notch',
  'web',
  'strip',
  'stock',
  'outline',
  'finish',
  'covering',
];

/** The section of a surface at station `s`, with everything that is cut there. */
export function sectionView(
  surface: Surface,
  s: number,
  materials: Plan['materials'],
  side: SideName = 'starboard',
): SectionView {
  const half = layOut(surface, side);
  const station = stationAt(half.line, Math.min(half.line.length, Math.max(0, s)));
  const rib = half.ribs.find(({ part, stations }) =>
    stations.some((r) => Math.abs(r.s - station.s) <= part.thickness / 2 + 1e-6),
  )?.part;
  const shapes = half.parts.flatMap((part) =>
    sectionOf(half, part, station, rib).map((drawn): Shape => {
      const line = `${surface.key}/${part.id}`;
      const plain = drawn.kind === 'stock' || drawn.kind === 'notch' || drawn.kind === 'lightening';
      const material = plain ? null : shapeMaterial(materials, part.material);
      return { line, material, closed: true, hidden: false, ...drawn };
    }),
  );
  const outline: Shape = {
    kind: 'outline',
    line: null,
    points: contourOf(station),
    closed: true,
    material: null,
    hidden: false,
  };
  const layered = [...shapes, outline].sort((a, b) => LAYERS.indexOf(a.kind) - LAYERS.indexOf(b.kind));
  return {
    s: station.s,
    chord: station.chord,
    ...greatestThickness(station),
    rib: rib ? `${surface.key}/${rib.id}` : null,
    shapes: layered,
  };
}

type Drawn = Pick<Shape, 'kind' | 'points'> & Partial<Shape>;

function sectionOf(half: Half, part: Part, station: Station, rib: Ribs | undefined): Drawn[] {
  const { chord, s } = station;
  if (chord <= 0) return [];
  switch (part.kind) {
    case 'ribs':
      return part === rib ? ribSection(half, part, station) : [];
    case 'strip':
      return covers(part, s) ? stripShapes(half, part, station, rib !== undefined) : [];
    case 'skin': {
      if (!covers(part, s)) return [];
      const depth = depthOf(half, part, s);
      const bands = contourLines(part, station).map((line) => bandUnder(line, depth, part.thickness));
      return bands.map((points) => ({ kind: 'skin', points }));
    }
    case 'capStrips': {
      if (!rib || !covers(part, s)) return [];
      const bands = contourLines(part, station).map((line) => bandUnder(line, 0, part.thickness));
      return bands.map((points) => ({ kind: 'capStrips', points }));
    }
    case 'web':
      if (!covers(part, s)) return [];
      // A rib takes the web's room; what is seen is the web of the next bay behind it.
      return webPieces(half, part, station).map((points) => ({
        kind: 'web',
        points,
        hidden: rib !== undefined,
      }));
    case 'covering':
    case 'finish':
      if (!covers(part, s)) return [];
      return contourLines(part, station).map((points) => ({ kind: part.kind, points, closed: false }));
    case 'sheet':
      return [{ kind: 'sheet', points: rectangle(0, chord, -part.thickness / 2, part.thickness / 2) }];
    case 'tipBlock':
    case 'glue':
      return [];
  }
}

/** The rib before skins and notches are taken off, and a dashed hint of what lightening takes out. */
function ribSection(half: Half, part: Ribs, station: Station): Drawn[] {
  const [from, to] = ribExtent(half, station);
  const points = sliceOf(station, from, to);
  const { centroid } = polygonIntegrals(points);
  if (part.lightening <= 0 || !centroid) return [{ kind: 'ribs', points }];
  const size = Math.sqrt(part.lightening);
  const shrunk = points.map(([x, z]): Point => [
    centroid[0] + size * (x - centroid[0]),
    centroid[1] + size * (z - centroid[1]),
  ]);
  return [
    { kind: 'ribs', points },
    { kind: 'lightening', points: shrunk, hidden: true },
  ];
}

function stripShapes(half: Half, strip: Strip, station: Station, onRib: boolean): Drawn[] {
  const section = stripSection(half, strip, station);
  const { place, z, points, hole } = section;
  if (strip.seat === 'nose' || strip.seat === 'tail') {
    const left = sanded(strip, section, station);
    const stock: Drawn = { kind: 'stock', points, hidden: true };
    return left.length > 2 ? [{ kind: 'strip', points: left }, stock] : [stock];
  }
  const own: Drawn = { kind: 'strip', points, ...(hole && { hole }) };
  if (!strip.letIn || !onRib) return [own];
  const notch = rectangle(place.front, place.back, z - place.height / 2, z + place.height / 2);
  return [{ kind: 'notch', points: notch }, own];
}

function greatestThickness({ section, chord }: Station): { thickness: number; thicknessAt: number } {
  let [thickness, thicknessAt] = [0, 0];
  for (const x of section.x) {
    const height = heightAt(section, x) * chord;
    if (height > thickness + 1e-9) [thickness, thicknessAt] = [height, x];
  }
  return { thickness, thicknessAt };
}
