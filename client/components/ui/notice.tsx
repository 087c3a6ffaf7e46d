import type { ReactNode } from 'react';
import { cn } from '#client/lib/cn.ts';

export type Tone = 'plain' | 'ink' | 'ochre' | 'red';

const LOOK: Record<Tone, string> = {
  plain: 'border-l-strong-rule',
  ink: 'border-l-ink bg-ink-wash',
  ochre: 'border-l-ochre bg-ochre-wash',
  red: 'border-l-red bg-red-wash',
};
const MARK: Record<Tone, { sign: string; className: string } | null> = {
  plain: null,
  ink: null,
  ochre: { sign: '◆', className: 'text-ochre' },
  red: { sign: '▲', className: 'text-red' },
};

interface NoticeProps {
  /** Red is only for out of limits or refused, ochre only for too close. */
  tone?: Tone;
  /** The word that says it without the colour, e.g. `Out of limits`. */
  word?: string;
  /** Spoken at once when it appears. */
  live?: boolean;
  className?: string;
  actions?: ReactNode;
  children: ReactNode;
}

/** Something to know, beside the thing that it is about. */
export function Notice({ tone = 'plain', word, live = false, className, actions, children }: NoticeProps) {
  const mark = MARK[tone];
  return (
    <div
      role={live ? 'alert' : undefined}
      className={cn(
        'flex flex-wrap items-center gap-x-4 gap-y-2 border-l-3 px-3 py-2',
        LOOK[tone],
        className,
      )}
    >
      <p className="min-w-0 flex-1 basis-64">
        {mark && (
          <span aria-hidden="true" className={cn('mr-1.5', mark.className)}>
            {mark.sign}
          </span>
        )}
        {word && <strong className={cn('mr-1.5 font-semibold', mark?.className)}>{word}</strong>}
        {children}
      </p>
      {actions && <div className="flex flex-wrap gap-2">{actions}</div>}
    </div>
  );
}
