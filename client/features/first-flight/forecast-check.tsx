import { Notice } from '#client/components/ui/notice.tsx';
import { useUnits } from '#client/lib/units.ts';
import {
  compareWithForecast,
  likelyCauses,
  type Comparison,
  type LikelyCause,
} from '#shared/core/field/compare-forecast.ts';
import type { FieldFigures } from '#shared/core/field/field-account.ts';
import type { Plan } from '#shared/core/plan.ts';
import { formatNumber } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';
import type { FirstFlightInput } from '#shared/schemas/first-flight.ts';
import type { Forecast } from './use-flight.ts';

interface ForecastCheckProps {
  measured: FieldFigures;
  method: FirstFlightInput['method'];
  forecast: Forecast;
  plan: Plan;
}

/** Whether the scales and the forecast can both be right; where not, what may be wrong. */
export function ForecastCheck({ measured, method, forecast, plan }: ForecastCheckProps) {
  const units = useUnits();
  const mass = compareWithForecast({ value: measured.mass, u: measured.u }, forecast.mass);
  const x = forecast.x && compareWithForecast({ value: measured.x, u: measured.ux }, forecast.x);
  const questioned = mass.verdict === 'questioned' || x?.verdict === 'questioned';
  const words = [
    `Mass ${figure(measured.mass, mass, 'mass', units)}`,
    ...(x ? [`balance ${figure(measured.x, x, 'length', units)}`] : []),
  ].join('; ');
  if (!questioned) {
    return (
      <p className="mt-3">
        <strong className="font-semibold">Agrees with the forecast.</strong> {words}.
      </p>
    );
  }
  const causes =
    method.kind === 'supports' && forecast.x
      ? likelyCauses(
          method.supports,
          { mass: measured.u, x: measured.ux },
          { mass: forecast.mass, x: forecast.x, items: plan.items.filter((item) => item.mass > 0) },
        )
      : [];
  return (
    <div className="mt-3">
      <Notice tone="ochre" word="Look again:">
        scales and forecast can hardly both be right. {words}.
      </Notice>
      {causes.length > 0 && (
        <>
          <h3 className="mt-2 font-semibold">It would fit if</h3>
          <ul className="mt-1 list-disc pl-5">
            {causes.map((cause, i) => (
              <li key={i}>{causeWords(cause, method, plan, units)}</li>
            ))}
          </ul>
        </>
      )}
    </div>
  );
}

function figure(
  value: number,
  { difference, multiples }: Comparison,
  quantity: 'mass' | 'length',
  units: Units,
): string {
  const by = units.format(Math.abs(difference), quantity);
  const side = quantity === 'mass' ? (difference > 0 ? 'over' : 'under') : difference > 0 ? 'aft' : 'forward';
  const times = multiples === null ? '' : `, ${formatNumber(multiples, 1)} times the joint uncertainty`;
  return `${units.format(value, quantity)}, ${by} ${side}${times}`;
}

function causeWords(
  cause: LikelyCause,
  method: FirstFlightInput['method'],
  plan: Pick<Plan, 'items'>,
  units: Units,
): string {
  switch (cause.code) {
    case 'readings_swapped':
      return 'the two readings were typed the wrong way round';
    case 'tare_forgotten': {
      const name = method.kind === 'supports' ? method.supports[cause.support]?.name.toLowerCase() : '';
      return `the tare on the ${name} support was forgotten`;
    }
    case 'places_in_inches':
      return 'the places of the supports were read in inches';
    case 'item_missing':
      return `${plan.items.find(({ id }) => id === cause.id)?.name ?? 'an item'} was not aboard`;
    case 'item_extra':
      return `${units.format(cause.grams, 'mass')} more than drawn lay on the scales`;
    case 'datum_shifted':
      return `the places were measured from a point ${units.format(Math.abs(cause.by), 'length')} ${cause.by > 0 ? 'aft' : 'ahead'} of the datum`;
  }
}
