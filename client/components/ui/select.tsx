import type { ComponentProps, Ref } from 'react';
import { cn } from '#client/lib/cn.ts';
import { Field, type FieldLook } from './field.tsx';

export interface Option {
  value: string;
  label: string;
  disabled?: boolean;
}
export interface OptionGroup {
  label: string;
  options: readonly Option[];
}

interface SelectProps extends FieldLook, Omit<ComponentProps<'select'>, 'id' | 'ref'> {
  options: readonly (Option | OptionGroup)[];
  /** The chosen value, without the event around it. */
  onValue?: (value: string) => void;
  selectRef?: Ref<HTMLSelectElement>;
}

/** The system's own list, so that it works with every keyboard, phone and reader. */
export function Select(props: SelectProps) {
  const { label, hint, error, suffix, inline, hideLabel, keepRoom, ...own } = props;
  const { options, onValue, onChange, selectRef, className, ...rest } = own;
  return (
    <Field {...{ label, hint, error, suffix, inline, hideLabel, keepRoom }}>
      {(control) => (
        <select
          {...rest}
          {...control}
          ref={selectRef}
          onChange={(event) => {
            onChange?.(event);
            onValue?.(event.target.value);
          }}
          className={cn('inked min-h-row w-full px-1.5', className)}
        >
          {options.map((option) =>
            'options' in option ? (
              <optgroup key={option.label} label={option.label}>
                {option.options.map(optionElement)}
              </optgroup>
            ) : (
              optionElement(option)
            ),
          )}
        </select>
      )}
    </Field>
  );
}

function optionElement({ value, label, disabled }: Option) {
  return (
    <option key={value} value={value} disabled={disabled}>
      {label}
    </option>
  );
}
