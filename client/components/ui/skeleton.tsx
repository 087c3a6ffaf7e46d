import { cn } from '#client/lib/cn.ts';

/** Faint ruled lines where something is about to stand. */
export function Skeleton({ lines = 4, className }: { lines?: number; className?: string }) {
  return (
    <div role="status" className={cn('max-w-2xl', className)}>
      <span className="sr-only">Loading …</span>
      {Array.from({ length: lines }, (_, i) => (
        <div key={i} aria-hidden="true" className="flex h-row items-center border-b border-rule">
          <div className="h-2 rounded-sm bg-rule" style={{ width: `${68 - ((i * 17) % 40)}%` }} />
        </div>
      ))}
    </div>
  );
}
