import { same } from '#client/lib/same.ts';
import type { MergeChoice } from '#shared/core/merge-fields.ts';
import { planChanges } from '#shared/core/plan-changes.ts';
import type { Plan } from '#shared/core/plan.ts';
import { mergePlans } from '#shared/core/plan-merge.ts';
import type { Desk, Kept, News } from './desk-state.ts';
import { changed, overtaken, type History } from './history.ts';
import { checkPlan } from './plan-check.ts';

/** A change made on a plan that others have changed since; what they made of the same field stays theirs. */
export function rebased(from: Plan, to: Plan, onto: Plan): Plan {
  const { plan } = mergePlans(from, to, onto, () => 'theirs');
  return same(plan, onto) ? onto : plan;
}

/** The desk with a newer state from the server: joined with it where nothing collides, or asking where it does. */
export function met(desk: Desk, current: Kept): Desk {
  const { history, base, sent } = desk;
  // Our own save whose answer was lost is no news.
  if (sent !== null && sameOnceChecked(sent, current.plan)) return settled(desk, { ...current, plan: sent });
  const { plan, conflicts } = mergePlans(base.plan, history.present, current.plan);
  if (conflicts.length > 0) {
    return { ...desk, phase: 'conflict', theirs: current, conflicts, sent: null, problem: null };
  }
  const joined = laid(desk, overtaken(history, plan));
  return { ...settled(joined, current), news: newsOf(desk, plan, current.updatedBy) };
}

/** The desk where somebody has chosen; it goes on asking while a choice is missing. */
export function decided(desk: Desk, choices: ReadonlyMap<string, MergeChoice>, at: number): Desk {
  const { history, base, theirs, conflicts } = desk;
  if (theirs === null || !conflicts.every(({ id }) => choices.has(id))) return desk;
  const [mine, joined] = [() => 'mine' as const, ({ id }: { id: string }) => choices.get(id) ?? 'mine'].map(
    (settle) => mergePlans(base.plan, history.present, theirs.plan, settle).plan,
  );
  if (!mine || !joined) return desk;
  // What was given up is a step of its own, so that an undo brings it back and leaves the rest of theirs.
  const before = overtaken(history, mine);
  const after = same(mine, joined) ? before : changed(before, joined, 'choose', at);
  return { ...settled(laid(desk, after), theirs), news: newsOf(desk, mine, theirs.updatedBy) };
}

/** What came in over what was there, beside what came in before and has not been read. */
function newsOf({ history, news }: Desk, plan: Plan, by: string): News | null {
  const changes = planChanges(history.present, plan);
  if (changes.length === 0) return news;
  return { by, changes: news?.by === by ? [...news.changes, ...changes] : changes };
}

/** Another plan on the desk: checked, and the last valid one kept for the figures. */
export function laid(desk: Desk, history: History<Plan>): Desk {
  const check = checkPlan(history.present);
  return { ...desk, history, check, valid: check.ok ? history.present : desk.valid };
}

/** Nothing on its way and nothing in question. */
export function settled(desk: Desk, base: Kept): Desk {
  return {
    ...desk,
    base,
    phase: 'idle',
    sent: null,
    theirs: null,
    conflicts: [],
    problem: null,
    offline: false,
    signedOut: false,
  };
}

/** The server keeps names trimmed; that makes no other plan of it. */
export function sameOnceChecked(sent: Plan, kept: Plan): boolean {
  const check = checkPlan(sent);
  return same(check.ok ? check.plan : sent, kept);
}
