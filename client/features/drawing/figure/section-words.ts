import type { Surface } from '#shared/core/plan.ts';
import type { SectionView } from '#shared/drawing/section-view.ts';
import type { Units } from '#shared/format/units.ts';
import { surfaceTitle } from './plan-words.ts';

interface SectionWords {
  title: string;
  thick: string;
  sentence: string;
}

/** Where a section is taken and how thick it is; `ribs` are the stations of the surface's ribs, root to tip. */
export function sectionWords(
  surface: Surface,
  section: SectionView,
  ribs: readonly number[],
  units: Units,
): SectionWords {
  const rib = ribs.findIndex((s) => Math.abs(s - section.s) < 1e-6);
  const where = `${units.format(section.s, 'length')} from the root`;
  const even = section.thicknessAt <= 0 || section.thicknessAt >= 1;
  const at = even ? '' : ` at ${units.format(section.thicknessAt, 'share')}`;
  const thick = `${units.format(section.thickness, 'length')} thick${at}`;
  const chord = `chord ${units.format(section.chord, 'length')}`;
  const inTip = section.s > surface.panels.reduce((sum, panel) => sum + panel.span, 0) + 1e-6;
  const between = inTip ? ', in the tip block' : section.rib === null ? ', between ribs' : '';
  const title = inTip ? 'Section of the tip' : 'Section';
  return {
    title: rib >= 0 ? `Section at rib ${rib + 1} · ${where}` : `${title} · ${where}`,
    thick,
    sentence: `Section of ${surfaceTitle(surface)}, ${where}: ${chord}, ${thick}${even ? '' : ' of the chord'}${between}.`,
  };
}
