import { describe, expect, it } from 'vitest';
import type { Part } from '#shared/core/plan.ts';
import { expectNearly, ROUNDING } from '#tests/support/nearly.ts';
import { lineOf } from '#tests/support/plans.ts';
import { boxWing, part, strip } from './box-wing.ts';

const ribs: Part = {
  ...part,
  id: 'ribs',
  kind: 'ribs',
  stations: [0, 250, 500],
  thickness: 2,
  lightening: 0,
};
const skin = (changes: object): Part => ({
  ...part,
  id: 'skin',
  kind: 'skin',
  from: 0,
  to: 500,
  start: 0,
  end: 0.3,
  seat: 'top',
  thickness: 1,
  ...changes,
});

/** Volume of the ribs beside the given other parts, mm³. */
const ribVolume = (...others: Part[]) => lineOf(boxWing([ribs, ...others]), 'wing/ribs').volume;

describe('ribs', () => {
  it('are the section times their thickness, each at its station', () => {
    const line = lineOf(boxWing([ribs]), 'wing/ribs');
    expectNearly(line.volume, 3 * 200 * 12 * 2, ROUNDING);
    expect(line.pieces).toBe(3);
    expectNearly(line.at[0], 100, ROUNDING);
    expectNearly(line.at[1], 250, ROUNDING);
    // 14,400 mm³ at 100 kg/m³.
    expectNearly(line.mass, 1.44, ROUNDING);
  });

  it('stand in equal steps, both ends included, when from, to and count are given', () => {
    const stepped: Part = {
      ...part,
      id: 'ribs',
      kind: 'ribs',
      from: 100,
      to: 500,
      count: 5,
      thickness: 2,
      lightening: 0,
    };
    const line = lineOf(boxWing([stepped]), 'wing/ribs');
    expect(line.pieces).toBe(5);
    expectNearly(line.at[1], 300, ROUNDING);
  });

  it('end at the back of a nose strip and at the front of a tail strip', () => {
    const nose = strip({ id: 'nose', seat: 'nose', width: [8, 8], height: [12, 12] });
    const tail = strip({ id: 'tail', seat: 'tail', width: [20, 20], height: [12, 12] });
    expectNearly(ribVolume(nose, tail), 3 * (200 - 28) * 12 * 2, ROUNDING);
  });

  it('lose the notches of let-in strips, and of those only', () => {
    expectNearly(ribVolume(strip()), 3 * (2400 - 18) * 2, ROUNDING);
    expectNearly(ribVolume(strip({ letIn: false })), 3 * 2400 * 2, ROUNDING);
  });

  it('lose the thickness of skins and cap strips over what these cover', () => {
    expectNearly(ribVolume(skin({})), 3 * (2400 - 60) * 2, ROUNDING);
    const caps: Part = {
      ...part,
      id: 'caps',
      kind: 'capStrips',
      from: 0,
      to: 300,
      start: 0.3,
      end: 0.8,
      seat: 'both',
      width: 5,
      thickness: 1,
    };
    // Two of the three ribs carry two caps of 100 × 1 mm each.
    expectNearly(ribVolume(caps), (3 * 2400 - 2 * 200) * 2, ROUNDING);
  });

  it('lose their lightening last, as a share of what is left', () => {
    const light: Part = {
      ...part,
      id: 'ribs',
      kind: 'ribs',
      stations: [250],
      thickness: 2,
      lightening: 0.25,
    };
    expectNearly(lineOf(boxWing([light, strip()]), 'wing/ribs').volume, 0.75 * (2400 - 18) * 2, ROUNDING);
  });

  it('notched through say so, and weigh what is left', () => {
    const bottom = strip({ id: 'bottom', seat: 'bottom', height: [10, 10] });
    const result = boxWing([ribs, strip(), bottom]);
    expect(result.notices).toContainEqual({ code: 'rib_notched_through', path: 'wing/ribs', station: 0 });
    expectNearly(lineOf(result, 'wing/ribs').volume, 3 * (2400 - 18 - 60) * 2, ROUNDING);
  });
});

describe('strips', () => {
  it('run from their first to their last station and lie flush under the face', () => {
    const line = lineOf(boxWing([strip({ from: 100, to: 300 })]), 'wing/strip');
    expectNearly(line.length, 200, ROUNDING);
    expectNearly(line.volume, 200 * 18, ROUNDING);
    expectNearly(line.at[0], 60, ROUNDING);
    expectNearly(line.at[1], 200, ROUNDING);
    expectNearly(line.at[2], 6 - 1.5, ROUNDING);
  });

  it('lie under a skin that covers them', () => {
    expectNearly(lineOf(boxWing([strip(), skin({ end: 0.5 })]), 'wing/strip').at[2], 6 - 1 - 1.5, ROUNDING);
    // A skin that ends on the strip's centre line covers it; a second one that begins there does not count twice.
    const butt = [skin({}), skin({ id: 'aft', start: 0.3, end: 0.8 })];
    expectNearly(lineOf(boxWing([strip(), ...butt]), 'wing/strip').at[2], 6 - 1 - 1.5, ROUNDING);
  });

  it('taper linearly in both sides between their ends', () => {
    // Reference table of strips, constructed: 6×3 to 3×1.5 over 600 long has 6,300 mm³ and its centre at 235.714.
    const line = lineOf(boxWing([strip({ to: 500, width: [6, 3], height: [3, 1.5] })]), 'wing/strip');
    expectNearly(line.volume, (6300 * 500) / 600, ROUNDING);
    expectNearly(line.at[1], (235.714285714 * 500) / 600, 1e-8);
  });

  it('are as long as their skew in plan view makes them', () => {
    // From 20 % to 80 % of 200 mm over 500 mm: 120 aft on 500 out.
    const line = lineOf(boxWing([strip({ at: [0.2, 0.8] })]), 'wing/strip');
    expectNearly(line.length, Math.hypot(500, 120), ROUNDING);
  });

  it('have the cross-section and the centroid of their profile', () => {
    const volume = (changes: object) => lineOf(boxWing([strip(changes)]), 'wing/strip').volume;
    expectNearly(volume({ profile: 'triangle' }), (500 * 18) / 2, ROUNDING);
    expectNearly(volume({ profile: 'round', height: [6, 6] }), 500 * Math.PI * 9, ROUNDING);
    expectNearly(volume({ profile: 'tube', height: [6, 6], wall: 1 }), 500 * Math.PI * (9 - 4), ROUNDING);
    const edge = strip({ seat: 'tail', profile: 'triangle', width: [18, 18] });
    // Thick edge forward: a third of the width behind the front, which lies 18 mm before the trailing edge.
    expectNearly(lineOf(boxWing([edge]), 'wing/strip').at[0], 200 - 18 + 6, ROUNDING);
  });

  it('past the tip are cut there, and that is told', () => {
    const result = boxWing([strip({ to: 620 })]);
    expect(result.notices).toContainEqual({
      code: 'station_past_tip',
      path: 'wing/strip',
      station: 620,
      tip: 500,
    });
    expectNearly(lineOf(result, 'wing/strip').length, 500, ROUNDING);
  });

  it('that share room, stand out of the section or over its edge are told', () => {
    const other = strip({ id: 'other', at: [0.31, 0.31] });
    const codes = (...parts: Part[]) => boxWing(parts).notices.map((n) => n.code);
    expect(codes(strip(), other)).toContain('strips_overlap');
    expect(codes(strip({ height: [13, 13] }))).toContain('strip_outside_section');
    expect(codes(strip({ at: [0.01, 0.01] }))).toContain('strip_outside_chord');
    expect(codes(strip({ profile: 'tube', wall: 4 }))).toContain('tube_wall_too_thick');
    expect(codes(strip())).not.toContain('strips_overlap');
  });
});

describe('skins, cap strips, webs and coverings', () => {
  it('a wrapped skin is measured from the top round the nose to the bottom', () => {
    const line = lineOf(boxWing([skin({ seat: 'wrap', start: 0.3, end: 0.4 })]), 'wing/skin');
    // A plate's edge carries no skin: 60 mm on top and 80 mm below.
    expectNearly(line.area, 140 * 500, ROUNDING);
    expectNearly(line.volume, 140 * 500, ROUNDING);
  });

  it('a skin that runs past the trailing edge is cut there, and that is told', () => {
    const result = boxWing([skin({ start: 0.5, end: 1.2 })]);
    expect(result.notices).toContainEqual({ code: 'skin_past_trailing_edge', path: 'wing/skin', end: 1.2 });
    expectNearly(lineOf(result, 'wing/skin').area, 100 * 500, ROUNDING);
  });

  it('cap strips count each rib in their range', () => {
    const caps: Part = {
      ...part,
      kind: 'capStrips',
      from: 0,
      to: 300,
      start: 0.3,
      end: 0.8,
      seat: 'both',
      width: 5,
      thickness: 1,
    };
    const line = lineOf(boxWing([ribs, caps]), 'wing/p');
    expect(line.pieces).toBe(4);
    expectNearly(line.volume, 4 * 100 * 5, ROUNDING);
    expect(boxWing([caps]).notices.map((n) => n.code)).toContain('no_ribs_for_caps');
  });

  it('a shear web fills the height between strips and skins in the bays between ribs', () => {
    const web: Part = { ...part, id: 'web', kind: 'web', from: 0, to: 500, at: [0.3, 0.3], thickness: 1.5 };
    const spars = [strip(), strip({ id: 'bottom', seat: 'bottom' })];
    const line = lineOf(boxWing([ribs, ...spars, skin({ end: 0.5 }), web]), 'wing/web');
    // 12 − 3 − 3 − 1 = 5 mm high over 500 mm less three ribs of 2 mm.
    expectNearly(line.area, 5 * (500 - 6), ROUNDING);
    expectNearly(line.volume, 5 * 494 * 1.5, ROUNDING);
  });

  it('covering weighs its area, overlap added, tip block included', () => {
    const tissue: Part = {
      ...part,
      id: 'tissue',
      kind: 'covering',
      material: 'tissue',
      from: 0,
      to: 500,
      seat: 'both',
      overlap: 0.1,
    };
    const tip: Part = { ...part, id: 'tip', kind: 'tipBlock', length: 40, hollow: 0.5 };
    expectNearly(lineOf(boxWing([tissue]), 'wing/tissue').mass, (2 * 200 * 500 * 1.1 * 20) / 1e6, ROUNDING);
    const withTip = lineOf(boxWing([tissue, tip]), 'wing/tissue');
    expectNearly(withTip.area, 2 * 200 * (500 + (Math.PI / 4) * 40) * 1.1, ROUNDING);
  });

  it('a tip block is half an ellipsoid on the last section', () => {
    const line = lineOf(boxWing([{ ...part, kind: 'tipBlock', length: 40, hollow: 0.5 }]), 'wing/p');
    expectNearly(line.volume, ((2 / 3) * 2400 * 40) / 2, ROUNDING);
    expectNearly(line.at[1], 500 + 15, ROUNDING);
  });

  it('a sheet is the planform times its thickness', () => {
    const line = lineOf(boxWing([{ ...part, kind: 'sheet', thickness: 3, cutout: 0.2 }]), 'wing/p');
    expectNearly(line.volume, 200 * 500 * 3 * 0.8, ROUNDING);
    expectNearly(line.at[0], 100, ROUNDING);
  });

  it('what is sold by area weighs by area, whatever its thickness', () => {
    const ply: Part = { ...ribs, material: 'ply' };
    // Three ribs of 2,400 mm² at 500 g/m².
    expectNearly(lineOf(boxWing([ply]), 'wing/ribs').mass, (3 * 2400 * 500) / 1e6, ROUNDING);
  });
});
