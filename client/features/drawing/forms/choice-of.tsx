import { Checkbox } from '#client/components/ui/checkbox.tsx';
import { Select } from '#client/components/ui/select.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import type { Form, KeysOf } from './form.ts';

interface ChoiceOfProps<T, K extends KeysOf<T, string>> {
  form: Form<T>;
  field: K;
  label: string;
  options: readonly { value: NonNullable<T[K]> & string; label: string }[];
  /** What an absent value means. */
  otherwise?: NonNullable<T[K]> & string;
}

/** One of a few words. */
export function ChoiceOf<T, K extends KeysOf<T, string>>(props: ChoiceOfProps<T, K>) {
  const { form, field, label, options, otherwise } = props;
  const value = (form.value[field] as string | undefined) ?? otherwise;
  return (
    <Select
      inline
      label={label}
      value={value}
      options={options}
      error={form.issue(field)}
      keepRoom={false}
      disabled={form.readOnly}
      onValue={(next) => form.set({ [field]: next } as Partial<T>, field)}
    />
  );
}

interface TextOfProps<T> {
  form: Form<T>;
  field: KeysOf<T, string>;
  label: string;
}

export function TextOf<T>({ form, field, label }: TextOfProps<T>) {
  return (
    <TextField
      inline
      label={label}
      value={(form.value[field] as string | undefined) ?? ''}
      error={form.issue(field)}
      keepRoom={false}
      readOnly={form.readOnly}
      autoComplete="off"
      maxLength={120}
      onChange={(event) => form.set({ [field]: event.target.value } as Partial<T>, field)}
    />
  );
}

interface TickOfProps<T> {
  form: Form<T>;
  field: KeysOf<T, boolean>;
  label: string;
  hint?: string;
}

export function TickOf<T>({ form, field, label, hint }: TickOfProps<T>) {
  return (
    <Checkbox
      label={label}
      hint={hint}
      checked={Boolean(form.value[field])}
      disabled={form.readOnly}
      onValue={(checked) => form.set({ [field]: checked } as Partial<T>, field)}
    />
  );
}
