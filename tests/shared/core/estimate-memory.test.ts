import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { estimate } from '#shared/core/estimate.ts';
import { newMemory } from '#shared/core/laid-surface.ts';
import type { Part, Plan, Surface } from '#shared/core/plan.ts';
import { anyPlan } from '#tests/support/plan-arbitrary.ts';
import { edits } from '#tests/support/plan-edits.ts';
import { DEMO_NAMES, demoPlan } from '#tests/support/plans.ts';

/** One of the edits that a builder makes most: a part, a panel, a material, an apex. */
function edited(plan: Plan, step: number): Plan {
  const at = step % Math.max(1, plan.surfaces.length);
  const change = (surface: Surface): Surface => {
    switch (step % 3) {
      case 0:
        return { ...surface, panels: surface.panels.map((p) => ({ ...p, span: p.span * 0.99 })) };
      case 1:
        return { ...surface, parts: surface.parts.map((p, i) => (i === step % 5 ? thinner(p) : p)) };
      default:
        return { ...surface, apex: [surface.apex[0] + 1, surface.apex[1], surface.apex[2]] };
    }
  };
  const surfaces = plan.surfaces.map((surface, i) => (i === at ? change(surface) : surface));
  if (step % 4 !== 3) return { ...plan, surfaces };
  const lighter = Object.entries(plan.materials).map(([key, material]) => [
    key,
    material.density === undefined ? material : { ...material, density: material.density * 0.9 },
  ]);
  return { ...plan, surfaces, materials: Object.fromEntries(lighter) as Plan['materials'] };
}

const thinner = (part: Part): Part =>
  'thickness' in part ? { ...part, thickness: part.thickness * 0.9 } : part;

/** A part moved along the span, put to one side, or set in somewhere else once more. */
function shifted([n, m, by, what]: [number, number, number, number]): (plan: Plan) => Plan {
  const change = (part: Part, mirrored: boolean): Part => {
    if (what === 0 && mirrored) return { ...part, side: 'port' };
    if (what === 1 && part.kind === 'skin') return { ...part, start: part.start * 0.8 };
    if (part.kind === 'ribs') return { ...part, stations: [Math.abs(by), Math.abs(by) / 2] };
    if (!('to' in part)) return part;
    return { ...part, from: Math.max(0, (part.from ?? 0) + by), to: Math.max(0, (part.to ?? 0) + by / 2) };
  };
  return (plan) => {
    const picked = plan.surfaces[n % Math.max(1, plan.surfaces.length)];
    if (!picked) return plan;
    const part = picked.parts[m % Math.max(1, picked.parts.length)];
    if (!part) return plan;
    const twin = { ...change(part, picked.mirrored), id: `${part.id}-${n % 97}` };
    const parts =
      what < 5
        ? picked.parts.map((p) => (p === part ? change(p, picked.mirrored) : p))
        : [...picked.parts, twin];
    return { ...plan, surfaces: plan.surfaces.map((s) => (s === picked ? { ...s, parts } : s)) };
  };
}

describe('an estimate that remembers the one before', () => {
  it('answers every edit as one that remembers nothing, notices and their order included', () => {
    fc.assert(
      fc.property(anyPlan, (first) => {
        const memory = newMemory();
        let plan = first;
        for (let step = 0; step < 6; step++) {
          expect(estimate(plan, memory)).toEqual(estimate(structuredClone(plan)));
          plan = edited(plan, step);
        }
      }),
      { numRuns: 60 },
    );
  });

  it('does so part by part: through resizing, moving, adding, removing and reordering on full plans', () => {
    const moved = fc.tuple(fc.nat(), fc.nat(), fc.integer({ min: -400, max: 400 }), fc.nat({ max: 9 }));
    const steps = fc.array(fc.oneof(edits, moved.map(shifted)), { minLength: 1, maxLength: 8 });
    fc.assert(
      fc.property(fc.oneof(anyPlan, fc.constantFrom(...DEMO_NAMES).map(demoPlan)), steps, (first, list) => {
        const memory = newMemory();
        estimate(first, memory);
        list.reduce((plan, step) => {
          const next = step(plan);
          expect(estimate(next, memory)).toEqual(estimate(structuredClone(next)));
          return next;
        }, first);
      }),
      { numRuns: 150 },
    );
  });

  it('measures again only what lies within reach of the changed part', () => {
    const memory = newMemory();
    const plan = demoPlan('whimbrel');
    estimate(plan, memory);
    const before = memory.surfaces[0]!.parts.known;
    const [wing, ...others] = plan.surfaces;
    const parts = wing!.parts.map((part) => (part.kind === 'web' ? { ...part, thickness: 9 } : part));
    estimate({ ...plan, surfaces: [{ ...wing!, parts }, ...others] }, memory);
    const after = memory.surfaces[0]!.parts.known;
    const again = parts.filter((part) => after.has(part) && after.get(part) !== before.get(part));
    // Nothing is measured by a web but the web itself.
    expect(new Set(again.map(({ kind }) => kind))).toEqual(new Set(['web']));
  });

  it('measures only the surface that was changed', () => {
    const memory = newMemory();
    const plan = demoPlan('whimbrel');
    estimate(plan, memory);
    const before = memory.surfaces;
    estimate(edited(plan, 0), memory);
    expect(memory.surfaces.map((laid, i) => laid === before[i])).toEqual([false, true, true]);
  });

  it('keeps the stations of a surface whose parts alone were changed, but not without end', () => {
    const memory = newMemory();
    const plan = demoPlan('dunlin');
    estimate(plan, memory);
    const { line } = memory.surfaces[0]!;
    const thin = edited(plan, 4);
    expect(thin.surfaces[1]?.panels).toBe(plan.surfaces[1]?.panels);
    estimate(thin, memory);
    expect(memory.surfaces[0]?.line).toBe(line);
    const panel = line.panels[0]!;
    for (let i = 0; i < 6_001; i++) panel.known.set(i / 7, panel.known.values().next().value!);
    estimate({ ...plan, surfaces: plan.surfaces.map((s) => ({ ...s, parts: [...s.parts] })) }, memory);
    expect(memory.surfaces[0]?.line).not.toBe(line);
  });
});
