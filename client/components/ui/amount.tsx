import { useState } from 'react';
import { cn } from '#client/lib/cn.ts';
import { useUnits } from '#client/lib/units.ts';
import { NARROW_SPACE, NO_VALUE } from '#shared/format/numbers.ts';
import type { UnitsOptions } from '#shared/format/units.ts';
import type { Quantity } from '#shared/units/quantities.ts';

interface AmountProps extends UnitsOptions {
  /** In the quantity's base unit; an en dash stands for null. */
  value: number | null | undefined;
  quantity: Quantity;
  /** Standard uncertainty, shown behind a ±. */
  u?: number | null | undefined;
  /** Written after the unit, e.g. `MAC`. */
  of?: string;
  /** Underline it in ink for a second when it changes. */
  flash?: boolean;
  className?: string;
}

/** A figure in the reader's unit, which stands smaller and in graphite. */
export function Amount({ value, quantity, u, of, flash = false, className, ...options }: AmountProps) {
  const units = useUnits();
  const figure = units.format(value, quantity, { ...options, bare: true });
  const label = units.label(quantity, options);
  const changes = useChanges(figure);
  const missing = figure === NO_VALUE;
  return (
    <span className={cn('whitespace-nowrap', className)}>
      <span key={flash ? changes : undefined} className={flash && changes > 0 ? 'changed' : undefined}>
        {figure}
      </span>
      {!missing && u !== undefined && u !== null && (
        <span className="text-[0.82em] font-normal text-graphite">
          {` ±${NARROW_SPACE}${units.doubt(u, quantity, { ...options, plus: false, bare: true })}`}
        </span>
      )}
      {!missing && !options.bare && label !== '' && (
        <span className="text-[0.82em] font-normal text-graphite">
          {label === '°' ? label : `${NARROW_SPACE}${label}`}
          {of && ` ${of}`}
        </span>
      )}
    </span>
  );
}

/** Counts how often a value has changed since it was first shown. */
function useChanges(value: string): number {
  const [seen, setSeen] = useState({ value, count: 0 });
  if (seen.value === value) return seen.count;
  setSeen({ value, count: seen.count + 1 });
  return seen.count + 1;
}
