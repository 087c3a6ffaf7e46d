import { heightsAt } from '../fit.ts';
import { covers, stripAt, type Half } from '../half.ts';
import { addAmount, emptyLump } from '../lump.ts';
import type { Web } from '../plan.ts';
import { ordinateAt } from '../section-integrals.ts';
import { pairAt, pointOf, samplesOver, type Station } from '../stations.ts';
import { clippedRange } from './range.ts';
import type { Basis, Measure } from './measure.ts';

/** Height left for a shear web, mm: the section there, less skins over it, less strips whose width holds it. */
export function webHeight(half: Half, web: Web, station: Station): number {
  const x = pairAt(web.at, web.from, web.to, station.s);
  let height = heightsAt(half, station, x).underSkins;
  for (const strip of half.strips) {
    if (!covers(strip, station.s)) continue;
    const place = stripAt(strip, station);
    if (Math.abs(place.centre - x * station.chord) <= place.width / 2 + 1e-9) height -= place.height;
  }
  return height;
}

/** A shear web, grain upright, in the bays between ribs: height integrated over s, less each rib's own room. */
export function measureWeb(half: Half, part: Web, basis: Basis): Measure {
  const path = `${half.surface.key}/${part.id}`;
  const [from, to] = clippedRange(half, part);
  const lump = emptyLump();
  let area = 0;
  const add = (station: Station, width: number) => {
    const height = webHeight(half, part, station);
    if (height <= 0) {
      half.notice({ code: 'web_without_height', path, station: station.s });
      return;
    }
    const x = pairAt(part.at, part.from, part.to, station.s);
    const middle = (ordinateAt(station.section, 'upper', x) + ordinateAt(station.section, 'lower', x)) / 2;
    const at = pointOf(station, x * station.chord, middle * station.chord);
    area += height * width;
    addAmount(lump, height * width * (basis === 'volume' ? part.thickness : 1), at);
  };
  const ends = [...half.skinEnds, ...half.strips.flatMap((strip) => [strip.from, strip.to])];
  for (const { station, ds } of samplesOver(half.line, from, to, ends)) add(station, ds);
  for (const { part: ribs, stations } of half.ribs) {
    for (const station of stations) if (covers({ from, to }, station.s)) add(station, -ribs.thickness);
  }
  // Ribs closer than they are thick leave no bay.
  if (area <= 0) return { pieces: 1, length: to - from, area: 0, volume: 0, lump: emptyLump() };
  return { pieces: 1, length: to - from, area, volume: area * part.thickness, lump };
}
