import type { ComponentProps, ReactNode } from 'react';
import { useOverflowing } from '#client/hooks/use-overflowing.ts';
import { cn } from '#client/lib/cn.ts';

interface TableProps extends ComponentProps<'table'> {
  /** What the table holds, read aloud; shown when `showCaption`. */
  caption: string;
  showCaption?: boolean;
  children: ReactNode;
}

/** A ruled table. Where it is too wide it scrolls in its own frame, which the keyboard then reaches. */
export function Table({ caption, showCaption = false, className, children, ...rest }: TableProps) {
  const [frame, overflowing] = useOverflowing<HTMLDivElement>();
  const reachable = overflowing ? { role: 'region', 'aria-label': caption, tabIndex: 0 } : {};
  return (
    <div ref={frame} {...reachable} className="relative max-w-full overflow-x-auto print:overflow-visible">
      <table {...rest} className={cn('w-full border-collapse', className)}>
        <caption className={showCaption ? 'caption pb-2 text-left' : 'sr-only'}>{caption}</caption>
        {children}
      </table>
    </div>
  );
}

const CELL = 'h-row px-2 align-middle first:pl-0 last:pr-0 print:h-auto print:py-0.5';

interface CellProps {
  /** Right-aligned figures. */
  numeric?: boolean;
}

/** Heading of a column. */
export function Th({ numeric = false, className, scope = 'col', ...rest }: CellProps & ComponentProps<'th'>) {
  return (
    <th
      scope={scope}
      className={cn(
        CELL,
        'border-b border-strong-rule text-note font-semibold text-graphite',
        numeric ? 'text-right' : 'text-left',
        className,
      )}
      {...rest}
    />
  );
}

export function Td({ numeric = false, className, ...rest }: CellProps & ComponentProps<'td'>) {
  return (
    <td
      className={cn(CELL, 'border-b border-rule', numeric && 'text-right whitespace-nowrap', className)}
      {...rest}
    />
  );
}

/** The cell that names its row. */
export function RowTh({ className, ...rest }: ComponentProps<'th'>) {
  return (
    <th scope="row" className={cn(CELL, 'border-b border-rule text-left font-normal', className)} {...rest} />
  );
}

interface TrProps extends ComponentProps<'tr'> {
  /** Lit, because it is picked here or in the drawing. */
  lit?: boolean;
  /** A total, or the head of a group. */
  strong?: boolean;
}

export function Tr({ lit = false, strong = false, className, ...rest }: TrProps) {
  return (
    <tr
      className={cn(lit && 'bg-ink-wash', strong && 'font-semibold [&>th]:font-semibold', className)}
      {...rest}
    />
  );
}
