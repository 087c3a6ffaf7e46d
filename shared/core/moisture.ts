/**
 * Equilibrium moisture content of wood in air, as a fraction of ovendry mass: Hailwood–Horrobin equation, Wood
 * Handbook (FPL-GTR-190, 2010) eq. 4-5, constants for °C (W. T. Simpson, FPL-RN-0268, 1998). One curve serves all
 * species. `relativeHumidity` is a fraction from 0 to below 1; null outside, where the equation says nothing.
 * @example equilibriumMoisture(21.1, 0.5)?.toFixed(3) // → '0.092'
 */
export function equilibriumMoisture(temperatureC: number, relativeHumidity: number): number | null {
  const h = relativeHumidity;
  const t = temperatureC;
  if (!(h >= 0 && h < 1)) return null;
  const w = 349 + 1.29 * t + 0.0135 * t * t;
  const k = 0.805 + 0.000736 * t - 0.00000273 * t * t;
  const k1 = 6.27 - 0.00938 * t - 0.000303 * t * t;
  const k2 = 1.91 + 0.0407 * t - 0.000293 * t * t;
  const kh = k * h;
  const bound = (k1 * kh + 2 * k1 * k2 * kh * kh) / (1 + k1 * kh + k1 * k2 * kh * kh);
  return (18 / w) * (kh / (1 - kh) + bound);
}

/**
 * Mass of the same bare wood at another moisture content: m₂ = m₁(1 + x₂)/(1 + x₁), by definition of moisture as a
 * fraction of ovendry mass. In the unit of `mass`.
 * @example massAtMoisture(110, 0.1, 0) // → 100
 */
export function massAtMoisture(mass: number, moisture: number, other: number): number {
  return (mass * (1 + other)) / (1 + moisture);
}
