import { NumberField } from '#client/components/ui/number-field.tsx';
import type { DampAir } from '#shared/core/humidity.ts';
import { HUMIDITY, TEMPERATURE } from './airs.ts';

interface AirFieldsProps {
  /** `Workshop`, `Field` */
  name: string;
  air: DampAir;
  onAir: (air: DampAir) => void;
}

const within = (value: number | null, { min, max }: { min: number; max: number }): value is number =>
  value !== null && value >= min && value <= max;

/** Temperature and relative humidity of one air. */
export function AirFields({ name, air, onAir }: AirFieldsProps) {
  return (
    <fieldset>
      <legend className="mb-1 font-semibold">{name}</legend>
      <div className="grid grid-cols-2 gap-x-4">
        <NumberField
          label="Temperature"
          quantity="ratio"
          suffix="°C"
          step={1}
          {...TEMPERATURE}
          value={air.temperature}
          onChange={(temperature) => {
            if (within(temperature, TEMPERATURE)) onAir({ ...air, temperature });
          }}
        />
        <NumberField
          label="Relative humidity"
          quantity="share"
          suffix="%"
          step={5}
          {...HUMIDITY}
          value={air.humidity}
          onChange={(humidity) => {
            if (within(humidity, HUMIDITY)) onAir({ ...air, humidity });
          }}
        />
      </div>
    </fieldset>
  );
}
