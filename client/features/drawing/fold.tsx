import type { ComponentProps, ReactNode } from 'react';
import { cn } from '#client/lib/cn.ts';

interface FoldProps extends Omit<ComponentProps<'details'>, 'children'> {
  summary: ReactNode;
  quiet?: boolean;
  children: ReactNode;
}

/** Something folded away until it is asked for. */
export function Fold({ summary, quiet = false, children, className, ...rest }: FoldProps) {
  return (
    <details {...rest} className={cn('group', className)}>
      <summary
        className={cn(
          'flex min-h-row list-none items-center gap-1.5 text-note text-ink [&::-webkit-details-marker]:hidden',
          !quiet && 'font-semibold',
        )}
      >
        <svg
          viewBox="0 0 6 10"
          width="6"
          height="10"
          aria-hidden="true"
          className="shrink-0 group-open:rotate-90"
        >
          <path d="M1 1 5 5 1 9" fill="none" stroke="currentColor" strokeWidth="1.4" />
        </svg>
        {summary}
      </summary>
      {children}
    </details>
  );
}
