import { useState } from 'react';
import { ChartFrame } from '#client/components/ui/chart-frame.tsx';
import { Select } from '#client/components/ui/select.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Beam } from '#shared/core/beam.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import { formatQuantity } from '#shared/format/numbers.ts';
import { Bars } from './bars.tsx';
import { doubtBars, massBars, momentBars } from './chart-data.ts';

interface ChartsProps {
  plan: Plan;
  result: Estimate;
  beam: Beam;
  lit: string | null;
}

/** Where the mass, the moment and the uncertainty come from; fetched after the page. */
export function Charts(props: ChartsProps) {
  return (
    <div className="grid grid-cols-1 gap-x-10 gap-y-8 md:grid-cols-2 xl:grid-cols-3">
      <MassChart {...props} />
      <MomentChart {...props} />
      <DoubtChart {...props} />
    </div>
  );
}

function MassChart({ plan, result, lit }: ChartsProps) {
  const units = useUnits();
  const bars = massBars(plan, result);
  const grams = (value: number) => units.format(value, 'mass');
  const share = (value: number) => formatQuantity(value / result.totals.mass, 'share');
  const [first] = bars;
  return (
    <ChartFrame
      title="Mass by group"
      sentence={
        first ? `${first.name} is the heaviest: ${share(first.value)} of ${grams(result.totals.mass)}.` : ''
      }
      columns={[{ label: 'Group' }, { label: 'Mass', numeric: true }, { label: 'Share', numeric: true }]}
      rows={bars.map(({ name, value }) => [name, grams(value), share(value)])}
    >
      <Bars bars={bars} format={grams} lit={lit} />
    </ChartFrame>
  );
}

function MomentChart({ plan, result, beam, lit }: ChartsProps) {
  const units = useUnits();
  const bars = momentBars(plan, result, beam.pivot);
  const show = (value: number) => units.format(value, 'moment', { bare: true });
  const fore = bars.filter(({ value }) => value < 0).reduce((sum, { value }) => sum - value, 0);
  const aft = bars.filter(({ value }) => value > 0).reduce((sum, { value }) => sum + value, 0);
  const point = beam.wanted ? 'the wanted balance point' : 'the balance point';
  return (
    <ChartFrame
      title="Where the moment comes from"
      sentence={`About ${point}: ${show(fore)} ${units.label('moment')} pull the nose down, ${show(aft)} the tail.`}
      columns={[
        { label: 'Group' },
        { label: `Moment ${units.label('moment')}`, numeric: true },
        { label: 'Pulls' },
      ]}
      rows={bars.map(({ name, value }) => [name, show(value), value < 0 ? 'nose down' : 'tail down'])}
    >
      <Bars bars={bars} format={show} lit={lit} about />
    </ChartFrame>
  );
}

function DoubtChart({ plan, result }: ChartsProps) {
  const units = useUnits();
  const [of, setOf] = useState<'mass' | 'balance'>('mass');
  const { bars, all } = doubtBars(plan, result, of);
  const show = (value: number) =>
    of === 'mass' ? units.doubt(value, 'mass', { fine: true }) : units.doubt(value, 'length', { fine: true });
  const whole = of === 'mass' ? result.totals.u : (result.balance.u ?? 0);
  const [first] = all;
  if (!first)
    return <p className="text-note text-graphite">No line has an uncertainty, so nothing is in doubt.</p>;
  return (
    <ChartFrame
      title="Where the uncertainty comes from"
      sentence={`±\u202f${show(whole)} in all; ${first.name} alone makes ${formatQuantity(first.share, 'share')} of its square. Weigh that part first.`}
      columns={[
        { label: 'Part' },
        { label: 'Alone ±', numeric: true },
        { label: 'Share of variance', numeric: true },
      ]}
      rows={all.map(({ name, group, u, share }) => [
        `${name}, ${group}`,
        show(u),
        formatQuantity(share, 'fineShare'),
      ])}
    >
      <div className="mb-2 w-48">
        <Select
          label="Uncertainty of"
          inline
          keepRoom={false}
          value={of}
          options={[
            { value: 'mass', label: 'the mass' },
            { value: 'balance', label: 'the balance' },
          ]}
          onValue={(value) => setOf(value === 'balance' ? 'balance' : 'mass')}
        />
      </div>
      <Bars bars={bars} format={show} />
    </ChartFrame>
  );
}
