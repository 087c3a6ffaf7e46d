import { useInfiniteQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Link, useSearchParams } from 'react-router-dom';
import { QueryView } from '#client/components/query-view.tsx';
import { Button, buttonClass } from '#client/components/ui/button.tsx';
import { useMedia } from '#client/hooks/use-media.ts';
import { useSettled } from '#client/hooks/use-settled.ts';
import { useUnits } from '#client/lib/units.ts';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';
import { DensityPlot } from './density-plot.tsx';
import { EntryForm } from './entry-form.tsx';
import { rackHeadline } from './figures.ts';
import { ImportDialog } from './import-dialog.tsx';
import { LABELS_AT_ONCE, labelsText } from './label-sheets.ts';
import { rackQueries } from './queries.ts';
import { RackCards } from './rack-cards.tsx';
import { RackTable } from './rack-table.tsx';
import { RackTools } from './rack-tools.tsx';
import { paramsOf, viewOf, type RackView } from './rack-view.ts';

export interface RackLinks {
  pieceHref: (id: string) => string;
  labelsHref: (ids: readonly string[]) => string;
  gliderHref: (id: string) => string;
}

const NONE: ReadonlySet<string> = new Set();

/** The reader's own sheets, sticks, blocks and tubes. */
export function Rack(links: RackLinks) {
  const units = useUnits();
  const [params, setParams] = useSearchParams();
  const [importing, setImporting] = useState(false);
  const [chosen, setChosen] = useState(NONE);
  const view = viewOf(params);
  const search = useSettled(view.search.trim(), 250);
  const query = useInfiniteQuery({
    ...rackQueries.list({ ...view, search }),
    placeholderData: (before) => before,
  });
  const { data, hasNextPage, isFetchingNextPage, fetchNextPage } = query;
  const look = (next: RackView) => setParams(paramsOf(next), { replace: true });
  const usual = view.state === 'onRack' && view.kind === null && view.search === '' && search === '';
  const wanted = chosen.size > 0 ? [...chosen] : (data ?? []).map(({ id }) => id);
  const nothingYet = usual && data?.length === 0;
  const newest = data?.reduce<StockPieceDto | undefined>(
    (last, piece) => (last === undefined || piece.number > last.number ? piece : last),
    undefined,
  );

  return (
    <>
      <div className="flex flex-wrap items-start gap-x-4 gap-y-3">
        <div className="mr-auto min-w-0">
          <h1 className="text-figure font-semibold">Rack</h1>
          <p role="status" className="mt-1 text-graphite">
            {nothingYet
              ? 'Nothing is on the rack yet.'
              : data && data.length > 0
                ? `${rackHeadline(data, hasNextPage, units)}.`
                : ''}
          </p>
        </div>
        <div className="flex flex-wrap gap-3">
          <Button onClick={() => setImporting(true)}>Import a table</Button>
          {!nothingYet && (
            <a href={`/api/rack/export?state=${view.state}`} download className={buttonClass()}>
              Export
            </a>
          )}
          {data && data.length > 0 && (
            <Link to={links.labelsHref(wanted.slice(0, LABELS_AT_ONCE))} className={buttonClass()}>
              {labelsText(chosen.size, wanted.length)}
            </Link>
          )}
        </div>
      </div>
      <section aria-labelledby="rack-entry" className="mt-5 border-t border-strong-rule pt-4">
        <h2 id="rack-entry" className="mb-3 text-heading font-semibold">
          Weigh a piece
        </h2>
        {nothingYet && (
          <p className="mb-3 max-w-2xl">
            Measure a piece, weigh it and type both here; Enter puts it on the rack, and the sizes stay for
            the next. A whole stack may come in as a table from a spreadsheet, saved as CSV.
          </p>
        )}
        <EntryForm last={newest} />
      </section>
      {!nothingYet && (
        <section aria-label="Pieces" className="mt-6 border-t border-strong-rule pt-4">
          <RackTools view={view} onView={look} />
          <div className="mt-4" aria-busy={query.isPlaceholderData}>
            <QueryView
              query={query}
              isEmpty={(pieces) => pieces.length === 0}
              empty={<p className="py-4">Nothing fits. Try fewer words, another kind or another state.</p>}
            >
              {(pieces) => (
                <Pieces
                  pieces={pieces}
                  view={view}
                  onView={look}
                  chosen={chosen}
                  onChosen={setChosen}
                  {...links}
                />
              )}
            </QueryView>
            {hasNextPage && (
              <Button className="mt-4" onClick={() => void fetchNextPage()} pending={isFetchingNextPage}>
                Show more
              </Button>
            )}
          </div>
        </section>
      )}
      {importing && <ImportDialog onClose={() => setImporting(false)} />}
    </>
  );
}

export interface PiecesProps extends RackLinks {
  pieces: readonly StockPieceDto[];
  view: RackView;
  onView: (view: RackView) => void;
  /** ids of what labels are printed for */
  chosen: ReadonlySet<string>;
  onChosen: (chosen: ReadonlySet<string>) => void;
}

function Pieces(props: PiecesProps) {
  const wide = useMedia('(min-width: 64rem)');
  return (
    <>
      {wide ? <RackTable {...props} /> : <RackCards {...props} />}
      <DensityPlot pieces={props.pieces} />
    </>
  );
}
