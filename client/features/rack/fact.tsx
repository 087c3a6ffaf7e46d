import type { ReactNode } from 'react';

/** One line of what is known of a piece. */
export function Fact({ name, children }: { name: string; children: ReactNode }) {
  return (
    <>
      <dt className="border-b border-rule py-1.5 text-graphite">{name}</dt>
      <dd className="-ml-4 border-b border-rule py-1.5 pl-4">{children}</dd>
    </>
  );
}
