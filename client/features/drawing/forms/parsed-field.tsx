import { useState } from 'react';
import { TextField } from '#client/components/ui/text-field.tsx';

export type Parsed<T> = { value: T } | { problem: string };

interface ParsedFieldProps<T> {
  label: string;
  value: T;
  format: (value: T) => string;
  parse: (text: string) => Parsed<T>;
  onValue: (value: T) => void;
  error?: string | undefined;
  hint?: string;
  inline?: boolean;
  hideLabel?: boolean;
  readOnly: boolean;
}

/** A value written as text. What was typed stands, right or wrong, until the value is changed elsewhere. */
export function ParsedField<T>(props: ParsedFieldProps<T>) {
  const { label, value, format, parse, onValue, readOnly, hint, inline = true, hideLabel = false } = props;
  const [typed, setTyped] = useState<{ text: string; meant: string | null } | null>(null);
  const [left, setLeft] = useState(false);
  const shown = format(value);
  const own = typed !== null && (typed.meant === null || typed.meant === shown);
  const text = own ? typed.text : shown;
  const parsed = parse(text);
  const take = (next: string) => {
    const read = parse(next);
    setLeft(false);
    setTyped({ text: next, meant: 'value' in read ? format(read.value) : null });
    if ('value' in read) onValue(read.value);
  };
  return (
    <TextField
      {...{ label, inline, hideLabel, hint, readOnly }}
      keepRoom={false}
      autoComplete="off"
      spellCheck={false}
      value={text}
      // What is only half typed is not scolded.
      error={props.error ?? ('problem' in parsed && (left || !own) ? parsed.problem : undefined)}
      onBlur={() => setLeft(true)}
      onChange={(event) => take(event.target.value)}
    />
  );
}
