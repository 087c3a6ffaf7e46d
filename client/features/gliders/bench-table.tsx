import { memo, useCallback, useRef, useEffect, type ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { Amount } from '#client/components/ui/amount.tsx';
import { RowTh, Table, Td, Th } from '#client/components/ui/table.tsx';
import { WhenNear } from '#client/components/when-near.tsx';
import { cn } from '#client/lib/cn.ts';
import { formatMoment } from '#client/lib/moments.ts';
import type { GliderOrder, GliderSummaryDto } from '#shared/schemas/glider.ts';
import { sortedBy, type BenchView } from './bench-view.ts';
import type { BenchLinks } from './bench.tsx';
import { GliderMenu } from './glider-menu.tsx';
import { halfSpanOf, OutlinePicture } from './outline-picture.tsx';

interface BenchTableProps extends BenchLinks {
  gliders: readonly GliderSummaryDto[];
  view: BenchView;
  onView: (view: BenchView) => void;
  /** ids of what is ticked; null while nothing is to be */
  selected: ReadonlySet<string> | null;
  onSelected: (selected: ReadonlySet<string>) => void;
}

const ROLE_WORDS = { owner: '', builder: 'you build', pilot: 'you fly', reader: 'you read' } as const;
const PICTURE = 'h-11 w-40 max-sm:h-7 max-sm:w-[4.5rem]';
const BOX = 'size-4.5 accent-ink pointer-coarse:size-6';

/** The gliders as ruled rows, each with its wing drawn; on the phone the figures stand under the name. */
export function BenchTable({ gliders, view, onView, selected, onSelected, ...links }: BenchTableProps) {
  const widest = Math.max(1, ...gliders.map(({ outline }) => halfSpanOf(outline)));
  const latest = useRef({ selected, onSelected });
  useEffect(() => {
    latest.current = { selected, onSelected };
  });
  // The same for ever, so that a tick draws one row anew and not all of them.
  const tick = useCallback((id: string, ticked: boolean) => {
    const next = new Set(latest.current.selected);
    if (ticked) next.add(id);
    else next.delete(id);
    latest.current.onSelected(next);
  }, []);
  const all = selected !== null && gliders.every(({ id }) => selected.has(id));
  const heading = (sort: GliderOrder, label: string) => (
    <SortHeading
      view={view}
      sort={sort}
      onSort={() => onView(sortedBy(view, sort))}
      numeric={sort !== 'name'}
    >
      {label}
    </SortHeading>
  );
  return (
    <Table caption="Gliders on the bench" className="table-fixed">
      <thead className={selected === null ? 'max-sm:sr-only' : undefined}>
        <tr>
          {selected !== null && (
            <Th className="w-9">
              <input
                type="checkbox"
                aria-label="Select all that are shown"
                checked={all}
                onChange={() => onSelected(new Set(all ? [] : gliders.map(({ id }) => id)))}
                className={cn(BOX, 'block')}
              />
            </Th>
          )}
          <Th className="w-44 max-sm:sr-only">
            <span className="sr-only">Picture</span>
          </Th>
          <SortTh view={view} sort="name">
            {heading('name', 'Glider')}
          </SortTh>
          <SortTh numeric view={view} sort="mass" className="w-28 max-sm:sr-only">
            {heading('mass', 'Mass')}
          </SortTh>
          <Th numeric className="w-32 max-sm:sr-only">
            Balance
          </Th>
          <Th numeric className="w-32 max-sm:sr-only">
            Wing loading
          </Th>
          <SortTh numeric view={view} sort="changed" className="w-40 max-sm:sr-only">
            {heading('changed', 'Last change')}
          </SortTh>
          <Th className="w-14 max-sm:sr-only">
            <span className="sr-only">Actions</span>
          </Th>
        </tr>
      </thead>
      <tbody className="max-sm:border-t max-sm:border-strong-rule">
        {gliders.map((glider) => (
          <BenchRow
            key={glider.id}
            glider={glider}
            widest={widest}
            href={links.hrefOf(glider.id)}
            sharingHref={links.sharingHrefOf(glider.id)}
            ticked={selected === null ? null : selected.has(glider.id)}
            onTick={tick}
          />
        ))}
      </tbody>
    </Table>
  );
}

interface SortThProps {
  view: BenchView;
  sort: GliderOrder;
  numeric?: boolean;
  className?: string;
  children: ReactNode;
}

function SortTh({ view, sort, numeric = false, className, children }: SortThProps) {
  const way = view.direction === 'up' ? 'ascending' : 'descending';
  return (
    <Th numeric={numeric} className={className} aria-sort={view.sort === sort ? way : undefined}>
      {children}
    </Th>
  );
}

interface SortHeadingProps {
  view: BenchView;
  sort: GliderOrder;
  onSort: () => void;
  /** the mark stands before the word, so that the word ends with the figures */
  numeric: boolean;
  children: ReactNode;
}

function SortHeading({ view, sort, onSort, numeric, children }: SortHeadingProps) {
  const sorted = view.sort === sort;
  return (
    <button
      type="button"
      onClick={onSort}
      className={cn(
        'inline-flex min-h-row items-center gap-1 font-semibold whitespace-nowrap hover:text-ink',
        numeric && 'flex-row-reverse',
        sorted && 'text-pencil',
      )}
    >
      {children}
      <span aria-hidden="true" className="w-2 text-[0.625rem]">
        {sorted ? (view.direction === 'up' ? '▲' : '▼') : ''}
      </span>
    </button>
  );
}

interface BenchRowProps {
  glider: GliderSummaryDto;
  /** half span of the largest, mm: the pictures are to one scale */
  widest: number;
  href: string;
  sharingHref: string;
  /** null while nothing is to be ticked */
  ticked: boolean | null;
  onTick: (id: string, ticked: boolean) => void;
}

const BenchRow = memo(function BenchRow(props: BenchRowProps) {
  const { glider, widest, href, sharingHref, ticked, onTick } = props;
  const { id, name, figures, outline, role, ownerName, updatedAt } = glider;
  const mass = <Amount value={figures.mass} quantity="mass" />;
  const balance = <Amount value={figures.percentMac} quantity="percentMac" of="MAC" />;
  const loading = <Amount value={figures.wingLoading} quantity="loading" />;
  const moment = <time dateTime={updatedAt}>{formatMoment(updatedAt)}</time>;
  return (
    <tr className={cn('group relative hover:bg-ink-wash', ticked && 'bg-ink-wash')}>
      {ticked !== null && (
        <Td className="relative z-1 w-9">
          <label className="grid min-h-row min-w-row cursor-pointer place-items-center sm:-ml-2">
            <span className="sr-only">Select {name}</span>
            <input
              type="checkbox"
              checked={ticked}
              onChange={(event) => onTick(id, event.target.checked)}
              className={BOX}
            />
          </label>
        </Td>
      )}
      <Td className="h-18! w-44 max-sm:w-20 max-sm:pt-4 max-sm:align-top">
        <WhenNear before={<div className={PICTURE} />}>
          <OutlinePicture outline={outline} widest={widest} className={PICTURE} />
        </WhenNear>
      </Td>
      <RowTh className="max-sm:py-3">
        <Link
          to={href}
          className="font-semibold text-pencil no-underline group-hover:text-ink after:absolute after:inset-0"
        >
          {name}
        </Link>
        {role !== 'owner' && (
          <span className="block text-note text-graphite">
            {ownerName}’s, {ROLE_WORDS[role]}
          </span>
        )}
        <span className="flex flex-wrap gap-x-3 text-note sm:hidden">
          {mass}
          {balance}
          {loading}
          <span className="text-graphite">{moment}</span>
        </span>
      </RowTh>
      <Td numeric className="max-sm:hidden">
        {mass}
      </Td>
      <Td numeric className="max-sm:hidden">
        {balance}
      </Td>
      <Td numeric className="max-sm:hidden">
        {loading}
      </Td>
      <Td numeric className="text-graphite max-sm:hidden">
        {moment}
      </Td>
      <Td className="relative z-1 w-12 text-right">
        <GliderMenu glider={glider} sharingHref={sharingHref} />
      </Td>
    </tr>
  );
});
