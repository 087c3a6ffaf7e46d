import type { Plan } from '#shared/core/plan.ts';
import { isDirty, reduce, startDesk, type Desk, type DeskEvent } from './autosave.ts';
import { keepSample, readSample } from './drafts.ts';

/** The sample as the visitor has changed it; kept in this browser only. */
export class SampleDesk {
  private desk: Desk;
  private readonly listeners = new Set<() => void>();

  constructor(original: Plan) {
    const plan = readSample();
    const kept = { version: 0, plan: original, updatedAt: '', updatedBy: '' };
    this.desk = startDesk(kept, plan === null ? null : { version: 0, plan, sent: null, at: '' });
  }

  readonly getDesk = (): Desk => this.desk;

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  readonly dispatch = (event: DeskEvent): void => {
    const before = this.desk;
    this.desk = reduce(before, event);
    if (this.desk === before) return;
    keepSample(isDirty(this.desk) ? this.desk.history.present : null);
    for (const listener of this.listeners) listener();
  };

  /** Back to the plan as delivered; an undo brings the changes back. */
  readonly startAgain = (): void => {
    const { plan } = this.desk.base;
    this.dispatch({ type: 'edited', recipe: () => plan, what: 'start again', at: Date.now() });
  };
}
