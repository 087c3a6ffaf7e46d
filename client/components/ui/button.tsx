import type { ComponentProps, ReactNode } from 'react';
import { cn } from '#client/lib/cn.ts';

export type ButtonVariant = 'primary' | 'quiet' | 'danger' | 'plain';

const BASE =
  'inline-flex min-h-row items-center justify-center gap-1.5 rounded-md border px-3 font-semibold no-underline ' +
  'transition-colors duration-150 disabled:cursor-not-allowed disabled:opacity-60 aria-disabled:opacity-60 ' +
  'pointer-coarse:px-3.5';
const VARIANTS: Record<ButtonVariant, string> = {
  primary:
    'forced-color-adjust-none border-ink bg-ink text-on-ink enabled:hover:border-ink-deep enabled:hover:bg-ink-deep',
  quiet: 'border-ink bg-transparent text-ink enabled:hover:bg-ink-wash',
  danger: 'border-red bg-transparent text-red enabled:hover:bg-red-wash',
  plain: 'border-transparent bg-transparent px-2 text-ink enabled:hover:bg-ink-wash',
};

/** Classes of a button, for a link that looks like one. */
export function buttonClass(variant: ButtonVariant = 'quiet', className?: string): string {
  return cn(BASE, VARIANTS[variant], className);
}

interface ButtonProps extends ComponentProps<'button'> {
  variant?: ButtonVariant;
  /** While true the button does nothing and says `pendingText`; it keeps the focus, which a disabled one would lose. */
  pending?: boolean;
  pendingText?: string;
  children: ReactNode;
}

export function Button({
  variant = 'quiet',
  pending = false,
  pendingText = 'One moment …',
  className,
  children,
  disabled,
  type = 'button',
  onClick,
  ...rest
}: ButtonProps) {
  return (
    <button
      type={type}
      className={buttonClass(variant, className)}
      disabled={disabled && !pending}
      aria-disabled={pending || undefined}
      {...rest}
      onClick={(event) => {
        // A form that is sent with Enter presses its button too.
        if (pending) event.preventDefault();
        else onClick?.(event);
      }}
    >
      {pending ? <span role="status">{pendingText}</span> : children}
    </button>
  );
}
