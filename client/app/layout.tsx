import { useEffect, useRef } from 'react';
import { Outlet, ScrollRestoration, useLocation } from 'react-router-dom';
import { Shortcuts } from '#client/components/shortcuts/shortcuts.tsx';
import { HatchDefs } from '#client/components/ui/hatch.tsx';
import { CrumbsProvider } from './crumbs.tsx';
import { Header } from './header.tsx';
import { NewerNotice } from './newer-notice.tsx';

/** What stands round every page: skip link, header, main. */
export function Layout() {
  const main = useRef<HTMLElement>(null);
  const { pathname } = useLocation();
  const before = useRef(pathname);

  // A reader's place moves with the page; the first page keeps the browser's own start.
  useEffect(() => {
    if (before.current === pathname) return;
    before.current = pathname;
    if (!main.current?.contains(document.activeElement)) main.current?.focus({ preventScroll: true });
  }, [pathname]);

  return (
    <CrumbsProvider>
      <a
        href="#main"
        onClick={(event) => {
          event.preventDefault();
          main.current?.focus();
        }}
        className="no-print fixed top-2 left-2 z-50 -translate-y-16 rounded-md bg-ink px-4 py-2 font-semibold text-on-ink focus:translate-y-0"
      >
        Skip to the page
      </a>
      <HatchDefs />
      <div className="mx-auto flex min-h-dvh w-full max-w-[96rem] flex-col px-4 sm:px-7 print:block print:max-w-none print:p-0">
        <Header />
        <main ref={main} id="main" tabIndex={-1} className="flex flex-1 flex-col pb-7 print:block print:pb-0">
          <NewerNotice />
          <Outlet />
        </main>
      </div>
      <Shortcuts />
      <ScrollRestoration />
    </CrumbsProvider>
  );
}
