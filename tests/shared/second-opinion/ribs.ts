import type { CapStrips, Ribs } from '#shared/core/plan.ts';
import { FACES } from './contour.ts';
import {
  capsAt,
  extentAt,
  reach,
  ribsIn,
  skinsAt,
  stationsOf,
  stickAt,
  stripsAt,
  type Half,
} from './half.ts';
import { depth, middle, placeAt, walk } from './place.ts';
import { emptyTally, putBoth, type Tally } from './tally.ts';

const SLABS = 1500;

/** Each rib: upright slabs of the section, less skins, cap strips and notches, less lightening. */
export function sliceRibs(half: Half, ribs: Ribs): Tally {
  const tally = emptyTally();
  for (const s of stationsOf(ribs)) {
    tally.pieces += 1;
    addRib(tally, half, ribs, s);
  }
  return tally;
}

function addRib(tally: Tally, half: Half, ribs: Ribs, s: number): void {
  const place = placeAt(half.surface, s);
  const [front, back] = extentAt(half, s, place.chord);
  const kept = 1 - ribs.lightening;
  const add = (area: number, x: number, rise: number, spreadRise = 0) =>
    putBoth(tally, half.hand, place, area * kept, ribs.thickness, { x, rise, spreadRise });

  const step = (back - front) / SLABS;
  for (let k = 0; k < SLABS; k++) {
    const share = front + (k + 0.5) * step;
    const height = depth(place, share);
    add(height * step * place.chord, share * place.chord, middle(place, share), height / Math.sqrt(12));
  }
  for (const sheet of [...skinsAt(half, s), ...capsAt(half, s)]) {
    for (const face of FACES) {
      const [start, end] = reach(sheet, face) ?? [0, 0];
      walk(place, face, Math.max(start, front), Math.min(end, back), (bit) => {
        add(-bit.length * sheet.thickness, bit.x, bit.rise);
      });
    }
  }
  for (const strip of stripsAt(half, s)) {
    if (!strip.letIn || strip.seat === 'nose' || strip.seat === 'tail') continue;
    const stick = stickAt(half, strip, s, place);
    add(-stick.width * stick.height, stick.line, stick.rise);
  }
}

/** One strip on each face of each rib that stands between the stations. */
export function sliceCaps(half: Half, caps: CapStrips): Tally {
  const tally = emptyTally();
  for (const { s } of ribsIn(half, caps)) {
    const place = placeAt(half.surface, s);
    for (const face of FACES) {
      const limits = reach(caps, face);
      if (!limits) continue;
      tally.pieces += 1;
      walk(place, face, ...limits, (bit) => {
        tally.length += bit.length;
        putBoth(tally, half.hand, place, bit.length * caps.width, caps.thickness, bit);
      });
    }
  }
  return tally;
}
