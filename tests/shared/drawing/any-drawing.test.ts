import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { estimate } from '#shared/core/estimate.ts';
import { balanceMarks, macMark, ribNumbers } from '#shared/drawing/marks.ts';
import { planOutline } from '#shared/drawing/outline.ts';
import { planView, sideView } from '#shared/drawing/plan-view.ts';
import { sectionView } from '#shared/drawing/section-view.ts';
import { surfaceShapes } from '#shared/drawing/surface-view.ts';
import { anyPlan } from '#tests/support/plan-arbitrary.ts';
import { DEMO_NAMES, demoPlan } from '#tests/support/plans.ts';

const isFinite = (points: readonly (readonly number[])[]) => points.every((p) => p.every(Number.isFinite));

// Hundreds of plans take seconds on a busy machine; this bounds a hang, it measures nothing.
describe('any plan that the schema accepts', { timeout: 120_000 }, () => {
  it('is drawn in finite numbers, whole, by surface, in section and from the side', () => {
    fc.assert(
      fc.property(anyPlan, fc.double({ min: 0, max: 1, noNaN: true }), (plan, share) => {
        const shapes = [...planView(plan), ...sideView(plan)];
        for (const surface of plan.surfaces) {
          const length = surface.panels.reduce((sum, panel) => sum + panel.span, 0);
          shapes.push(...surfaceShapes(surface, plan.materials, 'board'));
          shapes.push(...sectionView(surface, share * length, plan.materials).shapes);
          expect(isFinite([Object.values(macMark(surface)) as number[]])).toBe(true);
        }
        for (const { points, hole, kind } of shapes)
          expect(isFinite([...points, ...(hole ?? [])]), kind).toBe(true);
        expect(isFinite(planOutline(plan))).toBe(true);
      }),
      { numRuns: 300, seed: 29 },
    );
  });
});

describe('the demo gliders', () => {
  it.each(DEMO_NAMES)('draws every part of %s that has a place', (name) => {
    const plan = demoPlan(name);
    const drawn = new Set(planView(plan).map((shape) => shape.line));
    const upright = new Set(plan.surfaces.filter((s) => s.role === 'fin').map((s) => s.key));
    const expected = estimate(plan).lines.filter(({ id, surface }) => {
      const part = plan.surfaces
        .find((s) => s.key === surface)
        ?.parts.find((p) => `${surface}/${p.id}` === id);
      return part?.kind !== 'glue' && !upright.has(surface ?? '');
    });
    expect(expected.length).toBeGreaterThan(10);
    for (const { id } of expected) expect(drawn, id).toContain(id);
  });

  it.each(DEMO_NAMES)(
    'marks the balance of %s where the estimate puts it, inside its wanted range',
    (name) => {
      const plan = demoPlan(name);
      const result = estimate(plan);
      const { balance, wanted, neutralPoint } = balanceMarks(plan, result.balance);
      const wing = result.planform['wing']!;
      expect(balance?.x).toBe(result.balance.x);
      expect(neutralPoint).toBe(result.balance.neutralPoint);
      expect(wanted?.x).toBeCloseTo(wing.xLeMac + (plan.target!.percentMac / 100) * wing.mac, 9);
      expect(wanted!.to - wanted!.from).toBeCloseTo((2 * plan.target!.tolerance * wing.mac) / 100, 9);
    },
  );
});

describe('marks', () => {
  it('places the mean chord at the station whose y is its own', () => {
    const surface = demoPlan('whimbrel').surfaces[0]!;
    const mark = macMark(surface);
    const [chordLine] = surfaceShapes({ ...surface, parts: [] }, {}, 'above', ['starboard']).filter(
      (s) => s.kind === 'outline',
    );
    const onBoard = surfaceShapes({ ...surface, parts: [] }, {}, 'board', ['starboard']).find(
      (s) => s.kind === 'outline',
    );
    // Both outlines run through the same corners; y and s between two corners are in proportion.
    const ys = chordLine!.points.map(([, y]) => y);
    const ss = onBoard!.points.map(([, s]) => s);
    const i = ys.findIndex((y) => y >= mark.y);
    const share = (mark.y - ys[i - 1]!) / (ys[i]! - ys[i - 1]!);
    expect(mark.s).toBeCloseTo(ss[i - 1]! + share * (ss[i]! - ss[i - 1]!), 9);
  });

  it('numbers ribs from the root, one number to a station', () => {
    const surface = demoPlan('dunlin').surfaces[0]!;
    const numbers = ribNumbers(surface);
    expect(numbers[0]).toBe(0);
    expect(numbers).toEqual([...new Set(numbers)].sort((a, b) => a - b));
    const past = { ...surface, panels: [{ ...surface.panels[0]!, span: 100 }] };
    expect(Math.max(...ribNumbers(past))).toBeLessThanOrEqual(100);
  });

  it('outlines the first wing from its root, and nothing where there is none', () => {
    const plan = demoPlan('plover');
    const outline = planOutline(plan);
    const [rootX, rootY] = plan.surfaces[0]!.apex;
    expect(outline[0]).toEqual([rootX, rootY]);
    expect(outline.at(-1)).toEqual([rootX + plan.surfaces[0]!.panels[0]!.rootChord, rootY]);
    expect(planOutline({ ...plan, surfaces: [] })).toEqual([]);
  });
});
