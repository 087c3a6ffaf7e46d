import type { Plan } from '#shared/core/plan.ts';
import { naca, panel, part, plan, sheetTail, strip, wing } from './stock.ts';

/** What is not sold by volume, and what is not rectangular. */
type Size = Parameters<typeof strip>[4];
const NOWHERE: [number, number] = [0, 0];
const DOUBLER: Size = [
  [20, 8],
  [0.8, 0.8],
];
const THREE: Size = [
  [3, 3],
  [3, 3],
];
const areal = plan(
  'Parts of a material sold by area',
  [
    wing(
      [panel(350, [150, 110], [naca('4411'), naca('4411')], { sweep: 9, dihedral: 5 })],
      [
        part('ribs', {
          id: 'ribs',
          material: 'ply',
          from: 0,
          to: 350,
          count: 8,
          thickness: 0.8,
          lightening: 0.4,
        }),
        part('skin', {
          id: 'skin',
          material: 'ply',
          from: 0,
          to: 120,
          start: 0.1,
          end: 0.4,
          seat: 'top',
          thickness: 0.8,
        }),
        part('web', { id: 'web', material: 'ply', from: 125, to: 300, at: [0.3, 0.3], thickness: 0.8 }),
        part('capStrips', {
          id: 'caps',
          material: 'ply',
          from: 130,
          to: 350,
          start: 0.1,
          end: 0.9,
          seat: 'both',
          width: 4,
          thickness: 0.8,
        }),
        strip('doubler', [0, 90], 'bottom', [0.4, 0.4], DOUBLER, { material: 'ply' }),
        strip('wooden', [0, 350], 'top', [0.6, 0.6], THREE, { material: 'balsa-hard' }),
        part('glue', { id: 'glue', material: 'glue', method: 'share', share: 0.1 }),
      ],
    ),
    { ...sheetTail, parts: [part('sheet', { id: 'sheet', material: 'ply', thickness: 0.8, cutout: 0.5 })] },
  ],
  {
    solids: [
      {
        id: 'doubler',
        name: 'Doubler',
        group: 'fuselage',
        material: 'ply',
        shape: 'plate',
        outline: [
          [-120, -30],
          [60, -35],
          [150, -5],
          [20, 8],
          [-10, -12],
          [-100, 12],
        ],
        thickness: 0.8,
        count: 2,
        y: 3,
        cutout: 0.25,
      },
    ],
  },
);

const TUBE: Size = [
  [8, 6],
  [8, 6],
];
const ROUND: Size = [
  [4, 2],
  [3, 2],
];
const WEDGE: Size = [
  [30, 20],
  [6, 4],
];
const profiles = plan(
  'Tubes, round and triangular strips',
  [
    wing(
      [panel(360, [150, 120], [naca('3412'), naca('3412')], { sweep: 15, dihedral: 5 })],
      [
        part('ribs', { id: 'ribs', from: 0, to: 360, count: 9, thickness: 2, lightening: 0 }),
        strip('tube', [0, 330], 'middle', [0.28, 0.28], TUBE, {
          material: 'carbon',
          profile: 'tube',
          wall: 0.75,
        }),
        strip('round', [0, 360], 'bottom', [0.6, 0.65], ROUND, { material: 'spruce', profile: 'round' }),
        strip('wedge', [50, 360], 'top', [0.5, 0.5], ROUND, { profile: 'triangle' }),
        strip('nose', [0, 360], 'nose', NOWHERE, TUBE, { profile: 'round' }),
        strip('tail', [0, 360], 'tail', NOWHERE, WEDGE, { profile: 'triangle' }),
      ],
    ),
  ],
  {
    solids: [
      {
        id: 'boom',
        name: 'Boom',
        group: 'fuselage',
        material: 'carbon',
        shape: 'bar',
        from: [40, 1, -6],
        to: [620, -2, 9],
        width: [12, 6],
        height: [11, 6],
        profile: 'tube',
        wall: 0.8,
      },
      {
        id: 'dowel',
        name: 'Dowel',
        group: 'fittings',
        material: 'spruce',
        shape: 'bar',
        from: [30, -40, 0],
        to: [30, 40, 4],
        width: [5, 5],
        height: [5, 5],
        profile: 'round',
      },
      {
        id: 'block',
        name: 'Block',
        group: 'fuselage',
        material: 'balsa',
        shape: 'bar',
        from: [-220, 0, -8],
        to: [-150, 0, -6],
        width: [10, 26],
        height: [14, 24],
        profile: 'rectangle',
      },
    ],
  },
);

export const materialPlans: Plan[] = [areal, profiles];
