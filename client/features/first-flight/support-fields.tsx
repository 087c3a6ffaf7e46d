import { Button } from '#client/components/ui/button.tsx';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { FlightDraft } from './draft.ts';

type Support = FlightDraft['supports'][number];

interface SupportFieldsProps {
  support: Support;
  sideways: boolean;
  onChange: (support: Support) => void;
  onRemove: (() => void) | undefined;
}

const PLACE = { min: LIMITS.coordinateMm.min, max: LIMITS.coordinateMm.max };

/** One scale under the model: what it shows, what stands on it besides, and where it carries. */
export function SupportFields({ support, sideways, onChange, onRemove }: SupportFieldsProps) {
  const { name, reading, tare, x, y } = support;
  const put = (changes: Partial<Support>) => onChange({ ...support, ...changes });
  return (
    <fieldset className="mt-3">
      <legend className="flex w-full items-center justify-between font-semibold">
        {name}
        {onRemove && (
          <Button variant="plain" className="text-note" onClick={onRemove}>
            Take away<span className="sr-only"> {name}</span>
          </Button>
        )}
      </legend>
      <div className="mt-1 grid grid-cols-[1.2fr_1fr_0.8fr] gap-x-3">
        <NumberField
          label={<Labelled name={name} what="Shows" />}
          keepRoom={false}
          quantity="mass"
          value={reading}
          min={0}
          max={LIMITS.massG.max}
          className="text-heading"
          onChange={(value) => put({ reading: value })}
        />
        <NumberField
          label={<Labelled name={name} what="Stands at" />}
          keepRoom={false}
          quantity="length"
          value={x}
          {...PLACE}
          onChange={(value) => put({ x: value })}
        />
        <NumberField
          label={<Labelled name={name} what="Tare" />}
          keepRoom={false}
          quantity="mass"
          value={tare}
          min={0}
          max={LIMITS.massG.max}
          onChange={(value) => value !== null && put({ tare: value })}
        />
        {sideways && (
          <div className="col-span-3">
            <NumberField
              label={<Labelled name={name} what="Out to starboard" />}
              quantity="length"
              value={y}
              {...PLACE}
              hint="Port of the middle is a minus."
              onChange={(value) => value !== null && put({ y: value })}
            />
          </div>
        )}
      </div>
    </fieldset>
  );
}

/** Of several fields of a name it is told which. */
const Labelled = ({ name, what }: { name: string; what: string }) => (
  <>
    <span className="sr-only">{name}: </span>
    {what}
  </>
);
