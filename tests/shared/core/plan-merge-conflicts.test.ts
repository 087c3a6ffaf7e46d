import { describe, expect, it } from 'vitest';
import type { MergeChoice } from '#shared/core/merge-fields.ts';
import { mergePlans } from '#shared/core/plan-merge.ts';
import type { Item, Panel, Part, Plan, Ribs, Surface } from '#shared/core/plan.ts';
import { planSchema } from '#shared/schemas/plan.ts';
import { planOf, wingOf } from '#tests/support/plans.ts';

const ribs: Ribs = {
  id: 'ribs',
  name: 'Ribs',
  kind: 'ribs',
  material: 'balsa',
  from: 0,
  to: 500,
  count: 12,
  thickness: 1.6,
  lightening: 0,
};
const spar: Part = {
  id: 'spar',
  name: 'Spar',
  kind: 'strip',
  material: 'hard',
  from: 0,
  to: 500,
  at: [0.3, 0.3],
  seat: 'top',
  width: [5, 5],
  height: [3, 3],
  profile: 'rectangle',
  letIn: true,
};
const nose: Item = { id: 'nose', name: 'Lead', group: 'ballast', mass: 20, at: [-120, 0, 0] };
const wingWith = (parts: Part[], changes: Partial<Surface> = {}) =>
  planOf([wingOf(parts, changes)], { items: [nose] });
const base = wingWith([ribs, spar]);
const [panel] = wingOf([]).panels as [Panel];
const partsOf = (plan: Plan) => plan.surfaces[0]?.parts ?? [];
const choosing = (mine: Plan, theirs: Plan, choice: MergeChoice) =>
  mergePlans(base, mine, theirs, () => choice);
const told = (mine: Plan, theirs: Plan) => mergePlans(base, mine, theirs).conflicts.map(({ id }) => id);

describe('what is joined without a question', () => {
  it('are different fields of one part', () => {
    const mine = wingWith([{ ...ribs, thickness: 2.4 }, spar]);
    const theirs = wingWith([{ ...ribs, lightening: 0.2 }, spar]);
    const { plan, conflicts } = mergePlans(base, mine, theirs);
    expect(conflicts).toEqual([]);
    expect(partsOf(plan)[0]).toEqual({ ...ribs, thickness: 2.4, lightening: 0.2 });
  });

  it('are things added to one list at different places, in the order of both', () => {
    const mine = wingWith([{ ...ribs, id: 'a' }, ribs, spar]);
    const theirs = wingWith([ribs, { ...spar, id: 'b' }, spar, { ...spar, id: 'c' }]);
    expect(partsOf(mergePlans(base, mine, theirs).plan).map(({ id }) => id)).toEqual([
      'a',
      'ribs',
      'b',
      'spar',
      'c',
    ]);
  });

  it('is a list put in another order here and longer there', () => {
    const mine = wingWith([spar, ribs]);
    const theirs = wingWith([ribs, { ...spar, id: 'b' }, spar]);
    const { plan, conflicts } = mergePlans(base, mine, theirs);
    expect([partsOf(plan).map(({ id }) => id), conflicts]).toEqual([['spar', 'ribs', 'b'], []]);
  });

  it('is a panel added here while another is changed there', () => {
    const mine = wingWith([ribs, spar], { panels: [panel, { ...panel, span: 100 }] });
    const theirs = wingWith([ribs, spar], { panels: [{ ...panel, dihedral: 7 }] });
    const { plan, conflicts } = mergePlans(base, mine, theirs);
    expect(conflicts).toEqual([]);
    expect(plan.surfaces[0]?.panels).toEqual([
      { ...panel, dihedral: 7 },
      { ...panel, span: 100 },
    ]);
  });

  it('is a part of a material that the other side let go: the material stays', () => {
    const { hard, ...others } = base.materials;
    const mine = { ...wingWith([ribs]), materials: others };
    const theirs = wingWith([ribs, spar, { ...spar, id: 'spar-2', material: 'hard' }]);
    const { plan } = mergePlans(base, mine, theirs);
    expect(plan.materials['hard']).toEqual(hard);
    expect(planSchema.safeParse(plan).success).toBe(true);
  });
});

describe('what is asked', () => {
  it('is one field of one part, with what each side made of it', () => {
    const mine = wingWith([{ ...ribs, thickness: 2.4 }, spar]);
    const theirs = wingWith([{ ...ribs, thickness: 2 }, spar]);
    const where = { path: 'surfaces/wing/parts/ribs', name: 'Ribs', field: 'thickness', unit: 'mm' };
    expect(mergePlans(base, mine, theirs).conflicts).toEqual([
      {
        id: 'surfaces/wing/parts/ribs#thickness',
        path: where.path,
        name: 'Ribs',
        field: 'thickness',
        mine: [{ ...where, from: 1.6, to: 2.4 }],
        theirs: [{ ...where, from: 1.6, to: 2 }],
        canKeepBoth: false,
      },
    ]);
    const thickness = (choice: MergeChoice) => partsOf(choosing(mine, theirs, choice).plan)[0];
    expect(thickness('mine')).toMatchObject({ thickness: 2.4 });
    expect(thickness('theirs')).toMatchObject({ thickness: 2 });
    expect(thickness('before')).toMatchObject({ thickness: 1.6 });
  });

  it('is a part removed here and changed there', () => {
    const mine = wingWith([spar]);
    const theirs = wingWith([{ ...ribs, thickness: 2 }, spar]);
    expect(told(mine, theirs)).toEqual(['surfaces/wing/parts/ribs#']);
    expect(partsOf(choosing(mine, theirs, 'mine').plan)).toEqual([spar]);
    expect(partsOf(choosing(mine, theirs, 'theirs').plan)[0]).toMatchObject({ thickness: 2 });
    const removed = mergePlans(base, mine, theirs).conflicts[0];
    expect(removed?.mine).toMatchObject([{ field: null, from: 'ribs', to: null }]);
    expect(removed?.theirs).toMatchObject([{ field: 'thickness', from: 1.6, to: 2 }]);
  });

  it('is a list put in two orders', () => {
    const cap = { ...spar, id: 'cap' };
    const three = wingWith([ribs, spar, cap]);
    const mine = wingWith([spar, ribs, cap]);
    const theirs = wingWith([ribs, cap, spar]);
    const order = (choice: MergeChoice) =>
      partsOf(mergePlans(three, mine, theirs, () => choice).plan).map(({ id }) => id);
    expect(mergePlans(three, mine, theirs).conflicts.map(({ id }) => id)).toEqual([
      'surfaces/wing/parts#order',
    ]);
    expect([order('mine'), order('theirs')]).toEqual([
      ['spar', 'ribs', 'cap'],
      ['ribs', 'cap', 'spar'],
    ]);
  });

  it('are two things added under one key, which may both stay', () => {
    const mine = wingWith([ribs, spar, { ...spar, id: 'extra', width: [4, 4] }]);
    const theirs = wingWith([ribs, spar, { ...spar, id: 'extra', width: [6, 6] }]);
    const conflict = mergePlans(base, mine, theirs).conflicts[0];
    expect(conflict).toMatchObject({ field: null, canKeepBoth: true });
    expect(conflict?.mine).toMatchObject([
      { field: null, from: null, to: 'strip' },
      { field: 'width', from: null, to: [4, 4] },
    ]);
    const both = partsOf(choosing(mine, theirs, 'both').plan).slice(2);
    expect(both).toMatchObject([
      { id: 'extra', width: [6, 6] },
      { id: 'extra-2', width: [4, 4] },
    ]);
  });

  it('are fields that say something together, at once: equal steps or stations of their own', () => {
    const { from: _, to: __, count: ___, ...rest } = ribs;
    const mine = wingWith([{ ...rest, stations: [0, 100, 500] }, spar]);
    const theirs = wingWith([{ ...ribs, count: 14 }, spar]);
    expect(told(mine, theirs)).toHaveLength(1);
    for (const choice of ['mine', 'theirs'] as const)
      expect(planSchema.safeParse(choosing(mine, theirs, choice).plan).success).toBe(true);
  });

  it('are the panels as a whole where one side changed a panel and put a copy of the old one behind', () => {
    const mine = wingWith([ribs, spar], { panels: [{ ...panel, rootChord: 150 }] });
    const theirs = wingWith([ribs, spar], { panels: [{ ...panel, rootChord: 120 }, panel] });
    expect(told(mine, theirs)).toEqual(['surfaces/wing#panels']);
    expect(told(theirs, mine)).toEqual(['surfaces/wing#panels']);
  });

  it('are the panels as a whole where both sides cut the wing anew', () => {
    const mine = wingWith([ribs, spar], { panels: [panel, { ...panel, span: 100 }] });
    const theirs = wingWith([ribs, spar], { panels: [{ ...panel, span: 80 }, panel] });
    expect(told(mine, theirs)).toEqual(['surfaces/wing#panels']);
    expect(choosing(mine, theirs, 'theirs').plan.surfaces[0]?.panels).toEqual(theirs.surfaces[0]?.panels);
  });

  it('is a list in which one key stands twice, for then its things cannot be told apart', () => {
    const mine = wingWith([ribs, spar, spar]);
    const theirs = wingWith([{ ...ribs, thickness: 2 }, spar]);
    expect(told(mine, theirs)).toEqual(['surfaces/wing/parts#']);
    expect(partsOf(choosing(mine, theirs, 'mine').plan)).toHaveLength(3);
  });

  it('is a wanted balance taken away here and moved there', () => {
    const wanted = { ...base, target: { percentMac: 50, tolerance: 2 } };
    const theirs = { ...base, target: { percentMac: 48, tolerance: 2 } };
    const { conflicts, plan } = mergePlans(wanted, base, theirs, () => 'theirs');
    expect(conflicts.map(({ id }) => id)).toEqual(['target#']);
    expect(plan.target).toEqual({ percentMac: 48, tolerance: 2 });
  });
});
