import { useEffect, useRef, type ReactNode } from 'react';
import { NavLink, Outlet, useLocation, useNavigate } from 'react-router-dom';
import type { Place } from '#client/app/paths.ts';
import { SectionBoundary } from '#client/components/section-boundary.tsx';
import { WhyProvider } from '#client/components/why/why-provider.tsx';
import { TitleBlock } from '#client/features/gliders/title-block.tsx';
import { UndoButtons } from '#client/features/gliders/undo-buttons.tsx';
import { useUndo, useUndoKeys } from '#client/features/gliders/use-undo.ts';
import { useWorkspace } from '#client/features/gliders/workspace-context.ts';
import { cn } from '#client/lib/cn.ts';

const LABELS: Record<Place, string> = {
  drawing: 'Drawing',
  balance: 'Balance',
  loading: 'Loading',
  trial: 'Wood trial',
  built: 'As built',
  cut: 'Cut list',
  flight: 'First flight',
  sheets: 'Sheets',
  log: 'Log',
};

interface GliderFrameProps {
  places: readonly Place[];
  hrefOf: (place: Place) => string;
  /** What stands over the sheet: conflicts, restored edits. */
  notices?: ReactNode;
  /** A quiet line beside the tabs. */
  aside?: ReactNode;
}

/** The sheet of paper with its index tabs along the top edge and the title block at the lower right. */
export function GliderFrame({ places, hrefOf, notices, aside }: GliderFrameProps) {
  const workspace = useWorkspace();
  const { pathname } = useLocation();
  const { undo, redo, said } = useUndo(workspace);
  useUndoKeys(workspace.plan, undo, redo);
  const tabs = useRef<HTMLElement>(null);
  // On the phone the row of tabs is wider than the window; the open one stays in it.
  useEffect(() => {
    const open = tabs.current?.querySelector<HTMLElement>('[aria-current]');
    if (open) tabs.current?.scrollTo({ left: open.offsetLeft - open.offsetWidth });
  }, [pathname]);
  const navigate = useNavigate();
  const placeHref = (place: Place) => (places.includes(place) ? hrefOf(place) : null);
  return (
    <WhyProvider workspace={workspace} hrefOf={placeHref} onOpen={(href) => void navigate(href)}>
      <div className="flex flex-1 flex-col print:block">
        {notices}
        <div className="no-print flex flex-wrap-reverse items-end gap-x-4">
          <nav
            ref={tabs}
            aria-label={`Places of ${workspace.plan.name}`}
            className="relative -mb-px min-w-0 overflow-x-auto"
          >
            <ul className="flex">
              {places.map((place) => (
                <li key={place}>
                  <NavLink to={hrefOf(place)} className={tabClass}>
                    {LABELS[place]}
                  </NavLink>
                </li>
              ))}
            </ul>
          </nav>
          <div className="ml-auto flex items-center gap-x-3 max-sm:ml-0 max-sm:w-full">
            {aside}
            <UndoButtons workspace={{ ...workspace, undo, redo }} className="max-sm:hidden" />
            <span role="status" className="sr-only">
              {said}
            </span>
          </div>
        </div>
        <div className="flex flex-1 flex-col border border-strong-rule bg-sheet print:block print:border-0">
          <div className="flex min-h-0 flex-1 flex-col print:block">
            <SectionBoundary resetKey={pathname}>
              <Outlet />
            </SectionBoundary>
          </div>
          <TitleBlock workspace={{ ...workspace, undo, redo }} />
        </div>
      </div>
    </WhyProvider>
  );
}

function tabClass({ isActive }: { isActive: boolean }): string {
  return cn(
    'flex min-h-9 items-center border border-b-0 px-4 whitespace-nowrap no-underline pointer-coarse:min-h-11',
    'focus-visible:-outline-offset-2 max-sm:px-1.5',
    isActive
      ? 'rounded-t-md border-strong-rule bg-sheet font-semibold text-pencil'
      : 'border-transparent text-graphite hover:text-ink',
  );
}
