import { useState, type KeyboardEvent, type Ref } from 'react';
import { cn } from '#client/lib/cn.ts';
import { useUnits } from '#client/lib/units.ts';
import { parseQuantity } from '#shared/units/parse.ts';
import type { Quantity } from '#shared/units/quantities.ts';
import type { ParseProblem } from '#shared/units/scan.ts';
import type { Unit } from '#shared/units/units.ts';
import { Field, type FieldLook } from './field.tsx';
import { besideOf, stepped, textOf, underneathOf } from './number-text.ts';
import { boundIn, NUMBER_HELP, problemText, rangeText } from './number-words.ts';

interface NumberFieldProps extends FieldLook {
  quantity: Quantity;
  /** In the quantity's base unit; null or undefined shows an empty field. */
  value: number | null | undefined;
  /** The number in the base unit, or null with what stands in the way (`missing` for an empty field). */
  onChange: (value: number | null, problem: ParseProblem | null) => void;
  /** Unit of a bare number; the reader's choice for the quantity by default. */
  unit?: Unit;
  /** Bounds in the base unit; a value beyond them is still given on, and the field says what is wrong. */
  min?: number;
  max?: number;
  /** Lower bound that is itself refused. */
  above?: number;
  /** One press of an arrow key, in the unit typed. */
  step?: number;
  /** May be left empty. */
  optional?: boolean;
  /** For a cell of a table: label in the heading, no room kept, no unit behind. */
  compact?: boolean;
  disabled?: boolean;
  readOnly?: boolean;
  className?: string;
  placeholder?: string;
  onFocus?: () => void;
  inputRef?: Ref<HTMLInputElement>;
}

interface Typed {
  text: string;
  /** What the text was read as, to notice a value that came from elsewhere. */
  value: number | null;
}

/** A number as builders write it. Keeps the text as typed; never re-formats under the cursor. */
export function NumberField(props: NumberFieldProps) {
  const { quantity, value, onChange, optional = false, compact = false, step } = props;
  const { label, hint, suffix, inline, hideLabel, keepRoom } = props;
  const units = useUnits();
  const unit = props.unit ?? units.unit(quantity);
  const [typed, setTyped] = useState<Typed | null>(null);
  const [left, setLeft] = useState(false);

  // Typed text stands until the value is changed by something else: an undo, another part, a reload.
  const own = typed !== null && (typed.value === null || typed.value === value);
  const text = own ? typed.text : textOf(value, quantity, unit);

  const read = parseQuantity(text, quantity, unit);
  const problem = 'problem' in read && !(optional && read.problem === 'missing') ? read.problem : null;
  const wrongSize = 'value' in read ? rangeText(read.value, { ...props, unit }) : undefined;
  // An unfinished `1/` is no error while it is being typed.
  const refused = props.error === undefined ? undefined : boundIn(props.error, quantity, unit);
  // Nor is a field that nobody has come to yet; what stands in it otherwise is told at once.
  const isDue = left || (!own && problem !== 'missing');
  const error = refused ?? wrongSize ?? (problem && isDue ? problemText(problem) : undefined);

  // In a cell the heading names the unit; what another unit or a sum comes to still has to be told.
  const told = compact && own ? underneathOf(text, quantity, unit) || undefined : undefined;

  const take = (next: string) => {
    const parsed = parseQuantity(next, quantity, unit);
    const number = 'value' in parsed ? parsed.value : null;
    setTyped({ text: next, value: number });
    onChange(number, 'problem' in parsed ? parsed.problem : null);
  };

  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>) => {
    if ((event.key !== 'ArrowUp' && event.key !== 'ArrowDown') || event.altKey || props.readOnly) return;
    event.preventDefault();
    const direction = event.key === 'ArrowUp' ? 1 : -1;
    const next = stepped(text, quantity, unit, direction * (event.shiftKey ? 10 : 1), step);
    if (next !== text) take(next);
  };

  return (
    <Field
      {...{ label, error, inline }}
      hint={hint ?? told}
      suffix={suffix ?? (compact ? undefined : besideOf(text, quantity, unit))}
      hideLabel={hideLabel ?? compact}
      keepRoom={keepRoom ?? (!compact && !inline)}
    >
      {(control) => (
        <input
          {...control}
          ref={props.inputRef}
          type="text"
          inputMode={
            quantity === 'count' ? 'numeric' : quantity !== 'length' && props.min === 0 ? 'decimal' : 'text'
          }
          autoComplete="off"
          spellCheck={false}
          title={props.readOnly || props.disabled ? undefined : NUMBER_HELP}
          value={text}
          disabled={props.disabled}
          readOnly={props.readOnly}
          placeholder={props.placeholder}
          aria-required={optional ? undefined : true}
          onFocus={props.onFocus}
          onBlur={() => setLeft(true)}
          onChange={(event) => {
            setLeft(false);
            take(event.target.value);
          }}
          onKeyDown={onKeyDown}
          className={cn(
            'inked min-h-row w-full text-right',
            compact ? 'min-w-14 px-1.5 max-sm:px-0.5 max-sm:text-note' : 'px-2',
            props.className,
          )}
        />
      )}
    </Field>
  );
}
