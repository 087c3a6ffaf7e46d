import type { SVGProps } from 'react';
import { cn } from '#client/lib/cn.ts';

/** Small type on a drawing, with a margin of paper round it so that it stays readable over lines. */
export function SheetText({ className, ...rest }: SVGProps<SVGTextElement>) {
  return (
    <text
      fill="var(--graphite)"
      stroke="var(--sheet)"
      strokeWidth={3}
      paintOrder="stroke"
      strokeLinejoin="round"
      {...rest}
      className={cn('text-label', className)}
    />
  );
}
