import { describe, expect, it } from 'vitest';
import type { Plan } from '#shared/core/plan.ts';
import { heightOf } from './contour.ts';
import { secondOpinion } from './second-opinion.ts';
import { naca, panel, part, plan, wing } from './stock.ts';

/** The slicer on its own feet: it must find what is known without it before it may judge. */
const lineOf = (of: Plan, id: string) => {
  const line = secondOpinion(of).lines.find((one) => one.id === id);
  if (!line) throw new Error(`There is no line ${id}.`);
  return line;
};

describe('slicer', () => {
  // Abbott & von Doenhoff, Theory of Wing Sections, appendix I, NACA 0012, three decimals.
  it.each([
    [1.25, 1.894],
    [10, 4.683],
    [30, 6.002],
    [60, 4.563],
    [95, 0.807],
  ])('reads the printed ordinate of a 0012 at %f %% of the chord', (x, z) => {
    expect(heightOf(naca('0012'), 'top', x / 100, 100)).toBeCloseTo(z, 2);
    expect(heightOf(naca('0012'), 'bottom', x / 100, 100)).toBeCloseTo(-z, 2);
  });

  // NACA Report 460, table of the 4412, two decimals, from memory; printed to within 0.02.
  it.each([
    [5, 4.73, -2.49],
    [30, 9.76, -2.26],
    [80, 4.89, -0.39],
  ])('reads the printed ordinates of a 4412 at %f %% of the chord', (x, top, bottom) => {
    expect(Math.abs(heightOf(naca('4412'), 'top', x / 100, 100) - top)).toBeLessThan(0.02);
    expect(Math.abs(heightOf(naca('4412'), 'bottom', x / 100, 100) - bottom)).toBeLessThan(0.02);
  });

  it('finds the area that the formula of a symmetric section integrates to', () => {
    const wingOf = wing(
      [panel(100, [120, 120], [naca('0009'), naca('0009')])],
      [part('ribs', { id: 'rib', stations: [50], thickness: 1, lightening: 0 })],
    );
    // Integral of the polynomial of NACA Report 460: 0.6850833 t c².
    expect(lineOf(plan('One rib', [wingOf]), 'wing/rib').area).toBeCloseTo(
      2 * 0.6850833 * 0.09 * 120 ** 2,
      1,
    );
  });

  it('finds the mean chord of a tapered wing', () => {
    const tapered = wing([panel(500, [200, 120], [{ flat: 3 }, { flat: 3 }], { sweep: 40 })], []);
    const { mac, areaDeveloped } = secondOpinion(plan('Tapered', [tapered])).planform['wing'] ?? {};
    // Houghton & Carpenter, Aerodynamics for Engineering Students: ⅔ c (1 + λ + λ²) / (1 + λ).
    expect(mac).toBeCloseTo((2 / 3) * 200 * ((1 + 0.6 + 0.36) / 1.6), 3);
    expect(areaDeveloped).toBeCloseTo(160_000, 6);
  });

  it('finds the area and centroid of a hollow-backed outline', () => {
    const outline: [number, number][] = [
      [0, 0],
      [4, 0],
      [4, 4],
      [2, 1],
      [0, 4],
    ];
    const side = { id: 'side', name: 'Side', group: 'fuselage', material: 'balsa', shape: 'plate' } as const;
    const solids = [{ ...side, outline, thickness: 2, count: 1, y: 0, cutout: 0 }];
    const line = lineOf(plan('Plate', [], { solids }), 'solid/side');
    // By the corners: 10 mm², at 2 and 7/5.
    expect(line.area).toBeCloseTo(10, 5);
    expect(line.at[0]).toBeCloseTo(2, 5);
    expect(line.at[2]).toBeCloseTo(1.4, 5);
  });

  it('finds the volume and centroid of a cone', () => {
    const cone = { id: 'cone', name: 'Cone', group: 'nose', material: 'balsa', shape: 'bar' } as const;
    const ends = { from: [0, 0, 0], to: [90, 0, 0] } satisfies Record<string, [number, number, number]>;
    const solids: Plan['solids'] = [{ ...cone, ...ends, width: [20, 0], height: [20, 0], profile: 'round' }];
    const line = lineOf(plan('Cone', [], { solids }), 'solid/cone');
    // Euclid, Elements XII.10: a third of the cylinder; a quarter of the height from the base.
    expect(line.volume).toBeCloseTo((Math.PI * 100 * 90) / 3, 1);
    expect(line.at[0]).toBeCloseTo(22.5, 3);
  });
});
