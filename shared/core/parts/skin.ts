import { developedAt } from '../fit.ts';
import { covers, type Half } from '../half.ts';
import { addAmount, emptyLump } from '../lump.ts';
import type { CapStrips, Covering, Skin, TipBlock } from '../plan.ts';
import { areaBetween, heightAt } from '../section-integrals.ts';
import { pointOf, samplesOver, stationAt } from '../stations.ts';
import { clippedRange } from './range.ts';
import type { Basis, Measure } from './measure.ts';

/** Extent along x of what lies between two x/c of a chord, as a mean square about its middle, mm². */
const spreadOf = (start: number, end: number, chord: number) => ((end - start) * chord) ** 2 / 12;

/**
 * Sheeting: developed length × chord, integrated over s, × thickness. A skin that runs past the trailing edge, or
 * that the section has no room for, is told.
 * @example measureSkin(EXAMPLE_HALF, EXAMPLE_SKIN, 'volume').volume // → 25_000
 */
export function measureSkin(half: Half, part: Skin, basis: Basis): Measure {
  const path = `${half.surface.key}/${part.id}`;
  const last = Math.max(part.start, part.end);
  if (last > 1 + 1e-9) half.notice({ code: 'skin_past_trailing_edge', path, end: last });
  const [from, to] = clippedRange(half, part);
  const lump = emptyLump();
  let area = 0;
  for (const { station, ds } of samplesOver(half.line, from, to)) {
    const arc = developedAt(part, station);
    if (arc.amount <= 0) continue;
    area += arc.amount * ds;
    const amount = arc.amount * ds * (basis === 'volume' ? part.thickness : 1);
    const spread =
      part.seat === 'wrap' ? spreadOf(0, last, station.chord) : spreadOf(part.start, part.end, station.chord);
    addAmount(lump, amount, pointOf(station, arc.x / arc.amount, arc.z / arc.amount), spread);
  }
  const root = stationAt(half.line, from);
  const middle = part.seat === 'wrap' ? last / 2 : (part.start + part.end) / 2;
  const room = heightAt(root.section, middle) * root.chord;
  if (part.thickness * (part.seat === 'wrap' ? 2 : 1) >= room) {
    half.notice({ code: 'skin_thicker_than_section', path, station: root.s });
  }
  return { pieces: 1, length: null, area, volume: area * part.thickness, lump };
}

/**
 * Cap strips over the ribs that lie in their range: developed length × width × thickness, each rib. None at all is
 * told.
 * @example measureCapStrips(EXAMPLE_HALF, EXAMPLE_CAPS, 'volume').length // → 300
 */
export function measureCapStrips(half: Half, part: CapStrips, basis: Basis): Measure {
  clippedRange(half, part);
  const lump = emptyLump();
  let length = 0;
  let pieces = 0;
  for (const { stations } of half.ribs) {
    for (const station of stations) {
      if (!covers(part, station.s)) continue;
      const arc = developedAt(part, station);
      if (arc.amount <= 0) continue;
      pieces += part.seat === 'both' ? 2 : 1;
      length += arc.amount;
      const amount = arc.amount * part.width * (basis === 'volume' ? part.thickness : 1);
      const spread = spreadOf(part.start, part.end, station.chord);
      addAmount(lump, amount, pointOf(station, arc.x / arc.amount, arc.z / arc.amount), spread);
    }
  }
  if (pieces === 0) half.notice({ code: 'no_ribs_for_caps', path: `${half.surface.key}/${part.id}` });
  return { pieces, length, area: length * part.width, volume: length * part.width * part.thickness, lump };
}

/**
 * Covering or finish: developed length of the whole section × chord, integrated; a tip block in reach takes
 * π/4 of what a prism of its length would, and the overlap is added. mm²; the lump too, whatever the material.
 * @example measureCovering(EXAMPLE_HALF, { ...EXAMPLE_SKIN, kind: 'covering', seat: 'both', overlap: 0.05 }).area // → 105_000
 */
export function measureCovering(half: Half, part: Covering): Measure {
  const [from, to] = clippedRange(half, part);
  const lump = emptyLump();
  const add = 1 + part.overlap;
  for (const { station, ds } of samplesOver(half.line, from, to)) {
    const arc = developedAt({ seat: part.seat }, station);
    if (arc.amount <= 0) continue;
    const at = pointOf(station, arc.x / arc.amount, arc.z / arc.amount);
    addAmount(lump, arc.amount * ds * add, at, spreadOf(0, 1, station.chord));
  }
  if (to >= half.line.length - 1e-6) {
    for (const tip of half.parts) if (tip.kind === 'tipBlock') coverTip(half, part, tip, lump, add);
  }
  return { pieces: 1, length: null, area: lump.amount, volume: null, lump };
}

function coverTip(half: Half, part: Covering, tip: TipBlock, lump: Measure['lump'], add: number): void {
  const last = stationAt(half.line, half.line.length);
  const arc = developedAt({ seat: part.seat }, last);
  if (arc.amount <= 0) return;
  // The outline is half an ellipse: area π/4 of the rectangle, centroid 4/(3π) of the length out. Its slices shrink
  // towards the section's centroid, so the mean arc lies 8/(3π) of the way from there.
  const area = areaBetween(last.section, 0, 1);
  const mean = 8 / (3 * Math.PI);
  const towards = (arcMean: number, centre: number) => centre + mean * (arcMean - centre);
  const centre = area.amount > 0 ? [area.x / area.amount, area.z / area.amount] : [0, 0];
  const x = towards(arc.x / arc.amount, (centre[0] ?? 0) * last.chord);
  const z = towards(arc.z / arc.amount, (centre[1] ?? 0) * last.chord);
  const at = pointOf({ ...last, s: last.s + (4 / (3 * Math.PI)) * tip.length }, x, z);
  addAmount(lump, arc.amount * tip.length * (Math.PI / 4) * add, at, spreadOf(0, 1, last.chord));
}
