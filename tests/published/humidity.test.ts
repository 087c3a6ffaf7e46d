import { describe, expect, it, test } from 'vitest';
import reference from '#data/reference/moisture.json';
import { estimate } from '#shared/core/estimate.ts';
import { inAir } from '#shared/core/humidity.ts';
import type { Plan, Solid } from '#shared/core/plan.ts';
import { DEMO_NAMES, demoPlan, planOf } from '#tests/support/plans.ts';
import { expectNear, SAME_SUM } from './tolerance.ts';

const air = (percent: number) => ({ temperature: 20, humidity: percent / 100 });

const stick: Solid = {
  id: 'stick',
  name: 'Stick',
  group: 'fuselage',
  material: 'balsa',
  shape: 'bar',
  profile: 'rectangle',
  from: [0, 0, 0],
  to: [1000, 0, 0],
  width: [10, 10],
  height: [10, 10],
};
const wooden = (changes: Partial<Plan> = {}) => planOf([], { solids: [stick], ...changes });
const found = (plan: Plan, here: number, workshop: number) =>
  inAir(plan, estimate(plan), air(here), air(workshop));

test.each(reference.changes.rows)(
  `a model of bare wood weighed at $from % is $change % off at $to % (${reference.changes.source})`,
  ({ from, to, change }) => {
    const plan = wooden();
    const grown = (100 * (found(plan, to, from)?.mass ?? Number.NaN)) / estimate(plan).totals.mass - 100;
    // Changes are printed to 0.1 %.
    expect(Math.abs(grown - change)).toBeLessThan(0.06);
  },
);

describe('a model in damp air', () => {
  const lead = {
    id: 'lead',
    name: 'Lead',
    group: 'ballast',
    mass: 10,
    at: [-100, 0, 0] as [number, number, number],
  };

  it('moves only its wood: what is fitted keeps its mass', () => {
    const bare = found(wooden(), 80, 50);
    const fitted = found(wooden({ items: [lead] }), 80, 50);
    expectNear(fitted?.mass, (bare?.mass ?? Number.NaN) + 10, SAME_SUM);
    expect(fitted?.wood).toBe(bare?.mass);
  });

  it('balances by the moments of wet wood and dry lead', () => {
    const wet = found(wooden({ items: [lead] }), 80, 50);
    // The stick's middle is at 500 mm, the lead at −100 mm.
    expectNear(wet?.x, ((wet?.wood ?? Number.NaN) * 500 - 1000) / ((wet?.wood ?? Number.NaN) + 10), SAME_SUM);
  });

  it('starts from the moisture at which a density holds, whatever the workshop', () => {
    const materials = {
      balsa: { name: 'Balsa', category: 'wood' as const, density: 112, cv: 0.1, moistureAtDensity: 0.08 },
    };
    const plan = wooden({ materials });
    expect(found(plan, 80, 30)?.mass).toBe(found(plan, 80, 60)?.mass);
    const { moisture, mass } = found(plan, 80, 30) ?? { moisture: 0, mass: 0 };
    expectNear(mass, (11.2 * (1 + moisture)) / 1.08, SAME_SUM);
  });

  it.each(DEMO_NAMES)('is heavier the damper it is: %s', (name) => {
    const plan = demoPlan(name);
    const masses = [20, 40, 60, 80, 95].map((percent) => found(plan, percent, 45)?.mass ?? Number.NaN);
    expect(masses).toEqual([...masses].sort((a, b) => a - b));
    expect(new Set(masses).size).toBe(5);
  });

  it('is not told of in air that the equation says nothing of', () => {
    expect(found(wooden(), 100, 50)).toBeNull();
    expect(found(wooden(), 50, 100)).toBeNull();
  });
});
