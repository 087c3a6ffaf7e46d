import { balanceOnSupports, type Support } from '../supports.ts';

/** One scale under the model with what is not known of it. */
export interface SupportReading extends Support {
  /** standard uncertainty of reading less tare, g */
  u: number;
  /** standard uncertainty of its place, fore-and-aft and sideways, mm; 0 if not given */
  ux?: number;
  uy?: number;
}

/** What a model on its supports weighs and where it balances, with standard uncertainties. g and mm. */
export interface SupportsAccount {
  mass: number;
  u: number;
  x: number;
  ux: number;
  y: number;
  uy: number;
}

/**
 * Mass and balance point, fore-and-aft and sideways, of a model on any number of supports, each scale and each place
 * with its own uncertainty, all independent (JCGM 100:2008, 5.1.2): ∂x/∂Rᵢ = (xᵢ − x)/M, ∂x/∂xᵢ = Rᵢ/M. Null where
 * the supports carry nothing, or less than nothing.
 * @example supportsAccount([{ reading: 3, tare: 1, x: 0, u: 0 }, { reading: 2, tare: 0, x: 10, u: 0 }]) // → { mass: 4, u: 0, x: 5, ux: 0, y: 0, uy: 0 }
 */
export function supportsAccount(supports: readonly SupportReading[]): SupportsAccount | null {
  const found = balanceOnSupports(supports);
  if (!found || found.mass <= 0) return null;
  const { mass, x, y } = found;
  const doubt = (place: (s: SupportReading) => number, uPlace: (s: SupportReading) => number, at: number) =>
    Math.hypot(
      ...supports.flatMap((s) => [((place(s) - at) / mass) * s.u, ((s.reading - s.tare) / mass) * uPlace(s)]),
    );
  return {
    mass,
    u: Math.hypot(...supports.map((s) => s.u)),
    x,
    ux: doubt(
      (s) => s.x,
      (s) => s.ux ?? 0,
      x,
    ),
    y,
    uy: doubt(
      (s) => s.y ?? 0,
      (s) => s.uy ?? 0,
      y,
    ),
  };
}

/**
 * Standard uncertainty of a place found between two limits, mm: half the width over √3 (JCGM 100:2008, 4.3.7). Of
 * the finger test: a model that tips forward on a finger at 78 mm and aft at 82 mm balances at 80 mm.
 * @example fingerTest(78, 82) // → { x: 80, ux: 1.1547005383792517 }
 */
export function fingerTest(tipsForwardAt: number, tipsAftAt: number): { x: number; ux: number } {
  return {
    x: (tipsForwardAt + tipsAftAt) / 2,
    ux: Math.abs(tipsAftAt - tipsForwardAt) / 2 / Math.sqrt(3),
  };
}
