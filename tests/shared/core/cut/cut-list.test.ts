import { describe, expect, it } from 'vitest';
import { cutList } from '#shared/core/cut/cut-list.ts';
import { estimate } from '#shared/core/estimate.ts';
import { EXAMPLE_PLAN } from '#shared/core/example-wing.ts';
import { expectNearly, ROUNDING } from '#tests/support/nearly.ts';
import { DEMO_NAMES, demoPlan } from '#tests/support/plans.ts';

/** Sums of straight steps against integrals by Gauss points. */
const STEPPED = 1e-7;

describe('a cut list', () => {
  it.each(DEMO_NAMES)('has the sticks of %s in the lengths that the estimate measures', (name) => {
    const plan = demoPlan(name);
    const { sticks } = cutList(plan);
    const lengths = new Map<string, number>();
    for (const { line, length } of sticks) lengths.set(line, (lengths.get(line) ?? 0) + length);
    const measured = estimate(plan).lines.filter(({ id }) => lengths.has(id));
    expect(measured.length).toBe(lengths.size);
    for (const { id, length } of measured) expectNearly(lengths.get(id), length ?? Number.NaN, STEPPED);
  });

  it('cuts a stick where the dihedral breaks, and nowhere else', () => {
    const dunlin = cutList(demoPlan('dunlin')).sticks.filter(({ line }) => line === 'wing/spar-top');
    expect(dunlin.map(({ id }) => id)).toEqual([
      'wing/spar-top port 1',
      'wing/spar-top port 2',
      'wing/spar-top starboard 1',
      'wing/spar-top starboard 2',
    ]);
    expect(dunlin.map(({ place }) => place?.from)).toEqual([0, 370, 0, 370]);
    expect(cutList(EXAMPLE_PLAN).sticks.filter(({ panel }) => panel !== null)).toEqual([]);
  });

  it('has a blank for every rib of either half, as long as lies between the edges', () => {
    const { ribs } = cutList(EXAMPLE_PLAN);
    expect(ribs).toHaveLength(12);
    // A plate of 10 mm and 100 mm chord without edges.
    for (const { length, height, thickness } of ribs) {
      expectNearly(length, 100, ROUNDING);
      expectNearly(height, 10, ROUNDING);
      expect(thickness).toBe(2);
    }
    const [wing] = demoPlan('dunlin').surfaces;
    const inner = cutList(demoPlan('dunlin')).ribs.find(({ id }) => id === 'wing/ribs-inner port 1');
    // 136 mm of chord less a leading edge of 5 and a trailing edge of 22 mm.
    expect(wing?.panels[0]?.rootChord).toBe(136);
    expectNearly(inner?.length, 136 - 5 - 22, ROUNDING);
    expect(inner?.height).toBeGreaterThan(0.08 * 136);
  });
});
