import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import table from '#data/materials.json' with { type: 'json' };
import { estimate } from '#shared/core/estimate.ts';
import { planSchema } from '#shared/schemas/plan.ts';
import { guidedPlan } from '#shared/plan-start/guided-start.ts';
import { guidedProblems, type GuidedWishes } from '#shared/plan-start/guided-wishes.ts';
import type { KeyedMaterial } from '#shared/plan-start/wishes.ts';
import { expectNearly, ROUNDING } from '#tests/support/nearly.ts';

/** The table as the client hands it in: what is not known is left out. */
const OFFERED: KeyedMaterial[] = table.materials.map((row) => {
  const { key, name, category, density, areal, spread, cv, modulus, strength } = row;
  const figures = Object.entries({ density, areal, spread, modulus, strength });
  const material = {
    name,
    category,
    cv,
    ...Object.fromEntries(figures.filter(([, value]) => value !== null)),
  };
  return { key, material: material as KeyedMaterial['material'] };
});

const WISHES: GuidedWishes = {
  name: 'Sandpiper',
  span: 1200,
  rootChord: 150,
  tipChord: 110,
  dihedral: 'polyhedral',
  section: '4409',
  structure: 'sheeted',
  tail: 'built',
  radio: false,
};

const wishes: fc.Arbitrary<GuidedWishes> = fc
  .record({
    name: fc.constant('Sandpiper'),
    span: fc.integer({ min: 300, max: 4000 }),
    rootChord: fc.integer({ min: 40, max: 400 }),
    taper: fc.integer({ min: 45, max: 100 }),
    dihedral: fc.constantFrom('flat' as const, 'vee' as const, 'polyhedral' as const),
    section: fc.constantFrom('4409', '6406', '2412', '0010', '4415', '6409'),
    structure: fc.constantFrom('sheeted' as const, 'open' as const, 'sheet' as const),
    tail: fc.constantFrom('built' as const, 'sheet' as const, 'none' as const),
    radio: fc.boolean(),
  })
  .map(({ taper, ...rest }) => ({ ...rest, tipChord: Math.round((rest.rootChord * taper) / 100) }))
  .filter((one) => guidedProblems(one).length === 0);

describe('a guided start', () => {
  it('draws a valid plan with nothing to complain of, of the span asked for, balanced where it is wanted', () => {
    fc.assert(
      fc.property(wishes, (wish) => {
        const plan = guidedPlan(wish, OFFERED);
        expect(planSchema.safeParse(plan).error?.issues ?? []).toEqual([]);
        const result = estimate(plan);
        const told = result.notices.filter(({ code }) => !['no_tailplane', 'reynolds_low'].includes(code));
        expect(told).toEqual([]);
        expectNearly(result.planform['wing']?.span, wish.span, ROUNDING);
        expect(result.totals.mass).toBeGreaterThan(0);
      }),
      { numRuns: 300 },
    );
  });

  it('puts in what each way of building asks for', () => {
    const kinds = (changes: Partial<GuidedWishes>) =>
      guidedPlan({ ...WISHES, ...changes }, OFFERED).surfaces[0]?.parts.map(({ name }) => name);
    expect(kinds({})).toEqual([
      'Leading edge',
      'Trailing edge',
      'Spar, top',
      'Spar, bottom',
      'Ribs',
      'Nose sheeting',
      'Shear web',
      'Cap strips',
      'Tip block',
      'Covering',
      'Glue',
    ]);
    expect(kinds({ structure: 'open' })).toContain('Stringer, bottom');
    expect(kinds({ structure: 'sheet' })).toEqual(['Sheet', 'Finish', 'Glue']);
  });

  it('comes to a mass that such a model has', () => {
    // A towline glider of 1.2 m, 15 dm², built light: between 60 and 260 g (common practice, no source).
    const { totals, balance } = estimate(guidedPlan(WISHES, OFFERED));
    expect(totals.mass).toBeGreaterThan(60);
    expect(totals.mass).toBeLessThan(260);
    expect(balance.staticMargin).toBeGreaterThan(0.05);
    expect(balance.staticMargin).toBeLessThan(0.15);
  });

  it('says what stands in the way, field by field', () => {
    const codes = (changes: Partial<GuidedWishes>) =>
      guidedProblems({ ...WISHES, ...changes }).map(({ field, code }) => `${field} ${code}`);
    expect(codes({ span: 20, rootChord: Number.NaN })).toEqual([
      'span out_of_bounds',
      'rootChord out_of_bounds',
    ]);
    expect(codes({ tipChord: 160 })).toEqual(['tipChord tip_wider_than_root']);
    expect(codes({ rootChord: 500, tipChord: 400 })).toEqual(['rootChord chord_too_long']);
    expect(codes({ section: '44' })).toEqual(['section no_section']);
    expect(codes({ section: '4404' })).toEqual(['structure too_thin']);
    expect(codes({ section: '4404', structure: 'sheet' })).toEqual([]);
  });

  it('leaves out what nothing is offered for', () => {
    const plan = guidedPlan(WISHES, []);
    expect(plan.surfaces.flatMap(({ parts }) => parts)).toEqual([]);
    expect(plan.solids).toEqual([]);
    expect(planSchema.safeParse(plan).success).toBe(true);
  });
});
