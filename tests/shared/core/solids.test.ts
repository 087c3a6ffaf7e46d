import { describe, expect, it } from 'vitest';
import { estimate } from '#shared/core/estimate.ts';
import type { Bar, Plate, Solid } from '#shared/core/plan.ts';
import { expectNearly, ROUNDING } from '#tests/support/nearly.ts';
import { lineOf, planOf } from '#tests/support/plans.ts';

const bar = (changes: Partial<Bar> = {}): Bar => ({
  id: 's',
  name: 'Boom',
  group: 'fuselage',
  material: 'balsa',
  shape: 'bar',
  from: [0, 0, 0],
  to: [600, 0, 0],
  width: [6, 3],
  height: [3, 3],
  profile: 'rectangle',
  ...changes,
});
const plate = (changes: Partial<Plate> = {}): Plate => ({
  id: 's',
  name: 'Side',
  group: 'fuselage',
  material: 'balsa',
  shape: 'plate',
  outline: [
    [0, 0],
    [6, 0],
    [0, 3],
  ],
  thickness: 2,
  count: 2,
  y: 0,
  cutout: 0,
  ...changes,
});
const answer = (solid: Solid) => estimate(planOf([], { solids: [solid] }));
const line = (solid: Solid) => lineOf(answer(solid), 'solid/s');

describe('a bar', () => {
  it('tapered in one side has the volume and centre of the prismatoid', () => {
    // Constructed, exact: 600 long, 6×3 to 3×3 mm: 8,100 mm³, centre 266.667 from the thick end.
    expectNearly(line(bar()).volume, 8100, ROUNDING);
    expectNearly(line(bar()).at[0], 800 / 3, ROUNDING);
  });

  it('is as long as the way between its ends', () => {
    expectNearly(line(bar({ to: [300, 0, 400] })).length, 500, ROUNDING);
  });

  it('as a tube has a bore, and a wall too thick makes it solid and is told', () => {
    const tube = bar({ profile: 'tube', width: [6, 6], height: [6, 6], wall: 1 });
    expectNearly(line(tube).volume, Math.PI * (9 - 4) * 600, ROUNDING);
    const thick = { ...tube, wall: 4 };
    expectNearly(line(thick).volume, Math.PI * 9 * 600, ROUNDING);
    expect(answer(thick).notices).toContainEqual({ code: 'tube_wall_too_thick', path: 'solid/s' });
  });
});

describe('a plate', () => {
  it('weighs outline × thickness × count, less what is cut out', () => {
    // The triangle (0,0)(6,0)(0,3) has an area of 9 and its centroid at (2, 1).
    expectNearly(line(plate()).volume, 9 * 2 * 2, ROUNDING);
    expectNearly(line(plate({ cutout: 0.5 })).volume, 18, ROUNDING);
    expect(line(plate()).at).toEqual([2, 0, 1]);
    expect(line(plate()).pieces).toBe(2);
  });

  it('does not mind which way round its outline runs', () => {
    expectNearly(
      line(
        plate({
          outline: [
            [0, 3],
            [6, 0],
            [0, 0],
          ],
        }),
      ).volume,
      36,
      ROUNDING,
    );
  });

  it('without an area weighs nothing and is told', () => {
    const flat = plate({
      outline: [
        [0, 0],
        [5, 0],
        [9, 0],
      ],
    });
    expect(line(flat).mass).toBe(0);
    expect(answer(flat).notices).toContainEqual({ code: 'outline_without_area', path: 'solid/s' });
  });
});
