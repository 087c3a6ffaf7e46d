import type { Plan, Surface } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import type { SideName } from '#shared/drawing/frames.ts';
import { ribNumbers } from '#shared/drawing/marks.ts';
import type { Units } from '#shared/format/units.ts';
import type { PlanViewName } from './drawings.ts';

/** A surface's key as a heading: `wing` is `Wing`. */
export function surfaceTitle({ key }: Pick<Surface, 'key'>): string {
  return key === '' ? 'No name' : key.charAt(0).toUpperCase() + key.slice(1);
}

const SEEN: Record<PlanViewName, string> = {
  half: 'from above',
  whole: 'from above',
  side: 'from the side',
  front: 'from ahead',
};

/** What the plan shows; in brief, for a phone, without what can be seen. */
export function planTitle(
  view: PlanViewName,
  surface: Surface | null,
  side: SideName,
  brief: boolean,
): string {
  if (view === 'side') return brief ? 'Side' : 'Side elevation';
  if (view === 'front') return brief ? 'Front' : 'Front elevation';
  if (view === 'whole' || !surface) return brief ? 'Plan' : 'Plan, whole model';
  if (brief) return surfaceTitle(surface);
  const half = surface.mirrored ? `, ${side} half` : '';
  return `${surfaceTitle(surface)}${half}, laid flat`;
}

/** The plan in a sentence, for who does not see it. */
export function planSentence(
  plan: Plan,
  { planform, balance }: Estimate,
  view: PlanViewName,
  surface: Surface | null,
  units: Units,
): string {
  const mm = (value: number) => units.format(value, 'length');
  const where =
    balance.x === null
      ? ''
      : ` The balance point lies ${mm(balance.x)} aft of the datum, ± ${units.doubt(balance.u ?? 0, 'length')}.`;
  const form = surface && planform[surface.key];
  if (view === 'half' && surface && form) {
    const [root, tip] = [surface.panels[0]?.rootChord ?? 0, surface.panels.at(-1)?.tipChord ?? 0];
    const ribs = ribNumbers(surface).length;
    return (
      `${surfaceTitle(surface)}, one half laid flat: ${panels(surface, units)}, chord ${mm(root)} at the root and ` +
      `${mm(tip)} at the tip, ${ribs === 0 ? 'no ribs' : `ribs at ${ribs} stations`}, ` +
      `mean aerodynamic chord ${mm(form.mac)}.${where}`
    );
  }
  const names = plan.surfaces.map((s) => s.key).join(', ');
  const seen = SEEN[view];
  const rest = `${plan.solids.length} solids and ${plan.items.length} items`;
  return `${plan.name} ${seen}: ${names === '' ? 'no surfaces' : names}, ${rest}.${where}`;
}

function panels({ panels: list }: Surface, units: Units): string {
  const spans = list.map(({ span }) => units.size(span, { bare: true })).join(' and ');
  const unit = units.label('length');
  return list.length === 1 ? `one panel of ${spans} ${unit}` : `${list.length} panels of ${spans} ${unit}`;
}
