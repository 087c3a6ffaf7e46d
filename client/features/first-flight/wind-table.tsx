import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { useUnits } from '#client/lib/units.ts';
import { windSteps } from '#shared/core/field/wind-ballast.ts';
import type { Plan } from '#shared/core/plan.ts';
import { formatNumber } from '#shared/format/numbers.ts';

interface WindTableProps {
  /** g, as it is flown */
  mass: number;
  /** mm² */
  area: number;
  plan: Pick<Plan, 'flight'>;
  /** greatest mass of its class, g */
  most: number | null;
}

/** Share of the greatest lift coefficient at which it is trimmed to glide. Common practice, no source. */
const TRIM = 0.6;

/** Steps that suit the model: a twentieth of it, in whole grams that are handy. */
function stepsFor(mass: number): number[] {
  const step = [1, 2, 5, 10, 20, 50, 100].find((one) => one >= mass / 25) ?? 200;
  return [0, 1, 2, 3, 4, 5].map((times) => times * step);
}

/** What ballast at the balance point makes of loading and speeds on a windy day; the balance stays. */
export function WindTable({ mass, area, plan, most }: WindTableProps) {
  const units = useUnits();
  const { clMax = 1, airDensity = 1.225 } = plan.flight ?? {};
  const steps = windSteps({ mass, area, clMax, cl: clMax * TRIM, density: airDensity }, stepsFor(mass));
  const bare = { bare: true };
  return (
    <details className="mt-1">
      <summary className="opens flex min-h-11 items-center text-note font-semibold">Ballast for wind</summary>
      <p className="text-note text-graphite">
        At the balance point, where it moves nothing. Glide is told at {formatNumber(TRIM * 100, 0)} % of the
        greatest lift.
      </p>
      <Table caption="Ballast for wind" className="mt-1">
        <thead>
          <tr>
            <Th>Add {units.label('mass')}</Th>
            <Th numeric>{units.label('loading')}</Th>
            <Th numeric>Stall {units.label('speed')}</Th>
            <Th numeric>Glide {units.label('speed')}</Th>
            <Th numeric>Faster</Th>
          </tr>
        </thead>
        <tbody>
          {steps
            .filter((step) => most === null || step.mass <= most || step.ballast === 0)
            .map((step) => (
              <Tr key={step.ballast}>
                <RowTh>{units.format(step.ballast, 'mass', bare)}</RowTh>
                <Td numeric>{units.format(step.loading, 'loading', bare)}</Td>
                <Td numeric>{units.format(step.stall, 'speed', bare)}</Td>
                <Td numeric>{units.format(step.trim, 'speed', bare)}</Td>
                <Td numeric>×{formatNumber(step.faster, 2)}</Td>
              </Tr>
            ))}
        </tbody>
      </Table>
    </details>
  );
}
