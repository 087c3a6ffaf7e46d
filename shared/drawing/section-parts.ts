import { covers, ribExtent, type Half } from '#shared/core/half.ts';
import type { Part, Ribs, Strip } from '#shared/core/plan.ts';
import { polygonIntegrals } from '#shared/core/polygon.ts';
import type { Station } from '#shared/core/stations.ts';
import { sliceOf } from './contour.ts';
import { bandUnder, contourLines, depthOf } from './section-skins.ts';
import { rectangle, sanded, stripSection } from './section-strips.ts';
import { webPieces } from './section-web.ts';
import type { Point, Shape } from './shape.ts';

export type Drawn = Pick<Shape, 'kind' | 'points'> & Partial<Shape>;

/** What a station cuts of one part; `rib` are the ribs of which one stands there. */
export function sectionOf(half: Half, part: Part, station: Station, rib: Ribs | undefined): Drawn[] {
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
