import { useUnits } from '#client/lib/units.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import type { Plan } from '#shared/core/plan.ts';
import { BallastStep } from './ballast-step.tsx';
import type { FlightDraft } from './draft.ts';
import type { FieldVerdict } from './field-verdict.ts';
import { ForecastCheck } from './forecast-check.tsx';
import { RangeFields } from './range-fields.tsx';
import { RangeStrip } from './range-strip.tsx';
import { Sideways } from './sideways.tsx';
import type { ChangeDraft } from './use-draft.ts';
import type { FieldFacts, FlightAccount } from './use-flight.ts';
import { VerdictCard } from './verdict-card.tsx';
import { WeighStep } from './weigh-step.tsx';
import { WindTable } from './wind-table.tsx';

interface BalanceColumnProps {
  workspace: Workspace;
  plan: Plan;
  draft: FlightDraft;
  change: ChangeDraft;
  facts: FieldFacts;
  account: FlightAccount;
  verdict: FieldVerdict | null;
  gliderId: string;
}

/** From the scales to the ballast: how it balances, what to put where, and whether the forecast agrees. */
export function BalanceColumn(props: BalanceColumnProps) {
  const { workspace, plan, draft, change, facts, account, verdict, gliderId } = props;
  const units = useUnits();
  const flown = account.account?.flown ?? null;
  const { wing, neutralPoint } = facts.sources;
  return (
    <div className="min-w-0">
      <WeighStep draft={draft} change={change} />
      {verdict && <VerdictCard verdict={verdict} />}
      {!verdict && (
        <p className="mt-4 bg-ink-wash px-3 py-2">
          With every reading and place typed in, this says how it balances and what to put where.
        </p>
      )}
      {flown && (
        <RangeStrip
          flown={flown}
          range={account.range}
          neutralPoint={neutralPoint}
          outside={verdict?.kind === 'outside'}
          units={units}
        />
      )}
      <RangeFields draft={draft} change={change} sources={facts.sources} />
      {flown && (
        <BallastStep {...{ draft, change, facts, plan, flown }} range={account.range} gliderId={gliderId} />
      )}
      {account.method && <Sideways method={account.method} tip={tipOf(workspace)} />}
      {account.account && account.method && (
        <ForecastCheck
          measured={account.account.measured}
          method={account.method}
          forecast={facts.forecast}
          plan={plan}
        />
      )}
      {flown && wing && (
        <WindTable mass={flown.mass} area={wing.area} plan={plan} most={facts.terms?.most ?? null} />
      )}
    </div>
  );
}

/** Half the span of the first wing, where tip weight goes, mm. */
function tipOf({ plan, result }: Pick<Workspace, 'plan' | 'result'>): number | null {
  const wing = plan.surfaces.find(({ role }) => role === 'wing');
  const span = wing && result.planform[wing.key]?.span;
  return span === undefined ? null : span / 2;
}
