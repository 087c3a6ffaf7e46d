import type { ComponentProps, Ref } from 'react';
import { cn } from '#client/lib/cn.ts';
import { Field, type FieldLook } from './field.tsx';

interface TextFieldProps extends FieldLook, Omit<ComponentProps<'input'>, 'id' | 'ref'> {
  inputRef?: Ref<HTMLInputElement>;
}

/** One line of text with its label. */
export function TextField(props: TextFieldProps) {
  const { label, hint, error, suffix, inline, hideLabel, keepRoom, inputRef, className, ...input } = props;
  return (
    <Field {...{ label, hint, error, suffix, inline, hideLabel, keepRoom }}>
      {(control) => (
        <input
          {...input}
          {...control}
          ref={inputRef}
          className={cn('inked min-h-row w-full px-2', className)}
        />
      )}
    </Field>
  );
}

interface TextAreaProps extends FieldLook, Omit<ComponentProps<'textarea'>, 'id' | 'ref'> {
  inputRef?: Ref<HTMLTextAreaElement>;
}

/** Several lines of text with their label. */
export function TextArea(props: TextAreaProps) {
  const { label, hint, error, suffix, inline, hideLabel, keepRoom, inputRef, className, ...area } = props;
  return (
    <Field {...{ label, hint, error, suffix, inline, hideLabel, keepRoom }}>
      {(control) => (
        <textarea
          rows={3}
          {...area}
          {...control}
          ref={inputRef}
          className={cn('inked w-full px-2 py-1.5', className)}
        />
      )}
    </Field>
  );
}
