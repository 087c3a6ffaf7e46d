import type { Strip, Web } from '#shared/core/plan.ts';
import { pairAt, ribsIn, roomOver, stickAt, stripsAt, type Half, type Stick } from './half.ts';
import { placeAt, rise, type Place } from './place.ts';
import { slicesOf } from './slices.ts';
import { emptyTally, putBoth, type Tally } from './tally.ts';

type Shape = Pick<Strip, 'profile' | 'wall'>;

export function crossSection({ profile, wall = 0 }: Shape, width: number, height: number): number {
  switch (profile) {
    case 'rectangle':
      return width * height;
    case 'triangle':
      return (width * height) / 2;
    case 'round':
      return (Math.PI / 4) * width * height;
    case 'tube': {
      const bore = Math.max(0, width - 2 * wall) * Math.max(0, height - 2 * wall);
      return (Math.PI / 4) * (width * height - bore);
    }
  }
}

/** Slices of a strip, each as long as its centre line is from one cut to the next in the plan view. */
export function sliceStrip(half: Half, strip: Strip): Tally {
  const tally = emptyTally();
  tally.pieces = 1;
  alongStrip(half, strip, (stick, place, length) => {
    const area = crossSection(strip, stick.width, stick.height);
    tally.length += length;
    // What is cut from sheet that is sold by area shows its broad side; the narrow one is the sheet's thickness.
    const broad = Math.max(stick.width, stick.height);
    const root = Math.sqrt(strip.profile === 'rectangle' ? 12 : 16);
    const spread = { spreadX: stick.width / root, spreadRise: stick.height / root };
    const at = { x: stick.x, rise: stick.rise, ...spread };
    putBoth(tally, half.hand, place, broad * length, area / broad, at);
  });
  return tally;
}

export function alongStrip(
  half: Half,
  strip: Strip,
  visit: (stick: Stick, place: Place, length: number, s: number) => void,
): void {
  for (const { s, from, to, ds, place } of slicesOf(half, strip)) {
    const plan = (station: number, nudge: number) => {
      // Just inside the slice, so that a step at a joint is not taken for skew.
      const at = placeAt(half.surface, station + nudge);
      return at.nose + stickAt(half, strip, station + nudge, at).line;
    };
    const nudge = ds / 100;
    const dx = (plan(to, -nudge) - plan(from, nudge)) / 0.98;
    visit(stickAt(half, strip, s, place), place, Math.hypot(ds, dx), s);
  }
}

/** Upright slices between the strips and skins over the web's line, less what the ribs take out. */
export function sliceWeb(half: Half, web: Web): Tally {
  const tally = emptyTally();
  tally.pieces = 1;
  const add = (place: Place, s: number, ds: number) => {
    const share = pairAt(web, web.at, s);
    const { height, centre } = clearHeight(half, place, s, share);
    putBoth(tally, half.hand, place, height * ds, web.thickness, {
      x: share * place.chord,
      rise: centre,
      spreadRise: height / Math.sqrt(12),
    });
  };
  for (const { s, ds, place } of slicesOf(half, web)) {
    tally.length += ds;
    add(place, s, ds);
  }
  for (const rib of ribsIn(half, web)) add(placeAt(half.surface, rib.s), rib.s, -rib.thickness);
  return tally;
}

function clearHeight(half: Half, place: Place, s: number, share: number): { height: number; centre: number } {
  let high = rise(place, 'top', share) - roomOver(half, s, 'top', share);
  let low = rise(place, 'bottom', share) + roomOver(half, s, 'bottom', share);
  let between = 0;
  for (const strip of stripsAt(half, s)) {
    const { line, width, height } = stickAt(half, strip, s, place);
    if (Math.abs(line - share * place.chord) > width / 2) continue;
    if (strip.seat === 'top') high -= height;
    else if (strip.seat === 'bottom') low += height;
    else between += height;
  }
  return { height: Math.max(0, high - low - between), centre: (high + low) / 2 };
}
