import { loadingOf, speedAt } from '../loading.ts';

/** The model with some of its wind ballast aboard. */
export interface WindStep {
  /** at the balance point, g */
  ballast: number;
  /** g */
  mass: number;
  /** g/dm²; null without a wing */
  loading: number | null;
  /** m/s at the greatest and at the chosen lift coefficient */
  stall: number | null;
  trim: number | null;
  /** times the speed without ballast: √(mass ratio) */
  faster: number;
}

/**
 * What ballast at the balance point does to loading and speeds, step by step; the balance stays where it is. `area`
 * mm², `density` kg/m³, `cl` lift coefficient of the trim asked for.
 * @example windSteps({ mass: 100, area: 100_000, clMax: 1, cl: 0.5, density: 1.225 }, [0, 44]).map(({ faster }) => faster) // → [1, 1.2]
 */
export function windSteps(
  model: { mass: number; area: number; clMax: number; cl: number; density: number },
  ballasts: readonly number[],
): WindStep[] {
  return ballasts.map((ballast) => {
    const mass = model.mass + ballast;
    return {
      ballast,
      mass,
      loading: loadingOf(mass, model.area),
      stall: speedAt(mass, model.area, model.clMax, model.density),
      trim: speedAt(mass, model.area, model.cl, model.density),
      faster: model.mass > 0 ? Math.sqrt(mass / model.mass) : 1,
    };
  });
}

/**
 * Balance range, mm aft of the datum, of a range of static margins: x = xₙ − margin·MAC; the larger margin is the
 * forward end.
 * @example rangeOfMargins(100, 200, { least: 0.05, most: 0.15 }) // → { from: 70, to: 90 }
 */
export function rangeOfMargins(
  neutralPoint: number,
  mac: number,
  { least, most }: { least: number; most: number },
): { from: number; to: number } {
  return { from: neutralPoint - most * mac, to: neutralPoint - least * mac };
}
