import type { ReactNode } from 'react';

/** One part of the page under its heading. */
export function Part({ title, note, children }: { title: string; note?: ReactNode; children: ReactNode }) {
  return (
    <section aria-label={title}>
      <h2 className="text-heading font-semibold">{title}</h2>
      {note && <p className="mt-1 max-w-2xl text-note text-graphite">{note}</p>}
      <div className="mt-3">{children}</div>
    </section>
  );
}
