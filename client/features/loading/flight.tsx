import { lazy, Suspense, useState, type ReactNode } from 'react';
import { SectionBoundary } from '#client/components/section-boundary.tsx';
import { Skeleton } from '#client/components/ui/skeleton.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import { airAt } from '#shared/core/atmosphere.ts';
import { loadingOf } from '#shared/core/loading.ts';
import type { Plan } from '#shared/core/plan.ts';
import { formatNumber } from '#shared/format/numbers.ts';
import { AirFields, type Weather } from './air-fields.tsx';
import { SpeedTable } from './speed-table.tsx';
import { speedIn, type Flown } from './speeds.ts';

const SpeedChart = lazy(async () => ({ default: (await import('./speed-chart.tsx')).SpeedChart }));

interface FlightProps {
  workspace: Workspace;
  plan: Plan;
  flown: Flown;
  /** stands beside the speeds */
  children: ReactNode;
}

/** Speeds at which a light model usually trims: a lift coefficient well short of the stall. */
const USUAL_TRIM = 0.6;

/** Headline, speeds in a chosen air, and the curve. */
export function Flight({ workspace, plan, flown, children }: FlightProps) {
  const [weather, setWeather] = useState<Weather>({ altitude: 0, temperature: 15 });
  const [chosenLift, setChosenLift] = useState<number | null>(null);
  const clMax = plan.flight?.clMax ?? 1;
  const trimLift = chosenLift ?? Math.min(USUAL_TRIM, clMax);
  const air = airAt(weather.altitude, weather.temperature);
  const stall = speedIn(flown, clMax, air);
  const trim = speedIn(flown, trimLift, air);
  const loading = loadingOf(flown.mass, flown.area);
  const units = useUnits();
  const speed = (value: number | null) => units.format(value, 'speed');
  const other = units.other('loading') ?? 'oz/ft2';

  return (
    <>
      <header>
        <h1 className="text-figure font-semibold">
          {units.format(loading, 'loading')} on the wing, {units.format(loading, 'loading', { unit: other })}
        </h1>
        <p className="mt-1 text-graphite">
          <span className="font-semibold text-pencil">
            It stalls at {speed(stall.speed)} and trims at {speed(trim.speed)}
          </span>{' '}
          (lift coefficients {formatNumber(clMax, 2)} and {formatNumber(trimLift, 2)}) in air of{' '}
          {units.format(air.density, 'airDensity')}.
        </p>
      </header>
      <div className="mt-6 grid grid-cols-1 items-start gap-x-12 gap-y-8 lg:grid-cols-2">
        <div className="grid grid-cols-1 gap-y-8">{children}</div>
        <div className="grid grid-cols-1 gap-y-7">
          <AirFields
            workspace={workspace}
            plan={plan}
            weather={weather}
            onWeather={setWeather}
            trimLift={trimLift}
            onTrimLift={setChosenLift}
            density={air.density}
          />
          <SpeedTable
            air={air}
            rows={[
              { name: 'Stall', lift: clMax, ...stall },
              { name: 'Trim', lift: trimLift, ...trim },
            ]}
          />
          <SectionBoundary>
            <Suspense fallback={<Skeleton lines={5} />}>
              <SpeedChart flown={flown} clMax={clMax} trimLift={trimLift} air={air} />
            </Suspense>
          </SectionBoundary>
        </div>
      </div>
    </>
  );
}
