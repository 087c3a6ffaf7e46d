/** Why no ballast can do it: the arm is on the wrong side, or lies on the wanted balance point itself. */
export type BallastRefusal =
  | {
      refused: 'wrong_side';
      /** g that would have to come off at that arm instead, null where none would do */
      takeOff: number | null;
    }
  | { refused: 'at_wanted_point' };
/** The ballast that does it, g, or why none can. */
export type Ballast = { mass: number } | BallastRefusal;

/**
 * Ballast at arm `at` that brings `mass` from balance point `from` to `to`: m = M·(x₀ − x₁)/(x₁ − b)
 * (FAA-H-8083-1B, ch. 7). g and mm; fore and aft or sideways alike. A negative answer is refused with the mass that
 * would have to come off there.
 * @example ballastFor(120, 82, 75, -60) // → { mass: 6.222222222222222 }
 * @example ballastFor(120, 82, 75, 200) // → { refused: 'wrong_side', takeOff: 6.72 }
 */
export function ballastFor(mass: number, from: number, to: number, at: number): Ballast {
  if (from === to) return { mass: 0 };
  if (at === to) return { refused: 'at_wanted_point' };
  const needed = (mass * (from - to)) / (to - at);
  if (needed >= 0) return { mass: needed };
  const takeOff = -needed;
  return { refused: 'wrong_side', takeOff: takeOff < mass ? takeOff : null };
}

/**
 * How far the balance point moves, mm, when `moved` g of `total` g are carried over `distance` mm: m·d/M.
 * @example shiftOf(100, 8000, 120) // → 1.5
 */
export function shiftOf(moved: number, total: number, distance: number): number {
  return (moved * distance) / total;
}

/**
 * How many g of `total` g have to be carried over `distance` mm to move the balance point by `by` mm: M·Δx/d; null
 * where the distance is 0.
 * @example massToShift(7800, 1, 120) // → 65
 */
export function massToShift(total: number, by: number, distance: number): number | null {
  return distance === 0 ? null : (total * by) / distance;
}

/**
 * Balance point, mm, of `mass` g balancing at `from` after `added` g at `at`: (M·x₀ + m·b)/(M + m). Not for masses
 * that come to 0 together.
 * @example balanceAfter(120, 80, 40, 0) // → 60
 */
export function balanceAfter(mass: number, from: number, added: number, at: number): number {
  return (mass * from + added * at) / (mass + added);
}
