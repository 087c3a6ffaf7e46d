/** Present state with what came before and what was taken back. */
export interface History<T> {
  past: readonly T[];
  present: T;
  future: readonly T[];
  /** name and time (ms) of the last change, for joining quick repeats */
  last: { what: string; at: number } | null;
}

/** Steps kept. */
const DEPTH = 200;
/** Repeats of one change within this time undo together, ms. */
const JOIN = 1000;

export function startHistory<T>(present: T, past: readonly T[] = []): History<T> {
  return { past, present, future: [], last: null };
}

/** The history after a change; a quick repeat of the same change joins the one before. */
export function changed<T>(history: History<T>, present: T, what: string, at: number): History<T> {
  if (Object.is(present, history.present)) return history;
  const { last } = history;
  const joins = last !== null && last.what === what && at - last.at <= JOIN && history.past.length > 0;
  const past = joins ? history.past : [...history.past, history.present].slice(-DEPTH);
  return { past, present, future: [], last: { what, at } };
}

export function undone<T>(history: History<T>): History<T> {
  const present = history.past.at(-1);
  if (present === undefined) return history;
  return {
    past: history.past.slice(0, -1),
    present,
    future: [history.present, ...history.future],
    last: null,
  };
}

export function redone<T>(history: History<T>): History<T> {
  const [present, ...future] = history.future;
  if (present === undefined) return history;
  return { past: [...history.past, history.present], present, future, last: null };
}
