import type { Why } from './why.ts';

/** How a figure was made: formula with its numbers, steps, uncertainty, source. */
export function WhyPanel({ why }: { why: Why }) {
  return (
    <div className="max-w-2xl border-l-3 border-l-ink py-1 pl-3 text-note font-normal whitespace-normal">
      <p className="font-semibold">{why.formula}</p>
      {why.steps.map((step) => (
        <p key={step} className="mt-1">
          {step}
        </p>
      ))}
      {why.doubt && <p className="mt-1">{why.doubt}</p>}
      {why.source && (
        <p className="mt-1 text-graphite">
          <span className="sr-only">Source: </span>
          {why.source}
        </p>
      )}
    </div>
  );
}
