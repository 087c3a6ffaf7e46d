import { describe, expect, it } from 'vitest';
import { drawnGroups, firstTrials, oneGradeLighter, woodsOf } from '#client/features/trial/woods.ts';
import { snapshotOf } from '#client/lib/material-snapshot.ts';
import whimbrelJson from '#data/demo/gliders/whimbrel.json' with { type: 'json' };
import materialsJson from '#data/materials.json' with { type: 'json' };
import { estimate } from '#shared/core/estimate.ts';
import { runTrials } from '#shared/core/wood-trial.ts';
import { planSchema } from '#shared/schemas/plan.ts';

const plan = planSchema.parse(whimbrelJson);
const result = estimate(plan);
const table = materialsJson.materials.map((row) => snapshotOf(row as Parameters<typeof snapshotOf>[0]));
const woods = woodsOf(plan, table);
const groups = drawnGroups(plan, result);

describe('woods of a trial', () => {
  it('run from light to heavy, the plan’s own figures before the table’s, and hold nothing but wood', () => {
    const changed = {
      ...plan,
      materials: {
        ...plan.materials,
        'balsa-light': { name: 'Mine', category: 'wood' as const, density: 99, cv: 0.1 },
      },
    };
    const offered = woodsOf(changed, table);
    const densities = offered.map(({ material }) => material.density ?? 0);
    expect(densities).toEqual(densities.toSorted((a, b) => a - b));
    expect(offered.filter(({ key }) => key === 'balsa-light').map(({ material }) => material.name)).toEqual([
      'Mine',
    ]);
    expect(new Set(offered.map(({ material }) => material.category))).toEqual(new Set(['wood']));
  });

  it('know the next lighter grade of balsa, and none for the lightest and for spruce', () => {
    expect(oneGradeLighter('balsa-medium', woods)?.key).toBe('balsa-light');
    expect(oneGradeLighter('balsa-contest', woods)).toBeNull();
    expect(oneGradeLighter('spruce', woods)).toBeNull();
  });

  it('hold all the wood of the plan', () => {
    const wooden = result.lines.filter(({ material }) => plan.materials[material ?? '']?.category === 'wood');
    const mass = groups.reduce((sum, group) => sum + group.mass, 0);
    expect(mass).toBeCloseTo(
      wooden.reduce((sum, line) => sum + line.mass, 0),
      9,
    );
  });

  it('begin with ribs one grade lighter, and that saves mass', () => {
    const trials = firstTrials(groups, woods);
    expect(trials[0]?.name).toBe('One grade lighter ribs');
    const { results } = runTrials(plan, [{ name: 'As drawn', materials: {} }, ...trials], { arm: -232 });
    expect(results[1]?.wingMass).toBeLessThan(results[0]?.wingMass ?? 0);
  });
});
