import { facesOf } from '#shared/core/faces.ts';
import { covers, ribExtent, stripAt, type Half } from '#shared/core/half.ts';
import type { CapStrips, Covering, Part, Plan, Ribs, Skin, Strip, Web } from '#shared/core/plan.ts';
import { pairAt, stationAt, type Station } from '#shared/core/stations.ts';
import { bandOf, pieceAt, stationsAlong } from './bands.ts';
import type { Frame } from './frames.ts';
import { halfOutline, tipCurve } from './outline.ts';
import { shapeMaterial, type Point, type Shape } from './shape.ts';

/** Steps to a panel where an edge may curve: a place on the chord that changes along a chord that changes. */
const CURVE_STEPS = 8;

interface Drawn {
  points: Point[];
  hidden?: boolean;
}

/** Shapes of one part on one half, seen in a frame. Glue has none. */
export function partShapes(half: Half, part: Part, frame: Frame, materials: Plan['materials']): Shape[] {
  const line = `${half.surface.key}/${part.id}`;
  const material = shapeMaterial(materials, part.material);
  return drawPart(half, part, frame).map(({ points, hidden = false }) => ({
    kind: part.kind === 'glue' ? 'joint' : part.kind,
    line,
    points,
    closed: true,
    material,
    hidden,
  }));
}

function drawPart(half: Half, part: Part, frame: Frame): Drawn[] {
  switch (part.kind) {
    case 'ribs':
      return drawRibs(half, part, frame);
    case 'strip':
      return drawStrip(half, part, frame);
    case 'skin':
    case 'covering':
    case 'finish':
      return drawFaces(half, part, frame);
    case 'capStrips':
      return drawCaps(half, part, frame);
    case 'web':
      return drawWeb(half, part, frame);
    case 'tipBlock': {
      const last = stationAt(half.line, half.line.length);
      return last.chord > 0 ? [{ points: tipCurve(last, part.length, frame) }] : [];
    }
    case 'sheet': {
      const tip = half.parts.reduce(
        (most, p) => (p.kind === 'tipBlock' ? Math.max(most, p.length) : most),
        0,
      );
      return [{ points: halfOutline(half.line, tip, frame) }];
    }
    case 'glue':
      return [];
  }
}

/** True thickness along the span, from the back of a nose strip to the front of a tail strip. */
function drawRibs(half: Half, part: Ribs, frame: Frame): Drawn[] {
  const own = half.ribs.find((ribs) => ribs.part === part)?.stations ?? [];
  return own.map((station) => {
    const [from, to] = ribExtent(half, station);
    return { points: pieceAt(station, part.thickness, from * station.chord, to * station.chord, frame) };
  });
}

function drawStrip(half: Half, part: Strip, frame: Frame): Drawn[] {
  const curved = part.at !== undefined && part.at[0] !== part.at[1];
  const stations = stationsAlong(half.line, part.from, part.to, curved ? CURVE_STEPS : 1);
  if (stations.length === 0) return [];
  const front = (station: Station) => stripAt(part, station).front;
  const back = (station: Station) => stripAt(part, station).back;
  return [{ points: bandOf(stations, frame, front, back), hidden: part.seat === 'bottom' }];
}

/** The bottom face first and dashed, for the top lies over it. */
function drawFaces(half: Half, part: Skin | Covering, frame: Frame): Drawn[] {
  const stations = stationsAlong(half.line, part.from, part.to);
  if (stations.length === 0) return [];
  return facesOf(part)
    .filter(({ from, to }) => Math.min(1, to) > Math.max(0, from))
    .sort((a, b) => a.face.localeCompare(b.face))
    .map(({ face, from, to }) => ({
      points: bandOf(
        stations,
        frame,
        ({ chord }) => Math.max(0, from) * chord,
        ({ chord }) => Math.min(1, to) * chord,
      ),
      hidden: face === 'lower',
    }));
}

function drawCaps(half: Half, part: CapStrips, frame: Frame): Drawn[] {
  const [start, end] = [
    Math.max(0, Math.min(part.start, part.end)),
    Math.min(1, Math.max(part.start, part.end)),
  ];
  const under = half.ribs.flatMap(({ stations }) => stations.filter(({ s }) => covers(part, s)));
  return under.map((station) => ({
    points: pieceAt(station, part.width, start * station.chord, end * station.chord, frame),
    hidden: part.seat === 'bottom',
  }));
}

function drawWeb(half: Half, part: Web, frame: Frame): Drawn[] {
  const stations = stationsAlong(half.line, part.from, part.to, part.at[0] === part.at[1] ? 1 : CURVE_STEPS);
  if (stations.length === 0) return [];
  const centre = ({ s, chord }: Station) => pairAt(part.at, part.from, part.to, s) * chord;
  const points = bandOf(
    stations,
    frame,
    (station) => centre(station) - part.thickness / 2,
    (station) => centre(station) + part.thickness / 2,
  );
  return [{ points, hidden: true }];
}
