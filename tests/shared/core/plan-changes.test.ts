import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { PlanChange } from '#shared/core/field-changes.ts';
import { planChanges } from '#shared/core/plan-changes.ts';
import type { Part, Plan, Ribs } from '#shared/core/plan.ts';
import { planChange } from '#shared/schemas/glider-save.ts';
import { anyPlan } from '#tests/support/plan-arbitrary.ts';
import { demoPlan, DEMO_NAMES, planOf, wingOf } from '#tests/support/plans.ts';

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
};
const nose: Plan['items'][number] = {
  id: 'nose',
  name: 'Lead',
  group: 'ballast',
  mass: 20,
  at: [-120, 0, 0],
};
const plan = planOf([wingOf([ribs, spar])], { items: [nose] });
const withParts = (...parts: Part[]) => planOf([wingOf(parts)], { items: [nose] });
const change = (changes: Partial<PlanChange>): PlanChange => ({
  path: '',
  name: '',
  field: null,
  from: null,
  to: null,
  unit: null,
  ...changes,
});

describe('what differs between two plans', () => {
  it('is nothing for a plan and its copy', () => {
    for (const name of DEMO_NAMES)
      expect(planChanges(demoPlan(name), structuredClone(demoPlan(name)))).toEqual([]);
  });

  it('names the part, the field, both values and their unit', () => {
    const later = withParts({ ...ribs, thickness: 2.4 }, { ...spar, at: [0.3, 0.25], material: 'balsa' });
    expect(planChanges(plan, later)).toEqual([
      change({
        path: 'surfaces/wing/parts/ribs',
        name: 'Ribs',
        field: 'thickness',
        from: 1.6,
        to: 2.4,
        unit: 'mm',
      }),
      change({
        path: 'surfaces/wing/parts/spar',
        name: 'Spar',
        field: 'material',
        from: 'hard',
        to: 'balsa',
      }),
      change({
        path: 'surfaces/wing/parts/spar',
        name: 'Spar',
        field: 'at',
        from: [0.3, 0.3],
        to: [0.3, 0.25],
        unit: 'one',
      }),
    ]);
  });

  it('tells a place in space in mm and a place along the chord as shares', () => {
    const moved = planOf([wingOf([ribs, spar])], { items: [{ ...nose, at: [-115, 0, 0] }] });
    const [found] = planChanges(plan, moved);
    expect(found).toMatchObject({ path: 'items/nose', field: 'at', to: [-115, 0, 0], unit: 'mm' });
  });

  it('calls the added added and the removed removed, and a part of another kind another part', () => {
    const web: Part = {
      id: 'spar',
      name: 'Web',
      kind: 'web',
      material: 'balsa',
      from: 0,
      to: 9,
      at: [0.3, 0.3],
      thickness: 1,
    };
    expect(planChanges(plan, withParts(web))).toEqual([
      change({ path: 'surfaces/wing/parts/ribs', name: 'Ribs', from: 'ribs' }),
      change({ path: 'surfaces/wing/parts/spar', name: 'Spar', from: 'strip' }),
      change({ path: 'surfaces/wing/parts/spar', name: 'Web', to: 'web' }),
    ]);
  });

  it('sees a part moved in its list as moved, not as removed and added', () => {
    expect(planChanges(plan, withParts(spar, ribs))).toEqual([
      change({ path: 'surfaces/wing/parts', field: 'order' }),
    ]);
    expect(planChanges(plan, withParts(spar)).map(({ field }) => field)).toEqual([null]);
  });

  it('reads sections by name, plates by thickness and long lists by their number of points', () => {
    const sections = (rootSection: object, tipSection: object) => {
      const wing = wingOf([]);
      const [panel] = wing.panels;
      return planOf([{ ...wing, panels: [{ ...panel!, rootSection, tipSection } as typeof panel & object] }]);
    };
    const before = sections({ naca: '0012' }, { flat: 3 });
    const after = sections({ naca: '4409' }, { flat: 2 });
    expect(planChanges(before, after).map(({ field, from, to, unit }) => [field, from, to, unit])).toEqual([
      ['rootSection', 'NACA 0012', 'NACA 4409', null],
      ['tipSection', 3, 2, 'mm'],
    ]);
    expect(planChanges(before, after)[0]).toMatchObject({
      path: 'surfaces/wing/panels/1',
      name: 'wing, panel 1',
    });
    const plate = (...outline: [number, number][]) =>
      planOf([], {
        solids: [
          {
            id: 'fin',
            name: 'Fin',
            group: 'tail',
            material: 'balsa',
            shape: 'plate',
            outline,
            thickness: 2,
            count: 1,
            y: 0,
            cutout: 0,
          },
        ],
      });
    const [outline] = planChanges(plate([0, 0], [1, 0], [0, 1]), plate([0, 0], [1, 0], [1, 1], [0, 1]));
    expect(outline).toMatchObject({ field: 'outline', from: '3 points', to: '4 points', unit: null });
  });

  it('is told of aims, name and materials as well', () => {
    const later: Plan = {
      ...plan,
      name: 'Ruff',
      target: { percentMac: 40, tolerance: 2 },
      materials: { ...plan.materials, hard: { ...plan.materials['hard']!, density: 210 } },
    };
    expect(
      planChanges(plan, later).map(({ path, field, from, to, unit }) => [path, field, from, to, unit]),
    ).toEqual([
      ['', 'name', 'Test', 'Ruff', null],
      ['materials/hard', 'density', 200, 210, 'kg/m3'],
      ['target', 'percentMac', null, 40, 'percent'],
      ['target', 'tolerance', null, 2, 'percent'],
    ]);
  });

  it('finds something wherever two plans differ, in the form that the log keeps', () => {
    fc.assert(
      fc.property(anyPlan, anyPlan, (one, other) => {
        const found = planChanges(one, other);
        for (const entry of found) expect(planChange.safeParse(entry).error?.issues ?? []).toEqual([]);
        expect(found.length > 0).toBe(JSON.stringify(one) !== JSON.stringify(other));
        expect(planChanges(one, structuredClone(one))).toEqual([]);
      }),
      { numRuns: 150, seed: 31 },
    );
  });
});
