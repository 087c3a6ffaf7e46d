import { shortcutBook } from '#client/components/shortcuts/shortcut-book.ts';
import { TextField } from '#client/components/ui/text-field.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import type { Units } from '#shared/format/units.ts';
import { LIMITS } from '#shared/schemas/limits.ts';

type NameFieldProps = Pick<Workspace, 'plan' | 'edit' | 'canEdit' | 'issues'>;

interface HeadlineProps extends NameFieldProps {
  result: Estimate;
  /** a small screen, where the name has its field further down */
  narrow: boolean;
}

/** What is drawn, in a sentence, and the glider's name. */
export function Headline({ plan, result, edit, canEdit, issues, narrow }: HeadlineProps) {
  const units = useUnits();
  return (
    <header className="flex flex-wrap items-end justify-between gap-x-8 gap-y-2">
      <div className="min-w-0">
        <h1 className="text-heading font-semibold">{drawnSentence(plan, result, units)}</h1>
        <p className="text-note text-graphite">
          {canEdit
            ? 'Pick a part in the list or in the drawing; every change is drawn and weighed at once.'
            : 'You may look at this plan but not change it.'}{' '}
          {!narrow && (
            <button
              type="button"
              aria-haspopup="dialog"
              onClick={() => shortcutBook.setOpen(true)}
              className="link min-h-6 px-1"
            >
              Keys
            </button>
          )}
        </p>
      </div>
      {!narrow && (
        <div className="w-56 max-w-full">
          <NameField {...{ plan, edit, canEdit, issues }} />
        </div>
      )}
    </header>
  );
}

/** The glider's name. */
export function NameField({ plan, edit, canEdit, issues }: NameFieldProps) {
  return (
    <TextField
      label="Glider"
      value={plan.name}
      maxLength={LIMITS.name.max}
      error={issues.get('name')}
      keepRoom={false}
      readOnly={!canEdit}
      autoComplete="off"
      onChange={(event) => {
        const name = event.target.value;
        edit((p) => ({ ...p, name }), 'name');
      }}
    />
  );
}

function drawnSentence(plan: Plan, { planform, lines, totals }: Estimate, units: Units): string {
  const wing = plan.surfaces.find(({ role }) => role === 'wing');
  const form = wing && planform[wing.key];
  const parts = lines.length === 1 ? '1 part' : `${lines.length} parts`;
  const weigh =
    lines.length === 0 ? 'no parts yet' : `${parts} weighing ${units.format(totals.mass, 'mass')}`;
  if (!form) return lines.length === 0 ? 'An empty sheet' : `No wing yet, ${weigh}`;
  return `${units.format(form.span, 'length')} of span, ${units.format(form.areaProjected, 'area')} of wing, ${weigh}`;
}
