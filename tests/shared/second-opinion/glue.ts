import type { Strip } from '#shared/core/plan.ts';
import { FACES } from './contour.ts';
import { put } from './heap.ts';
import {
  extentAt,
  reach,
  ribsIn,
  roomOver,
  skinsAt,
  stickAt,
  stripsAt,
  tipBlockOf,
  type Half,
  type Stick,
} from './half.ts';
import { depth, placeAt, walk, type Place } from './place.ts';
import { sectionCentroid } from './sheets.ts';
import { alongStrip } from './sticks.ts';
import { emptyTally, type Tally } from './tally.ts';

/** Every contact area of one half, each where its rib or strip is; the layers of glue are counted by the mass. */
export function sliceJoints(half: Half): Tally {
  const tally = emptyTally();
  tally.pieces = 1;
  for (const rib of ribsIn(half, { from: 0, to: half.tip })) addRibJoints(tally, half, rib);
  addStripJoints(tally, half);
  if (tipBlockOf(half)) {
    const { area, x, rise } = sectionCentroid(half);
    put(tally.area, half.hand, placeAt(half.surface, half.tip), area, { x, rise });
  }
  return tally;
}

function addRibJoints(tally: Tally, half: Half, { s, thickness }: { s: number; thickness: number }): void {
  const place = placeAt(half.surface, s);
  const [front, back] = extentAt(half, s, place.chord);
  const add = (area: number, x: number, rise: number) => put(tally.area, half.hand, place, area, { x, rise });
  for (const strip of stripsAt(half, s)) {
    const stick = stickAt(half, strip, s, place);
    if (strip.seat === 'nose' || strip.seat === 'tail') {
      const face = stick.line + (strip.seat === 'nose' ? stick.width : -stick.width) / 2;
      add(buttHeight(half, s, place, stick, face) * thickness, face, stick.rise);
    } else {
      const touching = strip.letIn ? stick.width + 2 * stick.height : stick.width;
      add(touching * thickness, stick.line, stick.rise);
    }
  }
  for (const skin of skinsAt(half, s)) {
    for (const face of FACES) {
      const [start, end] = reach(skin, face) ?? [0, 0];
      walk(place, face, Math.max(start, front), Math.min(end, back), (bit) =>
        add(bit.length * thickness, bit.x, bit.rise),
      );
    }
  }
}

/** What the rib and the strip that it butts on have both in height at that face. */
function buttHeight(half: Half, s: number, place: Place, stick: Stick, face: number): number {
  const share = face / place.chord;
  const skins = roomOver(half, s, 'top', share) + roomOver(half, s, 'bottom', share);
  return Math.min(stick.height, Math.max(0, depth(place, share) - skins));
}

/** The faces on which a strip touches a skin over it: an edge touches on both, a strip in the middle on none. */
const touching = ({ seat }: Strip) =>
  FACES.filter((face) => seat === face || seat === 'nose' || seat === 'tail');

function addStripJoints(tally: Tally, half: Half): void {
  for (const strip of half.parts) {
    if (strip.kind !== 'strip') continue;
    alongStrip(half, strip, (stick, place, length, s) => {
      for (const face of touching(strip)) {
        if (roomOver(half, s, face, stick.line / place.chord) === 0) continue;
        put(tally.area, half.hand, place, stick.width * length, { x: stick.line, rise: stick.rise });
      }
    });
  }
}
