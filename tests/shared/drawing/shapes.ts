import { polygonArea } from 'd3-polygon';
import type { Part, Surface } from '#shared/core/plan.ts';
import type { Shape } from '#shared/drawing/shape.ts';
import { wingOf } from '#tests/support/plans.ts';

/** Area of a drawn shape by a second opinion. */
export const areaOf = (shape: Pick<Shape, 'points'>) =>
  Math.abs(polygonArea(shape.points.map(([x, y]) => [x, y])));

/** A cranked, swept, tapered wing whose breaks fall on no round figure. */
export const cranked = (parts: Part[]): Surface =>
  wingOf(parts, {
    apex: [7, 11, 3],
    panels: [
      {
        span: 311,
        rootChord: 173,
        tipChord: 151,
        sweep: 13,
        dihedral: 5,
        rootSection: { naca: '4409' },
        tipSection: { naca: '4409' },
      },
      {
        span: 197,
        rootChord: 151,
        tipChord: 83,
        sweep: 41,
        dihedral: 17,
        rootSection: { naca: '4409' },
        tipSection: { naca: '2408' },
      },
    ],
  });
