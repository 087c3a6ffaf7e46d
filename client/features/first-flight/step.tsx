import { useId, type ReactNode } from 'react';
import { cn } from '#client/lib/cn.ts';

interface StepProps {
  title: string;
  /** how far it has come, beside the title */
  state?: string;
  className?: string;
  children: ReactNode;
}

/** One step of the field day, under a rule. */
export function Step({ title, state, className, children }: StepProps) {
  const id = useId();
  return (
    <section aria-labelledby={id} className={cn('mt-6 border-t border-rule pt-5', className)}>
      <h2 id={id} className="text-heading font-semibold">
        {title}
        {state && <span className="ml-2 text-note font-normal text-graphite">{state}</span>}
      </h2>
      {children}
    </section>
  );
}
