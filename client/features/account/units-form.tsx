import { Select } from '#client/components/ui/select.tsx';
import { RowTh, Table, Td, Th } from '#client/components/ui/table.tsx';
import { INCH_CHOICES, unitsOf, type ChosenUnits } from '#shared/format/units.ts';
import { QUANTITIES } from '#shared/units/quantities.ts';
import { UNITS } from '#shared/units/units.ts';
import { presetOf, UNIT_ROWS, unitIn, withUnit } from './unit-list.ts';

interface UnitsFormProps {
  units: ChosenUnits;
  onUnits: (units: ChosenUnits) => void;
}

const PRESETS = [
  { value: 'metric', label: 'Millimetres and grams', choices: {} },
  { value: 'inch', label: 'Inches and ounces', choices: INCH_CHOICES },
] as const;

/** One set for everything, or a unit for each quantity; every screen, print and file follows at once. */
export function UnitsForm({ units, onUnits }: UnitsFormProps) {
  const preset = presetOf(units);
  const shown = unitsOf(units);
  return (
    <>
      <fieldset>
        <legend className="sr-only">Units</legend>
        <div className="flex flex-wrap gap-x-6">
          {PRESETS.map(({ value, label, choices }) => (
            <label key={value} className="flex min-h-row items-center gap-2">
              <input
                type="radio"
                name="unit-preset"
                checked={preset === value}
                onChange={() => onUnits(choices)}
                className="size-4 accent-ink"
              />
              {label}
            </label>
          ))}
          {preset === 'mixed' && (
            <label className="flex min-h-row items-center gap-2">
              <input type="radio" name="unit-preset" checked readOnly className="size-4 accent-ink" />
              As chosen below
            </label>
          )}
        </div>
      </fieldset>
      <details className="mt-2" open={preset === 'mixed'}>
        <summary className="opens">Each quantity on its own</summary>
        <Table caption="Unit of each quantity" className="mt-1 max-w-lg">
          <thead>
            <tr>
              <Th>Quantity</Th>
              <Th>Unit</Th>
              <Th numeric>For example</Th>
            </tr>
          </thead>
          <tbody>
            {UNIT_ROWS.map(({ quantity, label, example }) => (
              <tr key={quantity}>
                <RowTh>{label}</RowTh>
                <Td className="py-1">
                  <Select
                    label={`Unit for ${label.toLowerCase()}`}
                    hideLabel
                    keepRoom={false}
                    value={unitIn(units, quantity)}
                    options={QUANTITIES[quantity].units.map((unit) => ({
                      value: unit,
                      label: UNITS[unit].label,
                    }))}
                    onValue={(unit) => onUnits(withUnit(units, quantity, unit))}
                  />
                </Td>
                <Td numeric>{shown.format(example, quantity)}</Td>
              </tr>
            ))}
          </tbody>
        </Table>
      </details>
    </>
  );
}
