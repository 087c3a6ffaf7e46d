import { NumberField } from '#client/components/ui/number-field.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { TrialRun } from '#shared/core/wood-trial.ts';
import { formatNumber, NARROW_SPACE } from '#shared/format/numbers.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { TrialsInput } from '#shared/schemas/trials.ts';

interface TermsFieldsProps {
  plan: Plan;
  run: TrialRun;
  terms: TrialsInput['terms'];
  /** mm: of the terms, or as usual */
  arm: number;
  editable: boolean;
  onTerms: (terms: TrialsInput['terms']) => void;
}

/** What all trials are compared at, in words and to be changed. */
export function TermsFields({ plan, run, terms, arm, editable, onTerms }: TermsFieldsProps) {
  const units = useUnits();
  const { target } = plan;
  const point = target
    ? `the wanted ${formatNumber(target.percentMac, 1)}${NARROW_SPACE}% MAC`
    : `the plan’s own balance point${run.wanted === null ? '' : `, ${units.format(run.wanted, 'length')}`}`;
  const massOk = (value: number) => value > 0 && value <= LIMITS.massG.max;
  return (
    <section aria-label="Equal terms" className="mt-4">
      <p className="max-w-4xl text-graphite">
        Equal terms: every trial is trimmed to {point} by ballast at one arm
        {terms.minimumMass === null
          ? '.'
          : ', then filled up at the balance point to the class minimum mass.'}
        {run.takenOff > 0 &&
          ` The plan’s own ballast, ${units.format(run.takenOff, 'mass')}, is taken off first.`}
      </p>
      <div className="mt-2 grid max-w-3xl grid-cols-1 gap-x-8 gap-y-1 sm:grid-cols-2">
        <NumberField
          label="Ballast at arm"
          quantity="length"
          inline
          keepRoom
          readOnly={!editable}
          value={arm}
          min={LIMITS.coordinateMm.min}
          max={LIMITS.coordinateMm.max}
          onChange={(value) => {
            const { min, max } = LIMITS.coordinateMm;
            if (value !== null && value >= min && value <= max) onTerms({ ...terms, arm: value });
          }}
        />
        <NumberField
          label="Class minimum mass"
          quantity="mass"
          inline
          keepRoom
          optional
          readOnly={!editable}
          value={terms.minimumMass}
          above={0}
          max={LIMITS.massG.max}
          placeholder="none"
          onChange={(value, problem) => {
            if (value !== null ? massOk(value) : problem === 'missing')
              onTerms({ ...terms, minimumMass: value });
          }}
        />
      </div>
    </section>
  );
}
