import type { Plan } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import type { GliderDto } from '#shared/schemas/glider.ts';

/** `unsaved`: waits for its turn or for a cure; `offline`: will be sent when the connection is back. */
export type SaveState = 'saved' | 'saving' | 'unsaved' | 'offline' | 'conflict' | 'invalid';

/**
 * A change whose name begins so is made while something is held, such as a drag: all changes of that name are one
 * step back, however long they take. Each hold needs a name of its own.
 */
export const HELD = 'hold ';

/** The open glider: the live plan, what it works out to, and how to change it. Every place of a glider gets it. */
export interface Workspace {
  plan: Plan;
  /** `estimate(plan)`, of the last valid plan while the present one is not valid. */
  result: Estimate;
  /**
   * Changes the plan. The recipe answers a new plan and leaves the old one as it is. `what` names the change
   * (`wing: root chord`); quick repeats of the same one undo together.
   */
  edit: (recipe: (plan: Plan) => Plan, what: string) => void;
  canEdit: boolean;
  kind: 'saved' | 'sample';
  saveState: SaveState;
  /** ISO time of the last acknowledged save. */
  savedAt?: string | undefined;
  /** What keeps the plan from being saved, in words. */
  problem?: string | undefined;
  /** What is wrong with the plan at the moment, by path (`surfaces/0/panels/1/span`); empty when it is valid. */
  issues: ReadonlyMap<string, string>;
  glider?: GliderDto | undefined;
  /** Id of the picked line, such as `wing/spar-top`. */
  selected: string | null;
  select: (id: string | null) => void;
  undo: () => void;
  redo: () => void;
  canUndo: boolean;
  canRedo: boolean;
}
