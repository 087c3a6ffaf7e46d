import { useMemo, useState, type ReactNode } from 'react';
import { useNear } from '#client/hooks/use-near.ts';
import type { Hover } from '../hover.ts';
import { ListRow } from './list-row.tsx';
import type { RowOps } from './row-tools.tsx';

/** What the rows of a list say of themselves. Always the same object for one list. */
export interface RowWords<T> {
  /** id of a row's line on the balance sheet */
  lineOf: (row: T) => string;
  noteOf?: (row: T) => string;
  sizeOf: (row: T) => string;
}

interface RowGroupProps<T> {
  rows: readonly T[];
  words: RowWords<T>;
  /** g, by line: of now, and of when typing last rested */
  masses: ReadonlyMap<string, number>;
  restedMasses: ReadonlyMap<string, number>;
  /** the picked line, if it is one of these */
  picked: string | null;
  form: ReactNode;
  /** lines in which something is refused, if any of these is */
  wrong: ReadonlySet<string> | null;
  /** the list begins or ends with these */
  first: boolean;
  last: boolean;
  hover: Hover;
  ops: RowOps;
  narrow: boolean;
  canEdit: boolean;
}

type Named = { id: string; name: string };

/** Rows that are shown together. */
export const GROUP = 12;
/** Taller than a group with an open form, px. */
const MARGIN = 1200;

/** A stretch of a list. Far from what is looked at its masses wait until the builder's hands rest. */
export function RowGroup<T extends Named>(props: RowGroupProps<T>) {
  const { words, picked, form, wrong, first, last, hover, ops, narrow, canEdit } = props;
  const [ref, near] = useNear<HTMLLIElement>(props.rows[0]?.id ?? '', MARGIN);
  const masses = near ? props.masses : props.restedMasses;
  const rows = useSameRows(props.rows);
  // The very elements of before are not rendered again.
  return useMemo(
    () =>
      rows.map((row, i) => {
        const line = words.lineOf(row);
        return (
          <ListRow
            key={row.id}
            rowRef={i === 0 ? ref : undefined}
            id={row.id}
            line={line}
            name={row.name}
            note={words.noteOf?.(row) ?? ''}
            size={words.sizeOf(row)}
            mass={masses.get(line)}
            picked={picked === line}
            first={first && i === 0}
            last={last && i === rows.length - 1}
            wrong={wrong?.has(line) ?? false}
            form={picked === line ? form : null}
            {...{ hover, ops, narrow, canEdit }}
          />
        );
      }),
    [rows, words, masses, picked, form, wrong, first, last, hover, ops, narrow, canEdit, ref],
  );
}

/** The list of before while it holds the very same rows. */
function useSameRows<T>(rows: readonly T[]): readonly T[] {
  const [kept, setKept] = useState(rows);
  if (kept === rows) return kept;
  if (kept.length === rows.length && kept.every((row, i) => row === rows[i])) return kept;
  setKept(rows);
  return rows;
}
