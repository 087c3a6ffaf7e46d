import { useUnits } from '#client/lib/units.ts';
import { ballastFor } from '#shared/core/ballast.ts';
import { fieldSideways } from '#shared/core/field/field-account.ts';
import type { FirstFlightInput } from '#shared/schemas/first-flight.ts';

/** Port against starboard, and the weight at the light tip that levels them. `tip` mm from the middle. */
export function Sideways({ method, tip }: { method: FirstFlightInput['method']; tip: number | null }) {
  const units = useUnits();
  const found = fieldSideways(method);
  if (!found) return null;
  const { mass, y, uy } = found;
  const side = y > 0 ? 'starboard' : 'port';
  const light = y > 0 ? 'port' : 'starboard';
  if (Math.abs(y) <= uy) {
    return <p className="mt-3">Level sideways, as far as these scales can tell.</p>;
  }
  const weight = tip === null ? null : ballastFor(mass, y, 0, -Math.sign(y) * tip);
  return (
    <p className="mt-3">
      <strong className="font-semibold">
        {units.format(Math.abs(y), 'length')} to {side}
      </strong>{' '}
      ± {units.doubt(uy, 'length')}.
      {weight && 'mass' in weight && ` ${units.format(weight.mass, 'mass')} at the ${light} tip levels it.`}
    </p>
  );
}
