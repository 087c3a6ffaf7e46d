import type { Part, Plan, SectionSpec } from '#shared/core/plan.ts';
import { naca, panel, part, plan, sheetTail, strip, wing } from './stock.ts';

/** Wings and tails of unlike shapes, each for some rules of sections, panels and tips. */
type Size = Parameters<typeof strip>[4];
const NOWHERE: [number, number] = [0, 0];
const NOSE: Size = [
  [5, 4],
  [7, 5],
];
const TAIL: Size = [
  [14, 10],
  [4, 3],
];
const SPAR: Size = [
  [6, 4],
  [3, 2],
];
const THIN: Size = [
  [3, 3],
  [3, 3],
];

const skeleton = (tip: number): Part[] => [
  part('ribs', { id: 'ribs', from: 0, to: tip, count: 11, thickness: 1.6, lightening: 0.05 }),
  strip('nose', [0, tip], 'nose', NOWHERE, NOSE),
  strip('tail', [0, tip], 'tail', NOWHERE, TAIL),
  strip('spar', [0, tip], 'top', [0.32, 0.36], SPAR, { material: 'spruce' }),
  part('skin', { id: 'skin', from: 0, to: tip, start: 0.06, end: 0.28, seat: 'bottom', thickness: 0.4 }),
  part('covering', { id: 'tissue', material: 'tissue', from: 0, to: tip, seat: 'both', overlap: 0.06 }),
];

const polyhedral = plan(
  'Polyhedral',
  [
    wing(
      [
        panel(250, [150, 150], [naca('6409'), naca('6409')]),
        panel(210, [150, 130], [naca('6409'), naca('4409')], { sweep: 5, dihedral: 8 }),
        panel(150, [130, 80], [naca('4409'), naca('4407')], { sweep: 18, dihedral: 21 }),
      ],
      skeleton(610),
      { apex: [10, 0, 12] },
    ),
    sheetTail,
  ],
  {
    items: [
      { id: 'cell', name: 'Cell', group: 'gear', mass: 28, u: 0.4, at: [-130, 0, -20] },
      { id: 'peg', name: 'Peg', group: 'gear', mass: 1.4, u: 0.05, at: [70, 590, 60] },
      { id: 'lead', name: 'Lead', group: 'ballast', mass: 12, at: [-190, 2, -9] },
    ],
    target: { percentMac: 40, tolerance: 2 },
    flight: { clMax: 1.15, airDensity: 1.1, loadFactor: 5 },
  },
);

const sweptForward = plan('Swept forward, tips drooping', [
  wing(
    [
      panel(280, [140, 120], [naca('2412'), naca('2410')], { sweep: -18, dihedral: 5 }),
      panel(160, [120, 100], [naca('2410'), naca('0010')], { sweep: -30, dihedral: -12 }),
    ],
    [...skeleton(440), part('tipBlock', { id: 'tip', length: 18, hollow: 0.2 })],
    { apex: [60, 0, 0] },
  ),
  sheetTail,
]);

const flatToNaca = plan('Plate blended into a four-digit section', [
  wing(
    [
      panel(200, [120, 120], [{ flat: 12 }, naca('2410')], { sweep: 4, dihedral: 2 }),
      panel(180, [120, 80], [naca('2410'), { flat: 6 }], { sweep: 16, dihedral: 9 }),
    ],
    [
      part('ribs', { id: 'ribs', from: 10, to: 370, count: 9, thickness: 2, lightening: 0 }),
      strip('spar', [0, 380], 'bottom', [0.35, 0.35], SPAR, { material: 'spruce' }),
      part('covering', { id: 'top', material: 'tissue', from: 0, to: 380, seat: 'top', overlap: 0 }),
      part('covering', {
        id: 'bottom',
        material: 'tissue',
        from: 100,
        to: 300,
        seat: 'bottom',
        overlap: 0.2,
      }),
      part('finish', { id: 'dope', material: 'dope', from: 0, to: 380, seat: 'both', overlap: 0 }),
      part('tipBlock', { id: 'tip', length: 15, hollow: 0 }),
    ],
  ),
  sheetTail,
]);

/** Invented: a flat-bottomed section with a raised nose. */
const flatBottomed: SectionSpec = {
  name: 'Flat-bottomed',
  points: [
    [1, 0.002],
    [0.8, 0.032],
    [0.6, 0.061],
    [0.4, 0.083],
    [0.25, 0.086],
    [0.1, 0.066],
    [0.03, 0.044],
    [0.008, 0.03],
    [0, 0.02],
    [0.01, 0.008],
    [0.04, 0.001],
    [0.2, 0],
    [0.6, 0],
    [1, 0],
  ],
};
const points = plan('Sections by points, blended into a four-digit one', [
  wing(
    [
      panel(240, [150, 130], [flatBottomed, flatBottomed], { sweep: 6, dihedral: 4 }),
      panel(190, [130, 85], [flatBottomed, naca('3408')], { sweep: 20, dihedral: 10 }),
    ],
    [...skeleton(430), part('tipBlock', { id: 'tip', length: 22, hollow: 0.4 })],
  ),
  sheetTail,
]);

const tipCovered = plan('Tip block under covering and finish, faces apart', [
  wing(
    [panel(330, [130, 95], [naca('4410'), naca('4408')], { sweep: 22, dihedral: 7 })],
    [
      ...skeleton(330),
      part('tipBlock', { id: 'tip', length: 34, hollow: 0.6 }),
      part('finish', { id: 'dope-top', material: 'dope', from: 0, to: 330, seat: 'top', overlap: 0.05 }),
      part('finish', {
        id: 'dope-bottom',
        material: 'dope',
        from: 60,
        to: 330,
        seat: 'bottom',
        overlap: 0.3,
      }),
      part('finish', { id: 'short', material: 'dope', from: 0, to: 200, seat: 'both', overlap: 0 }),
    ],
  ),
  {
    ...sheetTail,
    panels: [panel(150, [90, 66], [naca('0008'), naca('0006')], { sweep: 16 })],
    parts: [...skeleton(150), part('tipBlock', { id: 'tip', length: 12, hollow: 0 })],
  },
]);

const wrapped = plan('Skins wrapped round the nose', [
  wing(
    [panel(300, [140, 110], [naca('0012'), naca('2412')], { sweep: 10, dihedral: 4 })],
    [
      part('ribs', { id: 'ribs', from: 0, to: 300, count: 8, thickness: 2, lightening: 0 }),
      part('skin', { id: 'wrap', from: 0, to: 300, start: 0.35, end: 0.2, seat: 'wrap', thickness: 1 }),
      strip('under', [0, 300], 'bottom', [0.12, 0.12], THIN, { material: 'balsa-hard' }),
      strip('clear', [0, 300], 'bottom', [0.25, 0.25], THIN, { letIn: false }),
      part('covering', { id: 'tissue', material: 'tissue', from: 0, to: 300, seat: 'both', overlap: 0 }),
    ],
  ),
  sheetTail,
]);

export const shapedPlans: Plan[] = [polyhedral, sweptForward, flatToNaca, points, tipCovered, wrapped];
