import { describe, expect, it } from 'vitest';
import type { Part } from '#shared/core/plan.ts';
import { lineAt, targetsOf } from '#shared/drawing/hit.ts';
import { surfaceShapes } from '#shared/drawing/surface-view.ts';
import { MATERIALS, wingOf } from '#tests/support/plans.ts';

const parts: Part[] = [
  {
    id: 'skin',
    name: 'Sheeting',
    kind: 'skin',
    material: 'balsa',
    from: 0,
    to: 500,
    start: 0,
    end: 0.4,
    seat: 'top',
    thickness: 1,
  },
  {
    id: 'spar',
    name: 'Spar',
    kind: 'strip',
    material: 'balsa',
    from: 0,
    to: 500,
    seat: 'top',
    at: [0.3, 0.3],
    width: [6, 6],
    height: [3, 3],
    profile: 'rectangle',
    letIn: true,
  },
  {
    id: 'tissue',
    name: 'Tissue',
    kind: 'covering',
    material: 'tissue',
    from: 0,
    to: 500,
    seat: 'both',
    overlap: 0,
  },
];
const targets = targetsOf(surfaceShapes(wingOf(parts), MATERIALS, 'board', ['starboard']));

describe('pointing at the plan', () => {
  it('finds the spar before the sheeting that it lies under', () => {
    expect(lineAt(targets, [60, 250], 1)).toBe('wing/spar');
    expect(lineAt(targets, [30, 250], 1)).toBe('wing/skin');
  });

  it('finds a thin part within reach of the pointer', () => {
    expect(lineAt(targets, [65, 250], 1)).toBe('wing/skin');
    expect(lineAt(targets, [65, 250], 3)).toBe('wing/spar');
  });

  it('finds nothing on bare covering or beside the wing', () => {
    expect(lineAt(targets, [150, 250], 2)).toBeNull();
    expect(lineAt(targets, [-40, 250], 2)).toBeNull();
  });
});
