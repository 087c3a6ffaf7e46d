import { describe, expect, test } from 'vitest';
import reference from '#data/reference/atmosphere.json';
import { airAt, reynoldsNumber } from '#shared/core/atmosphere.ts';
import { expectNear, expectPrinted } from './tolerance.ts';

/** The tables go by geometric altitude; the core, as an altimeter, by geopotential. */
const geopotential = (z: number) => (reference.earthRadius.metres * z) / (reference.earthRadius.metres + z);

describe('US Standard Atmosphere 1976', () => {
  test.each(reference.layer.rows)(`at $z m (${reference.layer.source})`, (row) => {
    const air = airAt(geopotential(row.z));
    expectPrinted(air.temperature, row.temperature, 4);
    expectPrinted(air.pressure, row.pressure, 2);
    expectPrinted(air.density, row.density, 6);
    expectPrinted(air.viscosity * 1e5, row.viscosity * 1e5, 5);
    expectPrinted((air.viscosity / air.density) * 1e5, row.kinematic * 1e5, 5);
    if (row.geopotentialDensity !== null) expectPrinted(airAt(row.z).density, row.geopotentialDensity, 6);
  });

  test.each(reference.printed.rows)(
    `at $z m, as printed (${reference.printed.source})`,
    ({ z, density, viscosityE6 }) => {
      const air = airAt(geopotential(z));
      expectPrinted(air.density, density, 3);
      expectPrinted(air.viscosity * 1e6, viscosityE6, 2);
    },
  );

  test('a warm day thins the air in proportion to its absolute temperature and leaves the pressure', () => {
    const [standard, warm] = [airAt(500), airAt(500, 30)];
    expect(warm.pressure).toBe(standard.pressure);
    expectNear(warm.density * warm.temperature, standard.density * standard.temperature, 1e-14);
    expect(warm.temperature).toBeCloseTo(303.15, 10);
  });
});

describe('Reynolds number', () => {
  const { report, standard } = reference.reynolds;
  test.each(report.rows)(
    `$chord mm at $speed m/s: $reynolds.printed (${report.source})`,
    ({ chord, speed, reynolds }) => {
      expectPrinted(
        reynoldsNumber(speed, chord, 1, report.kinematicViscosity),
        reynolds.printed,
        reynolds.decimals,
      );
    },
  );

  test.each(standard.rows)(`$chord mm at $speed m/s: $seaLevel (${standard.source})`, (row) => {
    const high = airAt(geopotential(1500));
    expectPrinted(reynoldsNumber(row.speed, row.chord, standard.seaLevelDensity), row.seaLevel, 0);
    // The layer's own formulas give 1.224999 kg/m³ at sea level.
    expectNear(reynoldsNumber(row.speed, row.chord), row.seaLevel, row.chord < 300 ? 4e-5 : 1e-6);
    if (row.at1500 !== null) {
      expectPrinted(reynoldsNumber(row.speed, row.chord, high.density, high.viscosity), row.at1500, 0);
    }
  });
});
