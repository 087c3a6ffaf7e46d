import type { Plan, Surface } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import type { SideName } from '#shared/drawing/frames.ts';
import { ribNumbers } from '#shared/drawing/marks.ts';
import { formatNumber, formatQuantity } from '#shared/format/numbers.ts';
import type { PlanViewName } from './drawings.ts';

/** A surface's key as a heading: `wing` is `Wing`. */
export function surfaceTitle({ key }: Pick<Surface, 'key'>): string {
  return key === '' ? 'No name' : key.charAt(0).toUpperCase() + key.slice(1);
}

/** What the plan shows; in brief, for a phone, without what can be seen. */
export function planTitle(
  view: PlanViewName,
  surface: Surface | null,
  side: SideName,
  brief: boolean,
): string {
  if (view === 'side') return brief ? 'Side' : 'Side elevation';
  if (view === 'whole' || !surface) return brief ? 'Plan' : 'Plan, whole model';
  if (brief) return surfaceTitle(surface);
  const half = surface.mirrored ? `, ${side} half` : '';
  return `${surfaceTitle(surface)}${half}, laid flat`;
}

const mm = (value: number) => formatQuantity(value, 'length');

/** The plan in a sentence, for who does not see it. */
export function planSentence(
  plan: Plan,
  { planform, balance }: Estimate,
  view: PlanViewName,
  surface: Surface | null,
): string {
  const where =
    balance.x === null
      ? ''
      : ` The balance point lies ${mm(balance.x)} aft of the datum, ± ${mm(balance.u ?? 0)}.`;
  const form = surface && planform[surface.key];
  if (view === 'half' && surface && form) {
    const [root, tip] = [surface.panels[0]?.rootChord ?? 0, surface.panels.at(-1)?.tipChord ?? 0];
    const ribs = ribNumbers(surface).length;
    return (
      `${surfaceTitle(surface)}, one half laid flat: ${panels(surface)}, chord ${mm(root)} at the root and ` +
      `${mm(tip)} at the tip, ${ribs === 0 ? 'no ribs' : `ribs at ${ribs} stations`}, ` +
      `mean aerodynamic chord ${mm(form.mac)}.${where}`
    );
  }
  const names = plan.surfaces.map((s) => s.key).join(', ');
  const seen = view === 'side' ? 'from the side' : 'from above';
  const rest = `${plan.solids.length} solids and ${plan.items.length} items`;
  return `${plan.name} ${seen}: ${names === '' ? 'no surfaces' : names}, ${rest}.${where}`;
}

function panels({ panels: list }: Surface): string {
  const spans = list.map(({ span }) => formatNumber(span, 0)).join(' and ');
  return list.length === 1 ? `one panel of ${spans} mm` : `${list.length} panels of ${spans} mm`;
}
