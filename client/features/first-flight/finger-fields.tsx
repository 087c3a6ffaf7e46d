import { NumberField } from '#client/components/ui/number-field.tsx';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { FlightDraft } from './draft.ts';

type Finger = FlightDraft['finger'];

const PLACE = { min: LIMITS.coordinateMm.min, max: LIMITS.coordinateMm.max };

/** For who has no second scale: where the model tips forward, and where aft. */
export function FingerFields({ finger, onChange }: { finger: Finger; onChange: (finger: Finger) => void }) {
  const put = (changes: Partial<Finger>) => onChange({ ...finger, ...changes });
  return (
    <div className="mt-3 grid grid-cols-1 gap-x-4 min-[360px]:grid-cols-2">
      <NumberField
        label="Tips forward at"
        quantity="length"
        value={finger.tipsForwardAt}
        {...PLACE}
        hint="aft of the datum"
        onChange={(tipsForwardAt) => put({ tipsForwardAt })}
      />
      <NumberField
        label="Tips aft at"
        quantity="length"
        value={finger.tipsAftAt}
        {...PLACE}
        hint="aft of the datum"
        onChange={(tipsAftAt) => put({ tipsAftAt })}
      />
      <NumberField
        label="It weighs"
        quantity="mass"
        value={finger.mass}
        above={0}
        max={LIMITS.massG.max}
        className="text-heading"
        onChange={(mass) => put({ mass })}
      />
    </div>
  );
}
