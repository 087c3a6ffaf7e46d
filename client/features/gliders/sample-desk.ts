import type { Plan } from '#shared/core/plan.ts';
import { reduce, startDesk, type DeskEvent } from './autosave.ts';
import { isDirty, type Desk } from './desk-state.ts';
import { draftOf, keepSample, readSample } from './drafts.ts';
import { trailShelf } from './history-shelf.ts';

/** Quiet time before changes are written to this browser, ms; leaving the page does not wait for it. */
const QUIET = 150;

/** The sample as the visitor has changed it; kept in this browser only. */
export class SampleDesk {
  private desk: Desk;
  private readonly trail = trailShelf('sample');
  private timer: ReturnType<typeof setTimeout> | undefined;
  private readonly listeners = new Set<() => void>();

  constructor(original: Plan) {
    const plan = readSample();
    const kept = { version: 0, plan: original, updatedAt: '', updatedBy: '' };
    this.desk = startDesk(kept, plan === null ? null : draftOf(plan), this.trail.take());
  }

  readonly getDesk = (): Desk => this.desk;

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  /** Writes what is still to be written when the page is left; the answer does so too. */
  readonly start = (): (() => void) => {
    addEventListener('pagehide', this.keep);
    return () => {
      removeEventListener('pagehide', this.keep);
      this.keep();
    };
  };

  readonly dispatch = (event: DeskEvent): void => {
    const before = this.desk;
    this.desk = reduce(before, event);
    if (this.desk === before) return;
    clearTimeout(this.timer);
    this.timer = setTimeout(this.keep, QUIET);
    for (const listener of this.listeners) listener();
  };

  /** Back to the plan as delivered; an undo brings the changes back. */
  readonly startAgain = (): void => {
    const { plan } = this.desk.base;
    this.dispatch({ type: 'edited', recipe: () => plan, what: 'start again', at: Date.now() });
  };

  private readonly keep = (): void => {
    clearTimeout(this.timer);
    keepSample(isDirty(this.desk) ? this.desk.history.present : null);
    this.trail.put(this.desk.history);
  };
}
