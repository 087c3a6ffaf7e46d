import type { Plan } from '#shared/core/plan.ts';
import { built, edges, ribs, SMALL, spars } from './framework.ts';
import { part, plan, sheetTail, strip } from './stock.ts';

/** Built-up wings for the rules of what is done rib by rib: glue, lightening, cap strips. */
const joints = plan('Glue in every kind of joint', [
  built([
    ribs,
    part('ribs', { id: 'doubler', stations: [0, 40], thickness: 3, lightening: 0.1 }),
    ...edges,
    ...spars,
    strip('on-top', [0, 520], 'top', [0.5, 0.5], SMALL, { letIn: false }),
    strip('middle', [0, 400], 'middle', [0.4, 0.4], SMALL),
    part('skin', { id: 'skin-top', from: 40, to: 480, start: 0.1, end: 0.6, seat: 'top', thickness: 1 }),
    part('skin', { id: 'skin-under', from: 0, to: 200, start: 0.2, end: 0.27, seat: 'bottom', thickness: 1 }),
    part('tipBlock', { id: 'tip', length: 20, hollow: 0.5 }),
    part('glue', { id: 'joints', material: 'glue', method: 'joints', layers: 2 }),
    part('glue', { id: 'port-joints', side: 'port', material: 'glue', method: 'joints' }),
  ]),
  sheetTail,
]);

const listedRibs = plan('Ribs by list, by steps and single, lightened', [
  built([
    part('ribs', { id: 'listed', stations: [0, 33, 71.5, 200, 319], thickness: 3, lightening: 0.25 }),
    part('ribs', { id: 'steps', from: 320, to: 520, count: 5, thickness: 1.5, lightening: 0.1 }),
    part('ribs', { id: 'single', from: 260, to: 300, count: 1, thickness: 2, lightening: 0 }),
    ...edges,
    part('capStrips', {
      id: 'caps-top',
      from: 71.5,
      to: 420,
      start: 0.2,
      end: 0.7,
      seat: 'top',
      width: 6,
      thickness: 1,
    }),
    part('capStrips', {
      id: 'caps-bottom',
      from: 0,
      to: 319,
      start: 0,
      end: 1,
      seat: 'bottom',
      width: 4,
      thickness: 0.8,
    }),
  ]),
  sheetTail,
]);

export const joinedPlans: Plan[] = [joints, listedRibs];
