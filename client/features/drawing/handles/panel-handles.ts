import type { Panel, Surface } from '#shared/core/plan.ts';
import { stationAt, type SurfaceLine } from '#shared/core/stations.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { changePanel, changeSurface, type Recipe } from '../edits/plan-edits.ts';
import { LEAST, type Handle, type Reach } from './handle.ts';

/**
 * The corners of the planform. At each panel's outer end the leading edge is swept and the trailing edge sets the
 * chord; along the span both move the break, with the panel beyond it giving way so that the tip stays.
 */
export function panelHandles(surface: Surface, index: number, line: SurfaceLine): Handle[] {
  const { panels } = surface;
  const change = (fn: (panels: Panel[]) => Panel[]): Recipe =>
    changeSurface(index, (s) => ({ ...s, panels: fn(s.panels) }));
  const root = panels[0];
  const handles: Handle[] = [];
  if (root) {
    const station = stationAt(line, 0);
    const chord: Reach = {
      ...chordReach(root.rootChord),
      set: (value) => change((all) => changePanel(all, 0, { rootChord: value })),
    };
    handles.push({
      id: 'root chord',
      name: 'Root, trailing edge',
      at: [station.leadingEdge + root.rootChord, 0],
      reach: { x: chord },
    });
  }
  panels.forEach((panel, i) => {
    const laid = line.panels[i];
    if (!laid) return;
    const station = stationAt(line, laid.end, laid);
    const outer = panels[i + 1];
    const span: Reach = {
      value: panel.span,
      min: LEAST,
      max: outer ? panel.span + outer.span - LEAST : LIMITS.lengthMm.max,
      marks: [],
      word: `of span, panel ${i + 1}`,
      set: (value) => change((all) => withSpan(all, i, value)),
    };
    const sweep: Reach = {
      value: panel.sweep,
      min: LIMITS.coordinateMm.min,
      max: LIMITS.coordinateMm.max,
      marks: [],
      word: 'of sweep',
      set: (value) => change((all) => withSweep(all, i, value)),
    };
    const chord: Reach = {
      ...chordReach(panel.tipChord),
      set: (value) => change((all) => changePanel(all, i, { tipChord: value })),
    };
    const end = outer ? `Panel ${i + 1}, outer end` : 'Tip';
    handles.push(
      {
        id: `front ${i}`,
        name: `${end}, leading edge`,
        at: [station.leadingEdge, laid.end],
        reach: { s: span, x: sweep },
      },
      {
        id: `back ${i}`,
        name: `${end}, trailing edge`,
        at: [station.leadingEdge + panel.tipChord, laid.end],
        reach: { s: span, x: chord },
      },
    );
  });
  return handles;
}

const chordReach = (value: number): Omit<Reach, 'set'> => ({
  value,
  min: LEAST,
  max: LIMITS.lengthMm.max,
  marks: [],
  word: 'of chord',
});

/** The break between a panel and the next moved; beyond the last there is nothing to give way. */
function withSpan(panels: readonly Panel[], at: number, span: number): Panel[] {
  const by = span - (panels[at]?.span ?? span);
  return panels.map((panel, i) => {
    if (i === at) return { ...panel, span };
    return i === at + 1 ? { ...panel, span: Math.max(LEAST, tidy(panel.span - by)) } : panel;
  });
}

/** The leading edge at a panel's outer end moved; the tip of the next panel stays where it is. */
function withSweep(panels: readonly Panel[], at: number, sweep: number): Panel[] {
  const by = sweep - (panels[at]?.sweep ?? sweep);
  return panels.map((panel, i) => {
    if (i === at) return { ...panel, sweep };
    return i === at + 1 ? { ...panel, sweep: tidy(panel.sweep - by) } : panel;
  });
}

/** Without what subtracting doubles leaves over. */
const tidy = (value: number) => Math.round(value * 1e6) / 1e6;
