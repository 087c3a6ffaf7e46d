import { NumberField } from '#client/components/ui/number-field.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Quantity } from '#shared/units/quantities.ts';
import type { Form, KeysOf } from './form.ts';

interface NumberOfProps<T> {
  form: Form<T>;
  field: KeysOf<T, number>;
  label: string;
  quantity: Quantity;
  hint?: string;
  /** May be left empty, and is then not given at all. */
  optional?: boolean;
  step?: number;
}

/** A number of the plan as a field. What the plan's rules refuse is told here and kept as typed. */
export function NumberOf<T>({
  form,
  field,
  label,
  quantity,
  hint,
  optional = false,
  step,
}: NumberOfProps<T>) {
  const units = useUnits();
  // The key is known to hold a number or nothing; an object with one computed key widens to strings.
  const change = (value: number | undefined) => form.set({ [field]: value } as Partial<T>, field);
  return (
    <NumberField
      inline
      label={label}
      quantity={quantity}
      value={form.value[field] as number | undefined}
      error={form.issue(field)}
      readOnly={form.readOnly}
      optional={optional}
      // Plain numbers keep the room of a unit, so that fields end in one line.
      {...(units.label(quantity) === '' && { suffix: '\u00a0' })}
      {...(hint !== undefined && { hint })}
      {...(step !== undefined && { step })}
      onChange={(value, problem) => {
        if (value !== null) change(value);
        else if (optional && problem === 'missing') change(undefined);
      }}
    />
  );
}
