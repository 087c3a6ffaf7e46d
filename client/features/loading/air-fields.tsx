import { Button } from '#client/components/ui/button.tsx';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { AskWhy } from '#client/components/why/ask-why.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import { airAt } from '#shared/core/atmosphere.ts';
import type { Flight, Plan } from '#shared/core/plan.ts';
import { formatNumber, NARROW_SPACE, roundTo } from '#shared/format/numbers.ts';
import { convert } from '#shared/units/units.ts';

/** Pressure altitude, m, and temperature, °C. */
export interface Weather {
  altitude: number;
  temperature: number;
}

interface AirFieldsProps {
  workspace: Workspace;
  plan: Plan;
  weather: Weather;
  onWeather: (weather: Weather) => void;
  trimLift: number;
  onTrimLift: (lift: number) => void;
  /** kg/m³, of this weather */
  density: number;
}

const MM_PER_M = 1000;
const FREEZING = 273.15;
/** Field and weather as far as anybody flies light models. */
const ALTITUDE = { min: -500, max: 6000 };
const TEMPERATURE = { min: -40, max: 60 };

const withFlight = (plan: Plan, flight: Flight): Plan => ({ ...plan, flight: { ...plan.flight, ...flight } });

/** The air of the day and the lift coefficients that the speeds are told for. */
export function AirFields(props: AirFieldsProps) {
  const { workspace, plan, weather, onWeather, trimLift, onTrimLift, density } = props;
  const { edit, canEdit } = workspace;
  const units = useUnits();
  const planned = plan.flight?.airDensity ?? 1.225;
  const rounded = roundTo(density, 3);
  const standard = airAt(weather.altitude).temperature - FREEZING;
  const within = (value: number | null, { min, max }: { min: number; max: number }): value is number =>
    value !== null && value >= min && value <= max;
  return (
    <section aria-label="Air and lift">
      <h2 className="caption">Air and lift</h2>
      <div className="mt-2 grid grid-cols-1 gap-x-4 sm:grid-cols-2">
        <NumberField
          label="Pressure altitude"
          quantity="length"
          unit={units.long}
          step={50}
          value={weather.altitude * MM_PER_M}
          min={ALTITUDE.min * MM_PER_M}
          max={ALTITUDE.max * MM_PER_M}
          onChange={(mm) => {
            const altitude = mm === null ? null : mm / MM_PER_M;
            if (within(altitude, ALTITUDE)) onWeather({ ...weather, altitude });
          }}
        />
        <NumberField
          label="Temperature"
          quantity="ratio"
          suffix="°C"
          step={1}
          value={weather.temperature}
          {...TEMPERATURE}
          onChange={(temperature) => {
            if (within(temperature, TEMPERATURE)) onWeather({ ...weather, temperature });
          }}
        />
        <NumberField
          label="Lift coefficient at the stall"
          quantity="ratio"
          step={0.05}
          value={workspace.plan.flight?.clMax ?? 1}
          above={0}
          max={5}
          readOnly={!canEdit}
          onChange={(clMax) => {
            if (clMax !== null) edit((p) => withFlight(p, { clMax }), 'stall lift coefficient');
          }}
        />
        <NumberField
          label="and when trimmed"
          quantity="ratio"
          step={0.05}
          value={trimLift}
          above={0}
          max={5}
          onChange={(lift) => {
            if (lift !== null && lift > 0 && lift <= 5) onTrimLift(lift);
          }}
        />
      </div>
      <p className="text-note text-graphite">
        Air of{' '}
        <AskWhy inText question={{ of: 'air', ...weather }}>
          {units.format(density, 'airDensity')}
        </AskWhy>
        ; at {formatNumber(convert(weather.altitude, 'm', units.long), 0)}
        {NARROW_SPACE}
        {units.long} the standard day has {formatNumber(standard, 1)}
        {NARROW_SPACE}°C (US Standard Atmosphere 1976).{' '}
        {rounded !== planned && `The plan reckons with ${units.format(planned, 'airDensity')}.`}
      </p>
      {canEdit && rounded !== planned && (
        <Button
          variant="plain"
          className="mt-1 -ml-2 print:hidden"
          onClick={() => edit((p) => withFlight(p, { airDensity: rounded }), 'air density')}
        >
          Use this air in the plan
        </Button>
      )}
    </section>
  );
}
