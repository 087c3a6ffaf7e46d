import { useState } from 'react';
import { useUnits } from '#client/lib/units.ts';
import type { Panel, SectionSpec, Surface } from '#shared/core/plan.ts';
import { changePanel, changeSurface } from '../edits/plan-edits.ts';
import { ParsedField } from '../forms/parsed-field.tsx';
import { PointsDialog } from '../forms/points-dialog.tsx';
import { parseSection, sectionText } from '../forms/section-text.ts';
import type { Desk } from './rows-pane.tsx';

interface SectionsTableProps {
  desk: Desk;
  surface: Surface;
  index: number;
}

type End = 'rootSection' | 'tipSection';
const END_WORDS: Record<End, string> = { rootSection: 'root', tipSection: 'tip' };

/** Root and tip section of each panel: four digits, a plate, or own points. */
export function SectionsTable({ desk, surface, index }: SectionsTableProps) {
  const [own, setOwn] = useState<{ panel: number; end: End } | null>(null);
  const units = useUnits();
  const set = (i: number, end: End, spec: SectionSpec) =>
    desk.edit(
      changeSurface(index, (s) => ({ ...s, panels: changePanel(s.panels, i, { [end]: spec }) })),
      `${surface.key}: panel ${i + 1} ${END_WORDS[end]} section`,
    );
  const setAll = (spec: SectionSpec) =>
    desk.edit(
      changeSurface(index, (s) => ({
        ...s,
        panels: s.panels.map((panel) => ({ ...panel, rootSection: spec, tipSection: spec })),
      })),
      `${surface.key}: all sections`,
    );
  const opened = own && surface.panels[own.panel]?.[own.end];
  return (
    <div className="mt-3 grid gap-y-1">
      <h2 className="caption px-2">Sections, root and tip</h2>
      {surface.panels.map((panel, i) => (
        <div key={i} className="flex items-start gap-x-1.5">
          <span className="w-6 px-1 pt-1.5 text-note text-graphite">{i + 1}</span>
          {(['rootSection', 'tipSection'] as const).map((end) => (
            <div key={end} className="flex min-w-0 flex-1 items-start">
              <div className="min-w-0 flex-1">
                <ParsedField
                  hideLabel
                  inline={false}
                  label={`Panel ${i + 1}, ${END_WORDS[end]} section`}
                  value={panel[end]}
                  format={(spec) => sectionText(spec, units)}
                  parse={(text) => parseSection(text, panel[end], units)}
                  onValue={(spec) => set(i, end, spec)}
                  error={issueOf(desk, index, i, end, panel)}
                  readOnly={!desk.canEdit}
                />
              </div>
              {desk.canEdit && (
                <button
                  type="button"
                  aria-label={`Own points for the ${END_WORDS[end]} section of panel ${i + 1}`}
                  title="Own points"
                  onClick={() => setOwn({ panel: i, end })}
                  className="min-h-row rounded-md px-1.5 text-note text-ink hover:bg-ink-wash"
                >
                  points
                </button>
              )}
            </div>
          ))}
        </div>
      ))}
      {own && opened && (
        <PointsDialog
          spec={opened}
          title={`Panel ${own.panel + 1}, ${END_WORDS[own.end]} section`}
          onClose={() => setOwn(null)}
          onSpec={(spec, everywhere) => {
            if (everywhere) setAll(spec);
            else set(own.panel, own.end, spec);
            setOwn(null);
          }}
        />
      )}
    </div>
  );
}

/** What is wrong with a section, whichever of its own fields it is in. */
function issueOf(desk: Desk, index: number, i: number, end: End, panel: Panel): string | undefined {
  if (desk.issues.size === 0) return undefined;
  const path = `surfaces/${index}/panels/${i}/${end}`;
  const field = Object.keys(panel[end])[0] ?? '';
  return desk.issues.get(path) ?? desk.issues.get(`${path}/${field}`);
}
