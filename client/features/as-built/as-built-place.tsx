import { useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { Skeleton } from '#client/components/ui/skeleton.tsx';
import { useValidPlan } from '#client/hooks/use-valid-plan.ts';
import { useUnits } from '#client/lib/units.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import { asBuilt } from '#shared/core/built/as-built.ts';
import { readingOf } from '#shared/core/built/reading.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { GliderDto } from '#shared/schemas/glider.ts';
import type { WeighingInput } from '#shared/schemas/weighing.ts';
import { BudgetPlot } from './budget-plot.tsx';
import { MaterialsSection } from './materials-section.tsx';
import { PanelsSection } from './panels-section.tsx';
import { PartsTable } from './parts-table.tsx';
import { TargetField } from './target-field.tsx';
import { useBuilt, type Built } from '#client/lib/built/use-built.ts';
import { WeighForm } from './weigh-form.tsx';
import { WeighingsList } from './weighings-list.tsx';
import { builtHeadline, heardWords } from './words.ts';

/** What the scale says while the glider is built, and what it makes of the forecast. */
export function AsBuiltPlace({ workspace, person }: { workspace: Workspace; person: string }) {
  const plan = useValidPlan(workspace);
  const { glider } = workspace;
  if (!plan || !glider) return null;
  return <Fetched glider={glider} plan={plan} person={person} />;
}

interface FetchedProps {
  glider: GliderDto;
  plan: Plan;
  person: string;
}

function Fetched({ glider, plan, person }: FetchedProps) {
  const built = useBuilt(glider.id, person, plan);
  if (built === 'failed') {
    return (
      <div className="px-4 py-6 sm:px-7">
        <Notice tone="red" word="Not there:">
          The weighings cannot be fetched just now. What you write down elsewhere on this device is kept.{' '}
          <Button variant="plain" onClick={() => window.location.reload()}>
            Try again
          </Button>
        </Notice>
      </div>
    );
  }
  if (built === null) return <Skeleton className="m-7 h-64" />;
  return <Weighed glider={glider} plan={plan} built={built} />;
}

function Weighed({ glider, plan, built }: Omit<FetchedProps, 'person'> & { built: Built }) {
  const units = useUnits();
  const [said, setSaid] = useState('');
  const { title, text, over } = builtHeadline(built, units);
  const canWeigh = glider.can.weigh;
  const note = (input: WeighingInput) => {
    built.note(input);
    // Told from what it changes, before the server has it.
    const reading = readingOf(input);
    if (!reading) return;
    const { covers } = input;
    const after = asBuilt(plan, [...built.counted, { id: 'now', covers, ...reading }]);
    const heard = after.heard.at(-1);
    const words = heard ? heardWords(heard, units) : '';
    setSaid(
      `${input.title}: ${units.format(reading.mass, 'mass')}, ${words}. Forecast ${units.format(after.mass, 'mass', { bare: true })} ± ${units.doubt(after.u, 'mass')}.`,
    );
  };
  return (
    <div className="px-4 pt-5 pb-8 sm:px-7">
      <header>
        <h1 className="text-figure font-semibold">
          {over && (
            <span aria-hidden="true" className="text-red">
              ▲{' '}
            </span>
          )}
          {title}
        </h1>
        <p className="mt-1 max-w-prose text-graphite">{text}</p>
      </header>
      {built.waiting > 0 && (
        <Notice tone="ochre" word="On this device:" className="mt-3 max-w-3xl">
          {built.waiting} {built.waiting === 1 ? 'weighing waits' : 'weighings wait'} to be sent; they count
          here already, and go by themselves when the server can be reached.
        </Notice>
      )}
      {canWeigh ? (
        <WeighForm
          plan={plan}
          gliderId={glider.id}
          gliderVersion={glider.version}
          onNote={note}
          said={said}
        />
      ) : (
        <p className="mt-4 text-graphite">
          You may look at the weighings of this glider; its builder or pilot weighs.
        </p>
      )}
      <div className="mt-4">
        <TargetField gliderId={glider.id} terms={built.terms} canWeigh={canWeigh} />
      </div>
      <BudgetPlot built={built} />
      <PanelsSection built={built} plan={plan} />
      <MaterialsSection built={built} plan={plan} />
      <WeighingsList built={built} canWeigh={canWeigh} gliderVersion={glider.version} />
      <section aria-label="Parts" className="mt-10 border-t border-rule pt-6">
        <h2 className="text-heading font-semibold">Part by part</h2>
        <PartsTable built={built} plan={plan} />
      </section>
    </div>
  );
}
