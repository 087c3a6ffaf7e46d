import { freshId, freshName } from '#shared/plan-start/names.ts';

/** Rows that are known by their `id`: parts, items and solids. */
interface Row {
  id: string;
}

/** The rows with one of them changed. */
export function withRow<T extends Row>(rows: readonly T[], id: string, change: (row: T) => T): T[] {
  return rows.map((row) => (row.id === id ? change(row) : row));
}

export function withoutRow<T extends Row>(rows: readonly T[], id: string): T[] {
  return rows.filter((row) => row.id !== id);
}

/** The rows with one moved by a step; at the ends it stays where it is. */
export function movedRow<T extends Row>(rows: readonly T[], id: string, by: 1 | -1): T[] {
  const from = rows.findIndex((row) => row.id === id);
  const to = from + by;
  const [row, other] = [rows[from], rows[to]];
  if (!row || !other) return [...rows];
  return rows.map((r, i) => (i === to ? row : i === from ? other : r));
}

/** The rows with a copy after the original, under an id and a name of its own. */
export function copiedRow<T extends Row & { name: string }>(
  rows: readonly T[],
  id: string,
): { rows: T[]; copy: T | null } {
  const at = rows.findIndex((row) => row.id === id);
  const original = rows[at];
  if (!original) return { rows: [...rows], copy: null };
  const copy: T = {
    ...original,
    id: freshId(
      original.id,
      rows.map((row) => row.id),
    ),
    name: freshName(
      original.name,
      rows.map((row) => row.name),
    ),
  };
  return { rows: [...rows.slice(0, at + 1), copy, ...rows.slice(at + 1)], copy };
}
