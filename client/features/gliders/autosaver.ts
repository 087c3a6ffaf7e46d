import { ApiError, isPassing, NetworkError } from '#client/lib/api.ts';
import type { Plan } from '#shared/core/plan.ts';
import { glider as gliderSchema } from '#shared/schemas/glider.ts';
import { reduce, startDesk, type DeskEvent } from './autosave.ts';
import { isDirty, isSendable, type Desk, type Kept } from './desk-state.ts';
import type { DraftShelf } from './drafts.ts';
import type { TrailShelf } from './history-shelf.ts';

/** Quiet time after an edit before it is sent, ms. */
const QUIET = 600;
/** Quiet time before unsent edits are written to this browser, ms; leaving the page does not wait for it. */
const DRAFT_QUIET = 150;
/** Waits between tries on a broken line, ms; the last one repeats. */
const RETRIES = [2_000, 5_000, 15_000, 30_000];

interface Ports {
  kept: Kept;
  shelf: DraftShelf;
  trail: TrailShelf;
  /** Saves the plan over that version. */
  send: (plan: Plan, version: number) => Promise<Kept>;
  onSaved?: (kept: Kept) => void;
}

/** Holds the desk, sends what is valid after a quiet moment, tries again when the line is back, loses nothing. */
export class Autosaver {
  private desk: Desk;
  private readonly ports: Ports;
  private readonly listeners = new Set<() => void>();
  private timer: ReturnType<typeof setTimeout> | undefined;
  private draftTimer: ReturnType<typeof setTimeout> | undefined;
  private tries = 0;
  private onItsWay: Promise<void> = Promise.resolve();

  constructor(ports: Ports) {
    this.ports = ports;
    this.desk = startDesk(ports.kept, ports.shelf.take(), ports.trail.take());
    if (!isDirty(this.desk)) ports.shelf.clear();
  }

  readonly getDesk = (): Desk => this.desk;

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  /** Begins to send by itself; the answer stops it. Nothing is dropped: what is ready goes out at once. */
  readonly start = (): (() => void) => {
    addEventListener('online', this.retry);
    addEventListener('pagehide', this.keepDraft);
    document.addEventListener('visibilitychange', this.keepDraft);
    this.plan();
    return () => {
      removeEventListener('online', this.retry);
      removeEventListener('pagehide', this.keepDraft);
      document.removeEventListener('visibilitychange', this.keepDraft);
      clearTimeout(this.timer);
      this.keepDraft();
      this.flush();
    };
  };

  readonly dispatch = (event: DeskEvent): void => {
    const before = this.desk;
    this.desk = reduce(before, event);
    if (this.desk === before) return;
    clearTimeout(this.draftTimer);
    this.draftTimer = setTimeout(this.keepDraft, DRAFT_QUIET);
    for (const listener of this.listeners) listener();
    this.plan();
  };

  /** Tries at once, after a cure or when the line is back. */
  readonly retry = (): void => {
    this.dispatch({ type: 'retried' });
    this.flush();
  };

  /**
   * Lays an older state on the desk as a new save, once what waits has been sent.
   * @throws Error when that, or this, could not be saved; nothing is then brought back
   */
  readonly bringBack = async (restore: (version: number) => Promise<Kept>): Promise<void> => {
    this.flush();
    await this.onItsWay;
    if (isDirty(this.desk)) throw new Error('Some edits are not saved yet. Bring it back once they are.');
    this.dispatch({ type: 'sent' });
    try {
      const kept = await restore(this.desk.base.version);
      this.dispatch({ type: 'broughtBack', kept, at: Date.now() });
      this.ports.onSaved?.(kept);
    } catch (error) {
      this.dispatch(eventOf(error));
      throw error;
    }
  };

  /** Gives the edits up here, because they live on elsewhere. */
  readonly forget = (): void => {
    const { base } = this.desk;
    this.dispatch({ type: 'edited', recipe: () => base.plan, what: 'kept elsewhere', at: Date.now() });
  };

  private readonly keepDraft = (): void => {
    clearTimeout(this.draftTimer);
    const { base, history, sent } = this.desk;
    this.ports.trail.put(history);
    if (!isDirty(this.desk)) return this.ports.shelf.clear();
    this.ports.shelf.put({
      version: base.version,
      plan: history.present,
      base: base.plan,
      sent,
      at: new Date().toISOString(),
    });
  };

  private flush(): void {
    if (isSendable(this.desk)) this.onItsWay = this.send();
  }

  private plan(): void {
    clearTimeout(this.timer);
    if (isSendable(this.desk)) this.timer = setTimeout(() => this.flush(), QUIET);
    else if (this.desk.phase === 'waiting') {
      const wait = RETRIES[Math.min(this.tries, RETRIES.length) - 1] ?? RETRIES[0];
      this.timer = setTimeout(this.retry, wait);
    }
  }

  private async send(): Promise<void> {
    const { check, base } = this.desk;
    if (!isSendable(this.desk) || !check.ok) return;
    this.dispatch({ type: 'sent' });
    try {
      const kept = await this.ports.send(check.plan, base.version);
      this.tries = 0;
      this.dispatch({ type: 'acknowledged', kept });
      this.ports.onSaved?.(kept);
    } catch (error) {
      this.tries += 1;
      this.dispatch(eventOf(error));
    }
  }
}

function eventOf(error: unknown): DeskEvent {
  if (error instanceof ApiError && error.status === 412) {
    const current = gliderSchema.safeParse(error.problem['current']);
    if (current.success) return { type: 'outdated', current: current.data };
  }
  return {
    type: 'failed',
    passing: isPassing(error),
    offline: error instanceof NetworkError,
    signedOut: error instanceof ApiError && error.status === 401,
    problem: wording(error),
  };
}

function wording(error: unknown): string {
  if (error instanceof ApiError) {
    if (error.status === 401)
      return 'You are signed out. Sign in again to save; the edits are kept on this device.';
    if (error.status === 404)
      return 'This glider was deleted or is no longer shared with you. The edits are kept on this device.';
    return [error.message, ...error.fields.map(({ detail }) => detail)].join(' ');
  }
  return error instanceof Error ? error.message : 'Saving did not work.';
}
