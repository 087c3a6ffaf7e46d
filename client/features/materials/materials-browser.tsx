import { useQuery } from '@tanstack/react-query';
import { useDeferredValue, useMemo, useState } from 'react';
import { QueryView } from '#client/components/query-view.tsx';
import { Button } from '#client/components/ui/button.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { useMedia } from '#client/hooks/use-media.ts';
import type { MaterialDto } from '#shared/schemas/material.ts';
import { CategoryTabs } from './category-tabs.tsx';
import { DeleteDialog } from './delete-dialog.tsx';
import { filterMaterials, type CategoryChoice } from './filter.ts';
import { MaterialCards } from './material-cards.tsx';
import { MaterialDialog } from './material-dialog.tsx';
import type { MaterialActions } from './material-menu.tsx';
import { MaterialsTable } from './materials-table.tsx';
import { materialQueries } from './queries.ts';
import { UsesDialog } from './uses-dialog.tsx';

interface MaterialsBrowserProps {
  /** null for a visitor, who only reads. */
  role: 'admin' | 'user' | null;
  gliderHref: (id: string) => string;
}

type OpenDialog =
  { kind: 'new'; from?: MaterialDto } | { kind: 'edit' | 'delete' | 'uses'; row: MaterialDto } | null;

/** The table of wood, glue, covering, finish, metal and gear, with sources. */
export function MaterialsBrowser({ role, gliderHref }: MaterialsBrowserProps) {
  const query = useQuery(materialQueries.list());
  const [dialog, setDialog] = useState<OpenDialog>(null);
  const close = () => setDialog(null);
  const actions: MaterialActions = {
    onEdit: (row) => setDialog({ kind: 'edit', row }),
    onDelete: (row) => setDialog({ kind: 'delete', row }),
    onCopy: role === null ? undefined : (from) => setDialog({ kind: 'new', from }),
    onUses: role === null ? undefined : (row) => setDialog({ kind: 'uses', row }),
  };

  return (
    <>
      <div className="flex flex-wrap items-start gap-4">
        <div className="mr-auto max-w-2xl">
          <h1 className="text-figure font-semibold">Materials</h1>
          <p className="mt-1 text-graphite">
            What wood, glue and covering weigh, how much they vary, and who says so. Strength and stiffness
            are estimates from averages; grain, knots and glue decide.
          </p>
        </div>
        {role !== null && (
          <Button variant="primary" onClick={() => setDialog({ kind: 'new' })}>
            New material
          </Button>
        )}
      </div>
      <QueryView query={query}>{(materials) => <Browse materials={materials} {...actions} />}</QueryView>
      {dialog?.kind === 'new' && (
        <MaterialDialog row={null} from={dialog.from} isAdmin={role === 'admin'} onClose={close} />
      )}
      {dialog?.kind === 'edit' && (
        <MaterialDialog row={dialog.row} isAdmin={role === 'admin'} onClose={close} />
      )}
      {dialog?.kind === 'delete' && <DeleteDialog row={dialog.row} onClose={close} gliderHref={gliderHref} />}
      {dialog?.kind === 'uses' && <UsesDialog row={dialog.row} onClose={close} gliderHref={gliderHref} />}
    </>
  );
}

function Browse({ materials, ...actions }: MaterialActions & { materials: readonly MaterialDto[] }) {
  const [search, setSearch] = useState('');
  const [choice, setChoice] = useState<CategoryChoice>('all');
  const sought = useDeferredValue(search);
  const wide = useMedia('(min-width: 64rem)');
  const found = useMemo(() => filterMaterials(materials, sought, choice), [materials, sought, choice]);
  return (
    <>
      <div className="mt-5 flex flex-wrap items-end gap-x-6 gap-y-3">
        <CategoryTabs materials={materials} choice={choice} onChoice={setChoice} />
        <div className="ml-auto w-64 max-sm:w-full">
          <TextField
            label="Search"
            type="search"
            keepRoom={false}
            value={search}
            onChange={(event) => setSearch(event.target.value)}
          />
        </div>
      </div>
      <p role="status" className="mt-3 mb-1 text-note text-graphite">
        {found.length === materials.length
          ? `${materials.length} materials`
          : `${found.length} of ${materials.length} materials`}
      </p>
      {found.length === 0 ? (
        <p className="py-4">Nothing fits. Try fewer words or another kind.</p>
      ) : wide ? (
        <MaterialsTable materials={found} {...actions} />
      ) : (
        <MaterialCards materials={found} {...actions} />
      )}
    </>
  );
}
