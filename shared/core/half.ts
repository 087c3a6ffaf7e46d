import type { Notice } from './notices.ts';
import type { CapStrips, Part, Ribs, Skin, Strip, Surface } from './plan.ts';
import { arcBetween, heightAt, ordinateAt, wrapArc, type Sums } from './section-integrals.ts';
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
  notice: (notice: Notice) => void;
}

/** Two millionths of a millimetre of slack, so that a station typed as the sum of panels is on the surface. */
const SLACK = 1e-6;
export const covers = (part: { from: number; to: number }, s: number) =>
  s >= part.from - SLACK && s <= part.to + SLACK;

/** Stations of a ribs part, mm. @example ribStations({ from: 0, to: 30, count: 4 }) // → [0, 10, 20, 30] */
export function ribStations(part: Pick<Ribs, 'stations' | 'from' | 'to' | 'count'>): number[] {
  if (part.stations) return part.stations;
  const { from = 0, to = 0, count = 1 } = part;
  return count === 1
    ? [from]
    : Array.from({ length: count }, (_, i) => from + ((to - from) * i) / (count - 1));
}

/** The half `side` of a surface. Parts of the other side are left out. */
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
  return {
    surface,
    line,
    parts,
    strips: of('strip'),
    skins: of('skin'),
    caps: of('capStrips'),
    ribs,
    notice,
  };
}

export interface StripAt {
  /** mm behind the leading edge: front, centre line, back */
  front: number;
  centre: number;
  back: number;
  width: number;
  height: number;
}

/** A strip's place and size at a station of its range. */
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

/** Extent of the ribs at a station, x/c: from the back of a nose strip to the front of a tail strip. */
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

/** The faces that a skin, cap strip or covering lies on, each with its x/c limits. */
export function facesOf(part: {
  seat: 'top' | 'bottom' | 'both' | 'wrap';
  start?: number;
  end?: number;
}): { face: 'upper' | 'lower'; from: number; to: number }[] {
  const [start, end] = [part.start ?? 0, part.end ?? 1];
  if (part.seat === 'wrap') {
    return [
      { face: 'upper', from: 0, to: start },
      { face: 'lower', from: 0, to: end },
    ];
  }
  const range = { from: Math.min(start, end), to: Math.max(start, end) };
  return (
    part.seat === 'both'
      ? (['upper', 'lower'] as const)
      : part.seat === 'top'
        ? (['upper'] as const)
        : (['lower'] as const)
  ).map((face) => ({ face, ...range }));
}

/** Developed length with first moments, mm and mm², that such a part takes at a station, inside an extent of x/c. */
export function developedAt(
  part: Parameters<typeof facesOf>[0],
  station: Station,
  extent: [number, number] = [0, 1],
): Sums {
  const { section, chord } = station;
  const faces = facesOf(part);
  const sum: Sums = { amount: 0, x: 0, z: 0 };
  const roundNose = faces.length === 2 && faces.every((f) => f.from <= 0) && extent[0] <= 0;
  const arcs = roundNose
    ? [wrapArc(section, Math.min(faces[0]?.to ?? 0, extent[1]), Math.min(faces[1]?.to ?? 0, extent[1]))]
    : faces.flatMap(({ face, from, to }) => {
        const [a, b] = [Math.max(from, extent[0]), Math.min(to, extent[1])];
        return b > a ? [arcBetween(section, face, a, b)] : [];
      });
  for (const arc of arcs) {
    sum.amount += arc.amount * chord;
    sum.x += arc.x * chord * chord;
    sum.z += arc.z * chord * chord;
  }
  return sum;
}

/** Thickness of the skins that lie over x/c on a face at a station, mm. */
export function skinOver(half: Half, station: Station, face: 'upper' | 'lower', x: number): number {
  let thickness = 0;
  for (const skin of half.skins) {
    if (!covers(skin, station.s)) continue;
    if (facesOf(skin).some((f) => f.face === face && x >= f.from - 1e-9 && x <= f.to + 1e-9)) {
      thickness += skin.thickness;
    }
  }
  return thickness;
}

/** Height of the section at x/c, mm, and of what is left of it under the skins there. */
export function heightsAt(half: Half, station: Station, x: number): { section: number; underSkins: number } {
  const section = heightAt(station.section, x) * station.chord;
  const skins = skinOver(half, station, 'upper', x) + skinOver(half, station, 'lower', x);
  return { section, underSkins: section - skins };
}

/** z of a strip's centre above the chord line, mm: outer face flush with the section, or with a skin's underside. */
export function stripZ(half: Half, strip: Strip, station: Station, place: StripAt): number {
  const { section, chord } = station;
  const x = chord > 0 ? place.centre / chord : 0;
  const upper = ordinateAt(section, 'upper', x) * chord;
  const lower = ordinateAt(section, 'lower', x) * chord;
  if (strip.seat === 'top') return upper - skinOver(half, station, 'upper', x) - place.height / 2;
  if (strip.seat === 'bottom') return lower + skinOver(half, station, 'lower', x) + place.height / 2;
  return (upper + lower) / 2;
}
