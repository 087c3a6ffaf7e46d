/** One scale under the model. */
export interface Support {
  /** what it shows, g */
  reading: number;
  /** what stands on it beside the model, g */
  tare: number;
  /** where the model rests on it, mm aft of the datum … */
  x: number;
  /** … and to starboard; 0 if not given */
  y?: number;
}

/**
 * Mass, g, and balance point, mm, of a model on any number of supports: Σ(R − tare)·x / Σ(R − tare). Null where all
 * of them together carry nothing.
 * @example balanceOnSupports([{ reading: 3, tare: 1, x: 0 }, { reading: 2, tare: 0, x: 10 }]) // → { mass: 4, x: 5, y: 0 }
 */
export function balanceOnSupports(
  supports: readonly Support[],
): { mass: number; x: number; y: number } | null {
  const net = supports.map((s) => ({ ...s, mass: s.reading - s.tare }));
  const mass = net.reduce((sum, s) => sum + s.mass, 0);
  if (mass === 0) return null;
  return {
    mass,
    x: net.reduce((sum, s) => sum + s.mass * s.x, 0) / mass,
    y: net.reduce((sum, s) => sum + s.mass * (s.y ?? 0), 0) / mass,
  };
}

/** Where the third wheel stands and where the datum lies. Lengths in one unit and positive, masses in another. */
export interface WheelLayout {
  third: 'nose' | 'tail';
  datum: 'forward of mains' | 'aft of mains';
  /** datum to main wheels */
  datumToMains: number;
  /** main wheels to third wheel */
  wheelbase: number;
  /** net on the third wheel, and in all */
  onThird: number;
  total: number;
}

/**
 * Balance point aft of the datum, in the unit of the lengths given, by the four wheel-layout forms (FAA-H-8083-30B
 * ch. 6, figs 6-29 to 6-32; the printed sign of the second form is the text's slip, its own working is used). A
 * check on `balanceOnSupports`.
 * @example balanceOfLayout({ third: 'nose', datum: 'forward of mains', datumToMains: 128, wheelbase: 78, onThird: 340, total: 2006 }).toFixed(4) // → '114.7797'
 */
export function balanceOfLayout(layout: WheelLayout): number {
  const fromMains = (layout.onThird * layout.wheelbase) / layout.total;
  const mains = layout.datum === 'forward of mains' ? layout.datumToMains : -layout.datumToMains;
  return layout.third === 'nose' ? mains - fromMains : mains + fromMains;
}

/**
 * Standard uncertainty, mm, of the balance point from scale and tape, all readings and places independent
 * (JCGM 100:2008, 5.1.2): ∂x/∂Rᵢ = (xᵢ − x)/M and ∂x/∂xᵢ = (Rᵢ − tareᵢ)/M. `uReading` g on each support, `uX` mm on
 * each place. Null where the supports carry nothing.
 * @example supportsUncertainty([{ reading: 3, tare: 1, x: 0 }, { reading: 2, tare: 0, x: 10 }], 0.1, 0).toFixed(5) // → '0.17678'
 */
export function supportsUncertainty(
  supports: readonly Support[],
  uReading: number,
  uX: number,
): number | null {
  const found = balanceOnSupports(supports);
  if (!found) return null;
  const { mass, x } = found;
  const square = supports.reduce((sum, s) => {
    const byReading = ((s.x - x) / mass) * uReading;
    const byPlace = ((s.reading - s.tare) / mass) * uX;
    return sum + byReading ** 2 + byPlace ** 2;
  }, 0);
  return Math.sqrt(square);
}
