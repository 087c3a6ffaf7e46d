import { breaksUnderSkins, signChanges } from '../breaks.ts';
import { heightsAt, stripZ } from '../fit.ts';
import { covers, stretchOf, stripAt, type Half, type StripAt } from '../half.ts';
import { addAmount, emptyLump } from '../lump.ts';
import type { Strip } from '../plan.ts';
import { pairAt, pairSlope, pointOf, samplesOver, stationAt, type Station } from '../stations.ts';
import { clippedRange } from './range.ts';
import type { Basis, Measure } from './measure.ts';

/**
 * Cross-section area of a strip, mm², and how far behind its centre line the centroid lies, in widths. Sizes in mm;
 * a tube whose `wall` leaves no bore is full, a round one of two sizes is an ellipse.
 * @example stripProfile('triangle', 18, 4) // → { area: 36, shift: -0.16666666666666666 }
 */
export function stripProfile(
  profile: Strip['profile'],
  width: number,
  height: number,
  wall = 0,
): { area: number; shift: number } {
  switch (profile) {
    case 'rectangle':
      return { area: width * height, shift: 0 };
    case 'triangle':
      return { area: (width * height) / 2, shift: -1 / 6 };
    case 'round':
      return { area: (Math.PI / 4) * width * height, shift: 0 };
    case 'tube': {
      const bore = Math.max(0, width - 2 * wall) * Math.max(0, height - 2 * wall);
      return { area: (Math.PI / 4) * (width * height - bore), shift: 0 };
    }
  }
}

/**
 * How far the strip's centre line runs aft per mm of s: its skew in plan view.
 * @example stripSkew({ ...EXAMPLE_SPAR, at: [0.25, 0.3] }, EXAMPLE_STATION) // → 0.01
 */
export function stripSkew(strip: Strip, station: Station): number {
  const widthSlope = pairSlope(strip.width, strip.from, strip.to);
  const { chordSlope, leadingEdgeSlope, chord, s } = station;
  if (strip.seat === 'nose') return leadingEdgeSlope + widthSlope / 2;
  if (strip.seat === 'tail') return leadingEdgeSlope + chordSlope - widthSlope / 2;
  const at = strip.at ?? [0, 0];
  return (
    leadingEdgeSlope +
    pairSlope(at, strip.from, strip.to) * chord +
    pairAt(at, strip.from, strip.to, s) * chordSlope
  );
}

/**
 * A spar, stringer or edge: its cross-section integrated along its own length, plan-view skew included. A strip
 * that leaves chord or section, or shares room with another, is told. Of a material known by area the broader side
 * counts.
 * @example measureStrip(EXAMPLE_HALF, EXAMPLE_SPAR, 'volume').volume // → 5000
 */
export function measureStrip(half: Half, part: Strip, basis: Basis): Measure {
  const [from, to] = clippedRange(half, part);
  const lump = emptyLump();
  const total = { length: 0, area: 0, volume: 0 };
  const near = stretchOf(half, from, to);
  const breaks = [...breaksUnderSkins(half, part, from, to)];
  if (basis === 'area') {
    const broadSide = (station: Station) => stripAt(part, station).width - stripAt(part, station).height;
    breaks.push(...signChanges(half.line, from, to, 1, broadSide));
  }
  for (const { station, ds } of samplesOver(half.line, from, to, breaks)) {
    const place = stripAt(part, station);
    const along = Math.hypot(1, stripSkew(part, station)) * ds;
    const { area, shift } = stripProfile(part.profile, place.width, place.height, part.wall);
    // A strip cut from sheet sold by area: the sheet's thickness is the smaller side.
    const face = Math.max(place.width, place.height);
    total.length += along;
    total.area += face * along;
    total.volume += area * along;
    const at = pointOf(station, place.centre + shift * place.width, stripZ(near, part, station, place));
    addAmount(lump, (basis === 'volume' ? area : face) * along, at, place.width ** 2 / 12);
  }
  checkStrip(near.strips.includes(part) ? near : half, part, from, to);
  return {
    pieces: 1,
    length: total.length,
    area: null,
    volume: total.volume,
    lump,
    ...(basis === 'area' && total),
  };
}

/** Places where a strip's own fit is looked at: its ends and the breaks between. */
function lookAt(half: Half, from: number, to: number): Station[] {
  const breaks = half.line.panels.map((panel) => panel.end).filter((s) => s > from && s < to);
  return [from, ...breaks, to].map((s) => stationAt(half.line, s));
}

function checkStrip(half: Half, part: Strip, from: number, to: number): void {
  const path = `${half.surface.key}/${part.id}`;
  if (part.profile === 'tube' && 2 * (part.wall ?? 0) > Math.min(...part.width, ...part.height)) {
    half.notice({ code: 'tube_wall_too_thick', path });
  }
  for (const station of lookAt(half, from, to)) {
    const place = stripAt(part, station);
    const beyond = Math.max(-place.front, place.back - station.chord);
    if (beyond > 1e-6) {
      half.notice({ code: 'strip_outside_chord', path, station: station.s, overBy: beyond });
    } else if (part.seat !== 'nose' && part.seat !== 'tail' && station.chord > 0) {
      const over = place.height - heightsAt(half, station, place.centre / station.chord).underSkins;
      if (over > 1e-6) half.notice({ code: 'strip_outside_section', path, station: station.s, overBy: over });
    }
    checkOverlap(half, part, station, place, path);
  }
}

/** Two strips on the same seat may touch but not share room; each pair is told once, by the later part. */
function checkOverlap(half: Half, part: Strip, station: Station, place: StripAt, path: string): void {
  for (const other of half.strips) {
    if (other === part) return;
    if (other.seat !== part.seat || !covers(other, station.s)) continue;
    // Strips butted end to end meet at a station without sharing room.
    if (Math.min(part.to, other.to) - Math.max(part.from, other.from) <= 1e-6) continue;
    const o = stripAt(other, station);
    const overBy = Math.min(place.back, o.back) - Math.max(place.front, o.front);
    if (overBy > 1e-6) {
      half.notice({ code: 'strips_overlap', path, other: other.id, station: station.s, overBy });
    }
  }
}
