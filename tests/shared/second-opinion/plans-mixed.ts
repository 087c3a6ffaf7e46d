import type { Plan, Surface } from '#shared/core/plan.ts';
import { naca, panel, part, plan, sheetTail, strip, wing } from './stock.ts';

/** Fins, more wings than one, and a wing beside a fuselage. */
type Size = Parameters<typeof strip>[4];
const NOWHERE: [number, number] = [0, 0];
const plainWing = wing(
  [panel(400, [140, 100], [naca('2409'), naca('2409')], { sweep: 14, dihedral: 6 })],
  [part('ribs', { id: 'ribs', from: 0, to: 400, count: 12, thickness: 2, lightening: 0.1 })],
);

const POST: Size = [
  [6, 4],
  [5, 3],
];
const fin: Surface = {
  key: 'fin',
  role: 'fin',
  apex: [500, 0, 10],
  mirrored: false,
  panels: [panel(140, [120, 80], [naca('0009'), naca('0007')], { sweep: 35, dihedral: 90 })],
  parts: [
    part('ribs', { id: 'ribs', from: 0, to: 140, count: 5, thickness: 1.5, lightening: 0 }),
    strip('post', [0, 140], 'middle', [0.55, 0.6], POST, { material: 'spruce' }),
    strip('nose', [0, 140], 'nose', NOWHERE, POST, { profile: 'round' }),
    part('tipBlock', { id: 'tip', length: 14, hollow: 0 }),
    part('covering', { id: 'tissue', material: 'tissue', from: 0, to: 140, seat: 'both', overlap: 0.05 }),
    part('covering', { id: 'port', material: 'tissue', from: 0, to: 140, seat: 'top', overlap: 0 }),
  ],
};
const endPlates: Surface = {
  key: 'end-plates',
  role: 'fin',
  apex: [535, 170, 15],
  mirrored: true,
  panels: [panel(60, [70, 40], [naca('2409'), { flat: 3 }], { sweep: 20, dihedral: 80 })],
  parts: [
    part('sheet', { id: 'sheet', thickness: 3, cutout: 0 }),
    part('finish', {
      id: 'dope',
      material: 'dope',
      side: 'port',
      from: 0,
      to: 60,
      seat: 'bottom',
      overlap: 0,
    }),
  ],
};
const fins = plan('Upright fins, one in the middle and two on the tailplane', [
  plainWing,
  sheetTail,
  fin,
  endPlates,
]);

const upper: Surface = {
  ...plainWing,
  key: 'upper',
  apex: [30, 0, 120],
  panels: [panel(400, [120, 90], [naca('4409'), naca('4409')])],
};
const twoWings = plan('Two wings, one over the other', [plainWing, upper, sheetTail]);

const pointed = plan('A wing that ends in a point, its root beside a fuselage', [
  wing(
    [panel(300, [150, 0], [naca('4412'), naca('4412')], { sweep: 50, dihedral: 5 })],
    [
      part('ribs', { id: 'ribs', stations: [0, 60, 120, 180], thickness: 2, lightening: 0 }),
      strip('spar', [0, 200], 'middle', [0.3, 0.4], POST),
      part('covering', { id: 'tissue', material: 'tissue', from: 0, to: 300, seat: 'both', overlap: 0 }),
    ],
    { apex: [0, 22, 0] },
  ),
  sheetTail,
]);

export const mixedPlans: Plan[] = [fins, twoWings, pointed];
