import { randomBytes } from 'node:crypto';
import { hash, verify } from '@node-rs/argon2';
import { unavailable } from '#server/errors.ts';
import { BoundedQueue, QueueFull } from '#server/bounded-queue.ts';

/**
 * argon2id with 19 MiB, two passes and one lane: OWASP Password Storage Cheat Sheet. The algorithm is the
 * package's default; a test looks at what comes out.
 */
const PARAMETERS = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

/** Each takes 19 MiB and a processor for some 20 ms: a flood must neither fill the memory nor starve the rest. */
const queue = new BoundedQueue({ atOnce: 2, mostWaiting: 64 });

async function queued<T>(task: () => Promise<T>): Promise<T> {
  try {
    return await queue.run(task);
  } catch (error) {
    if (error instanceof QueueFull)
      throw unavailable('Too many people are signing in. Try again in a moment.');
    throw error;
  }
}

/** One password may be typed as several sequences of code points; they are one password. */
const normalised = (password: string) => password.normalize('NFKC');

export function hashPassword(password: string): Promise<string> {
  return queued(() => hash(normalised(password), PARAMETERS));
}

let nobodysHash: Promise<string> | undefined;

/**
 * Whether the password is the one of the hash. Without a hash (nobody has that address) the same work is done for
 * nothing, so that the time taken does not tell who has an account.
 */
export async function passwordMatches(passwordHash: string | undefined, password: string): Promise<boolean> {
  nobodysHash ??= hashPassword(randomBytes(16).toString('hex'));
  const against = passwordHash ?? (await nobodysHash);
  const matches = await queued(() => verify(against, normalised(password)));
  return passwordHash !== undefined && matches;
}
