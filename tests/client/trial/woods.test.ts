import { describe, expect, it } from 'vitest';
import { trialHeadline } from '#client/features/trial/headline.ts';
import { parseTrials } from '#client/features/trial/trial-store.ts';
import { drawnGroups, firstTrials, oneGradeLighter, woodsOf } from '#client/features/trial/woods.ts';
import { snapshotOf } from '#client/lib/material-snapshot.ts';
import whimbrelJson from '#data/demo/gliders/whimbrel.json' with { type: 'json' };
import materialsJson from '#data/materials.json' with { type: 'json' };
import { estimate } from '#shared/core/estimate.ts';
import { runTrials, type TrialResult } from '#shared/core/wood-trial.ts';
import { USUAL_UNITS } from '#shared/format/units.ts';
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

describe('trialHeadline', () => {
  const trial = (name: string, bare: number, allUp: number | null): TrialResult => ({
    name,
    bare,
    allUp,
    wingMass: 0,
    wingBare: 0,
    u: 0,
    x: null,
    percentMac: null,
    wingLoading: null,
    classLoading: null,
    margin: null,
    marginAt: null,
    added: allUp === null ? null : 0,
    ballast: allUp === null ? null : allUp - bare,
    refused: allUp === null ? { refused: 'wrong_side', takeOff: 1 } : null,
  });
  const headline = (...results: TrialResult[]) =>
    trialHeadline({ results }, USUAL_UNITS).headline.replaceAll('\u202f', ' ');

  it('tells the best trial by what is left after the re-trim', () => {
    expect(
      headline(trial('As drawn', 100, 120), trial('Light ribs', 96.9, 116), trial('Light tail', 99, 112)),
    ).toBe('Light tail: saves 1.0 g; after re-trim 8.0 g');
  });

  it('says so when a saving is eaten by ballast, when nothing changes, and when it cannot be trimmed', () => {
    expect(headline(trial('As drawn', 100, 120), trial('Light nose', 98, 123))).toBe(
      'Light nose: saves 2.0 g; after re-trim 3.0 g more',
    );
    expect(headline(trial('As drawn', 100, 120), trial('Same', 100, 120))).toBe(
      'Same: no difference in mass',
    );
    expect(headline(trial('As drawn', 100, 120), trial('Heavy', 104, null))).toBe(
      'Heavy: costs 4.0 g; but it cannot be trimmed there',
    );
  });
});

describe('parseTrials', () => {
  it('reads back what was kept and nothing else', () => {
    const trials = firstTrials(groups, woods);
    expect(parseTrials(JSON.parse(JSON.stringify(trials)))).toEqual(trials);
    expect(
      parseTrials([{ name: 'x', materials: { ribs: { key: 'a', material: { name: 'no figures' } } } }]),
    ).toBeNull();
    expect(parseTrials({})).toBeNull();
  });
});
