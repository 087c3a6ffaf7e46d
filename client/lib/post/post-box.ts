import { z } from 'zod';
import { ApiError, requestJson } from '#client/lib/api.ts';

/** A record that was written down on this device and is on its way to the server. */
const waitingRecord = z.object({
  /** made with the record: however often it is sent, it is kept once */
  key: z.uuid(),
  gliderId: z.uuid(),
  kind: z.enum(['weighing', 'first-flight']),
  body: z.unknown(),
  /** why the server will not take it, in its words; null while it may */
  refused: z.string().nullable(),
});
export type WaitingRecord = z.infer<typeof waitingRecord>;

const PATHS: Record<WaitingRecord['kind'], (gliderId: string) => string> = {
  weighing: (id) => `/gliders/${encodeURIComponent(id)}/weighings`,
  'first-flight': (id) => `/gliders/${encodeURIComponent(id)}/first-flights`,
};

export interface PostBoxParts {
  storage: Pick<Storage, 'getItem' | 'setItem'>;
  send: (record: WaitingRecord) => Promise<unknown>;
  /** runs work while no other window of this browser does; the plain call where that cannot be had */
  alone: (name: string, work: () => Promise<void>) => Promise<void>;
}

/** Answers after which sending the same again is of no use. */
const isFinal = (error: unknown): error is ApiError =>
  error instanceof ApiError &&
  error.status >= 400 &&
  error.status < 500 &&
  ![401, 408, 429].includes(error.status);

/**
 * Records of one person that wait on this device until the server has acknowledged them, in the order in which they
 * were written. What is refused for good stays, with the reason, until the person takes it back.
 */
export class PostBox {
  readonly #key: string;
  readonly #parts: PostBoxParts;
  #records: readonly WaitingRecord[];
  #sending = false;
  readonly #listeners = new Set<() => void>();
  readonly #arrivals = new Set<(record: WaitingRecord, answer: unknown) => void>();

  constructor(person: string, parts: PostBoxParts) {
    this.#key = `featherbeam.post.${person}`;
    this.#parts = parts;
    this.#records = this.#read();
  }

  /** The same array until something changes. */
  get records(): readonly WaitingRecord[] {
    return this.#records;
  }

  subscribe(listener: () => void): () => void {
    this.#listeners.add(listener);
    return () => this.#listeners.delete(listener);
  }

  /** Told of every record that the server has acknowledged, and of its answer. */
  onArrival(listener: (record: WaitingRecord, answer: unknown) => void): () => void {
    this.#arrivals.add(listener);
    return () => this.#arrivals.delete(listener);
  }

  /** Keeps a record on the device, and sends it. @throws where the device cannot keep it */
  put(record: Omit<WaitingRecord, 'refused'>): void {
    const others = this.#read().filter(({ key }) => key !== record.key);
    this.#write([...others, { ...record, refused: null }]);
    void this.send();
  }

  /** Takes back what has not been sent. */
  drop(key: string): void {
    this.#write(this.#read().filter((record) => record.key !== key));
  }

  /** Reads again what another window has written. */
  refresh(): void {
    this.#records = this.#read();
    for (const listener of this.#listeners) listener();
  }

  /** Sends what waits, one after the other, and stops at the first that finds no way. */
  async send(): Promise<void> {
    if (this.#sending) return;
    this.#sending = true;
    try {
      await this.#parts.alone(this.#key, async () => {
        for (;;) {
          const next = this.#read().find(({ refused }) => refused === null);
          if (!next) return;
          let answer: unknown;
          try {
            answer = await this.#parts.send(next);
          } catch (error) {
            if (!isFinal(error)) return;
            const { detail } = error.problem;
            const why = [detail, ...error.fields.map((field) => field.detail)].join(' ').trim();
            this.#write(this.#read().map((one) => (one.key === next.key ? { ...one, refused: why } : one)));
            continue;
          }
          // Told before it is taken away, so that it is always somewhere.
          for (const arrival of this.#arrivals) arrival(next, answer);
          this.#write(this.#read().filter(({ key }) => key !== next.key));
        }
      });
    } finally {
      this.#sending = false;
    }
  }

  #read(): readonly WaitingRecord[] {
    try {
      const kept: unknown = JSON.parse(this.#parts.storage.getItem(this.#key) ?? '[]');
      return z.array(waitingRecord).catch([]).parse(kept);
    } catch {
      return [];
    }
  }

  #write(records: readonly WaitingRecord[]): void {
    this.#parts.storage.setItem(this.#key, JSON.stringify(records));
    this.refresh();
  }
}

/** Sends a record to where its kind is kept. */
export const sendRecord = ({ kind, gliderId, key, body }: WaitingRecord): Promise<unknown> =>
  requestJson(PATHS[kind](gliderId), { method: 'POST', body, headers: { 'Idempotency-Key': key } });
