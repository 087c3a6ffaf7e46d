import { snapshotOf } from '#client/lib/material-snapshot.ts';
import { describe, expect, it } from 'vitest';
import { PART_CHOICES, SET_CHOICES, withParts } from '#client/features/drawing/edits/add-parts.ts';
import { choices, preferred } from '#client/features/drawing/edits/materials.ts';
import { newItem, newSolid, newSurface, SOLID_CHOICES } from '#client/features/drawing/edits/new-rows.ts';
import { noticeWords } from '#client/components/notice-text.ts';
import { startPlan } from '#client/features/gliders/start-plan.ts';
import delivered from '#data/materials.json';
import { estimate } from '#shared/core/estimate.ts';
import type { Part, Plan, Surface } from '#shared/core/plan.ts';
import { USUAL_UNITS } from '#shared/format/units.ts';
import { fitsPart, fitsSolid } from '#shared/plan-start/fits.ts';
import { newPart } from '#shared/plan-start/new-part.ts';
import { newSet } from '#shared/plan-start/part-sets.ts';
import { WISHES } from '#shared/plan-start/wishes.ts';
import { planSchema } from '#shared/schemas/plan.ts';
import { DEMO_NAMES, demoPlan } from '#tests/support/plans.ts';

const table = delivered.materials.map((row) => snapshotOf(row as Parameters<typeof snapshotOf>[0]));
const empty = startPlan('New');

/** The plan with one part more, made of what its builder would reach for. */
function withNew(plan: Plan, surface: Surface, choice: (typeof PART_CHOICES)[number]['choice']): Plan {
  const bare = newPart(choice, surface);
  const material = preferred(plan, table, fitsPart(bare), WISHES[choice]);
  if (!material) throw new Error(`no material fits ${choice}`);
  const part: Part = { ...bare, id: 'new', material: material.key };
  return {
    ...plan,
    materials: { ...plan.materials, [material.key]: material.material },
    surfaces: plan.surfaces.map((s) => (s.key === surface.key ? { ...s, parts: [...s.parts, part] } : s)),
  };
}

describe('a set of parts', () => {
  const withSet = (plan: Plan, index: number, choice: (typeof SET_CHOICES)[number]['choice']) => {
    const surface = plan.surfaces[index]!;
    return withParts(plan, surface, index, newSet(choice, surface), table).recipe(plan);
  };

  it.each(SET_CHOICES)('“$label” suits every surface of the demo gliders and a blank wing', ({ choice }) => {
    for (const plan of [empty, ...DEMO_NAMES.map(demoPlan)]) {
      for (const index of plan.surfaces.keys()) {
        const after = withSet(plan, index, choice);
        expect(planSchema.safeParse(after).error?.issues ?? []).toEqual([]);
        const before = plan.surfaces[index]!.parts.length;
        expect(after.surfaces[index]!.parts.length - before).toBe(
          newSet(choice, plan.surfaces[index]!).length,
        );
      }
    }
  });

  it('each in turn makes a wing of a blank one, that weighs something and fits without a red word', () => {
    const plan = SET_CHOICES.reduce((p, { choice }) => withSet(p, 0, choice), empty);
    const { lines, notices } = estimate(plan);
    // Ribs, two spars, sheeting and web, two stringers, two edges, a tip
    expect(lines).toHaveLength(10);
    for (const line of lines) expect(line.mass, line.name).toBeGreaterThan(0);
    const words = notices.map((notice) => noticeWords(notice, plan, USUAL_UNITS));
    expect(words.filter(({ tone }) => tone === 'red')).toEqual([]);
  });

  it.each(['0006', '4406', '2407', '4409', '0018'])(
    'each in turn fits into a wing of section %s, however small its chords',
    (naca) => {
      for (const [rootChord, tipChord] of [
        [40, 40],
        [70, 40],
        [150, 90],
        [400, 160],
      ] as const) {
        const section = { naca };
        const bare = empty.surfaces.map((surface): Surface => ({
          ...surface,
          panels: surface.panels.map((panel) => ({
            ...panel,
            rootChord,
            tipChord,
            rootSection: section,
            tipSection: section,
          })),
        }));
        const plan = SET_CHOICES.reduce((p, { choice }) => withSet(p, 0, choice), {
          ...empty,
          surfaces: bare,
        });
        const told = estimate(plan).notices.map(({ code }) => code);
        expect(
          told.filter((code) => /^strip|^rib|^web|^skin|^part/.test(code)),
          `${rootChord}–${tipChord} mm`,
        ).toEqual([]);
      }
    },
  );

  it('of ribs stands at the root, at every break and at the tip, whole bays between', () => {
    const { surfaces } = demoPlan('whimbrel');
    const [ribs] = newSet('ribSet', surfaces[0]!);
    const stations = ribs?.part.kind === 'ribs' ? (ribs.part.stations ?? []) : [];
    let end = 0;
    for (const { span } of surfaces[0]!.panels) expect(stations).toContain((end += span));
    expect(stations[0]).toBe(0);
    expect(stations.at(-1)).toBe(end);
    const bays = stations.slice(1).map((s, i) => s - stations[i]!);
    expect(Math.max(...bays) / Math.min(...bays)).toBeLessThan(2.5);
  });

  it('of stringers goes before the spars where there are some behind', () => {
    const once = withSet(empty, 0, 'stringerPair');
    const twice = withSet(once, 0, 'stringerPair');
    const places = twice.surfaces[0]!.parts.map((part) => (part.kind === 'strip' ? part.at?.[0] : null));
    expect(places).toEqual([0.6, 0.6, 0.12, 0.12]);
    expect(twice.surfaces[0]!.parts.map(({ name }) => name)[2]).toBe('Stringer, top 2');
  });
});

describe('a new part', () => {
  it.each(PART_CHOICES)('$label suits every surface of the demo gliders and a blank wing', ({ choice }) => {
    for (const plan of [empty, ...DEMO_NAMES.map(demoPlan)]) {
      for (const surface of plan.surfaces) {
        const after = withNew(plan, surface, choice);
        expect(planSchema.safeParse(after).error?.issues ?? [], `${plan.name} ${surface.key}`).toEqual([]);
      }
    }
  });

  it('built up in turn on a blank wing, weighs something and fits without a red word', () => {
    const order = PART_CHOICES.map(({ choice }) => choice).filter((choice) => choice !== 'sheet');
    const plan = order.reduce((p, choice) => {
      const added = withNew(p, p.surfaces[0]!, choice);
      const parts = added.surfaces[0]!.parts.map((part, i) => ({ ...part, id: `p${i}` }));
      return { ...added, surfaces: [{ ...added.surfaces[0]!, parts }] };
    }, empty);
    const { lines, notices } = estimate(plan);
    expect(lines).toHaveLength(order.length);
    for (const line of lines) expect(line.mass, line.name).toBeGreaterThan(0);
    const words = notices.map((notice) => noticeWords(notice, plan, USUAL_UNITS));
    expect(words.filter(({ tone }) => tone === 'red')).toEqual([]);
  });

  it('is the bottom spar once the top one is there', () => {
    const after = withNew(empty, empty.surfaces[0]!, 'spar');
    expect(newPart('spar', empty.surfaces[0]!)).toMatchObject({ seat: 'top', name: 'Spar, top' });
    expect(newPart('spar', after.surfaces[0]!)).toMatchObject({ seat: 'bottom', name: 'Spar, bottom' });
  });
});

describe('new surfaces, solids and items', () => {
  it('make a plan that balances: a tailplane behind the wing, a fin, a boom and gear', () => {
    const surfaces = [...empty.surfaces, newSurface(empty, 'tailplane'), newSurface(empty, 'fin')];
    const solids = SOLID_CHOICES.map(({ choice, wishes }) => {
      const bare = newSolid(choice);
      return { ...bare, id: choice, material: preferred(empty, table, fitsSolid(bare), wishes)!.key };
    });
    const materials = Object.fromEntries(
      table
        .filter(({ key }) => solids.some(({ material }) => material === key))
        .map(({ key, material }) => [key, material]),
    );
    const plan: Plan = { ...empty, materials, surfaces, solids, items: [{ ...newItem(), id: 'item' }] };
    expect(planSchema.safeParse(plan).error?.issues ?? []).toEqual([]);
    const { balance, planform } = estimate(plan);
    expect(balance.neutralPoint).toBeGreaterThan(planform['wing']!.xLeMac);
    expect(balance.x).not.toBeNull();
  });

  it('never take a name that is there', () => {
    expect(newSurface(empty, 'wing').key).toBe('wing-2');
  });
});

describe('materials to choose from', () => {
  it('are the plan’s own first, then the table’s, none twice', () => {
    const plan = demoPlan('dunlin');
    const offered = choices(plan, table, fitsPart({ kind: 'ribs' })).map(({ key }) => key);
    expect(new Set(offered).size).toBe(offered.length);
    expect(Object.keys(plan.materials)).toContain(offered[0]);
    expect(offered).toContain('obeche');
  });

  it('are only those by which the part can be weighed', () => {
    const keys = (kind: Part['kind'], method?: 'joints' | 'share') =>
      choices(empty, table, fitsPart({ kind, ...(method && { method }) })).map(({ key }) => key);
    expect(keys('covering')).toContain('tissue-light');
    expect(keys('covering')).not.toContain('spruce');
    expect(keys('tipBlock')).not.toContain('ply-0.8mm');
    expect(keys('ribs')).toContain('ply-0.8mm');
    expect(keys('glue', 'joints')).not.toContain('epoxy-filler');
    expect(keys('glue', 'share')).toContain('epoxy-filler');
  });

  it('are kept as snapshots without what is not known', () => {
    const tissue = table.find(({ key }) => key === 'tissue-light');
    expect(tissue?.material).toMatchObject({ category: 'covering', areal: 12.5 });
    expect(Object.keys(tissue?.material ?? {})).not.toContain('density');
  });
});
