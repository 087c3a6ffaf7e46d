import { lazy, Suspense, useMemo, useRef, useState } from 'react';
import { useToast } from '#client/components/ui/toast.tsx';
import { useMedia } from '#client/hooks/use-media.ts';
import { useValidPlan } from '#client/hooks/use-valid-plan.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import type { SurfaceRole } from '#shared/core/plan.ts';
import { newSurface } from './edits/new-rows.ts';
import { Fold } from './fold.tsx';
import { FlightForm } from './forms/flight-form.tsx';
import { Headline, NameField } from './headline.tsx';
import { Hover } from './hover.ts';
import { FocusWish } from './lists/focus-wish.ts';
import { IndexTabs } from './lists/index-tabs.tsx';
import { ItemsPane } from './lists/items-pane.tsx';
import type { Desk } from './lists/rows-pane.tsx';
import { SolidsPane } from './lists/solids-pane.tsx';
import { SurfacePane } from './lists/surface-pane.tsx';
import { useMaterialTable } from '#client/hooks/use-material-table.ts';
import { NoticesList } from './notices-list.tsx';
import { Views } from './views.tsx';
import { useDrawingKeys } from './use-drawing-keys.ts';
import { useLooking } from './use-looking.ts';
import { usePlace } from './use-place.ts';

const PrintDialog = lazy(async () => ({
  default: (await import('./print/print-dialog.tsx')).PrintDialog,
}));

/** The plan as it is drawn: what it is made of on the left, the drawing that follows every letter on the right. */
export function DrawingPlace({ workspace }: { workspace: Workspace }) {
  const { plan, result, edit, undo, canEdit, issues, selected, select } = workspace;
  const valid = useValidPlan(workspace);
  const table = useMaterialTable(workspace.kind);
  const narrow = !useMedia('(min-width: 64rem)');
  const [hover] = useState(() => new Hover());
  const [wish] = useState(() => new FocusWish());
  const masses = useMemo(() => new Map(result.lines.map(({ id, mass }) => [id, mass])), [result]);
  const { tab, setTab, station, setStation } = usePlace(plan, selected);
  const desk: Desk = {
    plan,
    edit,
    undo,
    canEdit,
    issues,
    masses,
    hover,
    wish,
    narrow,
    picked: selected,
    pick: select,
  };
  const surface = tab.kind === 'surface' ? plan.surfaces[tab.index] : undefined;
  const addSurface = (role: SurfaceRole) => {
    select(null);
    setTab({ kind: 'surface', index: plan.surfaces.length });
    edit((p) => ({ ...p, surfaces: [...p.surfaces, newSurface(p, role)] }), `add a ${role}`);
  };

  const root = useRef<HTMLDivElement>(null);
  const looking = useLooking();
  const [printing, setPrinting] = useState(false);
  const print = () => setPrinting(true);
  const picking = { picked: selected, pick: select };
  useDrawingKeys({ root, plan, tab, wish, looking, station, setStation, print, ...picking });

  const nav = useRef<HTMLElement>(null);
  const say = useToast();
  const surfaceRemoved = (key: string, index: number) => {
    setTab({ kind: 'surface', index: Math.max(0, index - 1) });
    say(`The ${key} was removed. Undo brings it back.`);
    // The pressed button has gone with its surface.
    setTimeout(() => nav.current?.querySelector<HTMLElement>('[aria-current]')?.focus());
  };

  const list = (
    <div className="min-w-0">
      <IndexTabs
        plan={plan}
        tab={tab}
        onTab={(next) => {
          select(null);
          setTab(next);
        }}
        canEdit={canEdit}
        onAdd={addSurface}
        navRef={nav}
      />
      <div className="mt-4">
        {tab.kind === 'surface' && surface && (
          <SurfacePane
            key={tab.index}
            desk={desk}
            surface={surface}
            index={tab.index}
            table={table}
            onRemoved={() => surfaceRemoved(surface.key, tab.index)}
          />
        )}
        {tab.kind === 'solids' && <SolidsPane desk={desk} table={table} />}
        {tab.kind === 'items' && <ItemsPane desk={desk} />}
      </div>
      <Fold
        summary={narrow ? 'Name, wanted balance and flight' : 'Wanted balance and flight'}
        className="mt-4 border-t border-rule px-2 pt-1"
      >
        <div className="grid gap-y-3 pt-1">
          {narrow && <NameField {...{ plan, edit, canEdit, issues }} />}
          <FlightForm {...{ plan, edit, issues, canEdit }} />
        </div>
      </Fold>
    </div>
  );
  const views = (
    <Views
      looking={looking}
      onPrint={print}
      plan={valid}
      stale={valid !== plan}
      result={result}
      tab={tab}
      station={station}
      onStation={setStation}
      picked={selected}
      onPick={select}
      edit={canEdit ? edit : null}
      undo={undo}
      hover={hover}
      narrow={narrow}
    />
  );
  const notices = valid && <NoticesList notices={result.notices} plan={valid} onPick={select} />;

  return (
    <div ref={root} className="flex flex-1 flex-col">
      <div className="px-4 pt-5 pb-4 sm:px-7">
        <Headline {...{ plan, result, edit, canEdit, issues, narrow }} />
      </div>
      {narrow ? (
        <div className="border-t border-rule px-4 pb-10">
          {views}
          <div className="py-3">{notices}</div>
          {list}
        </div>
      ) : (
        <div className="grid flex-1 grid-cols-[26rem_minmax(0,1fr)] border-t border-rule">
          <div className="border-r border-rule px-5 py-4">{list}</div>
          <div className="min-w-0 px-6 py-4">
            <div className="sticky top-3 grid grid-cols-[minmax(0,1fr)] gap-y-4">
              {views}
              {notices}
            </div>
          </div>
        </div>
      )}
      {printing && valid && (
        <Suspense>
          <PrintDialog
            plan={valid}
            surface={tab.kind === 'surface' ? (valid.surfaces[tab.index] ?? null) : null}
            station={station}
            looking={looking}
            balance={result.balance.x}
            onClose={() => setPrinting(false)}
          />
        </Suspense>
      )}
    </div>
  );
}
