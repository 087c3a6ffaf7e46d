import { same } from '#client/lib/same.ts';
import type { SaveState } from '#client/lib/workspace.ts';
import type { PlanChange } from '#shared/core/field-changes.ts';
import type { PlanConflict } from '#shared/core/merge-fields.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { GliderDto } from '#shared/schemas/glider.ts';
import type { History } from './history.ts';
import type { PlanCheck } from './plan-check.ts';

/** What of a glider the server holds, as far as is known here. */
export type Kept = Pick<GliderDto, 'version' | 'plan' | 'updatedAt' | 'updatedBy'>;

/** Edits that were not acknowledged when the page was left. */
export interface Draft {
  version: number;
  plan: Plan;
  /** The plan of that version, to tell these edits from other people's; null where there was no room for it. */
  base: Plan | null;
  /** On its way when the page was left: it may have arrived. */
  sent: Plan | null;
  /** ISO time of the last edit */
  at: string;
}

/** `waiting`: will be tried again by itself; `refused`: not before something changes. */
export type Phase = 'idle' | 'sending' | 'waiting' | 'refused' | 'conflict';

/** What came from elsewhere and was joined with the plan on the desk. */
export interface News {
  by: string;
  changes: PlanChange[];
}

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
  /** A newer state that cannot be joined without a choice. */
  theirs: Kept | null;
  /** What has to be chosen; empty unless the phase is `conflict`. */
  conflicts: readonly PlanConflict[];
  /** What was taken in, until it has been read. */
  news: News | null;
  problem: string | null;
  /** No connection, as opposed to a server in trouble. */
  offline: boolean;
  /** The session has ended; signing in again cures it. */
  signedOut: boolean;
  /** Unsent edits were put back on opening: when they were made, and what they made of what. */
  restored: { at: string; over: Plan; plan: Plan } | null;
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
