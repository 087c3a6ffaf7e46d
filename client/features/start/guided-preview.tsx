import { useMemo } from 'react';
import { PlanPicture } from '#client/components/drawing/plan-picture.tsx';
import { Amount } from '#client/components/ui/amount.tsx';
import { estimate } from '#shared/core/estimate.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { Quantity } from '#shared/units/quantities.ts';

/** What the wishes come to: seen from above, and in the figures that are asked for first. */
export function GuidedPreview({ plan }: { plan: Plan | null }) {
  const result = useMemo(() => plan && estimate(plan), [plan]);
  if (!plan || !result) {
    return (
      <p className="text-graphite" role="status">
        It is drawn here once every size is right.
      </p>
    );
  }
  const { totals, balance, loading, speeds } = result;
  const ballast = plan.items.find(({ id }) => id === 'ballast');
  return (
    <section aria-label="What it comes to" className="min-w-0">
      <div className="border border-rule bg-paper px-4 py-6 sm:px-8">
        <PlanPicture plan={plan} balance={balance.x} label={`${plan.name} from above, nose up`} />
      </div>
      <dl className="mt-4 grid grid-cols-2 gap-x-8 gap-y-2 sm:grid-cols-3">
        <Figure label="All-up mass" value={totals.mass} u={totals.u} quantity="mass" />
        <Figure label="of it the wing" value={totals.wingMass} quantity="mass" />
        <Figure label="Wing loading" value={loading.wing} quantity="loading" />
        <Figure label="Balance" value={balance.percentMac} quantity="percentMac" of="MAC" />
        <Figure label={ballast ? ballast.name : 'Ballast'} value={ballast?.mass ?? 0} quantity="mass" />
        <Figure label="Stall speed" value={speeds.stall} quantity="speed" />
      </dl>
      <p className="mt-4 max-w-2xl text-note text-graphite">
        Proportions by rules of thumb (common practice, no source): a tail four chords behind the wing, sized
        for a static margin of a tenth, which the lead in the nose brings about. They are a beginning;
        strength is yours to check on Loading.
      </p>
    </section>
  );
}

interface FigureProps {
  label: string;
  value: number | null;
  u?: number;
  quantity: Quantity;
  of?: string;
}

function Figure({ label, ...amount }: FigureProps) {
  return (
    <div>
      <dt className="text-note text-graphite">{label}</dt>
      <dd className="text-heading font-semibold">
        <Amount {...amount} />
      </dd>
    </div>
  );
}
