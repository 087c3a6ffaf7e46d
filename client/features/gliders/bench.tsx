import { useInfiniteQuery } from '@tanstack/react-query';
import { useEffect, useMemo, useState } from 'react';
import { QueryView } from '#client/components/query-view.tsx';
import { Button } from '#client/components/ui/button.tsx';
import { Select } from '#client/components/ui/select.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { useSettled } from '#client/hooks/use-settled.ts';
import type { GliderSummaryDto } from '#shared/schemas/glider.ts';
import { BENCH_ORDERS, inOrder, type BenchOrder } from './bench-order.ts';
import { BenchTable } from './bench-table.tsx';
import { NewGliderMenu, useNewGlider } from './new-glider.tsx';
import { gliderQueries } from './queries.ts';

interface BenchProps {
  hrefOf: (id: string) => string;
  onOpen: (id: string) => void;
}

/** The reader's gliders and those shared with them. */
export function Bench({ hrefOf, onOpen }: BenchProps) {
  const [search, setSearch] = useState('');
  const [order, setOrder] = useState<BenchOrder>('changed');
  const sought = useSettled(search.trim(), 250);
  const query = useInfiniteQuery({ ...gliderQueries.list(sought), placeholderData: (before) => before });
  const { hasNextPage, isFetchingNextPage, fetchNextPage } = query;

  const nothingYet = search === '' && sought === '' && query.data?.length === 0;

  // Newest first is the server's order; any other is only true of the whole list.
  const needsAll = order !== 'changed' && hasNextPage && !isFetchingNextPage;
  useEffect(() => {
    if (needsAll) void fetchNextPage();
  }, [needsAll, fetchNextPage]);

  return (
    <>
      <div className="flex flex-wrap items-end gap-x-4 gap-y-3">
        <h1 className="text-figure font-semibold">Bench</h1>
        <div className="ml-auto flex flex-wrap items-end gap-3 max-sm:w-full">
          {!nothingYet && (
            <BenchTools search={search} onSearch={setSearch} order={order} onOrder={setOrder} />
          )}
          <NewGliderMenu onOpen={onOpen} />
        </div>
      </div>
      <div className="mt-6">
        <QueryView
          query={query}
          isEmpty={(gliders) => gliders.length === 0}
          empty={sought === '' ? <EmptyBench onOpen={onOpen} /> : <NothingFound search={sought} />}
        >
          {(gliders) => <Ordered gliders={gliders} order={order} hrefOf={hrefOf} />}
        </QueryView>
        {hasNextPage && order === 'changed' && (
          <Button className="mt-4" onClick={() => void fetchNextPage()} pending={isFetchingNextPage}>
            Show more
          </Button>
        )}
      </div>
    </>
  );
}

interface BenchToolsProps {
  search: string;
  onSearch: (search: string) => void;
  order: BenchOrder;
  onOrder: (order: BenchOrder) => void;
}

function BenchTools({ search, onSearch, order, onOrder }: BenchToolsProps) {
  return (
    <>
      <div className="w-52 max-sm:w-full">
        <TextField
          label="Search by name"
          type="search"
          keepRoom={false}
          value={search}
          maxLength={120}
          onChange={(event) => onSearch(event.target.value)}
        />
      </div>
      <div className="w-36 max-sm:flex-1">
        <Select
          label="Order"
          keepRoom={false}
          value={order}
          options={BENCH_ORDERS}
          onValue={(value) => onOrder(BENCH_ORDERS.find((o) => o.value === value)?.value ?? 'changed')}
        />
      </div>
    </>
  );
}

interface OrderedProps {
  gliders: readonly GliderSummaryDto[];
  order: BenchOrder;
  hrefOf: (id: string) => string;
}

function Ordered({ gliders, order, hrefOf }: OrderedProps) {
  const ordered = useMemo(() => inOrder(gliders, order), [gliders, order]);
  return <BenchTable gliders={ordered} hrefOf={hrefOf} />;
}

function EmptyBench({ onOpen }: { onOpen: (id: string) => void }) {
  const { pending, blank, fromSample } = useNewGlider(onOpen);
  return (
    <div className="max-w-xl py-4">
      <h2 className="text-heading font-semibold">Nothing lies here yet</h2>
      <p className="mt-2">
        Begin with a copy of the sample glider and change it into yours, or with a blank sheet. A plan that
        somebody gave you comes in through “New glider”.
      </p>
      <p className="mt-5 flex flex-wrap gap-3">
        <Button variant="primary" onClick={fromSample} pending={pending}>
          Copy the sample
        </Button>
        <Button onClick={blank} disabled={pending}>
          Blank sheet
        </Button>
      </p>
    </div>
  );
}

function NothingFound({ search }: { search: string }) {
  return <p className="py-4">No glider’s name holds “{search}”.</p>;
}
