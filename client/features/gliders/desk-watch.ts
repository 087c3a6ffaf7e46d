/** Between two looks at the server's version while the window is in view, ms. */
const EVERY = 30_000;

interface Ports {
  /** Version on the desk, whatever was done to it since. */
  known: () => number;
  /** Version that the server holds: a light question. */
  latest: () => Promise<number>;
  /** Fetches the newer state and lays it on the desk. */
  refresh: () => Promise<unknown>;
  /** Name that the windows of this browser hear one another by. */
  channel: string;
}

/**
 * Notices that somebody else saved: by a look at the version every half minute, on coming back to the window and when
 * the line is back, and at once when another window of this browser says so.
 */
export class DeskWatch {
  private readonly ports: Ports;
  private channel: BroadcastChannel | undefined;
  private looking = false;

  constructor(ports: Ports) {
    this.ports = ports;
  }

  readonly start = (): (() => void) => {
    this.channel = new BroadcastChannel(this.ports.channel);
    this.channel.addEventListener('message', this.look);
    addEventListener('focus', this.look);
    addEventListener('online', this.look);
    document.addEventListener('visibilitychange', this.look);
    const timer = setInterval(this.look, EVERY);
    return () => {
      this.channel?.close();
      this.channel = undefined;
      removeEventListener('focus', this.look);
      removeEventListener('online', this.look);
      document.removeEventListener('visibilitychange', this.look);
      clearInterval(timer);
    };
  };

  /** Tells the other windows that this one has saved. */
  readonly announce = (): void => this.channel?.postMessage('saved');

  readonly look = (): void => {
    if (this.looking || document.visibilityState === 'hidden') return;
    this.looking = true;
    void this.compare().finally(() => {
      this.looking = false;
    });
  };

  private async compare(): Promise<void> {
    try {
      if ((await this.ports.latest()) > this.ports.known()) await this.ports.refresh();
    } catch {
      // Without an answer nothing is known to be stale; whatever is wrong, saving tells it.
    }
  }
}
