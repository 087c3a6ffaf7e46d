import { useInfiniteQuery } from '@tanstack/react-query';
import { QueryView } from '#client/components/query-view.tsx';
import { Button } from '#client/components/ui/button.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import { sheetQueries } from './queries.ts';
import { SaveSheet } from './save-sheet.tsx';
import { SheetList } from './sheet-list.tsx';
import { sheetsHeadline } from './sheet-words.ts';

interface SheetsPlaceProps {
  workspace: Workspace;
  sheetHref: (id: string) => string;
}

/** The numbered, unchanging balance sheets of a stored glider. */
export function SheetsPlace({ workspace, sheetHref }: SheetsPlaceProps) {
  const { glider } = workspace;
  if (!glider) return null;
  return (
    <Sheets workspace={workspace} gliderId={glider.id} maySave={glider.can.saveSheet} sheetHref={sheetHref} />
  );
}

interface SheetsProps extends SheetsPlaceProps {
  gliderId: string;
  maySave: boolean;
}

function Sheets({ workspace, gliderId, maySave, sheetHref }: SheetsProps) {
  const units = useUnits();
  const query = useInfiniteQuery(sheetQueries.list(gliderId));
  const { hasNextPage, isFetchingNextPage, fetchNextPage } = query;
  return (
    <div className="px-4 pt-5 pb-8 sm:px-7">
      <QueryView query={query}>
        {(sheets) => {
          const { headline, detail } = sheetsHeadline(sheets[0], workspace.result, units);
          return (
            <>
              <header>
                <h1 className="text-figure font-semibold">{headline}</h1>
                <p className="mt-1 max-w-2xl text-graphite">{detail}</p>
              </header>
              {maySave && (
                <section aria-label="Save a sheet" className="mt-5">
                  <SaveSheet workspace={workspace} gliderId={gliderId} />
                </section>
              )}
              {sheets.length > 0 && (
                <section aria-label="Saved sheets" className="mt-8">
                  <SheetList sheets={sheets} sheetHref={sheetHref} />
                  {hasNextPage && (
                    <Button
                      className="mt-4"
                      pending={isFetchingNextPage}
                      onClick={() => void fetchNextPage()}
                    >
                      Older sheets
                    </Button>
                  )}
                </section>
              )}
            </>
          );
        }}
      </QueryView>
    </div>
  );
}
