import type { Plan } from '#shared/core/plan.ts';
import { built, edges, NOWHERE, pair, ribs, SMALL, SPAR, spars, whole } from './framework.ts';
import { part, plan, sheetTail, strip } from './stock.ts';

/** Built-up wings, each for some rules of how parts take room from one another. */
const stringersUnderSkins = plan('Tapered let-in stringers under skins', [
  built([
    ribs,
    ...edges,
    ...spars,
    strip('stringer-top', [15, 505], 'top', [0.14, 0.21], SMALL, { material: 'balsa-hard' }),
    strip('stringer-aft', [0, 410], 'bottom', [0.7, 0.6], SMALL),
    part('skin', { id: 'skin-top', ...whole, start: 0.05, end: 0.4, seat: 'top', thickness: 1.5 }),
    part('skin', { id: 'over', from: 80, to: 300, start: 0.1, end: 0.3, seat: 'top', thickness: 0.8 }),
    part('skin', {
      id: 'skin-under',
      from: 0,
      to: 330,
      start: 0.05,
      end: 0.27,
      seat: 'bottom',
      thickness: 1,
    }),
    part('skin', { id: 'centre', from: 0, to: 70, start: 0.27, end: 0.8, seat: 'bottom', thickness: 1.2 }),
  ]),
  sheetTail,
]);

const oneSided = plan('One-sided parts of different wood', [
  built([
    ribs,
    part('ribs', { id: 'port-ribs', side: 'port', stations: [50, 150], thickness: 3, lightening: 0.2 }),
    strip(
      'nose-port',
      [0, 520],
      'nose',
      NOWHERE,
      [
        [12, 8],
        [11, 7],
      ],
      { side: 'port' },
    ),
    strip('nose-starboard', [0, 520], 'nose', NOWHERE, SMALL, { side: 'starboard', material: 'spruce' }),
    ...pair('starboard', 520, [0.3, 0.3], SPAR, { side: 'starboard' }),
    ...pair('port', 460, [0.3, 0.29], SMALL, { side: 'port', material: 'balsa-hard' }),
    part('web', { id: 'web', from: 0, to: 450, at: [0.3, 0.29], thickness: 1.5 }),
    part('skin', {
      id: 'skin',
      side: 'starboard',
      ...whole,
      start: 0.1,
      end: 0.25,
      seat: 'top',
      thickness: 1,
    }),
    part('capStrips', {
      id: 'caps',
      side: 'port',
      ...whole,
      start: 0.3,
      end: 0.8,
      seat: 'both',
      width: 5,
      thickness: 1,
    }),
    part('tipBlock', { id: 'tip', length: 26, hollow: 0.3 }),
    part('covering', { id: 'tissue', material: 'tissue', ...whole, seat: 'both', overlap: 0.1 }),
    part('glue', { id: 'glue', material: 'glue', method: 'share', share: 0.07 }),
  ]),
  sheetTail,
]);

const webs = plan('Webs between strips, beside them and alone', [
  built([
    ribs,
    ...edges,
    ...spars,
    part('skin', { id: 'skin-top', from: 0, to: 260, start: 0.1, end: 0.5, seat: 'top', thickness: 1.4 }),
    part('skin', {
      id: 'skin-under',
      from: 0,
      to: 260,
      start: 0.1,
      end: 0.5,
      seat: 'bottom',
      thickness: 1.4,
    }),
    part('web', { id: 'between', from: 0, to: 320, at: [0.27, 0.27], thickness: 2 }),
    part('web', {
      id: 'in-half-width',
      material: 'ply',
      from: 320,
      to: 500,
      at: [0.28, 0.28],
      thickness: 0.8,
    }),
    part('web', { id: 'beside', from: 280, to: 500, at: [0.31, 0.31], thickness: 0.8 }),
    part('web', { id: 'alone', from: 33, to: 471, at: [0.6, 0.55], thickness: 1 }),
    part('web', { id: 'on-middle', from: 20, to: 190, at: [0.45, 0.45], thickness: 1.2 }),
    strip('middle', [0, 300], 'middle', [0.45, 0.45], SMALL, { material: 'balsa-hard' }),
  ]),
  sheetTail,
]);

export const builtPlans: Plan[] = [stringersUnderSkins, oneSided, webs];
