import type { BuiltSide } from '../built/sided-lines.ts';
import { developedAt } from '../fit.ts';
import { covers, halfOf, ribExtent, ribStations, stripAt, type Half } from '../half.ts';
import type { Bar, CapStrips, Plan, Strip, Surface } from '../plan.ts';
import { ordinateAt } from '../section-integrals.ts';
import { stationAt, surfaceLine, type Station } from '../stations.ts';

/** A stick to be cut. Lengths mm. */
export interface StickPiece {
  id: string;
  /** id of the estimate's line */
  line: string;
  name: string;
  side: BuiltSide;
  /** of several panels, which; null where it runs through */
  panel: number | null;
  material: string;
  /** the larger and the smaller side of its section, where it is largest */
  width: number;
  thickness: number;
  /** along the stick itself, skew included */
  length: number;
  /** where it begins, from the root, and the half span; null outside a surface and for what lies along a rib */
  place: { surface: string; from: number; halfSpan: number } | null;
  /** its middle along the half span; null outside a surface */
  station: number | null;
}

/** The block of sheet that a rib is cut from, grain along the chord. Lengths mm. */
export interface RibBlank {
  id: string;
  line: string;
  name: string;
  side: BuiltSide;
  /** counted from the root */
  number: number;
  material: string;
  station: number;
  /** along the chord, between nose and tail strip, and across it */
  length: number;
  height: number;
  thickness: number;
}

export interface CutList {
  sticks: StickPiece[];
  ribs: RibBlank[];
}

/** Intervals that a stick's way is summed over in each panel. */
const INTERVALS = 48;

/**
 * Sticks and rib blanks that a plan is cut as, port and starboard each by name. A stick that runs over a break of the
 * dihedral is cut there, a piece for each panel.
 * @example cutList(EXAMPLE_PLAN).sticks.map(({ id, length }) => [id, length]) // → [['wing/spar port', 500], ['wing/spar starboard', 500], ['solid/boom middle', 400]]
 */
export function cutList(plan: Plan): CutList {
  const sticks: StickPiece[] = [];
  const ribs: RibBlank[] = [];
  for (const surface of plan.surfaces) {
    const half = halfOf(surface, surfaceLine(surface), 'starboard', () => undefined);
    for (const part of surface.parts) {
      for (const side of sidesOf(surface, part.side)) {
        if (part.kind === 'strip') sticks.push(...stripPieces(surface, half, part, side));
        if (part.kind === 'capStrips') sticks.push(...capPieces(surface, half, part, side));
        if (part.kind === 'ribs') {
          ribStations(part).forEach((s, i) => {
            const blank = blankAt(half, stationAt(half.line, s));
            const id = `${surface.key}/${part.id} ${side} ${i + 1}`;
            const { name, material, thickness } = part;
            const line = `${surface.key}/${part.id}`;
            ribs.push({ id, line, name, side, number: i + 1, material, station: s, ...blank, thickness });
          });
        }
      }
    }
  }
  sticks.push(...plan.solids.flatMap((solid) => (solid.shape === 'bar' ? [barPiece(solid)] : [])));
  return { sticks, ribs };
}

/**
 * The sides that a part is cut for.
 * @example sidesOf({ mirrored: true }, 'both') // → ['port', 'starboard']
 */
export function sidesOf(surface: Pick<Surface, 'mirrored'>, side: Strip['side']): BuiltSide[] {
  if (!surface.mirrored) return ['middle'];
  return side === 'port' || side === 'starboard' ? [side] : ['port', 'starboard'];
}

const larger = (pair: readonly number[]) => Math.max(...pair);

function section(width: readonly number[], height: readonly number[]): { width: number; thickness: number } {
  const sides = [larger(width), larger(height)];
  return { width: larger(sides), thickness: Math.min(...sides) };
}

function stripPieces(surface: Surface, { line }: Half, strip: Strip, side: BuiltSide): StickPiece[] {
  const to = Math.min(strip.to, line.length);
  if (!(to > strip.from)) return [];
  const breaks = line.panels.filter((panel, i) => {
    const next = surface.panels[i + 1];
    return next !== undefined && next.dihedral !== surface.panels[panel.index]?.dihedral;
  });
  const inside = breaks.map(({ end }) => end).filter((end) => end > strip.from && end < to);
  const ends = [strip.from, ...inside, to];
  return ends.slice(1).map((end, i): StickPiece => {
    const from = ends[i] ?? strip.from;
    return {
      id: `${surface.key}/${strip.id} ${side}${inside.length > 0 ? ` ${i + 1}` : ''}`,
      line: `${surface.key}/${strip.id}`,
      name: strip.name,
      side,
      panel: inside.length > 0 ? i + 1 : null,
      material: strip.material,
      ...section(strip.width, strip.height),
      length: wayOf(line, strip, from, end),
      place: { surface: surface.key, from, halfSpan: line.length },
      station: (from + end) / 2,
    };
  });
}

/** A strip over the edge of each rib in reach, for each face that it lies on. */
function capPieces(surface: Surface, half: Half, caps: CapStrips, side: BuiltSide): StickPiece[] {
  const faces = caps.seat === 'both' ? (['top', 'bottom'] as const) : [caps.seat];
  const stations = half.ribs.flatMap((ribs) => ribs.stations).filter(({ s }) => covers(caps, s));
  const pieces = stations.flatMap((station) =>
    faces.map((seat) => ({ length: developedAt({ ...caps, seat }, station).amount, station: station.s })),
  );
  return pieces
    .filter(({ length }) => length > 0)
    .map((piece, i): StickPiece => {
      const line = `${surface.key}/${caps.id}`;
      const own = { line, name: caps.name, side, panel: null, material: caps.material, place: null };
      return { id: `${line} ${side} ${i + 1}`, ...own, ...section([caps.width], [caps.thickness]), ...piece };
    });
}

/** Length of a strip's centre line, mm: summed over steps that begin anew at every panel. */
function wayOf(line: Half['line'], strip: Strip, from: number, to: number): number {
  const stops = [from, ...line.panels.map(({ end }) => end).filter((end) => end > from && end < to), to];
  let way = 0;
  for (let k = 1; k < stops.length; k++) {
    const [a, b] = [stops[k - 1] ?? from, stops[k] ?? to];
    const panel = line.panels.find(({ start, end }) => (a + b) / 2 >= start && (a + b) / 2 <= end);
    const place = (s: number) => {
      const station = stationAt(line, s, panel);
      return station.leadingEdge + stripAt(strip, station).centre;
    };
    for (let i = 0; i < INTERVALS; i++) {
      const s = a + ((b - a) * i) / INTERVALS;
      const next = a + ((b - a) * (i + 1)) / INTERVALS;
      way += Math.hypot(next - s, place(next) - place(s));
    }
  }
  return way;
}

/** Nodes at which a section's height is looked for. */
const NODES = 80;

function blankAt(half: Half, station: Station): { length: number; height: number } {
  const [start, end] = ribExtent(half, station);
  let [top, bottom] = [Number.NEGATIVE_INFINITY, Number.POSITIVE_INFINITY];
  for (let i = 0; i <= NODES; i++) {
    const x = start + ((end - start) * i) / NODES;
    top = Math.max(top, ordinateAt(station.section, 'upper', x));
    bottom = Math.min(bottom, ordinateAt(station.section, 'lower', x));
  }
  return { length: (end - start) * station.chord, height: Math.max(0, top - bottom) * station.chord };
}

function barPiece({ id, name, material, from, to, width, height }: Bar): StickPiece {
  const length = Math.hypot(to[0] - from[0], to[1] - from[1], to[2] - from[2]);
  const own = { line: `solid/${id}`, name, side: 'middle' as const, panel: null, material };
  return { id: `solid/${id} middle`, ...own, ...section(width, height), length, place: null, station: null };
}
