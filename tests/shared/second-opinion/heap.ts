import type { Vec3 } from '#shared/core/frame.ts';
import { cosine, type Place } from './place.ts';

/** A heap of small grains, of which only the sums are kept: amount, first and second moments. */
export class Heap {
  amount = 0;
  first: Vec3 = [0, 0, 0];
  second: Vec3 = [0, 0, 0];

  add(amount: number, at: Vec3): void {
    this.amount += amount;
    for (const i of [0, 1, 2] as const) {
      this.first[i] += amount * at[i];
      this.second[i] += amount * at[i] ** 2;
    }
  }

  addAll(other: Heap, factor = 1): void {
    this.amount += other.amount * factor;
    for (const i of [0, 1, 2] as const) {
      this.first[i] += other.first[i] * factor;
      this.second[i] += other.second[i] * factor;
    }
  }

  get centre(): Vec3 {
    return this.amount === 0 ? [0, 0, 0] : ([0, 1, 2].map((i) => (this.first[i] ?? 0) / this.amount) as Vec3);
  }
}

/** 1 to starboard, −1 to port. */
export type Hand = 1 | -1;

/**
 * Puts an amount into the heap that lies `x` behind the nose and `rise` square to the panel, spread evenly with
 * these root mean squares.
 */
export function put(
  heap: Heap,
  hand: Hand,
  place: Place,
  amount: number,
  at: { x: number; rise: number; spreadX?: number; spreadRise?: number; beyond?: number },
): void {
  const { x, rise, spreadX = 0, spreadRise = 0, beyond = 0 } = at;
  const sin = Math.sin(place.dihedral);
  const cos = cosine(place.dihedral);
  const spread = spreadX > 0 || spreadRise > 0;
  for (const sign of spread ? [1, -1] : [1]) {
    const over = rise + sign * spreadRise;
    heap.add(amount / (spread ? 2 : 1), [
      place.nose + x + sign * spreadX,
      hand * (place.y + beyond * cos - over * sin),
      place.z + beyond * sin + over * cos,
    ]);
  }
}
