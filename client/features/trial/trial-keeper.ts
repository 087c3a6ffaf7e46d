import { ApiError, isPassing } from '#client/lib/api.ts';
import { gliderTrials, trialsInput, type GliderTrialsDto, type TrialsInput } from '#shared/schemas/trials.ts';
import {
  acknowledged,
  isUnsent,
  listOf,
  overtaken,
  startTrials,
  type TrialDesk,
  type TrialDraft,
} from './trial-desk.ts';

/** Quiet time after an edit before it is sent, and between tries on a broken line, ms. */
const QUIET = 600;
const RETRY = 5_000;

interface Ports {
  kept: GliderTrialsDto;
  draft: { take: () => TrialDraft | null; put: (draft: TrialDraft | null) => void };
  send: (list: TrialsInput, version: number) => Promise<GliderTrialsDto>;
  onSaved: (kept: GliderTrialsDto) => void;
}

/** Holds the list of trials, sends it after a quiet moment, joins it with other people's, loses nothing. */
export class TrialKeeper {
  private desk: TrialDesk;
  private readonly ports: Ports;
  private readonly listeners = new Set<() => void>();
  private timer: ReturnType<typeof setTimeout> | undefined;

  constructor(ports: Ports) {
    this.ports = ports;
    this.desk = startTrials(ports.kept, ports.draft.take());
  }

  readonly getDesk = (): TrialDesk => this.desk;

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  /** Begins to send by itself; the answer stops it, and what is ready goes out at once. */
  readonly start = (): (() => void) => {
    addEventListener('online', this.retry);
    this.plan();
    return () => {
      removeEventListener('online', this.retry);
      clearTimeout(this.timer);
      void this.send();
    };
  };

  readonly change = (list: TrialsInput): void => {
    const phase = this.desk.phase === 'sending' ? 'sending' : 'idle';
    this.lay({ ...this.desk, list, phase, problem: null });
  };

  /** A list that came with a fresh look at the server. */
  readonly refreshed = (kept: GliderTrialsDto): void => {
    if (kept.version > this.desk.base.version && this.desk.phase !== 'sending') {
      this.lay(overtaken(this.desk, kept));
    }
  };

  readonly newsRead = (): void => this.lay({ ...this.desk, joinedWith: null });

  readonly retry = (): void => {
    if (this.desk.phase === 'waiting' || this.desk.phase === 'refused')
      this.lay({ ...this.desk, phase: 'idle' });
    void this.send();
  };

  private lay(desk: TrialDesk): void {
    this.desk = desk;
    this.ports.draft.put(isUnsent(desk) ? { base: listOf(desk.base), list: desk.list } : null);
    for (const listener of this.listeners) listener();
    this.plan();
  }

  private plan(): void {
    clearTimeout(this.timer);
    const { phase } = this.desk;
    if (phase === 'idle' && isUnsent(this.desk)) this.timer = setTimeout(() => void this.send(), QUIET);
    if (phase === 'waiting') this.timer = setTimeout(this.retry, RETRY);
  }

  private async send(): Promise<void> {
    const { list, base, phase } = this.desk;
    if (phase !== 'idle' || !isUnsent(this.desk)) return;
    const wrong = trialsInput.safeParse(list).error?.issues[0];
    if (wrong) {
      this.lay({ ...this.desk, phase: 'refused', problem: problemOf(wrong.path, wrong.message) });
      return;
    }
    this.lay({ ...this.desk, phase: 'sending' });
    try {
      const kept = await this.ports.send(list, base.version);
      this.lay(acknowledged(this.desk, list, kept));
      this.ports.onSaved(kept);
    } catch (error) {
      this.lay(failed(this.desk, error));
    }
  }
}

function problemOf(path: readonly PropertyKey[], message: string): string {
  return path.at(-1) === 'name' ? 'Not kept yet: every trial needs a name.' : `Not kept yet: ${message}`;
}

function failed(desk: TrialDesk, error: unknown): TrialDesk {
  if (error instanceof ApiError && error.status === 412) {
    const current = gliderTrials.safeParse(error.problem['current']);
    if (current.success) return overtaken(desk, current.data);
  }
  const passing = isPassing(error);
  const said = error instanceof Error ? error.message : 'Saving did not work.';
  const problem = passing
    ? 'No answer from the server: the trials are kept on this device and sent later.'
    : said;
  return { ...desk, phase: passing ? 'waiting' : 'refused', problem };
}
