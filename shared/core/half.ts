import { facesOf } from './faces.ts';
import type { Notice } from './notices.ts';
import type { CapStrips, Part, Ribs, Skin, Strip, Surface } from './plan.ts';
import { pairAt, stationAt, type Station, type SurfaceLine } from './stations.ts';

/** One half of a surface with the parts that are on it: what a part's own size depends on. */
export interface Half {
  surface: Surface;
  line: SurfaceLine;
  parts: Part[];
  strips: Strip[];
  skins: Skin[];
  caps: CapStrips[];
  ribs: { part: Ribs; stations: Station[] }[];
  /** where skins begin and end along s: integrals of what lies under them are split there */
  skinEnds: number[];
  /** x/c at which skins begin or end on either face; a nose or tail of the section is no edge */
  skinEdges: number[];
  /** what lies over each face, laid out once: it is asked at every sample of every strip */
  over: Record<'upper' | 'lower', SkinFace[]>;
  /** stretches already looked at, for many parts begin and end at the same stations */
  stretches: Map<string, Half>;
  notice: (notice: Notice) => void;
}

/** A skin on one face: its stations, its x/c limits and how thick it is. */
export interface SkinFace {
  skin: Skin;
  from: number;
  to: number;
}

/** A millionth of a millimetre of slack, so that a station typed as the sum of panels is on the surface. */
const SLACK = 1e-6;
/**
 * True where a part's range holds the station `s`, ends included; all mm.
 * @example covers({ from: 0, to: 500 }, 500) // → true
 */
export const covers = (part: { from: number; to: number }, s: number) =>
  s >= part.from - SLACK && s <= part.to + SLACK;

const distinct = (values: number[]) => [...new Set(values)];

/**
 * Stations of a ribs part, mm: those given, or else `count` in equal steps, both ends included.
 * @example ribStations({ from: 0, to: 30, count: 4 }) // → [0, 10, 20, 30]
 */
export function ribStations(part: Pick<Ribs, 'stations' | 'from' | 'to' | 'count'>): number[] {
  if (part.stations) return part.stations;
  const { from = 0, to = 0, count = 1 } = part;
  return count === 1
    ? [from]
    : Array.from({ length: count }, (_, i) => from + ((to - from) * i) / (count - 1));
}

/**
 * The half `side` of a surface with its parts sorted by kind; parts of the other side are left out. Either half is
 * laid out as the starboard one: who asks for the port half mirrors what comes out. `notice` is told of every part
 * that does not fit, by whatever measures it later.
 * @example halfOf(EXAMPLE_WING, EXAMPLE_LINE, 'port', () => undefined).strips.length // → 1
 */
export function halfOf(
  surface: Surface,
  line: SurfaceLine,
  side: 'port' | 'starboard',
  notice: (notice: Notice) => void,
): Half {
  const parts = surface.parts.filter((part) => (part.side ?? 'both') === 'both' || part.side === side);
  const of = <K extends Part['kind']>(kind: K) =>
    parts.filter((part): part is Extract<Part, { kind: K }> => part.kind === kind);
  const ribs = of('ribs').map((part) => ({
    part,
    stations: ribStations(part)
      .filter((s) => s <= line.length + SLACK)
      .map((s) => stationAt(line, s)),
  }));
  const skins = of('skin');
  const skinEnds = distinct(skins.flatMap((skin) => [skin.from, skin.to]));
  const faces = skins.flatMap((skin) => facesOf(skin).map((range) => ({ skin, ...range })));
  const over = {
    upper: faces.filter(({ face }) => face === 'upper'),
    lower: faces.filter(({ face }) => face === 'lower'),
  };
  const skinEdges = distinct(faces.flatMap(({ from, to }) => [from, to])).filter((x) => x > 0 && x < 1);
  return {
    surface,
    line,
    parts,
    strips: of('strip'),
    skins,
    caps: of('capStrips'),
    ribs,
    skinEnds,
    skinEdges,
    over,
    stretches: new Map(),
    notice,
  };
}

/**
 * The half with only those strips, skins and cap strips that may be met from `from` to `to`, mm: of many cut into
 * bays a part has few about it, and they are asked for at every sample.
 * @example stretchOf(EXAMPLE_HALF, 0, 100).strips.length // → 1
 */
export function stretchOf(half: Half, from: number, to: number): Half {
  const key = `${from} ${to}`;
  const known = half.stretches.get(key);
  if (known) return known;
  const isNear = (part: { from: number; to: number }) =>
    Math.min(part.from, part.to) <= to + SLACK && Math.max(part.from, part.to) >= from - SLACK;
  const stretch: Half = {
    ...half,
    strips: half.strips.filter(isNear),
    skins: half.skins.filter(isNear),
    caps: half.caps.filter(isNear),
    over: {
      upper: half.over.upper.filter(({ skin }) => isNear(skin)),
      lower: half.over.lower.filter(({ skin }) => isNear(skin)),
    },
    stretches: new Map(),
  };
  half.stretches.set(key, stretch);
  return stretch;
}

/** Place and size of a strip where a station cuts it, mm. */
export interface StripAt {
  /** mm behind the leading edge: front, centre line, back */
  front: number;
  centre: number;
  back: number;
  width: number;
  height: number;
}

/**
 * A strip's place and size at a station of its range. The front of a nose strip lies on the leading edge, the back
 * of a tail strip on the trailing edge.
 * @example stripAt(EXAMPLE_SPAR, EXAMPLE_STATION) // → { front: 22.5, centre: 25, back: 27.5, width: 5, height: 2 }
 */
export function stripAt(strip: Strip, { s, chord }: Station): StripAt {
  const width = pairAt(strip.width, strip.from, strip.to, s);
  const height = pairAt(strip.height, strip.from, strip.to, s);
  const centre =
    strip.seat === 'nose'
      ? width / 2
      : strip.seat === 'tail'
        ? chord - width / 2
        : pairAt(strip.at ?? [0, 0], strip.from, strip.to, s) * chord;
  return { front: centre - width / 2, centre, back: centre + width / 2, width, height };
}

/**
 * Extent of the ribs at a station, x/c: from the back of a nose strip to the front of a tail strip, or the whole
 * chord; never reversed, and [0, 0] where there is no chord.
 * @example ribExtent(EXAMPLE_HALF, EXAMPLE_STATION) // → [0, 1]
 */
export function ribExtent(half: Half, station: Station): [from: number, to: number] {
  let [from, to] = [0, 1];
  if (station.chord <= 0) return [0, 0];
  for (const strip of half.strips) {
    if (!covers(strip, station.s)) continue;
    if (strip.seat === 'nose') from = Math.max(from, stripAt(strip, station).back / station.chord);
    if (strip.seat === 'tail') to = Math.min(to, stripAt(strip, station).front / station.chord);
  }
  return [Math.min(from, 1), Math.max(Math.min(from, 1), to)];
}
