import type { Part } from '#shared/core/plan.ts';
import { naca, panel, part, strip, wing } from './stock.ts';

/** A built-up wing of two panels with its ribs, edges and spars, for plans to add their own parts to. */
export const NOWHERE: [number, number] = [0, 0];
export const whole = { from: 0, to: 520 };
export const built = (parts: Part[]) =>
  wing(
    [
      panel(320, [160, 140], [naca('4412'), naca('4409')], { sweep: 8, dihedral: 3 }),
      panel(200, [140, 90], [naca('4409'), naca('2410')], { sweep: 24, dihedral: 11 }),
    ],
    parts,
  );
export const edges: Part[] = [
  strip('nose', [0, 520], 'nose', NOWHERE, [
    [7, 5],
    [10, 7],
  ]),
  strip('tail', [0, 520], 'tail', NOWHERE, [
    [24, 16],
    [5, 4],
  ]),
];
export const ribs = part('ribs', { id: 'ribs', ...whole, count: 14, thickness: 2, lightening: 0 });
export const pair = (
  id: string,
  to: number,
  at: [number, number],
  size: Parameters<typeof strip>[4],
  more = {},
) => [
  strip(`${id}-top`, [0, to], 'top', at, size, { material: 'spruce', ...more }),
  strip(`${id}-bottom`, [0, to], 'bottom', at, size, { material: 'spruce', ...more }),
];
export const SPAR: Parameters<typeof strip>[4] = [
  [8, 4],
  [4, 2],
];
export const spars = pair('spar', 520, [0.27, 0.27], SPAR);
export const SMALL: Parameters<typeof strip>[4] = [
  [4, 2],
  [5, 2.5],
];
