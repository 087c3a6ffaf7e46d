/** The product's mark: a beam on its pivot with one weight hung from it. */
export function Mark({ className }: { className?: string }) {
  return (
    <svg viewBox="0 0 32 32" aria-hidden="true" className={className}>
      <path d="M2 13.5 30 7.5" fill="none" stroke="currentColor" strokeWidth="2.4" strokeLinecap="round" />
      <path
        d="M18 10.5 12.5 27h11Z"
        fill="none"
        stroke="currentColor"
        strokeWidth="2"
        strokeLinejoin="round"
      />
      <circle cx="5.5" cy="19" r="3.6" fill="var(--ink)" />
    </svg>
  );
}
