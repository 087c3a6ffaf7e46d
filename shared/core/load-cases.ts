import type { Spar, SparStation } from './result.ts';

/**
 * Most lift that a wing can give at a speed, over its weight: n = (V/V_s)², both speeds in the same unit and the
 * same air, V_s the stall speed at n = 1 (the stall line of the flight envelope). What a line, a throw or a gust
 * asks for cannot be more: the wing stalls first. Null without a stall speed.
 * @example loadFactorAt(12, 4) // → 9
 */
export function loadFactorAt(speed: number, stall: number | null): number | null {
  return stall !== null && stall > 0 && speed >= 0 ? (speed / stall) ** 2 : null;
}

/**
 * Speed at which a wing can just reach a load factor, in the unit of the stall speed: V = V_s·√n. Null without a
 * stall speed.
 * @example speedAtLoadFactor(9, 4) // → 12
 */
export function speedAtLoadFactor(n: number, stall: number | null): number | null {
  return stall !== null && stall > 0 && n >= 0 ? stall * Math.sqrt(n) : null;
}

/**
 * A spar's stations at another load factor: moment and stress grow with it, the margin shrinks. `from` is the load
 * factor that the stations are told for. None where a load factor is not above 0.
 * @example atLoadFactor([{ s: 0, moment: 100, stress: 2, margin: 6 }], 2, 4) // → [{ s: 0, moment: 200, stress: 4, margin: 3 }]
 */
export function atLoadFactor(stations: readonly SparStation[], from: number, to: number): SparStation[] {
  if (!(from > 0 && to > 0)) return [];
  const by = to / from;
  return stations.map(({ s, moment, stress, margin }) => ({
    s,
    moment: moment * by,
    stress: stress * by,
    margin: margin / by,
  }));
}

/**
 * The station with the least margin; null where no strip carries.
 * @example worstStation({ stations: [{ s: 0, moment: 9, stress: 2, margin: 6 }], worst: 0 })?.margin // → 6
 */
export function worstStation({ stations, worst }: Spar): SparStation | null {
  return stations.find(({ s }) => s === worst) ?? null;
}

/**
 * Load factor at which the least margin is 1, where the spar as reckoned just reaches its strength: the load factor
 * of the stations times their least margin. Null where no strip carries.
 * @example loadFactorAtStrength({ stations: [{ s: 0, moment: 9, stress: 2, margin: 6 }], worst: 0 }, 2) // → 12
 */
export function loadFactorAtStrength(spar: Spar, loadFactor: number): number | null {
  const worst = worstStation(spar);
  return worst && loadFactor > 0 ? worst.margin * loadFactor : null;
}
