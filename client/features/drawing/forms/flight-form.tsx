import { NumberField } from '#client/components/ui/number-field.tsx';
import type { Workspace } from '#client/lib/workspace.ts';
import type { Flight, Plan } from '#shared/core/plan.ts';
import type { Form } from './form.ts';
import { NumberOf } from './number-of.tsx';

/** Used where a wanted balance is given without a tolerance, % MAC. */
const USUAL_TOLERANCE = 2;

/** Wanted balance and the numbers that loading and speeds are told with. */
export function FlightForm({
  plan,
  edit,
  issues,
  canEdit,
}: Pick<Workspace, 'plan' | 'edit' | 'issues' | 'canEdit'>) {
  const { target } = plan;
  const flight: Form<Flight> = {
    value: plan.flight ?? {},
    set: (changes, field) => edit((p) => ({ ...p, flight: { ...p.flight, ...changes } }), `flight: ${field}`),
    issue: (path) => issues.get(`flight/${path}`),
    readOnly: !canEdit,
  };
  const setTarget = (next: Plan['target'], field: string) =>
    edit(({ target: _, ...rest }) => (next ? { ...rest, target: next } : rest), `wanted balance: ${field}`);
  return (
    <div className="grid gap-y-1.5">
      <NumberField
        inline
        optional
        label="Wanted balance"
        quantity="percentMac"
        suffix="% MAC"
        value={target?.percentMac}
        error={issues.get('target/percentMac')}
        readOnly={!canEdit}
        onChange={(percentMac, problem) => {
          const tolerance = target?.tolerance ?? USUAL_TOLERANCE;
          if (percentMac !== null) setTarget({ percentMac, tolerance }, 'place');
          else if (problem === 'missing') setTarget(undefined, 'place');
        }}
      />
      <NumberField
        inline
        label="± within"
        quantity="percentMac"
        suffix="% MAC"
        value={target?.tolerance}
        optional={!target}
        disabled={!target}
        error={issues.get('target/tolerance')}
        readOnly={!canEdit}
        onChange={(tolerance) =>
          target && tolerance !== null && setTarget({ ...target, tolerance }, 'tolerance')
        }
      />
      <NumberOf form={flight} field="clMax" label="Highest lift coefficient" quantity="ratio" optional />
      <NumberOf
        form={flight}
        field="airDensity"
        label="Air density"
        quantity="airDensity"
        optional
        step={0.005}
      />
    </div>
  );
}
