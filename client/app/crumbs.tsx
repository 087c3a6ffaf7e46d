import { createContext, useContext, useEffect, useState, type ReactNode } from 'react';
import { Link } from 'react-router-dom';

/** One step on the way to the open page; the last one, without an address, is the page itself. */
export interface Crumb {
  label: string;
  href?: string;
}

const CrumbsContext = createContext<{ crumbs: Crumb[]; set: (crumbs: Crumb[]) => void } | null>(null);

export function CrumbsProvider({ children }: { children: ReactNode }) {
  const [crumbs, set] = useState<Crumb[]>([]);
  return <CrumbsContext value={{ crumbs, set }}>{children}</CrumbsContext>;
}

/** Shows the way to the page in the header while the page is open. */
export function useCrumbs(crumbs: Crumb[]): void {
  const set = useContext(CrumbsContext)?.set;
  const text = JSON.stringify(crumbs);
  useEffect(() => {
    set?.(JSON.parse(text) as Crumb[]);
    return () => set?.([]);
  }, [set, text]);
}

export function CrumbTrail() {
  const crumbs = useContext(CrumbsContext)?.crumbs ?? [];
  if (crumbs.length === 0) return null;
  return (
    <nav aria-label="You are here" className="min-w-0">
      <ol className="flex min-w-0 items-baseline gap-2">
        {crumbs.map(({ label, href }, i) => (
          <li
            key={`${i}-${label}`}
            className="flex min-w-0 items-baseline gap-2 first:shrink-0 max-sm:not-last:hidden"
          >
            {i > 0 && (
              <span aria-hidden="true" className="text-graphite max-sm:hidden">
                /
              </span>
            )}
            {href ? (
              <Link to={href} className="text-graphite no-underline hover:text-ink hover:underline">
                {label}
              </Link>
            ) : (
              <span aria-current="page" className="truncate font-semibold">
                {label}
              </span>
            )}
          </li>
        ))}
      </ol>
    </nav>
  );
}
