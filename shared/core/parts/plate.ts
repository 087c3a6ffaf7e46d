import type { Half } from '../half.ts';
import { addAmount, emptyLump } from '../lump.ts';
import type { Sheet, TipBlock } from '../plan.ts';
import { areaBetween } from '../section-integrals.ts';
import { pointOf, samplesOver, stationAt } from '../stations.ts';
import type { Basis, Measure } from './measure.ts';

/**
 * Half an ellipsoid on the last section: volume 2/3 · area · length · (1 − hollow), its centroid 3/8 of the length
 * beyond the last station, shrinking towards the section's centroid. mm, mm³.
 * @example measureTipBlock(EXAMPLE_HALF, { kind: 'tipBlock', id: 'tip', name: 'Tip', material: 'balsa', length: 30, hollow: 0 }).volume // → 20_000
 */
export function measureTipBlock(half: Half, part: TipBlock): Measure {
  const last = stationAt(half.line, half.line.length);
  const section = areaBetween(last.section, 0, 1);
  const volume = (2 / 3) * section.amount * last.chord ** 2 * part.length * (1 - part.hollow);
  const lump = emptyLump();
  if (section.amount > 0) {
    const x = (section.x / section.amount) * last.chord;
    const z = (section.z / section.amount) * last.chord;
    const at = pointOf({ ...last, s: last.s + (3 / 8) * part.length }, x, z);
    addAmount(lump, volume, at, last.chord ** 2 / 20);
  }
  return { pieces: 1, length: part.length, area: null, volume, lump };
}

/**
 * A plate of the surface's whole planform, tip blocks' outline in: a sheet tail or wing. Area = planform · (1 −
 * cutout), mm²; volume = area · thickness, mm³.
 * @example measureSheet(EXAMPLE_HALF, { kind: 'sheet', id: 'plate', name: 'Plate', material: 'balsa', thickness: 3, cutout: 0 }, 'volume').volume // → 150_000
 */
export function measureSheet(half: Half, part: Sheet, basis: Basis): Measure {
  const lump = emptyLump();
  const left = (1 - part.cutout) * (basis === 'volume' ? part.thickness : 1);
  for (const { station, ds } of samplesOver(half.line, 0, half.line.length)) {
    addAmount(
      lump,
      station.chord * ds * left,
      pointOf(station, station.chord / 2, 0),
      station.chord ** 2 / 12,
    );
  }
  const last = stationAt(half.line, half.line.length);
  const section = areaBetween(last.section, 0, 1);
  const middle = section.amount > 0 ? section.x / section.amount : 0.5;
  for (const tip of half.parts) {
    if (tip.kind !== 'tipBlock') continue;
    // Half an ellipse shrinking towards the section's centroid; the mean of c·x over it is 2/3, of c alone π/4.
    const area = (Math.PI / 4) * last.chord * tip.length;
    const x = middle * last.chord + ((2 / 3) * last.chord * (0.5 - middle)) / (Math.PI / 4);
    const at = pointOf({ ...last, s: last.s + (4 / (3 * Math.PI)) * tip.length }, x, 0);
    addAmount(lump, area * left, at, last.chord ** 2 / 16);
  }
  const area = basis === 'volume' ? lump.amount / part.thickness : lump.amount;
  return { pieces: 1, length: null, area, volume: area * part.thickness, lump };
}
