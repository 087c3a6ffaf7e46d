import type { Point } from '#shared/drawing/shape.ts';
import { snapLength } from '#shared/drawing/snap.ts';
import type { Recipe } from '../edits/plan-edits.ts';

/** Along the span (s, mm from the root) or along the chord (x, mm). */
export type Axis = 's' | 'x';

/** One number that a handle changes. */
export interface Reach {
  /** as it is, mm */
  value: number;
  min: number;
  max: number;
  /** places worth falling onto, such as ribs */
  marks: readonly number[];
  /** in words, such as `from the root` */
  word: string;
  set: (value: number) => Recipe;
}

/** A place of the drawing that can be taken hold of, by pointer or by keyboard, to change what is drawn. */
export interface Handle {
  /** always the same for the same place, so that a hold survives what it changes */
  id: string;
  /** such as `Rib 5` */
  name: string;
  /** x aft and s, mm, of the starboard half laid flat */
  at: Point;
  reach: Partial<Record<Axis, Reach>>;
}

/** Least length that a handle leaves of anything, mm. */
export const LEAST = 1;

export const within = (low: number, value: number, high: number) => Math.max(low, Math.min(high, value));

/** The value that a reach takes when it is pushed to `wanted`: a mark nearby, else a step of the unit. */
export function aimed({ min, max, marks }: Reach, wanted: number, step: number, near: number): number {
  return within(min, snapLength(wanted, step, marks, near), max);
}

/** The next step of the unit in a direction; `by` more than one of them. */
export function stepped({ value, min, max }: Reach, step: number, direction: 1 | -1, by = 1): number {
  const here = value / step;
  const next = direction === 1 ? Math.floor(here + 1e-6) + by : Math.ceil(here - 1e-6) - by;
  return within(min, snapLength(next * step, step), max);
}
