import { describe, expect, it, test } from 'vitest';
import reference from '#data/reference/moisture.json';
import { equilibriumMoisture, massAtMoisture } from '#shared/core/moisture.ts';
import { expectNear, SAME_SUM } from './tolerance.ts';

describe(`equilibrium moisture (${reference.equilibrium.source})`, () => {
  const cells = reference.equilibrium.rows.flatMap(({ celsius, percent }) =>
    percent.map((printed, i) => ({
      celsius,
      humidity: reference.equilibrium.humidity[i] ?? Number.NaN,
      printed,
    })),
  );
  // The table is printed to 0.1 from Fahrenheit steps; its cells lie within 0.06 points of its own equation.
  test.each(cells)('$celsius °C, $humidity %: $printed %', ({ celsius, humidity, printed }) => {
    const found = equilibriumMoisture(celsius, humidity / 100);
    expect(Math.abs((found ?? Number.NaN) * 100 - printed)).toBeLessThan(0.06);
  });
});

describe('moisture', () => {
  it('changes the mass of bare wood by the water alone, there and back', () => {
    expectNear(massAtMoisture(massAtMoisture(73, 0.08, 0.13), 0.13, 0.08), 73, SAME_SUM);
  });

  it.each(reference.changes.rows)(
    `from $from to $to % at 20 °C: $change % (${reference.changes.source})`,
    ({ from, to, change }) => {
      const [x1, x2] = [equilibriumMoisture(20, from / 100), equilibriumMoisture(20, to / 100)];
      const grown = massAtMoisture(100, x1 ?? Number.NaN, x2 ?? Number.NaN) - 100;
      expect(Math.abs(grown - change)).toBeLessThan(0.06);
    },
  );

  it('has no answer outside the range of relative humidity', () => {
    expect(equilibriumMoisture(20, 1)).toBeNull();
    expect(equilibriumMoisture(20, -0.1)).toBeNull();
  });
});
