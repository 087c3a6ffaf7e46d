import { memo } from 'react';
import { useUnits } from '#client/lib/units.ts';
import { estimate } from '#shared/core/estimate.ts';
import { inAir, type DampAir } from '#shared/core/humidity.ts';
import { builtAs, type Tried } from './trial-chances.ts';

/** A dry and a damp day, and the heated room that the wood was weighed in (common practice, no source). */
const [DRY, DAMP, WORKSHOP]: [DampAir, DampAir, DampAir] = [
  { temperature: 15, humidity: 0.3 },
  { temperature: 15, humidity: 0.9 },
  { temperature: 20, humidity: 0.45 },
];

interface AirNoteProps {
  /** place in what was tried */
  picked: number;
  later: Tried;
}

/** What the day's air can make of a trial's mass, beside a class minimum where one is set. */
export const AirNote = memo(Air);

function Air({ picked, later: { plan, run, terms, tried } }: AirNoteProps) {
  const units = useUnits();
  const [trial, result] = [tried[picked], run.results[picked]];
  const built = trial && result ? builtAs(plan, trial, result, { arm: terms.arm, wanted: run.wanted }) : null;
  if (!trial || !built) return null;
  const all = estimate(built);
  const [dry, damp] = [DRY, DAMP].map((air) => inAir(built, all, air, WORKSHOP));
  if (!dry || !damp) return null;
  const least = terms.minimumMass ?? null;
  const short = least === null ? 0 : least - dry.mass;
  return (
    <p className="mt-3 max-w-prose text-note text-graphite">
      In air of 30 to 90 % humidity “{trial.name}” weighs {units.format(dry.mass, 'mass')} to{' '}
      {units.format(damp.mass, 'mass')}: a bound, for sealed wood moves less.{' '}
      {least !== null &&
        (short > 0
          ? `On a dry day that is ${units.format(short, 'mass')} under the class minimum of ${units.format(least, 'mass')}: carry that much more.`
          : `Even on a dry day it keeps the class minimum of ${units.format(least, 'mass')}.`)}
    </p>
  );
}
