import type { Plan } from '#shared/core/plan.ts';
import type { Figures } from './tasks.ts';
import { Histogram } from './histogram.tsx';
import { SharesChart } from './shares-chart.tsx';

/** How the draws fall, and which material scatters them; fetched after the page. */
export function DrawsCharts({ plan, figures }: { plan: Plan; figures: Figures }) {
  const { mass, x, percentMac, shares } = figures;
  const { target } = plan;
  return (
    <div className="grid grid-cols-1 gap-x-10 gap-y-8 md:grid-cols-2">
      {mass && <Histogram title="All-up mass" quantity="mass" summary={mass} />}
      {percentMac ? (
        <Histogram
          title="Balance, % MAC"
          quantity="percentMac"
          summary={percentMac}
          wanted={target && [target.percentMac - target.tolerance, target.percentMac + target.tolerance]}
        />
      ) : (
        x && <Histogram title="Balance from the datum" quantity="length" summary={x} />
      )}
      {shares.length > 0 && <SharesChart plan={plan} shares={shares} />}
    </div>
  );
}
