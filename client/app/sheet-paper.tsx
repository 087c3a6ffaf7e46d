import type { ReactNode } from 'react';
import { cn } from '#client/lib/cn.ts';

/** A sheet of drawing paper with its thin frame. */
export function SheetPaper({ narrow = false, children }: { narrow?: boolean; children: ReactNode }) {
  return (
    <div
      className={cn(
        'border border-strong-rule bg-sheet px-4 py-6 sm:px-7 print:border-0 print:p-0',
        narrow ? 'mx-auto mt-2 w-full max-w-lg sm:mt-8 sm:px-10 sm:py-9' : 'flex-1',
      )}
    >
      {children}
    </div>
  );
}
