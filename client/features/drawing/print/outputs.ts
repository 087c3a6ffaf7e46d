import type { Plan, Surface } from '#shared/core/plan.ts';
import type { SideName } from '#shared/drawing/frames.ts';
import { ribNumbers } from '#shared/drawing/marks.ts';
import { packed, stacked } from '#shared/drawing/paper/packing.ts';
import { tiled, type Pages, type Paper } from '#shared/drawing/paper/pages.ts';
import { boardDrawing, modelDrawing, ribDrawing, ribDrawings } from '#shared/drawing/paper/true-drawings.ts';
import type { TrueDrawing } from '#shared/drawing/paper/true-size.ts';
import type { Units } from '#shared/format/units.ts';
import type { PlanViewName } from '../figure/drawings.ts';
import { surfaceTitle } from '../figure/plan-words.ts';

/** What can be put on paper at its true size. */
export type What = 'rib' | 'ribs' | 'starboard' | 'port' | Exclude<PlanViewName, 'half'>;

export interface Subject {
  plan: Plan;
  surface: Surface | null;
  /** where the section is taken, mm */
  station: number;
  side: SideName;
  /** mm aft of the datum */
  balance: number | null;
  units: Units;
}

const ribAt = ({ surface, station }: Subject) =>
  surface ? ribNumbers(surface).findIndex((s) => Math.abs(s - station) < 1e-6) : -1;

/** What there is to choose from, in words. */
export function whatChoices(subject: Subject): { value: What; label: string }[] {
  const { surface, station, units } = subject;
  const choices: { value: What; label: string }[] = [];
  if (surface) {
    const ribs = ribNumbers(surface);
    const at = ribAt(subject);
    const title = surfaceTitle(surface);
    if (at >= 0) {
      choices.push({
        value: 'rib',
        label: `${title}, rib ${at + 1} at ${units.format(station, 'length')}`,
      });
    }
    if (ribs.length > 0) choices.push({ value: 'ribs', label: `${title}, all ${ribs.length} ribs` });
    choices.push({
      value: 'starboard',
      label: surface.mirrored ? `${title}, starboard half, laid flat` : `${title}, laid flat`,
    });
    if (surface.mirrored) choices.push({ value: 'port', label: `${title}, port half, laid flat` });
  }
  return [
    ...choices,
    { value: 'whole', label: 'Whole model from above' },
    { value: 'side', label: 'Whole model from the side' },
    { value: 'front', label: 'Whole model from ahead' },
  ];
}

/** The drawings that a choice comes to; several where they are to be kept whole on their pages. */
function drawingsOf(what: What, subject: Subject): TrueDrawing[] {
  const { plan, surface, station, side, balance, units } = subject;
  const words = { length: (mm: number) => units.size(Math.round(mm * 100) / 100) };
  switch (what) {
    case 'rib':
      return surface && station !== null
        ? [ribDrawing(plan, surface, side, station, words) ?? []].flat()
        : [];
    case 'ribs':
      return surface ? ribDrawings(plan, surface, side, words) : [];
    case 'starboard':
    case 'port':
      return surface ? [boardDrawing(plan, surface, what, balance)] : [];
    default:
      return [modelDrawing(plan, what)];
  }
}

const ribsTitle = ({ plan, surface }: Subject) => `${plan.name}, ${surface?.key ?? ''}, ribs`;

/** A choice as one drawing, for a file; null where nothing is drawn. */
export function drawingOf(what: What, subject: Subject): TrueDrawing | null {
  const drawings = drawingsOf(what, subject);
  if (drawings.length === 0) return null;
  return what === 'ribs' ? stacked(ribsTitle(subject), drawings) : (drawings[0] ?? null);
}

/** A choice on pages: ribs are kept whole where a page is large enough. Null where nothing is drawn. */
export function pagesOf(what: What, subject: Subject, paper: Paper): Pages | null {
  const drawings = drawingsOf(what, subject);
  const whole = what === 'ribs' || what === 'rib' ? packed(ribsTitle(subject), drawings, paper) : null;
  if (whole) return whole.pages.length > 0 ? whole : null;
  const drawing = drawingOf(what, subject);
  return drawing && tiled(drawing, paper);
}
