import { Dialog as Radix } from 'radix-ui';
import type { ReactNode } from 'react';
import { cn } from '#client/lib/cn.ts';

interface DialogProps {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  title: string;
  /** One sentence under the title, read with it. */
  description?: ReactNode;
  wide?: boolean;
  /** As large as the window allows, for a picture. */
  full?: boolean;
  children: ReactNode;
}

/** A sheet laid over the table: keeps the focus, closes with Escape, gives the focus back. */
export function Dialog(props: DialogProps) {
  const { open, onOpenChange, title, description, wide = false, full = false, children } = props;
  return (
    <Radix.Root open={open} onOpenChange={onOpenChange}>
      <Radix.Portal>
        <Radix.Overlay className="no-print fixed inset-0 z-40 bg-veil" />
        <Radix.Content
          {...(description ? {} : { 'aria-describedby': undefined })}
          className={cn(
            'fixed inset-x-0 bottom-0 z-50 max-h-[92dvh] overflow-y-auto border border-strong-rule bg-sheet p-5 shadow-float',
            'sm:inset-x-auto sm:top-1/2 sm:bottom-auto sm:left-1/2 sm:-translate-x-1/2 sm:-translate-y-1/2 sm:rounded-md sm:p-6',
            full ? 'sm:w-[min(80rem,94vw)]' : wide ? 'sm:w-[min(46rem,94vw)]' : 'sm:w-[min(30rem,94vw)]',
          )}
        >
          <Radix.Title className="pr-12 text-heading font-semibold">{title}</Radix.Title>
          {description && <Radix.Description className="mt-1 text-graphite">{description}</Radix.Description>}
          <div className="mt-4">{children}</div>
          {/* Last in order, so that the focus begins with what the dialog is about. */}
          <Radix.Close
            aria-label="Close"
            className="absolute top-3.5 right-3.5 grid size-row place-items-center rounded-md text-ink hover:bg-ink-wash"
          >
            <svg viewBox="0 0 12 12" width="12" height="12" aria-hidden="true">
              <path d="M1 1 11 11M11 1 1 11" stroke="currentColor" strokeWidth="1.6" />
            </svg>
          </Radix.Close>
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}

/** The row of buttons that ends a dialog, the one that acts last. */
export function DialogActions({ children }: { children: ReactNode }) {
  return <div className="mt-6 flex flex-wrap justify-end gap-3">{children}</div>;
}
