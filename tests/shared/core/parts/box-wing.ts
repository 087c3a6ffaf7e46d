import { estimate } from '#shared/core/estimate.ts';
import type { Part, Strip } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import { planOf, wingOf } from '#tests/support/plans.ts';

/**
 * A half wing whose section is a plate 12 mm thick, 200 mm of chord, 500 mm of span: every figure can be summed
 * by hand.
 */
export function boxWing(parts: Part[]): Estimate {
  const plate = { flat: 12 };
  const panel = {
    span: 500,
    rootChord: 200,
    tipChord: 200,
    sweep: 0,
    dihedral: 0,
    rootSection: plate,
    tipSection: plate,
  };
  return estimate(planOf([wingOf(parts, { mirrored: false, panels: [panel] })]));
}

export const part = { id: 'p', name: 'Part', material: 'balsa' };

export function strip(changes: Partial<Strip> = {}): Strip {
  return {
    ...part,
    id: 'strip',
    kind: 'strip',
    from: 0,
    to: 500,
    at: [0.3, 0.3],
    seat: 'top',
    width: [6, 6],
    height: [3, 3],
    profile: 'rectangle',
    letIn: true,
    ...changes,
  };
}
