import { developedAt, heightsAt, skinOver, stripZ } from '../fit.ts';
import { covers, ribExtent, ribStations, stretchOf, stripAt, type Half } from '../half.ts';
import { addAmount, emptyLump } from '../lump.ts';
import type { Ribs } from '../plan.ts';
import { areaBetween, ordinateAt, spreadBetween, type Sums } from '../section-integrals.ts';
import { pointOf, stationAt, type Station } from '../stations.ts';
import type { Basis, Measure } from './measure.ts';

/**
 * Net area of a rib with its first moments about nose and chord line, mm² and mm³: the section between nose and
 * tail strip, less skins and cap strips within that extent, less the notches of let-in strips. Lightening is not
 * taken off here. Negative where these leave nothing.
 * @example ribArea(EXAMPLE_HALF, EXAMPLE_STATION) // → { amount: 940, x: 48_500, z: -280 }
 */
export function ribArea(half: Half, station: Station): Sums {
  const { section, chord } = station;
  const extent = ribExtent(half, station);
  const gross = areaBetween(section, extent[0], extent[1]);
  const net: Sums = { amount: gross.amount * chord ** 2, x: gross.x * chord ** 3, z: gross.z * chord ** 3 };
  for (const covered of [half.skins, half.caps]) {
    for (const cover of covered) {
      if (!covers(cover, station.s)) continue;
      const arc = developedAt(cover, station, extent);
      if (arc.amount > 0) takeOff(net, arc.amount * cover.thickness, arc.x / arc.amount, arc.z / arc.amount);
    }
  }
  for (const strip of half.strips) {
    if (!strip.letIn || strip.seat === 'nose' || strip.seat === 'tail' || !covers(strip, station.s)) continue;
    const place = stripAt(strip, station);
    takeOff(net, place.width * place.height, place.centre, stripZ(half, strip, station, place));
  }
  return net;
}

function takeOff(net: Sums, area: number, x: number, z: number): void {
  net.amount -= area;
  net.x -= area * x;
  net.z -= area * z;
}

/** True where the notches at one place on the chord, with the skins over it, leave nothing of the rib. */
function notchedThrough(half: Half, station: Station): boolean {
  const inside = half.strips.filter(
    (strip) => strip.letIn && strip.seat !== 'nose' && strip.seat !== 'tail' && covers(strip, station.s),
  );
  return inside.some((strip) => {
    const place = stripAt(strip, station);
    const over = inside.filter((other) => {
      const o = stripAt(other, station);
      return o.front <= place.centre && o.back >= place.centre;
    });
    const cut = over.reduce((sum, other) => sum + stripAt(other, station).height, 0);
    return cut >= heightsAt(half, station, place.centre / station.chord).underSkins - 1e-9;
  });
}

/**
 * Ribs of one half. Volume = net area × share left by lightening × thickness, at each station. A rib past the tip
 * is told and left out, one that is notched through is told and counts as a piece.
 * @example measureRibs(EXAMPLE_HALF, EXAMPLE_RIBS, 'volume').volume // → 11_280
 */
export function measureRibs(half: Half, part: Ribs, basis: Basis): Measure {
  const path = `${half.surface.key}/${part.id}`;
  const lump = emptyLump();
  let area = 0;
  let pieces = 0;
  for (const s of ribStations(part)) {
    if (s > half.line.length + 1e-6) {
      half.notice({ code: 'station_past_tip', path, station: s, tip: half.line.length });
      continue;
    }
    const station = stationAt(half.line, s);
    const near = stretchOf(half, s, s);
    const net = ribArea(near, station);
    const [from, to] = ribExtent(near, station);
    if (net.amount <= 0 || notchedThrough(near, station)) {
      half.notice({ code: 'rib_notched_through', path, station: s });
    }
    pieces += 1;
    if (net.amount <= 0) continue;
    const left = net.amount * (1 - part.lightening);
    area += left;
    const at = pointOf(station, net.x / net.amount, net.z / net.amount);
    addAmount(
      lump,
      basis === 'volume' ? left * part.thickness : left,
      at,
      spreadBetween(station.section, from, to) * station.chord ** 2,
    );
  }
  return { pieces, length: null, area, volume: area * part.thickness, lump };
}

/**
 * Height that a rib offers at x/c, mm, between the skins' undersides; never negative.
 * @example ribHeight(EXAMPLE_HALF, EXAMPLE_STATION, 0.25) // → 9
 */
export function ribHeight(half: Half, station: Station, x: number): number {
  const top = ordinateAt(station.section, 'upper', x) * station.chord - skinOver(half, station, 'upper', x);
  const bottom =
    ordinateAt(station.section, 'lower', x) * station.chord + skinOver(half, station, 'lower', x);
  return Math.max(0, top - bottom);
}
