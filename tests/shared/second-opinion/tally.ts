import { Heap, put, type Hand } from './heap.ts';
import type { Place } from './place.ts';

/** What the slices of a part come to. A part weighs by its volume or, of areal material, by its area. */
export interface Tally {
  pieces: number;
  length: number;
  volume: Heap;
  area: Heap;
}

export const emptyTally = (): Tally => ({ pieces: 0, length: 0, volume: new Heap(), area: new Heap() });

export function addTally(sum: Tally, more: Tally): Tally {
  sum.pieces += more.pieces;
  sum.length += more.length;
  sum.volume.addAll(more.volume);
  sum.area.addAll(more.area);
  return sum;
}

/** A bit of a part with an area and that area's thickness. */
export function putBoth(
  tally: Tally,
  hand: Hand,
  place: Place,
  area: number,
  thickness: number,
  at: Parameters<typeof put>[4],
): void {
  put(tally.area, hand, place, area, at);
  put(tally.volume, hand, place, area * thickness, at);
}
