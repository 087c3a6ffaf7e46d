import { breaksUnderSkins } from '../breaks.ts';
import { developedAt, skinOver, stripZ } from '../fit.ts';
import { covers, ribExtent, stretchOf, stripAt, type Half } from '../half.ts';
import { addAmount, emptyLump } from '../lump.ts';
import type { Strip } from '../plan.ts';
import { areaBetween } from '../section-integrals.ts';
import { pointOf, samplesOver, stationAt, type Station } from '../stations.ts';
import { ribHeight } from './ribs.ts';
import { stripSkew } from './strip.ts';
import type { Measure } from './measure.ts';

/**
 * Area of all joints of one half, mm², each at its place: rib × strip, rib × skin, strip × skin over it, and the
 * tip block on the last section. What a glue weighs is its spread, g per m², times this.
 * @example measureJoints(EXAMPLE_HALF).area // → 3208
 */
export function measureJoints(half: Half): Measure {
  const lump = emptyLump();
  for (const { part, stations } of half.ribs) {
    for (const station of stations) {
      const near = stretchOf(half, station.s, station.s);
      for (const strip of near.strips) ribOnStrip(near, strip, station, part.thickness, lump);
      ribOnSkins(near, station, part.thickness, lump);
    }
  }
  for (const strip of half.strips) stripUnderSkins(half, strip, lump);
  for (const tip of half.parts) {
    if (tip.kind !== 'tipBlock') continue;
    const last = stationAt(half.line, half.line.length);
    const { amount, x, z } = areaBetween(last.section, 0, 1);
    if (amount <= 0) continue;
    addAmount(
      lump,
      amount * last.chord ** 2,
      pointOf(last, (x / amount) * last.chord, (z / amount) * last.chord),
    );
  }
  return { pieces: 1, length: null, area: lump.amount, volume: null, lump };
}

type Joints = Measure['lump'];

function ribOnStrip(half: Half, strip: Strip, station: Station, thickness: number, joints: Joints): void {
  if (!covers(strip, station.s)) return;
  const place = stripAt(strip, station);
  const z = stripZ(half, strip, station, place);
  if (strip.seat === 'nose' || strip.seat === 'tail') {
    // The rib butts on the strip over what both have in height there: a strip is sanded down to the section.
    const face = strip.seat === 'nose' ? place.back : place.front;
    const height = Math.min(place.height, ribHeight(half, station, face / station.chord));
    addAmount(joints, height * thickness, pointOf(station, face, z));
    return;
  }
  const contact = strip.letIn ? place.width + 2 * place.height : place.width;
  addAmount(joints, contact * thickness, pointOf(station, place.centre, z));
}

function ribOnSkins(half: Half, station: Station, thickness: number, joints: Joints): void {
  const extent = ribExtent(half, station);
  for (const skin of half.skins) {
    if (!covers(skin, station.s)) continue;
    const arc = developedAt(skin, station, extent);
    if (arc.amount <= 0) continue;
    addAmount(joints, arc.amount * thickness, pointOf(station, arc.x / arc.amount, arc.z / arc.amount));
  }
}

const FACES = {
  top: ['upper'],
  bottom: ['lower'],
  middle: [],
  nose: ['upper', 'lower'],
  tail: ['upper', 'lower'],
} as const;

/** A spar lies under the skin of its own face; an edge fills the section and touches the skins of both. */
function stripUnderSkins(half: Half, strip: Strip, joints: Joints): void {
  const faces = FACES[strip.seat];
  if (faces.length === 0 || half.skins.length === 0) return;
  const [from, to] = [Math.min(strip.from, strip.to), Math.max(strip.from, strip.to)];
  const near = stretchOf(half, from, to);
  for (const { station, ds } of samplesOver(half.line, from, to, breaksUnderSkins(near, strip, from, to))) {
    if (station.chord <= 0) continue;
    const place = stripAt(strip, station);
    const x = place.centre / station.chord;
    const touching = faces.filter((face) => skinOver(near, station, face, x) > 0).length;
    if (touching === 0) continue;
    const area = touching * place.width * Math.hypot(1, stripSkew(strip, station)) * ds;
    addAmount(joints, area, pointOf(station, place.centre, stripZ(near, strip, station, place)));
  }
}
