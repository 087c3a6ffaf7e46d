/** US Standard Atmosphere 1976, lowest layer: constants of its table 2 and section 1.2. */
const SEA_LEVEL = { temperature: 288.15, pressure: 101_325 };
const LAPSE = 0.0065;
/** specific gas constant of dry air, J/(kg·K) */
const GAS = 287.05307;
const EXPONENT = 5.2558761;

/** State of the air. */
export interface Air {
  /** K */
  temperature: number;
  /** Pa */
  pressure: number;
  /** kg/m³ */
  density: number;
  /** dynamic viscosity, Pa·s */
  viscosity: number;
}

/**
 * Dynamic viscosity of air by Sutherland's law as in the US Standard Atmosphere 1976, Pa·s; temperature in K.
 * @example (viscosityOfAir(288.15) * 1e5).toFixed(5) // → '1.78938'
 */
export function viscosityOfAir(temperatureK: number): number {
  return (1.458e-6 * temperatureK ** 1.5) / (temperatureK + 110.4);
}

/**
 * Air of the US Standard Atmosphere 1976 at a pressure altitude (geopotential metres, below 11,000) and, where the
 * day is not standard, at its temperature in °C.
 * @example airAt(0).density.toFixed(4) // → '1.2250'
 */
export function airAt(pressureAltitudeM: number, temperatureC?: number): Air {
  const standard = SEA_LEVEL.temperature - LAPSE * pressureAltitudeM;
  const pressure = SEA_LEVEL.pressure * (standard / SEA_LEVEL.temperature) ** EXPONENT;
  const temperature = temperatureC === undefined ? standard : temperatureC + 273.15;
  return {
    temperature,
    pressure,
    density: pressure / (GAS * temperature),
    viscosity: viscosityOfAir(temperature),
  };
}

/**
 * Reynolds number ρ·V·c/μ; speed in m/s, `chord` in mm, density in kg/m³ (standard at sea level if not given),
 * viscosity in Pa·s (that of 15 °C).
 * @example Math.round(reynoldsNumber(5, 100)) // → 34230
 */
export function reynoldsNumber(
  speed: number,
  chord: number,
  density = airAt(0).density,
  viscosity = viscosityOfAir(SEA_LEVEL.temperature),
): number {
  return (density * speed * (chord / 1000)) / viscosity;
}
