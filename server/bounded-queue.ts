/** Refused because as many are waiting already as may. */
export class QueueFull extends Error {}

/** Lets so many tasks run at once and so many wait; more are refused at once. */
export class BoundedQueue {
  readonly #atOnce: number;
  readonly #mostWaiting: number;
  readonly #waiting: (() => void)[] = [];
  #running = 0;

  constructor({ atOnce, mostWaiting }: { atOnce: number; mostWaiting: number }) {
    this.#atOnce = atOnce;
    this.#mostWaiting = mostWaiting;
  }

  /** @throws QueueFull */
  async run<T>(task: () => Promise<T>): Promise<T> {
    if (this.#running < this.#atOnce) {
      this.#running += 1;
    } else {
      if (this.#waiting.length >= this.#mostWaiting) throw new QueueFull();
      // Whoever finishes hands over its place, so that the count stays as it is.
      await new Promise<void>((start) => this.#waiting.push(start));
    }
    try {
      return await task();
    } finally {
      const next = this.#waiting.shift();
      if (next) next();
      else this.#running -= 1;
    }
  }
}
