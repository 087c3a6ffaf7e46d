import { useMemo } from 'react';
import { z } from 'zod';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { useKept } from '#client/hooks/use-kept.ts';
import { useValidPlan } from '#client/hooks/use-valid-plan.ts';
import { useUnits } from '#client/lib/units.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { AirFields } from './air-fields.tsx';
import { AirTable } from './air-table.tsx';
import { airRows, keptAirs, USUAL_AIRS, type KeptAirs } from './airs.ts';
import { weatherHeadline } from './words.ts';

interface WeatherSectionProps {
  workspace: Workspace;
  /** whose air it is: the airs are the person's, the class minimum the glider's */
  person: string;
}

const keptMinimum = z.number().positive().max(LIMITS.massG.max).nullable();

/** What the air does to mass and balance: a bound, as if all wood were bare. */
export function WeatherSection({ workspace, person }: WeatherSectionProps) {
  const plan = useValidPlan(workspace);
  const { result } = workspace;
  const units = useUnits();
  const [airs, keepAirs] = useKept<KeptAirs>(`featherbeam.airs.${person}`, keptAirs, USUAL_AIRS);
  const [minimum, keepMinimum] = useKept<number | null>(
    `featherbeam.class-minimum.${workspace.glider?.id ?? 'sample'}`,
    keptMinimum,
    null,
  );
  const rows = useMemo(() => (plan ? airRows(plan, result, airs) : []), [plan, result, airs]);
  const wood = rows.some((row) => row.wood > 0);
  if (!plan) return null;
  const headline = weatherHeadline(rows, minimum, units);

  return (
    <section aria-labelledby="weather" className="mt-10 border-t border-rule pt-6">
      <h2 id="weather" className="text-heading font-semibold">
        {wood ? headline.title : 'No wood here for the air to change'}
      </h2>
      <p className="mt-1 max-w-3xl text-graphite">
        {wood
          ? `${headline.text} As a bound: sealed wood moves less and later.`
          : 'Wood takes up water from damp air and grows heavier; give parts their wood on the Drawing.'}
      </p>
      {wood && (
        <div className="mt-5 grid grid-cols-1 items-start gap-x-12 gap-y-6 lg:grid-cols-2">
          <div>
            <div className="grid grid-cols-1 gap-x-6 gap-y-2 sm:grid-cols-2">
              <AirFields
                name="Workshop"
                air={airs.workshop}
                onAir={(workshop) => keepAirs({ ...airs, workshop })}
              />
              <AirFields name="Field" air={airs.field} onAir={(field) => keepAirs({ ...airs, field })} />
            </div>
            <div className="mt-2 max-w-64">
              <NumberField
                label="Least mass of the class"
                quantity="mass"
                optional
                above={0}
                max={LIMITS.massG.max}
                value={minimum}
                onChange={(mass, problem) => {
                  const fits = mass !== null && mass > 0 && mass <= LIMITS.massG.max;
                  if (fits || problem === 'missing') keepMinimum(mass);
                }}
              />
            </div>
            <p className="mt-1 max-w-prose text-note text-graphite">
              Water in wood at rest with the air: Wood Handbook (USDA FPL-GTR-190, 2010), eq. 4-5; its mass
              goes as (1 + x₂) ÷ (1 + x₁). Each wood starts from the moisture at which the materials table
              gives its density; one of your own without it, from the workshop. Ply, covering and glue stay as
              they are. Thin bare sheet follows within hours, a doped and covered model within days.
            </p>
          </div>
          <AirTable
            rows={rows}
            drawn={{ mass: result.totals.mass, percentMac: result.balance.percentMac }}
            minimum={minimum}
          />
        </div>
      )}
    </section>
  );
}
