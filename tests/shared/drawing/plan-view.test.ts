import { describe, expect, it } from 'vitest';
import type { Part } from '#shared/core/plan.ts';
import { planformOf } from '#shared/core/planform.ts';
import { TIP_STEPS } from '#shared/drawing/outline.ts';
import { planView } from '#shared/drawing/plan-view.ts';
import type { Shape } from '#shared/drawing/shape.ts';
import { surfaceShapes } from '#shared/drawing/surface-view.ts';
import { expectNearly, ROUNDING } from '#tests/support/nearly.ts';
import { DEMO_NAMES, demoPlan, MATERIALS, planOf, wingOf } from '#tests/support/plans.ts';
import { areaOf, cranked } from './shapes.ts';

const sum = (shapes: readonly Shape[]) => shapes.reduce((total, shape) => total + areaOf(shape), 0);
/** A quarter turn drawn in n chords holds sin(δ)/δ of the ellipse's area, δ = 90°/n. */
const STEP = Math.PI / 2 / TIP_STEPS;
const INSCRIBED = Math.sin(STEP) / STEP;

describe('the planform drawn', () => {
  it.each(DEMO_NAMES)('of %s has the area that is computed, seen from above and on the board', (name) => {
    const plan = demoPlan(name);
    for (const surface of plan.surfaces.filter((s) => s.role !== 'fin')) {
      const bare = { ...surface, parts: surface.parts.filter((part) => part.kind !== 'tipBlock') };
      const { areaProjected, areaDeveloped } = planformOf(bare);
      const outline = (view: 'above' | 'board') =>
        surfaceShapes(bare, plan.materials, view).filter((shape) => shape.kind === 'outline');
      expectNearly(sum(outline('above')), areaProjected, ROUNDING);
      expectNearly(sum(outline('board')), areaDeveloped, ROUNDING);
    }
  });

  it('takes in a tip block as half an ellipse, short only of what its chords cut off', () => {
    const tip: Part = { id: 'tip', name: 'Tip', kind: 'tipBlock', material: 'balsa', length: 37, hollow: 0 };
    const [bare, tipped] = [cranked([]), cranked([tip])];
    const block = planformOf(tipped).areaDeveloped - planformOf(bare).areaDeveloped;
    const shapes = surfaceShapes(tipped, MATERIALS, 'board');
    expectNearly(sum(shapes.filter((shape) => shape.kind === 'tipBlock')), block * INSCRIBED, ROUNDING);
    const whole = planformOf(bare).areaDeveloped + block * INSCRIBED;
    expectNearly(sum(shapes.filter((shape) => shape.kind === 'outline')), whole, ROUNDING);
  });

  it('keeps a step in the chord as a step, without losing area', () => {
    const stepped = wingOf([], {
      panels: [100, 130].map((chord) => ({
        ...wingOf([]).panels[0]!,
        rootChord: chord,
        tipChord: chord,
        span: 200,
      })),
    });
    const [outline] = surfaceShapes(stepped, MATERIALS, 'board', ['starboard']).filter(
      (s) => s.kind === 'outline',
    );
    // 200 mm × 100 mm + 200 mm × 130 mm
    expectNearly(areaOf(outline!), 46_000, ROUNDING);
  });

  it('mirrors the port half in the plane of symmetry', () => {
    const [starboard, port] = planView(planOf([cranked([])])).filter((shape) => shape.kind === 'outline');
    expect(port?.points).toEqual(starboard?.points.map(([x, y]) => [x, -y]));
    expect(
      planView(planOf([cranked([])]), { half: 'starboard' }).filter((s) => s.kind === 'outline'),
    ).toHaveLength(1);
  });

  it('shows a fin from above by its sections, not as a line without width', () => {
    const fin = wingOf([], {
      role: 'fin',
      mirrored: false,
      panels: [{ ...wingOf([]).panels[0]!, dihedral: 90, rootSection: { flat: 4 }, tipSection: { flat: 4 } }],
    });
    const shapes = planView(planOf([fin]));
    expect(shapes).toHaveLength(2);
    // 200 mm of chord, 4 mm thick
    for (const shape of shapes) expectNearly(areaOf(shape), 800, ROUNDING);
  });
});
