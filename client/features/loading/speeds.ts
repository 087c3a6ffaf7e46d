import { reynoldsNumber, type Air } from '#shared/core/atmosphere.ts';
import { speedAt } from '#shared/core/loading.ts';

/** What speeds are made from. */
export interface Flown {
  /** g */
  mass: number;
  /** mm², projected */
  area: number;
  /** mm */
  mac: number;
}

export interface SpeedAt {
  /** m/s */
  speed: number | null;
  reynolds: number | null;
}

/** Speed and Reynolds number at a lift coefficient in an air. */
export function speedIn(
  { mass, area, mac }: Flown,
  lift: number,
  air: Pick<Air, 'density' | 'viscosity'>,
): SpeedAt {
  const speed = lift > 0 ? speedAt(mass, area, lift, air.density) : null;
  return { speed, reynolds: speed === null ? null : reynoldsNumber(speed, mac, air.density, air.viscosity) };
}

/** One point of a curve; `x` is air density, kg/m³, or lift coefficient. */
export interface CurvePoint {
  x: number;
  stall: number;
  trim: number | null;
}

/** Densities from a hot day on a mountain to a cold one by the sea, kg/m³. */
const THIN = 0.9;
const THICK = 1.35;
const STEPS = 18;

/** Stall and trim speed over air density. */
export function overDensity({ mass, area }: Flown, clMax: number, trimLift: number): CurvePoint[] {
  return steps(THIN, THICK).flatMap((x) => {
    const stall = speedAt(mass, area, clMax, x);
    return stall === null ? [] : [{ x, stall, trim: speedAt(mass, area, trimLift, x) }];
  });
}

/** Speed over lift coefficient, from a fast glide to the stall; every point is one speed. */
export function overLift({ mass, area }: Flown, clMax: number, density: number): CurvePoint[] {
  return steps(Math.min(0.2, clMax / 2), clMax).flatMap((x) => {
    const speed = speedAt(mass, area, x, density);
    return speed === null ? [] : [{ x, stall: speed, trim: null }];
  });
}

function steps(from: number, to: number): number[] {
  return Array.from({ length: STEPS + 1 }, (_, i) => from + ((to - from) * i) / STEPS);
}
