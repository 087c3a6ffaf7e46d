import {
  useDeferredValue,
  useEffect,
  useLayoutEffect,
  useMemo,
  useRef,
  useState,
  type ReactNode,
} from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { useSettled } from '#client/hooks/use-settled.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { Recipe } from '../edits/plan-edits.ts';
import { copiedRow, movedRow, withoutRow } from '../edits/rows.ts';
import type { Hover } from '../hover.ts';
import { GROUP, RowGroup, type RowWords } from './row-group.tsx';
import type { RowOps } from './row-tools.tsx';
import type { FocusWish } from './focus-wish.ts';
import { useHeldFocus } from './use-held-focus.ts';

/** What every list of the drawing needs of the desk. */
export interface Desk {
  plan: Plan;
  edit: Workspace['edit'];
  undo: () => void;
  canEdit: boolean;
  issues: Workspace['issues'];
  picked: string | null;
  pick: (line: string | null) => void;
  /** g, by line */
  masses: ReadonlyMap<string, number>;
  hover: Hover;
  narrow: boolean;
  wish: FocusWish;
}

interface RowsPaneProps<T> {
  desk: Desk;
  title: string;
  /** heads of the columns of size and mass */
  sizeHead: string;
  rows: readonly T[];
  /** always the same object for one list */
  words: RowWords<T>;
  /** where a row stands in the plan, such as `items/3` */
  pathOf: (index: number) => string;
  change: (rows: (rows: T[]) => T[]) => Recipe;
  formOf: (row: T, index: number) => ReactNode;
  /** told where there are no rows */
  empty: string;
  /** the control that adds one */
  add: ReactNode;
}

/** What was taken out last; told until the plan changes again. */
interface Removed {
  name: string;
  line: string;
  before: Plan;
  after: Plan | null;
}

/** How long typing rests before what is far off follows, ms. */
const REST = 250;

/** A list whose rows are picked, opened, copied, moved and removed, with the focus always somewhere sensible. */
export function RowsPane<T extends { id: string; name: string }>(props: RowsPaneProps<T>) {
  const { desk, title, rows, words, formOf, empty, add } = props;
  const { plan, picked, narrow, hover, wish, canEdit, masses } = desk;
  const list = useRef<HTMLUListElement>(null);
  const [removed, setRemoved] = useState<Removed | null>(null);
  if (removed && removed.after === null && plan !== removed.before) setRemoved({ ...removed, after: plan });
  const ops = useOps(props, (name, line) => setRemoved({ name, line, before: plan, after: null }));
  const held = useHeldFocus(() => rows.map(words.lineOf), wish);
  useEffect(() => wish.grant(list.current));
  const restedMasses = useDeferredValue(useSettled(masses, REST));
  const wrong = desk.issues.size > 0 ? wrongLines(props) : null;

  return (
    <section aria-label={title}>
      <div className="flex items-baseline gap-x-2 border-b border-strong-rule px-2 pb-1 text-note text-graphite">
        <h2 className="caption flex-1">{title}</h2>
        <span className="shrink-0">{rows.length > 0 && props.sizeHead}</span>
        <span className="w-18 shrink-0 text-right">{rows.length > 0 && 'Mass'}</span>
      </div>
      {rows.length === 0 && <p className="px-2 py-3 text-note text-graphite">{empty}</p>}
      <ul ref={list} {...held}>
        {groupsOf(rows).map((group, g) => {
          const lines = group.map(words.lineOf);
          const at = picked === null ? -1 : lines.indexOf(picked);
          const row = group[at];
          return (
            <RowGroup
              key={g}
              rows={group}
              picked={row ? picked : null}
              form={row ? formOf(row, g * GROUP + at) : null}
              wrong={wrong && lines.some((line) => wrong.has(line)) ? wrong : null}
              first={g === 0}
              last={(g + 1) * GROUP >= rows.length}
              {...{ words, masses, restedMasses, hover, ops, narrow, canEdit }}
            />
          );
        })}
      </ul>
      <div className="flex flex-wrap items-center gap-x-3 gap-y-1 pt-2">
        {canEdit && <span data-add="">{add}</span>}
        <p role="status" className="flex min-h-row items-center gap-x-2 text-note text-graphite">
          {removed?.after === plan && (
            <>
              “{removed.name}” removed.
              <Button
                variant="plain"
                className="text-note"
                onClick={() => {
                  wish.ask(removed.line, 'row');
                  desk.undo();
                }}
              >
                Undo
              </Button>
            </>
          )}
        </p>
      </div>
    </section>
  );
}

function groupsOf<T>(rows: readonly T[]): (readonly T[])[] {
  return Array.from({ length: Math.ceil(rows.length / GROUP) }, (_, g) =>
    rows.slice(g * GROUP, (g + 1) * GROUP),
  );
}

/** Lines of the rows in which something is refused. */
function wrongLines<T>({ desk, rows, words, pathOf }: RowsPaneProps<T>): ReadonlySet<string> {
  const paths = [...desk.issues.keys()];
  const wrong = rows.filter((_, i) => paths.some((path) => path.startsWith(`${pathOf(i)}/`)));
  return new Set(wrong.map(words.lineOf));
}

/** Operations that stay the same object while what they act on changes. */
function useOps<T extends { id: string; name: string }>(
  props: RowsPaneProps<T>,
  onRemoved: (name: string, line: string) => void,
): RowOps {
  const latest = useRef({ props, onRemoved });
  useLayoutEffect(() => {
    latest.current = { props, onRemoved };
  });
  return useMemo((): RowOps => {
    const now = () => latest.current.props;
    const lineAt = (i: number) => {
      const row = now().rows[i];
      return row ? now().words.lineOf(row) : null;
    };
    return {
      pick: (line) => now().desk.pick(line),
      close: (line) => {
        now().desk.wish.ask(line, 'row');
        now().desk.pick(null);
      },
      copy: (id) => {
        const { desk, rows, change, words } = now();
        const { copy } = copiedRow(rows, id);
        if (!copy) return;
        desk.edit(
          change((all) => copiedRow(all, id).rows),
          `copy ${id}`,
        );
        desk.wish.ask(words.lineOf(copy), 'form');
        desk.pick(words.lineOf(copy));
      },
      move: (id, by) => {
        const { desk, rows, change, words } = now();
        const row = rows.find((r) => r.id === id);
        if (!row) return;
        // Moving a row takes its element out of the page for a moment, and the focus with it.
        desk.wish.ask(words.lineOf(row), by === -1 ? 'up' : 'down');
        desk.edit(
          change((all) => movedRow(all, id, by)),
          `move ${id}`,
        );
      },
      remove: (id) => {
        const { desk, rows, change } = now();
        const at = rows.findIndex((row) => row.id === id);
        const row = rows[at];
        if (!row) return;
        latest.current.onRemoved(row.name, now().words.lineOf(row));
        desk.wish.ask(lineAt(at + 1) ?? lineAt(at - 1), 'row');
        desk.pick(null);
        desk.edit(
          change((all) => withoutRow(all, id)),
          `remove ${id}`,
        );
      },
    };
  }, []);
}
