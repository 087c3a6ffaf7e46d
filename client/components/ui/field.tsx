import { useId, type ReactNode } from 'react';
import { cn } from '#client/lib/cn.ts';

/** What the control inside a field must carry, so that label, hint and error are told with it. */
export interface ControlProps {
  id: string;
  'aria-describedby': string | undefined;
  'aria-invalid': boolean | undefined;
}

/** What every field may say around its control. */
export interface FieldLook {
  label: ReactNode;
  /** Stands after the control, e.g. `mm` or the same length in another unit. */
  suffix?: ReactNode;
  hint?: ReactNode;
  error?: string | undefined;
  /** Label beside the control, in a row, for dense forms. */
  inline?: boolean | undefined;
  /** Label read aloud only; for table cells whose heading is the label. */
  hideLabel?: boolean | undefined;
  /** Keep a line free for an error, so that nothing jumps. Off in tables. */
  keepRoom?: boolean | undefined;
}

interface FieldProps extends FieldLook {
  className?: string | undefined;
  children: (control: ControlProps) => ReactNode;
}

/** Visible label, control, unit, hint and error, joined for assistive technology. */
export function Field(props: FieldProps) {
  const { label, suffix, hint, error, inline = false, hideLabel = false, keepRoom = true, className } = props;
  const id = useId();
  const hintId = hint ? `${id}-hint` : undefined;
  const errorId = error ? `${id}-error` : undefined;
  const describedBy = [hintId, errorId].filter(Boolean).join(' ') || undefined;
  const control = props.children({
    id,
    'aria-describedby': describedBy,
    'aria-invalid': error ? true : undefined,
  });

  return (
    <div
      className={cn(
        inline && 'grid grid-cols-[minmax(min(5.5rem,40%),2fr)_minmax(0,3fr)] items-baseline gap-x-2',
        className,
      )}
    >
      <label
        htmlFor={id}
        className={hideLabel ? 'sr-only' : cn('block text-note', !inline && 'mb-1 font-semibold')}
      >
        {label}
      </label>
      <div className="min-w-0">
        {/* In large letters the unit goes below its number. */}
        <div className="flex flex-wrap items-baseline gap-x-2">
          <div className="min-w-[min(3.5rem,100%)] flex-1">{control}</div>
          {suffix && (
            <span
              className={cn('shrink-0 text-note text-graphite', inline ? 'min-w-[5em]' : 'min-w-[2.5em]')}
            >
              {suffix}
            </span>
          )}
        </div>
        {hint && (
          <p id={hintId} className="mt-1 text-note text-graphite">
            {hint}
          </p>
        )}
        <FieldError id={errorId} error={error} keepRoom={keepRoom} />
      </div>
    </div>
  );
}

function FieldError({
  id,
  error,
  keepRoom,
}: {
  id: string | undefined;
  error: string | undefined;
  keepRoom: boolean;
}) {
  if (!error && !keepRoom) return null;
  return (
    <p id={id} className={cn('mt-0.5 text-note text-red', keepRoom && 'min-h-[1.125rem]')}>
      {error && (
        <>
          <span aria-hidden="true">▲ </span>
          {error}
        </>
      )}
    </p>
  );
}
