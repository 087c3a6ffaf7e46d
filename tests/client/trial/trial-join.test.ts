import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { joinTrials } from '#client/features/trial/trial-join.ts';
import type { TrialsInput } from '#shared/schemas/trials.ts';

const wood = (density: number) => ({
  key: `w${density}`,
  material: { name: `W ${density}`, category: 'wood' as const, density, cv: 0.1 },
});
const list = (
  trials: Record<string, Record<string, number>>,
  minimumMass: number | null = null,
): TrialsInput => ({
  trials: Object.entries(trials).map(([name, woods]) => ({
    name,
    materials: Object.fromEntries(Object.entries(woods).map(([key, density]) => [key, wood(density)])),
  })),
  terms: { arm: null, minimumMass },
});

const lists = fc
  .dictionary(
    fc.constantFrom('Light', 'Hard', 'Odd'),
    fc.dictionary(fc.constantFrom('ribs', 'spars', 'wing/top'), fc.constantFrom(100, 150, 200), {
      noNullPrototype: true,
    }),
    { noNullPrototype: true },
  )
  .map((trials) => list(trials));

describe('two lists of trials that were one', () => {
  const base = list({ Light: { ribs: 100 }, Hard: { spars: 200 } });

  it('keep what each side added, changed and deleted', () => {
    const mine = list({ Light: { ribs: 100, spars: 150 }, Hard: { spars: 200 }, Mine: { ribs: 90 } }, 300);
    const theirs = list({ Light: { ribs: 110 }, Theirs: { ribs: 80 } });
    expect(joinTrials(base, mine, theirs)).toEqual(
      list({ Light: { ribs: 110, spars: 150 }, Theirs: { ribs: 80 }, Mine: { ribs: 90 } }, 300),
    );
  });

  it('keep both trials where both chose another wood for the same, mine under another name', () => {
    expect(
      joinTrials(base, list({ Light: { ribs: 90 } }), list({ Light: { ribs: 120 }, Hard: { spars: 200 } })),
    ).toEqual(list({ Light: { ribs: 120 }, 'Light, 2': { ribs: 90 } }));
  });

  it('keep a trial that one deleted and the other changed', () => {
    const mine = list({ Light: { ribs: 100 } });
    const theirs = list({ Light: { ribs: 100 }, Hard: { spars: 210 } });
    expect(joinTrials(base, mine, theirs)).toEqual(theirs);
    expect(joinTrials(base, theirs, mine)).toEqual(theirs);
  });

  it('take my order where only I changed it', () => {
    const mine = list({ Hard: { spars: 200 }, Light: { ribs: 100 } });
    expect(joinTrials(base, mine, list({ Light: { ribs: 110 }, Hard: { spars: 200 } }))).toEqual(
      list({ Hard: { spars: 200 }, Light: { ribs: 110 } }),
    );
  });

  it('are theirs where I changed nothing, mine where they changed nothing, and never two of a name', () => {
    fc.assert(
      fc.property(lists, lists, lists, (from, mine, theirs) => {
        expect(joinTrials(from, from, theirs)).toEqual(theirs);
        expect(joinTrials(from, mine, from)).toEqual(mine);
        const names = joinTrials(from, mine, theirs).trials.map(({ name }) => name);
        expect(new Set(names).size).toBe(names.length);
      }),
    );
  });

  it('lose no wood that either side chose anew', () => {
    fc.assert(
      fc.property(lists, lists, lists, (from, mine, theirs) => {
        const joined = JSON.stringify(joinTrials(from, mine, theirs));
        for (const side of [mine, theirs]) {
          for (const { name, materials } of side.trials) {
            const before = from.trials.find((trial) => trial.name === name)?.materials ?? {};
            for (const [key, chosen] of Object.entries(materials)) {
              if (before[key]?.key !== chosen.key)
                expect(joined).toContain(`"${key}":${JSON.stringify(chosen)}`);
            }
          }
        }
      }),
    );
  });
});
