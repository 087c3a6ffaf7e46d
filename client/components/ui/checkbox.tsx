import { useId, type ComponentProps, type ReactNode, type Ref } from 'react';
import { cn } from '#client/lib/cn.ts';

interface CheckboxProps extends Omit<ComponentProps<'input'>, 'id' | 'ref' | 'type'> {
  label: ReactNode;
  hint?: ReactNode;
  onValue?: (checked: boolean) => void;
  inputRef?: Ref<HTMLInputElement>;
}

/** A box to tick, its whole line being the target. */
export function Checkbox({ label, hint, onValue, onChange, inputRef, className, ...rest }: CheckboxProps) {
  const id = useId();
  return (
    <label htmlFor={id} className={cn('flex min-h-row items-center gap-2.5', className)}>
      <input
        {...rest}
        id={id}
        ref={inputRef}
        type="checkbox"
        aria-describedby={hint ? `${id}-hint` : undefined}
        onChange={(event) => {
          onChange?.(event);
          onValue?.(event.target.checked);
        }}
        className="size-4.5 shrink-0 accent-ink pointer-coarse:size-6"
      />
      <span>
        {label}
        {hint && (
          <span id={`${id}-hint`} className="block text-note text-graphite">
            {hint}
          </span>
        )}
      </span>
    </label>
  );
}
