import { useInfiniteQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect, useMemo, useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { QueryView } from '#client/components/query-view.tsx';
import { SectionBoundary } from '#client/components/section-boundary.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { formatMoment } from '#client/lib/moments.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import type { GliderSaveDto } from '#shared/schemas/glider-save.ts';
import type { GliderDto } from '#shared/schemas/glider.ts';
import { CompareView } from './compare/compare-view.tsx';
import type { Side } from './compare/use-stood.ts';
import { Headline } from './headline.tsx';
import { restoreSave } from './mutations.ts';
import { PhotoSection } from './photos/photo-section.tsx';
import { logQueries } from './queries.ts';
import { NameDialog } from './saves/name-dialog.tsx';
import { groupSaves } from './saves/save-groups.ts';
import { SaveList } from './saves/save-list.tsx';

interface LogPlaceProps {
  workspace: Workspace;
  glider: GliderDto;
  /** Saves what waits, then lays what the restore answers on the desk; rejects when either does not work. */
  bringBack: (restore: (version: number) => Promise<GliderDto>) => Promise<void>;
}

/** Who changed what and when: every saved state, two of them beside each other, and photos. */
export function LogPlace({ workspace, glider, bringBack }: LogPlaceProps) {
  const { id, can } = glider;
  const query = useInfiniteQuery(logQueries.saves(id));
  const [params, setParams] = useSearchParams();
  const [naming, setNaming] = useState<GliderSaveDto | null>(null);
  const say = useToast();
  useFreshLog(id, workspace.savedAt);

  const [from, to] = [sideOf(params.get('from')), sideOf(params.get('to'))];
  const compare = (one: Side | null, other: Side | null) =>
    setParams(one === null || other === null ? {} : { from: String(one), to: String(other) });
  const restore = (version: number, when: string) =>
    bringBack((over) => restoreSave(id, version, over)).then(
      () => say(`The state of ${when} is back as a new save. Undo takes it away again.`),
      (error: Error) => say(`Not brought back. ${error.message}`),
    );

  return (
    <div className="px-4 pt-5 pb-8 sm:px-7">
      <QueryView query={query}>
        {(saves) =>
          from !== null && to !== null ? (
            <CompareView
              workspace={workspace}
              gliderId={id}
              saves={saves}
              from={from}
              to={to}
              onChange={compare}
              onClose={() => compare(null, null)}
              onBringBack={
                workspace.canEdit
                  ? (version) =>
                      void restore(version, momentOf(saves, version)).then(() => compare(null, null))
                  : undefined
              }
            />
          ) : (
            <Log
              workspace={workspace}
              glider={glider}
              saves={saves}
              query={query}
              onCompare={compare}
              onBringBack={
                workspace.canEdit
                  ? ({ version, savedAt }) => void restore(version, formatMoment(savedAt))
                  : undefined
              }
              onName={can.nameSave ? setNaming : undefined}
            />
          )
        }
      </QueryView>
      <NameDialog gliderId={id} save={naming} onClose={() => setNaming(null)} />
    </div>
  );
}

interface LogProps {
  workspace: Workspace;
  glider: GliderDto;
  saves: readonly GliderSaveDto[];
  query: { hasNextPage: boolean; fetchNextPage: () => unknown; isFetchingNextPage: boolean };
  onCompare: (from: Side, to: Side) => void;
  onBringBack: ((save: GliderSaveDto) => void) | undefined;
  onName: ((save: GliderSaveDto) => void) | undefined;
}

function Log({ workspace, glider, saves, query, onCompare, onBringBack, onName }: LogProps) {
  const groups = useMemo(() => groupSaves(saves), [saves]);
  const { materials } = workspace.plan;
  return (
    <>
      <Headline groups={groups} materials={materials} />
      {workspace.saveState === 'offline' && (
        <p className="mt-1 text-note text-ochre">
          <span aria-hidden="true">◆ </span>
          No connection: what is edited now is listed here once it is sent.
        </p>
      )}
      <div className="mt-6 grid grid-cols-1 items-start gap-x-12 gap-y-8 lg:grid-cols-[minmax(0,7fr)_minmax(0,4fr)]">
        <SaveList
          groups={groups}
          materials={materials}
          actions={{ onCompare, onBringBack, onName }}
          hasMore={query.hasNextPage}
          onMore={() => void query.fetchNextPage()}
          pending={query.isFetchingNextPage}
        />
        <SectionBoundary>
          <PhotoSection gliderId={glider.id} can={glider.can} />
        </SectionBoundary>
      </div>
    </>
  );
}

/** Every acknowledged save is a new row. */
function useFreshLog(gliderId: string, savedAt: string | undefined): void {
  const client = useQueryClient();
  useEffect(() => {
    void client.invalidateQueries({ queryKey: logQueries.saves(gliderId).queryKey });
  }, [client, gliderId, savedAt]);
}

function sideOf(text: string | null): Side | null {
  if (text === 'now') return 'now';
  return text !== null && /^[1-9]\d{0,8}$/.test(text) ? Number(text) : null;
}

function momentOf(saves: readonly GliderSaveDto[], version: number): string {
  const save = saves.find((one) => one.version === version);
  return save ? formatMoment(save.savedAt) : 'that save';
}
