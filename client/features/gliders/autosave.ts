import { same } from '#client/lib/same.ts';
import type { MergeChoice } from '#shared/core/merge-fields.ts';
import type { Plan } from '#shared/core/plan.ts';
import { decided, laid, met, rebased, sameOnceChecked, settled } from './desk-merge.ts';
import type { Desk, Draft, Kept } from './desk-state.ts';
import { changed, redone, startHistory, undone, type History } from './history.ts';
import type { Trail } from './history-shelf.ts';
import { checkPlan } from './plan-check.ts';

export type DeskEvent =
  | { type: 'edited'; recipe: (plan: Plan) => Plan; what: string; at: number }
  | { type: 'undone' }
  | { type: 'redone' }
  | { type: 'sent' }
  | { type: 'acknowledged'; kept: Kept }
  | { type: 'failed'; passing: boolean; offline: boolean; signedOut: boolean; problem: string }
  | { type: 'outdated'; current: Kept }
  | { type: 'refreshed'; kept: Kept }
  | { type: 'decided'; choices: ReadonlyMap<string, MergeChoice>; at: number }
  | { type: 'tookTheirs'; at: number }
  | { type: 'broughtBack'; kept: Kept; at: number }
  | { type: 'newsRead' }
  | { type: 'retried' };

const BLANK: Plan = { version: 1, name: '', materials: {}, surfaces: [], items: [], solids: [] };

/** Lays a glider on the desk, with the edits that were not sent and the steps that can be taken back. */
export function startDesk(kept: Kept, draft: Draft | null, trail: Trail | null = null): Desk {
  const clean: Desk = {
    history: historyOf(kept.plan, trail, []),
    check: checkPlan(kept.plan),
    valid: kept.plan,
    base: kept,
    phase: 'idle',
    sent: null,
    theirs: null,
    conflicts: [],
    news: null,
    problem: null,
    offline: false,
    signedOut: false,
    restored: null,
  };
  if (draft === null || same(draft.plan, kept.plan)) return clean;
  const arrived = draft.sent !== null && sameOnceChecked(draft.sent, kept.plan);
  const current = draft.version >= kept.version || arrived;
  // Without what the edits were made on, whatever differs is asked for.
  const over = current ? kept.plan : (draft.base ?? BLANK);
  const step = { before: over, after: draft.plan };
  const restored: Desk = {
    ...laid(clean, historyOf(draft.plan, trail, [step])),
    base: current ? kept : { ...kept, version: draft.version, plan: over },
    restored: { at: draft.at, over, plan: draft.plan },
  };
  return current ? restored : met(restored, kept);
}

/** The steps of this window, where there are any, under what now lies on the desk. */
function historyOf(present: Plan, trail: Trail | null, otherwise: Trail['past']): History<Plan> {
  if (trail === null) return startHistory(present, otherwise);
  return startHistory(same(trail.present, present) ? trail.present : present, trail.past, trail.future);
}

export function reduce(desk: Desk, event: DeskEvent): Desk {
  switch (event.type) {
    case 'edited':
      return moved(desk, changed(desk.history, event.recipe(desk.history.present), event.what, event.at));
    case 'undone':
      return moved(desk, undone(desk.history, rebased));
    case 'redone':
      return moved(desk, redone(desk.history, rebased));
    case 'sent':
      return { ...desk, phase: 'sending', sent: desk.history.present };
    case 'acknowledged':
      return settled(desk, { ...event.kept, plan: desk.sent ?? event.kept.plan });
    case 'failed': {
      const { passing, offline, signedOut, problem } = event;
      // What went into a broken line may have arrived, so it stays in `sent`.
      const sent = passing ? desk.sent : null;
      return { ...desk, phase: passing ? 'waiting' : 'refused', sent, offline, signedOut, problem };
    }
    case 'outdated':
      return met(desk, event.current);
    case 'refreshed': {
      const newest = desk.theirs ?? desk.base;
      // A save on its way brings its own answer.
      if (event.kept.version <= newest.version || desk.phase === 'sending') return desk;
      return met(desk, event.kept);
    }
    case 'decided':
      return decided(desk, event.choices, event.at);
    case 'tookTheirs': {
      const { theirs } = desk;
      if (theirs === null) return desk;
      return settled(laid(desk, changed(desk.history, theirs.plan, 'take theirs', event.at)), theirs);
    }
    case 'broughtBack': {
      // What was typed while the answer was on its way stays on top of it.
      const plan = rebased(desk.base.plan, event.kept.plan, desk.history.present);
      return settled(laid(desk, changed(desk.history, plan, 'bring back', event.at)), event.kept);
    }
    case 'newsRead':
      return desk.news === null ? desk : { ...desk, news: null };
    case 'retried':
      return desk.phase === 'waiting' || desk.phase === 'refused' ? { ...desk, phase: 'idle' } : desk;
  }
}

/** Another plan by this person's hand. */
function moved(desk: Desk, history: History<Plan>): Desk {
  if (history === desk.history) return desk;
  const next = laid(desk, history);
  // An edit may answer the question, or be the first to raise it.
  if (desk.theirs !== null) return met(next, desk.theirs);
  return desk.phase === 'refused' ? { ...next, phase: 'idle', problem: null } : next;
}
