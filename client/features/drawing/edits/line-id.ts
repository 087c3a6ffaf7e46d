import type { Plan } from '#shared/core/plan.ts';

/** Where a line of the balance sheet has its form: on a surface, among the solids or among the items. */
export type Tab = { kind: 'surface'; index: number } | { kind: 'solids' } | { kind: 'items' };

export interface LinePlace {
  tab: Tab;
  /** id of the part, solid or item */
  id: string;
}

/** Reads `wing/spar-top`, `solid/boom`, `item/rx`; null for a line that the plan does not have. */
export function placeOfLine(plan: Plan, line: string | null): LinePlace | null {
  if (line === null) return null;
  // A surface may be called `item`; its own parts come first.
  for (const [index, surface] of plan.surfaces.entries()) {
    const part = surface.parts.find(({ id }) => line === `${surface.key}/${id}`);
    if (part) return { tab: { kind: 'surface', index }, id: part.id };
  }
  const solid = plan.solids.find(({ id }) => line === `solid/${id}`);
  if (solid) return { tab: { kind: 'solids' }, id: solid.id };
  const item = plan.items.find(({ id }) => line === `item/${id}`);
  return item ? { tab: { kind: 'items' }, id: item.id } : null;
}

export function sameTab(a: Tab, b: Tab): boolean {
  return a.kind === 'surface' && b.kind === 'surface' ? a.index === b.index : a.kind === b.kind;
}

/** The tab, or the nearest that still exists after a surface was removed or brought back. */
export function existingTab(plan: Plan, tab: Tab): Tab {
  if (tab.kind !== 'surface') return tab;
  if (plan.surfaces.length === 0) return { kind: 'solids' };
  return { kind: 'surface', index: Math.min(tab.index, plan.surfaces.length - 1) };
}
