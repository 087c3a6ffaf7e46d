import type { ReactNode } from 'react';

interface PartProps {
  title: string;
  note?: ReactNode;
  children: ReactNode;
}

/** One part of the account: its heading in the margin of the sheet, what can be done beside it. */
export function Part({ title, note, children }: PartProps) {
  return (
    <section
      aria-label={title}
      className="grid gap-x-10 gap-y-3 border-t border-rule py-6 md:grid-cols-[15rem_minmax(0,1fr)]"
    >
      <div>
        <h2 className="text-heading font-semibold">{title}</h2>
        {note && <p className="mt-1 text-note text-graphite">{note}</p>}
      </div>
      <div className="min-w-0">{children}</div>
    </section>
  );
}
