/** What is known of why a part does not weigh what was estimated; each is measured over planned. */
export interface OverrunCauses {
  /** density of the piece that it was cut from; null where it was not weighed */
  density: number | null;
  /** its thickness as measured; null where it was not */
  thickness: number | null;
  /** usual spread of the material, relative standard deviation */
  cv: number;
}

/** A difference taken apart. g; `rest` is what glue, sanding and everything unmeasured account for. */
export interface Overrun {
  over: number;
  density: number | null;
  thickness: number | null;
  rest: number;
  /** the rest in multiples of what the material's spread and the scale leave open; null where nothing is open */
  surprise: number | null;
  /** a density not measured may well explain the rest, or it takes more than wood's spread to do so */
  likely: 'within_spread' | 'more_than_spread' | 'explained';
}

/**
 * Why a part ran over: how much its measured density and thickness account for, one after the other, and whether
 * the usual spread explains the rest. Below one hundredth of the estimate, or the scale's own doubt, nothing is left
 * to explain.
 * @example overrunOf({ estimated: 10, measured: 12, u: 0.05 }, { density: 1.1, thickness: null, cv: 0.1 }).density // → 1
 */
export function overrunOf(
  { estimated, measured, u }: { estimated: number; measured: number; u: number },
  { density, thickness, cv }: OverrunCauses,
): Overrun {
  const byDensity = density === null ? null : estimated * (density - 1);
  const dense = estimated * (density ?? 1);
  const byThickness = thickness === null ? null : dense * (thickness - 1);
  const over = measured - estimated;
  const rest = over - (byDensity ?? 0) - (byThickness ?? 0);
  const open = Math.hypot(u, density === null ? estimated * cv : 0);
  const surprise = open > 0 ? rest / open : null;
  const slight = Math.abs(rest) <= Math.max(2 * u, estimated / 100);
  const usual = surprise !== null && Math.abs(surprise) <= 2;
  return {
    over,
    density: byDensity,
    thickness: byThickness,
    rest,
    surprise,
    likely: slight ? 'explained' : usual && density === null ? 'within_spread' : 'more_than_spread',
  };
}
