import { same } from '#client/lib/same.ts';
import type { SaveState } from '#client/lib/workspace.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { GliderDto } from '#shared/schemas/glider.ts';
import { changed, redone, startHistory, undone, type History } from './history.ts';
import { checkPlan, type PlanCheck } from './plan-check.ts';

/** What of a glider the server holds, as far as is known here. */
export type Kept = Pick<GliderDto, 'version' | 'plan' | 'updatedAt' | 'updatedBy'>;

/** Edits that were not acknowledged when the page was left. */
export interface Draft {
  version: number;
  plan: Plan;
  /** On its way when the page was left: it may have arrived. */
  sent: Plan | null;
  /** ISO time of the last edit */
  at: string;
}

/** `waiting`: will be tried again by itself; `refused`: not before something changes. */
type Phase = 'idle' | 'sending' | 'waiting' | 'refused' | 'conflict';

/** The plan on the desk, and how it stands to the one that the server holds. */
export interface Desk {
  history: History<Plan>;
  check: PlanCheck;
  /** Last plan that was valid; what the estimate is made from. */
  valid: Plan;
  base: Kept;
  phase: Phase;
  /** Sent without an answer yet. */
  sent: Plan | null;
  theirs: Kept | null;
  problem: string | null;
  /** No connection, as opposed to a server in trouble. */
  offline: boolean;
  /** The session has ended; signing in again cures it. */
  signedOut: boolean;
  /** Unsent edits were put back on opening: when they were made, and the plan they were made over. */
  restored: { at: string; over: Plan } | null;
}

export type DeskEvent =
  | { type: 'edited'; recipe: (plan: Plan) => Plan; what: string; at: number }
  | { type: 'undone' }
  | { type: 'redone' }
  | { type: 'sent' }
  | { type: 'acknowledged'; kept: Kept }
  | { type: 'failed'; passing: boolean; offline: boolean; signedOut: boolean; problem: string }
  | { type: 'outdated'; current: Kept }
  | { type: 'refreshed'; kept: Kept }
  | { type: 'keptMine' }
  | { type: 'tookTheirs'; at: number }
  | { type: 'retried' };

export function startDesk(kept: Kept, draft: Draft | null): Desk {
  const clean: Desk = {
    ...onDesk(startHistory(kept.plan), kept.plan),
    base: kept,
    phase: 'idle',
    sent: null,
    theirs: null,
    problem: null,
    offline: false,
    signedOut: false,
    restored: null,
  };
  if (draft === null || same(draft.plan, kept.plan)) return clean;
  const restored = {
    ...clean,
    ...onDesk(startHistory(draft.plan, [kept.plan]), kept.plan),
    restored: { at: draft.at, over: kept.plan },
  };
  const arrived = draft.sent !== null && sameOnceChecked(draft.sent, kept.plan);
  if (draft.version >= kept.version || arrived) return restored;
  return { ...restored, base: { ...kept, version: draft.version }, phase: 'conflict', theirs: kept };
}

/** Whether there is something that the server does not hold. */
export function isDirty({ history, base }: Desk): boolean {
  return history.present !== base.plan && !same(history.present, base.plan);
}

export function saveStateOf(desk: Desk): SaveState {
  if (desk.phase === 'conflict') return 'conflict';
  if (desk.phase === 'sending') return 'saving';
  if (!isDirty(desk)) return 'saved';
  if (!desk.check.ok) return 'invalid';
  if (desk.phase === 'waiting' && desk.offline) return 'offline';
  return 'unsaved';
}

/** Whether the present plan may be sent now. */
export function isSendable(desk: Desk): boolean {
  return desk.phase === 'idle' && desk.check.ok && isDirty(desk);
}

export function reduce(desk: Desk, event: DeskEvent): Desk {
  switch (event.type) {
    case 'edited':
      return moved(desk, changed(desk.history, event.recipe(desk.history.present), event.what, event.at));
    case 'undone':
      return moved(desk, undone(desk.history));
    case 'redone':
      return moved(desk, redone(desk.history));
    case 'sent':
      return { ...desk, phase: 'sending', sent: desk.history.present };
    case 'acknowledged':
      return settled(desk, { ...event.kept, plan: desk.sent ?? event.kept.plan });
    case 'failed': {
      const { passing, offline, signedOut, problem } = event;
      // What went into a broken line may have arrived, so it stays in `sent`.
      return {
        ...desk,
        phase: passing ? 'waiting' : 'refused',
        sent: passing ? desk.sent : null,
        offline,
        signedOut,
        problem,
      };
    }
    case 'outdated':
      // Our own save whose answer was lost is no conflict.
      if (desk.sent !== null && sameOnceChecked(desk.sent, event.current.plan)) {
        return settled(desk, { ...event.current, plan: desk.sent });
      }
      return { ...desk, phase: 'conflict', theirs: event.current, sent: null, problem: null };
    case 'refreshed':
      if (event.kept.version <= desk.base.version || desk.phase === 'sending' || isDirty(desk)) return desk;
      return settled(moved(desk, changed(desk.history, event.kept.plan, 'refreshed', 0)), event.kept);
    case 'keptMine':
      return desk.theirs === null ? desk : settled(desk, desk.theirs);
    case 'tookTheirs': {
      const { theirs } = desk;
      if (theirs === null) return desk;
      return settled(moved(desk, changed(desk.history, theirs.plan, 'take theirs', event.at)), theirs);
    }
    case 'retried':
      return desk.phase === 'waiting' || desk.phase === 'refused' ? { ...desk, phase: 'idle' } : desk;
  }
}

function onDesk(history: History<Plan>, lastValid: Plan): Pick<Desk, 'history' | 'check' | 'valid'> {
  const check = checkPlan(history.present);
  return { history, check, valid: check.ok ? history.present : lastValid };
}

function moved(desk: Desk, history: History<Plan>): Desk {
  if (history === desk.history) return desk;
  const phase = desk.phase === 'refused' ? 'idle' : desk.phase;
  return {
    ...desk,
    ...onDesk(history, desk.valid),
    phase,
    problem: phase === desk.phase ? desk.problem : null,
  };
}

function settled(desk: Desk, base: Kept): Desk {
  return {
    ...desk,
    base,
    phase: 'idle',
    sent: null,
    theirs: null,
    problem: null,
    offline: false,
    signedOut: false,
  };
}

/** The server keeps names trimmed; that makes no other plan of it. */
function sameOnceChecked(sent: Plan, kept: Plan): boolean {
  const check = checkPlan(sent);
  return same(check.ok ? check.plan : sent, kept);
}
