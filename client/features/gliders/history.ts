import { HELD } from '#client/lib/workspace.ts';

/** One change: what it was made on, and what came of it. */
export interface Step<T> {
  before: T;
  after: T;
}

/** Present state with the changes that led to it and those that were taken back. */
export interface History<T> {
  past: readonly Step<T>[];
  present: T;
  future: readonly Step<T>[];
  /** name and time (ms) of the last change, for joining quick repeats */
  last: { what: string; at: number } | null;
}

/**
 * Makes the change from one state to another on a state that something else has changed since; answers that very
 * state where nothing is left to change.
 */
export type Rebase<T> = (from: T, to: T, onto: T) => T;

/** Steps kept. */
const DEPTH = 200;
/** Repeats of one change within this time undo together, ms. */
const JOIN = 1000;

export function startHistory<T>(
  present: T,
  past: readonly Step<T>[] = [],
  future: readonly Step<T>[] = [],
): History<T> {
  return { past, present, future, last: null };
}

/** The history after a change; a quick repeat of the same change joins the one before. */
export function changed<T>(history: History<T>, present: T, what: string, at: number): History<T> {
  if (Object.is(present, history.present)) return history;
  const { last, past } = history;
  const before = past.at(-1);
  const repeats = last !== null && last.what === what && (at - last.at <= JOIN || what.startsWith(HELD));
  const joins = repeats && before !== undefined;
  const step = { before: joins ? before.before : history.present, after: present };
  return {
    past: [...(joins ? past.slice(0, -1) : past), step].slice(-DEPTH),
    present,
    future: [],
    last: { what, at },
  };
}

/** The history where the present was changed from elsewhere: that is no step, so an undo leaves it alone. */
export function overtaken<T>(history: History<T>, present: T): History<T> {
  return Object.is(present, history.present) ? history : { ...history, present, last: null };
}

/** Takes the last change back, and only that; steps that have nothing left to take back are passed over. */
export function undone<T>(history: History<T>, rebase: Rebase<T>): History<T> {
  const { past, present, future } = history;
  const step = past.at(-1);
  if (step === undefined) return history;
  const earlier = past.slice(0, -1);
  const next = moved(step.after, step.before, present, rebase);
  if (Object.is(next, present)) return undone({ ...history, past: earlier, last: null }, rebase);
  return { past: earlier, present: next, future: [{ before: next, after: present }, ...future], last: null };
}

/** Makes the last change that was taken back again. */
export function redone<T>(history: History<T>, rebase: Rebase<T>): History<T> {
  const { past, present, future } = history;
  const [step, ...later] = future;
  if (step === undefined) return history;
  const next = moved(step.before, step.after, present, rebase);
  if (Object.is(next, present)) return redone({ ...history, future: later, last: null }, rebase);
  return { past: [...past, { before: present, after: next }], present: next, future: later, last: null };
}

function moved<T>(from: T, to: T, onto: T, rebase: Rebase<T>): T {
  return Object.is(from, onto) ? to : rebase(from, to, onto);
}
