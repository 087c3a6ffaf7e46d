import { heightsAt, skinOver, stripZ } from '#shared/core/fit.ts';
import { covers, stripAt, type Half } from '#shared/core/half.ts';
import type { Web } from '#shared/core/plan.ts';
import { ordinateAt } from '#shared/core/section-integrals.ts';
import { pairAt, type Station } from '#shared/core/stations.ts';
import { rectangle } from './section-strips.ts';
import type { Point } from './shape.ts';

/** Pieces of a shear web at a station: between the skins, parted by the strips that lie across its middle. */
export function webPieces(half: Half, web: Web, station: Station): Point[][] {
  const { section, chord, s } = station;
  const x = pairAt(web.at, web.from, web.to, s);
  if (chord <= 0 || heightsAt(half, station, x).underSkins <= 0) return [];
  let gaps: [bottom: number, top: number][] = [
    [
      ordinateAt(section, 'lower', x) * chord + skinOver(half, station, 'lower', x),
      ordinateAt(section, 'upper', x) * chord - skinOver(half, station, 'upper', x),
    ],
  ];
  for (const strip of half.strips) {
    if (!covers(strip, s)) continue;
    const place = stripAt(strip, station);
    if (Math.abs(place.centre - x * chord) > place.width / 2 + 1e-9) continue;
    const z = stripZ(half, strip, station, place);
    const [bottom, top] = [z - place.height / 2, z + place.height / 2];
    gaps = gaps.flatMap(([low, high]): [number, number][] => [
      [low, Math.min(high, bottom)],
      [Math.max(low, top), high],
    ]);
  }
  const [left, right] = [x * chord - web.thickness / 2, x * chord + web.thickness / 2];
  return gaps
    .filter(([low, high]) => high - low > 1e-9)
    .map(([low, high]) => rectangle(left, right, low, high));
}
