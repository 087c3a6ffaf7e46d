import type { CapStrips, Pair, Part, Ribs, Skin, Strip, Surface, TipBlock } from '#shared/core/plan.ts';
import type { FaceName } from './contour.ts';
import type { Hand } from './heap.ts';
import { middle, NEAR, placeAt, rise, tipOf, type Place } from './place.ts';

/** One half of a surface with the parts that it holds. */
export interface Half {
  surface: Surface;
  hand: Hand;
  parts: Part[];
  tip: number;
}

export function halvesOf(surface: Surface): Half[] {
  const tip = tipOf(surface);
  if (!surface.mirrored) return [{ surface, hand: 1, parts: surface.parts, tip }];
  const holding = (name: 'port' | 'starboard') =>
    surface.parts.filter(({ side }) => side === undefined || side === 'both' || side === name);
  return [
    { surface, hand: 1, parts: holding('starboard'), tip },
    { surface, hand: -1, parts: holding('port'), tip },
  ];
}

export const covers = (range: { from: number; to: number }, s: number) =>
  range.from - NEAR <= s && s <= range.to + NEAR;

export const pairAt = (range: { from: number; to: number }, [a, b]: Pair, s: number) =>
  range.to === range.from ? a : a + ((b - a) * (s - range.from)) / (range.to - range.from);

const ofKind =
  <K extends Part['kind']>(kind: K) =>
  (half: Half) =>
    half.parts.filter((part): part is Extract<Part, { kind: K }> => part.kind === kind);
const stripsOf = ofKind('strip');
const skinsOf = ofKind('skin');
const capsOf = ofKind('capStrips');
const ribsOf = ofKind('ribs');

export const stripsAt = (half: Half, s: number): Strip[] =>
  stripsOf(half).filter((strip) => covers(strip, s));
export const skinsAt = (half: Half, s: number): Skin[] => skinsOf(half).filter((skin) => covers(skin, s));
export const capsAt = (half: Half, s: number): CapStrips[] => capsOf(half).filter((caps) => covers(caps, s));
export const tipBlockOf = (half: Half): TipBlock | undefined => ofKind('tipBlock')(half)[0];

export function stationsOf(ribs: Ribs): number[] {
  if (ribs.stations) return ribs.stations;
  const { from = 0, to = 0, count = 0 } = ribs;
  return Array.from({ length: count }, (_, i) =>
    count === 1 ? from : from + ((to - from) * i) / (count - 1),
  );
}

export const ribsIn = (half: Half, range: { from: number; to: number }) =>
  ribsOf(half).flatMap((ribs) =>
    stationsOf(ribs)
      .filter((s) => covers(range, s))
      .map((s) => ({ s, thickness: ribs.thickness })),
  );

/** The shares of the chord between which a skin or a cap strip lies on a face. */
export function reach(part: Skin | CapStrips, face: FaceName): [start: number, end: number] | null {
  if (part.seat === 'wrap') return [0, face === 'top' ? part.start : part.end];
  return part.seat === face || part.seat === 'both' ? [part.start, part.end] : null;
}

/**
 * Thickness of the skins over a point of a face. Where one ends and another begins, as at a joint over a spar, they
 * lie side by side and the thicker one counts; anywhere else they lie on one another.
 */
export function roomOver(half: Half, s: number, face: FaceName, share: number): number {
  const room = { over: 0, ending: 0, starting: 0 };
  for (const skin of skinsAt(half, s)) {
    const [start, end] = reach(skin, face) ?? [Infinity, -Infinity];
    if (share < start - NEAR || share > end + NEAR) continue;
    const place = share > end - NEAR ? 'ending' : share < start + NEAR ? 'starting' : 'over';
    room[place] += skin.thickness;
  }
  return room.over + Math.max(room.ending, room.starting);
}

export interface Stick {
  width: number;
  height: number;
  /** centre line behind the leading edge, mm */
  line: number;
  /** centroid of the cross-section */
  x: number;
  rise: number;
}

export function stickAt(half: Half, strip: Strip, s: number, place: Place = placeAt(half.surface, s)): Stick {
  const width = pairAt(strip, strip.width, s);
  const height = pairAt(strip, strip.height, s);
  const line = lineOf(strip, s, width, place.chord);
  const x = strip.profile === 'triangle' ? line - width / 6 : line;
  const share = line / place.chord;
  if (strip.seat === 'top' || strip.seat === 'bottom') {
    const inward = strip.seat === 'top' ? -1 : 1;
    const outer = rise(place, strip.seat, share) + inward * roomOver(half, s, strip.seat, share);
    return { width, height, line, x, rise: outer + (inward * height) / 2 };
  }
  return { width, height, line, x, rise: middle(place, share) };
}

function lineOf(strip: Strip, s: number, width: number, chord: number): number {
  if (strip.seat === 'nose') return width / 2;
  if (strip.seat === 'tail') return chord - width / 2;
  return pairAt(strip, strip.at ?? [0, 0], s) * chord;
}

/** Shares of the chord between which a rib stands: behind the nose strips, before the tail strips. */
export function extentAt(half: Half, s: number, chord: number): [front: number, back: number] {
  const widest = (seat: 'nose' | 'tail') =>
    Math.max(
      0,
      ...stripsAt(half, s)
        .filter((p) => p.seat === seat)
        .map((p) => pairAt(p, p.width, s)),
    );
  return [widest('nose') / chord, 1 - widest('tail') / chord];
}
