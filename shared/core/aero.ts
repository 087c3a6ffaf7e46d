/**
 * Lift slope dC_L/dα of a straight wing per radian, by its aspect ratio: H. B. Helmbold (1942), in the form
 * a = 2π·AR/(2 + √(AR² + 4)); J. D. Anderson, Aircraft Performance and Design, eq. 2.18a. Sweep is left out.
 * @example liftSlope(8).toFixed(5) // → '4.90576'
 */
export function liftSlope(aspectRatio: number): number {
  return (2 * Math.PI * aspectRatio) / (2 + Math.sqrt(aspectRatio ** 2 + 4));
}

/**
 * Downwash slope dε/dα = 2a/(π·AR) far behind an elliptically loaded wing of that aspect ratio (R. C. Nelson,
 * Flight Stability and Automatic Control, ch. 2); `slope` a per radian. A pure number.
 * @example downwashSlope(10).toFixed(5) // → '0.32792'
 */
export function downwashSlope(aspectRatio: number, slope = liftSlope(aspectRatio)): number {
  return (2 * slope) / (Math.PI * aspectRatio);
}

/** What the neutral point of wing and tail hangs on. */
export interface WingAndTail {
  /** mm², projected */
  wingArea: number;
  tailArea: number;
  wingAspectRatio: number;
  tailAspectRatio: number;
  /** tail's quarter-chord point, in wing MACs behind the leading edge of the wing's MAC */
  tailPlace: number;
  /** share of the free stream's dynamic pressure at the tail; 0.9 if not given */
  tailEfficiency?: number;
}

/**
 * Neutral point of wing and tail together, as a fraction of the wing's MAC behind its leading edge:
 * h = (¼ + k·h_t)/(1 + k), k = η·(S_t/S)·(a_t/a_w)·(1 − dε/dα). The fuselage, which moves it forward, is left out.
 * @example neutralPoint({ wingArea: 1, tailArea: 0.15, wingAspectRatio: 10, tailAspectRatio: 5, tailPlace: 3.25, tailEfficiency: 1 }).toFixed(6) // → '0.480569'
 */
export function neutralPoint(given: WingAndTail): number {
  const wingSlope = liftSlope(given.wingAspectRatio);
  const tailSlope = liftSlope(given.tailAspectRatio);
  const downwash = downwashSlope(given.wingAspectRatio, wingSlope);
  const k =
    (given.tailEfficiency ?? 0.9) *
    (given.tailArea / given.wingArea) *
    (tailSlope / wingSlope) *
    (1 - downwash);
  return (0.25 + k * given.tailPlace) / (1 + k);
}
