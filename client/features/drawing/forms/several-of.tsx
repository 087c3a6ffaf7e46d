import { useId, type ReactNode } from 'react';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { useUnits } from '#client/lib/units.ts';
import { roundTo } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';
import type { Quantity } from '#shared/units/quantities.ts';
import type { Form, KeysOf } from './form.ts';

interface Cell {
  label: string;
  value: number | undefined;
  error: string | undefined;
  onChange: (value: number) => void;
}

interface NumbersRowProps {
  label: string;
  quantity: Quantity;
  cells: readonly Cell[];
  between?: ReactNode;
  readOnly: boolean;
}

/** Several numbers that belong together on one line under one label: a range, a taper, a place in space. */
export function NumbersRow({ label, quantity, cells, between, readOnly }: NumbersRowProps) {
  const id = useId();
  const units = useUnits();
  return (
    <div
      role="group"
      aria-labelledby={id}
      className="grid grid-cols-[minmax(min(5.5rem,40%),2fr)_minmax(0,3fr)] items-baseline gap-x-2"
    >
      <span id={id} className="text-note">
        {label}
      </span>
      <div className="flex min-w-0 flex-wrap items-baseline gap-x-1.5">
        <div className="flex min-w-[min(6rem,100%)] flex-1 items-baseline gap-1.5">
          {cells.map((cell, i) => (
            <div key={cell.label} className="flex min-w-0 flex-1 items-baseline gap-1.5">
              {i > 0 && between && <span className="text-note text-graphite">{between}</span>}
              <div className="min-w-0 flex-1">
                <NumberField
                  compact
                  className="min-w-0!"
                  {...cell}
                  label={`${label}, ${cell.label}`}
                  quantity={quantity}
                  readOnly={readOnly}
                  onChange={(value) => value !== null && cell.onChange(value)}
                />
              </div>
            </div>
          ))}
        </div>
        <span className="min-w-[2.5em] shrink-0 text-note text-graphite">
          {besideAll(cells, quantity, units)}
        </span>
      </div>
    </div>
  );
}

interface RowOfProps<T, K> {
  form: Form<T>;
  field: K;
  label: string;
  quantity: Quantity;
}

/** The unit; where all are one size that is sold by its fraction of an inch, that size in mm. */
function besideAll(cells: readonly Cell[], quantity: Quantity, units: Units): string {
  const value = cells[0]?.value;
  const isFraction =
    quantity === 'length' &&
    units.unit('length') === 'mm' &&
    value !== undefined &&
    roundTo(value, 1) !== value;
  return isFraction && cells.every((cell) => cell.value === value)
    ? units.format(value, 'length', { fine: true })
    : units.label(quantity);
}

/** A value at the beginning of a range and one at its end. The second follows the first while they are the same. */
export function PairOf<T>({ form, field, label, quantity }: RowOfProps<T, KeysOf<T, [number, number]>>) {
  const [a, b] = (form.value[field] as [number, number] | undefined) ?? [undefined, undefined];
  const set = (pair: [number, number]) => form.set({ [field]: pair } as Partial<T>, field);
  return (
    <NumbersRow
      label={label}
      quantity={quantity}
      readOnly={form.readOnly}
      between="→"
      cells={[
        {
          label: 'at its inner end',
          value: a,
          error: form.issue(`${field}/0`) ?? form.issue(field),
          onChange: (v) => set([v, b === undefined || b === a ? v : b]),
        },
        {
          label: 'at its outer end',
          value: b,
          error: form.issue(`${field}/1`),
          onChange: (v) => set([a ?? v, v]),
        },
      ]}
    />
  );
}

/** A place in space. */
export function PlaceOf<T>({
  form,
  field,
  label,
}: Omit<RowOfProps<T, KeysOf<T, [number, number, number]>>, 'quantity'>) {
  const at = form.value[field] as [number, number, number];
  const names = ['x aft', 'y to starboard', 'z up'] as const;
  return (
    <NumbersRow
      label={label}
      quantity="length"
      readOnly={form.readOnly}
      cells={names.map((name, axis) => ({
        label: name,
        value: at[axis],
        error: form.issue(`${field}/${axis}`),
        onChange: (value) =>
          form.set({ [field]: at.map((v, i) => (i === axis ? value : v)) } as Partial<T>, `${field} ${name}`),
      }))}
    />
  );
}

interface RangeOfProps<T> {
  form: Form<T>;
  from: KeysOf<T, number>;
  to: KeysOf<T, number>;
  label: string;
  quantity: Quantity;
}

/** Two numbers that bound a range. */
export function RangeOf<T>({ form, from, to, label, quantity }: RangeOfProps<T>) {
  const cell = (field: KeysOf<T, number>, name: string): Cell => ({
    label: name,
    value: form.value[field] as number | undefined,
    error: form.issue(field),
    onChange: (value) => form.set({ [field]: value } as Partial<T>, field),
  });
  return (
    <NumbersRow
      label={label}
      quantity={quantity}
      readOnly={form.readOnly}
      between="–"
      cells={[cell(from, 'from'), cell(to, 'to')]}
    />
  );
}
