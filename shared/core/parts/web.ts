import { breaksOverWeb, signChanges } from '../breaks.ts';
import { skinOver } from '../fit.ts';
import { covers, stretchOf, stripAt, type Half } from '../half.ts';
import { addAmount, emptyLump } from '../lump.ts';
import type { Web } from '../plan.ts';
import { ordinateAt } from '../section-integrals.ts';
import { pairAt, pointOf, samplesOver, type Station } from '../stations.ts';
import { clippedRange } from './range.ts';
import type { Basis, Measure } from './measure.ts';

/**
 * Height left for a shear web, mm, and the z of its middle above the chord line: the section there, less skins over
 * it, less the strips whose width holds it. The height is negative where these leave no room.
 * @example webRoom(EXAMPLE_HALF, EXAMPLE_WEB, EXAMPLE_STATION) // → { height: 7, middle: -1.5 }
 */
export function webRoom(half: Half, web: Web, station: Station): { height: number; middle: number } {
  const x = pairAt(web.at, web.from, web.to, station.s);
  const { section, chord } = station;
  let top = ordinateAt(section, 'upper', x) * chord - skinOver(half, station, 'upper', x);
  let bottom = ordinateAt(section, 'lower', x) * chord + skinOver(half, station, 'lower', x);
  for (const strip of half.strips) {
    if (!covers(strip, station.s)) continue;
    const { centre, width, height } = stripAt(strip, station);
    if (Math.abs(centre - x * chord) > width / 2 + 1e-9) continue;
    if (strip.seat === 'top') top -= height;
    else if (strip.seat === 'bottom') bottom += height;
    else [top, bottom] = [top - height / 2, bottom + height / 2];
  }
  return { height: top - bottom, middle: (top + bottom) / 2 };
}

/**
 * A shear web, grain upright, in the bays between ribs: height integrated over s, less rib thickness × height at
 * each rib. Where there is no height for it, that is told.
 * @example measureWeb(EXAMPLE_HALF, EXAMPLE_WEB, 'volume').area // → 3416
 */
export function measureWeb(half: Half, part: Web, basis: Basis): Measure {
  const path = `${half.surface.key}/${part.id}`;
  const [from, to] = clippedRange(half, part);
  const lump = emptyLump();
  let area = 0;
  const near = stretchOf(half, from, to);
  const add = (station: Station, width: number) => {
    const { height, middle } = webRoom(near, part, station);
    if (height <= 0) {
      half.notice({ code: 'web_without_height', path, station: station.s });
      return;
    }
    const x = pairAt(part.at, part.from, part.to, station.s);
    const at = pointOf(station, x * station.chord, middle);
    area += height * width;
    addAmount(lump, height * width * (basis === 'volume' ? part.thickness : 1), at);
  };
  const breaks = breaksOverWeb(near, part, from, to);
  // Where the room closes the web ends, on the way between two breaks.
  breaks.push(...signChanges(half.line, from, to, 8, (station) => webRoom(near, part, station).height));
  for (const { station, ds } of samplesOver(half.line, from, to, breaks)) add(station, ds);
  for (const { part: ribs, stations } of half.ribs) {
    for (const station of stations) if (covers({ from, to }, station.s)) add(station, -ribs.thickness);
  }
  // Ribs closer than they are thick leave no bay.
  if (area <= 0) return { pieces: 1, length: to - from, area: 0, volume: 0, lump: emptyLump() };
  return { pieces: 1, length: to - from, area, volume: area * part.thickness, lump };
}
