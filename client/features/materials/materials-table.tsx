import { useTable, type Header } from '@tanstack/react-table';
import { useState, type ReactNode } from 'react';
import { RowTh, Table, Td, Th } from '#client/components/ui/table.tsx';
import { cn } from '#client/lib/cn.ts';
import { useUnits } from '#client/lib/units.ts';
import type { MaterialDto } from '#shared/schemas/material.ts';
import { columns, features, FIGURES, figureText } from './columns.tsx';
import { MaterialMenu, type MaterialActions } from './material-menu.tsx';
import { Swatch } from './swatch.tsx';
import { categoryWord } from './words.ts';

interface MaterialsTableProps extends MaterialActions {
  materials: MaterialDto[];
}

/** Every material with every figure; a press on a name opens where the figures come from. */
export function MaterialsTable({ materials, ...actions }: MaterialsTableProps) {
  const units = useUnits();
  const [open, setOpen] = useState<ReadonlySet<string>>(new Set());
  const table = useTable({
    features,
    columns,
    data: materials,
    enableSortingRemoval: false,
    initialState: { sorting: [{ id: 'name', desc: false }] },
    getRowId: (row) => row.id,
  });
  const headers = new Map(table.getFlatHeaders().map((header) => [header.column.id, header]));
  const toggle = (id: string) => {
    const next = new Set(open);
    if (!next.delete(id)) next.add(id);
    setOpen(next);
  };

  return (
    <Table caption="Materials" className="text-note">
      <thead>
        <tr>
          <SortTh header={headers.get('name')}>Material</SortTh>
          <SortTh header={headers.get('category')}>Kind</SortTh>
          {FIGURES.map((figure) => (
            <SortTh
              key={figure.id}
              header={headers.get(figure.id)}
              numeric
              unit={units.label(figure.quantity)}
            >
              {figure.label}
            </SortTh>
          ))}
          <SortTh header={headers.get('basis')}>Source</SortTh>
          <SortTh header={headers.get('usedBy')} numeric>
            Used by
          </SortTh>
          <Th>
            <span className="sr-only">Actions</span>
          </Th>
        </tr>
      </thead>
      <tbody>
        {table.getRowModel().rows.map(({ original: row }) => (
          <MaterialRow
            key={row.id}
            row={row}
            open={open.has(row.id)}
            onToggle={() => toggle(row.id)}
            {...actions}
          />
        ))}
      </tbody>
    </Table>
  );
}

interface SortThProps {
  header: Header<typeof features, MaterialDto> | undefined;
  numeric?: boolean;
  unit?: string;
  children: ReactNode;
}

function SortTh({ header, numeric = false, unit, children }: SortThProps) {
  const sorted = header?.column.getIsSorted() ?? false;
  return (
    <Th
      numeric={numeric}
      aria-sort={sorted === false ? undefined : sorted === 'asc' ? 'ascending' : 'descending'}
    >
      <button
        type="button"
        onClick={() => header?.column.toggleSorting()}
        className={cn(
          'inline-flex min-h-row items-center gap-1 font-semibold whitespace-nowrap hover:text-ink',
          numeric && 'flex-row-reverse',
          sorted && 'text-pencil',
        )}
      >
        <span>
          {children}
          {unit && <span className="ml-1 font-normal">{unit}</span>}
        </span>
        <span aria-hidden="true" className="w-2 text-[0.625rem]">
          {sorted === 'asc' ? '▲' : sorted === 'desc' ? '▼' : ''}
        </span>
      </button>
    </Th>
  );
}

interface MaterialRowProps extends MaterialActions {
  row: MaterialDto;
  open: boolean;
  onToggle: () => void;
}

function MaterialRow({ row, open, onToggle, ...actions }: MaterialRowProps) {
  const units = useUnits();
  const detailId = `material-${row.id}`;
  const edge = open ? 'border-b-0' : undefined;
  return (
    <>
      <tr className={cn(open && 'bg-ink-wash')}>
        <RowTh className={cn('min-w-52', edge)}>
          <button
            type="button"
            aria-expanded={open}
            aria-controls={open ? detailId : undefined}
            onClick={onToggle}
            className="flex min-h-row items-center gap-2.5 text-left text-body hover:text-ink"
          >
            <Swatch material={row} />
            <span>
              {row.name}
              {!row.shared && <span className="ml-1.5 text-note text-graphite">your own</span>}
            </span>
          </button>
        </RowTh>
        <Td className={cn('whitespace-nowrap text-graphite', edge)}>{categoryWord(row.category)}</Td>
        {FIGURES.map((figure) => (
          <Td
            key={figure.id}
            numeric
            className={cn('text-body', row[figure.id] === null && 'text-graphite', edge)}
          >
            {figureText(row, figure, units)}
          </Td>
        ))}
        <Td className={cn('max-w-56 min-w-40', edge)}>
          <span className="block truncate">
            {row.basis}
            <span className="text-graphite"> · {row.source}</span>
          </span>
        </Td>
        <Td numeric className={edge}>
          <UsedBy row={row} {...actions} />
        </Td>
        <Td className={cn('w-10 text-right', edge)}>
          <MaterialMenu row={row} {...actions} />
        </Td>
      </tr>
      {open && (
        <tr className="bg-ink-wash">
          <Td colSpan={FIGURES.length + 5} id={detailId} className="h-auto pt-0 pr-6 pb-3 pl-[2.9rem]!">
            <MaterialNotes row={row} />
          </Td>
        </tr>
      )}
    </>
  );
}

/** The long texts of a row. */
export function MaterialNotes({ row }: { row: MaterialDto }) {
  return (
    <div className="max-w-3xl text-note">
      {row.form && <p>{row.form}</p>}
      <p className="mt-1 text-graphite">Source: {row.source}</p>
    </div>
  );
}

/** In how many gliders; a press says which. */
export function UsedBy({ row, onUses }: Pick<MaterialRowProps, 'row' | 'onUses'>) {
  if (row.usedBy === 0) return <span className="text-graphite">0</span>;
  if (!onUses) return <>{row.usedBy}</>;
  return (
    <button
      type="button"
      onClick={() => onUses(row)}
      aria-label={`${row.name} is used by ${row.usedBy}: show where`}
      className="link min-h-row min-w-8 text-right max-lg:min-w-11 max-lg:text-left"
    >
      {row.usedBy}
    </button>
  );
}
