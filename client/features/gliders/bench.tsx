import { useInfiniteQuery } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { useSearchParams } from 'react-router-dom';
import { QueryView } from '#client/components/query-view.tsx';
import { Button } from '#client/components/ui/button.tsx';
import { useSettled } from '#client/hooks/use-settled.ts';
import type { GliderSummaryDto } from '#shared/schemas/glider.ts';
import { benchQuery } from './bench-queries.ts';
import { BenchSelection } from './bench-selection.tsx';
import { BenchTable } from './bench-table.tsx';
import { BenchTools } from './bench-tools.tsx';
import { paramsOf, viewOf, type BenchView } from './bench-view.ts';
import { NewGliderMenu, useNewGlider } from './new-glider.tsx';

export interface BenchLinks {
  hrefOf: (id: string) => string;
  sharingHrefOf: (id: string) => string;
}

interface BenchProps extends BenchLinks {
  onOpen: (id: string) => void;
  /** to the start by a few wishes */
  onGuided: () => void;
}

const NONE: ReadonlySet<string> = new Set();

/** The reader's gliders and those shared with them. */
export function Bench({ onOpen, onGuided, ...links }: BenchProps) {
  const [params, setParams] = useSearchParams();
  const view = viewOf(params);
  const search = useSettled(view.search.trim(), 250);
  const query = useInfiniteQuery({
    ...benchQuery({ ...view, search }),
    placeholderData: (before) => before,
  });
  // Null while nothing is to be selected.
  const [selected, setSelected] = useState<ReadonlySet<string> | null>(null);
  const look = (next: BenchView) => {
    if (next.archived !== view.archived) setSelected(selected && NONE);
    setParams(paramsOf(next), { replace: true });
  };
  const usual = view.archived === 'no' && view.search === '' && search === '';
  const { hasNextPage, isFetchingNextPage, fetchNextPage } = query;
  const isEmpty = (gliders: readonly GliderSummaryDto[]) => gliders.length === 0 && !hasNextPage;
  const nothingYet = usual && query.data !== undefined && isEmpty(query.data);

  return (
    <>
      <div className="flex flex-wrap items-end gap-x-4 gap-y-3">
        <h1 className="text-figure font-semibold">
          {view.archived === 'only' ? 'Bench, archived' : 'Bench'}
        </h1>
        <div className="ml-auto flex flex-wrap items-end gap-3 max-sm:w-full">
          {!nothingYet && (
            <BenchTools
              view={view}
              onView={look}
              selecting={selected !== null}
              onSelecting={(on) => setSelected(on ? NONE : null)}
            />
          )}
          <NewGliderMenu onOpen={onOpen} onGuided={onGuided} />
        </div>
      </div>
      <div className="mt-6" aria-busy={query.isPlaceholderData}>
        <QueryView
          query={query}
          isEmpty={isEmpty}
          empty={
            nothingYet ? <EmptyBench onOpen={onOpen} onGuided={onGuided} /> : <NothingFound view={view} />
          }
        >
          {(gliders) => (
            <Gliders
              gliders={gliders}
              view={view}
              onView={look}
              selected={selected}
              onSelected={setSelected}
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
    </>
  );
}

interface GlidersProps extends BenchLinks {
  gliders: readonly GliderSummaryDto[];
  view: BenchView;
  onView: (view: BenchView) => void;
  selected: ReadonlySet<string> | null;
  onSelected: (selected: ReadonlySet<string> | null) => void;
}

function Gliders({ gliders, selected, onSelected, ...rest }: GlidersProps) {
  const chosen = selected === null ? [] : gliders.filter(({ id }) => selected.has(id));
  return (
    <>
      {selected !== null && (
        <BenchSelection
          chosen={chosen}
          archived={rest.view.archived === 'only'}
          onDone={() => onSelected(NONE)}
        />
      )}
      <BenchTable gliders={gliders} selected={selected} onSelected={onSelected} {...rest} />
    </>
  );
}

function EmptyBench({ onOpen, onGuided }: Pick<BenchProps, 'onOpen' | 'onGuided'>) {
  const { pending, blank, fromSample } = useNewGlider(onOpen);
  return (
    <div className="max-w-xl py-4">
      <h2 className="text-heading font-semibold">Nothing lies here yet</h2>
      <p className="mt-2">
        Say in a few words what your glider is to be and have it drawn, or begin with a copy of the sample and
        change it into yours. A plan that somebody gave you comes in through “New glider”.
      </p>
      <p className="mt-5 flex flex-wrap gap-3">
        <Button variant="primary" onClick={onGuided}>
          Draw one from a few wishes
        </Button>
        <Button onClick={fromSample} pending={pending}>
          Copy the sample
        </Button>
        <Button onClick={blank} disabled={pending}>
          Blank sheet
        </Button>
      </p>
    </div>
  );
}

function NothingFound({ view: { search, archived } }: { view: BenchView }): ReactNode {
  const where = archived === 'only' ? ' among those put away' : '';
  if (search.trim() === '') return <p className="py-4">Nothing is put away.</p>;
  return (
    <p className="py-4">
      No glider’s name holds “{search.trim()}”{where}.
    </p>
  );
}
