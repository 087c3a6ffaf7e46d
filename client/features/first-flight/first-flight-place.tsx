import { useMemo, useState } from 'react';
import { useOnline } from '#client/hooks/use-online.ts';
import { useValidPlan } from '#client/hooks/use-valid-plan.ts';
import { useUnits } from '#client/lib/units.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import { speedAt } from '#shared/core/loading.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { GliderDto } from '#shared/schemas/glider.ts';
import { BalanceColumn } from './balance-column.tsx';
import { CheckStep } from './check-step.tsx';
import { checkLines } from './checks.ts';
import { freshDraft } from './draft.ts';
import { fieldVerdict } from './field-verdict.ts';
import { GlidesStep } from './glides-step.tsx';
import { missingOf, recordOf } from './record-of.ts';
import { Records } from './records.tsx';
import { SignStep } from './sign-step.tsx';
import { Thresholds } from './thresholds.tsx';
import { useDraft } from './use-draft.ts';
import { flightAccount, useFieldFacts } from './use-flight.ts';

/** The field day of a model: weighed, balanced, gone through, glided and signed, with or without a connection. */
export function FirstFlightPlace({ workspace, person }: { workspace: Workspace; person: string }) {
  const plan = useValidPlan(workspace);
  const { glider } = workspace;
  if (!plan || !glider) return null;
  return <FieldDay workspace={workspace} plan={plan} glider={glider} person={person} />;
}

interface FieldDayProps {
  workspace: Workspace;
  plan: Plan;
  glider: GliderDto;
  person: string;
}

function FieldDay({ workspace, plan, glider, person }: FieldDayProps) {
  const units = useUnits();
  const online = useOnline();
  const { result } = workspace;
  const [draft, change, replace] = useDraft(person, glider.id);
  const facts = useFieldFacts(glider.id, person, plan, result);
  const [said, setSaid] = useState('');
  const account = useMemo(() => flightAccount(draft, facts), [draft, facts]);
  const { wing } = facts.sources;
  const flown = account.account?.flown ?? null;
  const verdict = flown && fieldVerdict(flown, account.range, wing, units);
  const { clMax = 1, airDensity = 1.225 } = plan.flight ?? {};
  const mass = flown?.mass ?? facts.forecast.mass.value;
  const lines = checkLines(
    {
      balance: flown?.x ?? null,
      stall: wing && speedAt(mass, wing.area, clMax, airDensity),
      wind: draft.wind,
      ballast: draft.ballast.reduce((sum, one) => sum + one.mass, 0),
      plan,
    },
    units,
  );
  const canSign = glider.can.signFlight;
  const sign = () => {
    const { forecast, box } = facts;
    const options = { draft, account, lines, forecast, gliderVersion: glider.version, now: new Date() };
    const body = recordOf(options);
    box.put({ key: draft.id, gliderId: glider.id, kind: 'first-flight', body });
    replace(freshDraft(draft, draft.id));
    setSaid(`Signed by ${draft.signature} and kept on this device.`);
  };
  return (
    <div className="in-sun mx-auto w-full max-w-2xl px-4 pt-5 pb-10 sm:px-7 lg:max-w-6xl">
      <header className="flex flex-wrap items-baseline justify-between gap-x-4">
        <h1 className="text-figure font-semibold">First flight</h1>
        <p role="status" className="text-note text-graphite">
          {online ? 'Kept on this device while you type' : 'No signal: everything is kept here'}
        </p>
      </header>
      {!canSign && (
        <p className="mt-2 text-graphite">
          You may try this page and read what was signed; the builder or the pilot of this glider signs.
        </p>
      )}
      <div className="lg:grid lg:grid-cols-2 lg:gap-x-12">
        <BalanceColumn
          {...{ workspace, plan, draft, change, facts, account, verdict }}
          gliderId={glider.id}
        />
        <div className="min-w-0">
          <CheckStep draft={draft} change={change} lines={lines} />
          <Thresholds flown={flown} />
          <GlidesStep draft={draft} change={change} />
          {canSign && (
            <SignStep
              draft={draft}
              change={change}
              missing={missingOf(draft, account, lines)}
              onSign={sign}
            />
          )}
          <p role="status" className={said === '' ? 'sr-only' : 'mt-3 bg-ink-wash px-3 py-2 font-semibold'}>
            {said}
          </p>
          <Records
            facts={facts}
            canSign={canSign}
            followed={draft.follows}
            onFollow={(follows) => change({ follows })}
          />
        </div>
      </div>
    </div>
  );
}
