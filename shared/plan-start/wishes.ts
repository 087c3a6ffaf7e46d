import type { PlanMaterial } from '#shared/core/plan.ts';
import type { PartChoice } from './new-part.ts';

/** A material by the key that plans know it by. */
export interface KeyedMaterial {
  key: string;
  material: PlanMaterial;
}

/** Keys of the materials table that a builder would reach for first. */
export const WISHES: Record<PartChoice, readonly string[]> = {
  ribs: ['balsa-medium', 'balsa-light'],
  spar: ['spruce', 'balsa-hard'],
  stringer: ['balsa-hard', 'balsa-medium'],
  leadingEdge: ['balsa-medium', 'balsa-hard'],
  trailingEdge: ['balsa-medium', 'balsa-hard'],
  sheeting: ['balsa-light', 'balsa-medium'],
  capStrips: ['balsa-light', 'balsa-medium'],
  web: ['balsa-medium', 'balsa-light'],
  tipBlock: ['balsa-light', 'balsa-contest'],
  sheet: ['balsa-light', 'balsa-medium'],
  covering: ['tissue-light', 'film-iron-on-light'],
  finish: ['dope-clear', 'sanding-sealer'],
  glue: ['pva'],
};

/** The first of the wished-for keys that is offered and fits, or else whatever fits; null where nothing does. */
export function wished<M extends KeyedMaterial>(
  offered: readonly M[],
  fits: (material: PlanMaterial) => boolean,
  wishes: readonly string[],
): M | null {
  const fitting = offered.filter(({ material }) => fits(material));
  for (const wish of wishes) {
    const found = fitting.find(({ key }) => key === wish);
    if (found) return found;
  }
  return fitting[0] ?? null;
}
