import type { FileStore } from './storage/file-store.ts';

/** What the services use beside the database. */
export interface Surroundings {
  files: FileStore;
  /** where people reach the service, without a slash at its end: every mailed link begins so */
  address: () => string;
  /** mails are kept to be read at `/api/dev/mails`, for want of a mail server */
  mailsAreShown: boolean;
  /** a mail was written and waits to be sent */
  mailWaits: () => void;
}

let bound: Surroundings | undefined;

/** Bound once at start, like the models to their database. */
export function bindSurroundings(around: Surroundings): void {
  bound = around;
}

export function surroundings(): Surroundings {
  if (!bound) throw new Error('The services have no surroundings: call bindSurroundings first.');
  return bound;
}
