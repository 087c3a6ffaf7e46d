import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import dunlinJson from '#data/demo/gliders/dunlin.json' with { type: 'json' };
import ploverJson from '#data/demo/gliders/plover.json' with { type: 'json' };
import whimbrelJson from '#data/demo/gliders/whimbrel.json' with { type: 'json' };
import { balanceAfter } from '#shared/core/ballast.ts';
import { estimate } from '#shared/core/estimate.ts';
import { worstStation } from '#shared/core/load-cases.ts';
import type { Item } from '#shared/core/plan.ts';
import { isBallast } from '#shared/core/wood-trial-base.ts';
import { withWood, woodGroups } from '#shared/core/wood-groups.ts';
import { runTrials, type Trial } from '#shared/core/wood-trial.ts';
import { planSchema } from '#shared/schemas/plan.ts';

const plans = [dunlinJson, ploverJson, whimbrelJson].map((json) => planSchema.parse(json));

/** A plan, and trials of it: some groups and some single parts, each in a wood by chance. */
const given = fc.constantFrom(...plans).chain((plan) => {
  const groups = woodGroups(plan);
  const keys = groups.flatMap(({ key, members }) => [key, ...members.map(({ id }) => id)]);
  const wood = fc
    .record({ density: fc.integer({ min: 60, max: 500 }), strength: fc.integer({ min: 5, max: 60 }) })
    .map((figures) => ({
      key: 'tried',
      material: { name: 'Tried', category: 'wood' as const, cv: 0.1, modulus: 3, ...figures },
    }));
  const trial = fc.record({
    name: fc.constantFrom('One', 'Two', 'Three'),
    materials: fc.dictionary(fc.constantFrom(...keys), wood, { maxKeys: 5, noNullPrototype: true }),
  });
  return fc.record({
    plan: fc.constant(plan),
    trials: fc.array(trial, { minLength: 1, maxLength: 4 }),
    terms: fc.record({
      arm: fc.integer({ min: -400, max: 400 }),
      minimumMass: fc.option(fc.integer({ min: 1, max: 2000 })),
    }),
  });
});

describe('equal terms', () => {
  it('balance every trimmed trial at the wanted point to a billionth, and never under the class minimum', () => {
    fc.assert(
      fc.property(given, ({ plan, trials, terms }) => {
        const { wanted, results } = runTrials(plan, trials, terms);
        for (const { bare, x, ballast, added, allUp } of results) {
          if (allUp === null) continue;
          const trimmed = balanceAfter(bare, x!, ballast!, terms.arm);
          expect(balanceAfter(bare + ballast!, trimmed, added!, wanted!)).toBeCloseTo(wanted!, 9);
          expect(allUp).toBeCloseTo(Math.max(terms.minimumMass ?? 0, bare + ballast!), 9);
        }
      }),
      { numRuns: 60 },
    );
  });

  it('never ask for negative ballast: what cannot be trimmed is refused and says why', () => {
    fc.assert(
      fc.property(given, ({ plan, trials, terms }) => {
        for (const { ballast, allUp, refused, margin } of runTrials(plan, trials, terms).results) {
          expect(ballast === null).toBe(refused !== null);
          if (ballast !== null) expect(ballast).toBeGreaterThanOrEqual(0);
          else expect([allUp, margin]).toEqual([null, null]);
        }
      }),
      { numRuns: 60 },
    );
  });

  it('hold whatever the order of the trials', () => {
    fc.assert(
      fc.property(given, ({ plan, trials, terms }) => {
        const forth = runTrials(plan, trials, terms).results;
        const back = runTrials(plan, [...trials].reverse(), terms).results;
        expect([...back].reverse()).toEqual(forth);
      }),
      { numRuns: 30 },
    );
  });

  it('come to the same figures as an estimate of the plan in those woods, spar included', () => {
    fc.assert(
      fc.property(given, ({ plan, trials, terms }) => {
        const { results, wanted } = runTrials(plan, trials, terms);
        results.forEach(({ ballast, added, allUp, ...result }, i) => {
          if (allUp === null) return;
          const weight = (id: string, mass: number, x: number): Item => ({
            id,
            name: id,
            group: 'ballast',
            mass,
            at: [x, 0, 0],
          });
          const items = [
            ...plan.items.filter((item) => !isBallast(item)),
            weight('trim-1', ballast!, terms.arm),
            weight('trim-2', added!, wanted!),
          ];
          const whole = estimate(withWood({ ...plan, items }, (trials[i] as Trial).materials));
          expect(whole.totals.mass).toBeCloseTo(allUp, 6);
          expect(whole.totals.wingMass).toBeCloseTo(result.wingMass, 6);
          expect(whole.totals.u).toBeCloseTo(result.u, 6);
          expect(whole.balance.x).toBeCloseTo(wanted!, 6);
          expect(whole.loading.classLoading).toBeCloseTo(result.classLoading!, 6);
          expect(worstStation(whole.spar)?.margin ?? null).toEqual(
            result.margin === null ? null : expect.closeTo(result.margin, 6),
          );
        });
      }),
      { numRuns: 25 },
    );
  });
});

describe('a wood named for a single part', () => {
  it('counts before that of its group, for solids too, and leaves the rest alone', () => {
    for (const plan of plans) {
      const [group] = woodGroups(plan);
      const [member] = group!.members;
      const wood = (density: number) => ({
        key: `w${density}`,
        material: { name: `W ${density}`, category: 'wood' as const, density, cv: 0.1 },
      });
      const tried = withWood(plan, { [group!.key]: wood(111), [member!.id]: wood(222) });
      const now = woodGroups(tried).find(({ key }) => key === group!.key);
      expect(now?.members.map(({ material }) => material)).toEqual(
        group!.members.map(({ id }) => (id === member!.id ? 'w222' : 'w111')),
      );
    }
  });
});
