import { AppError } from '#server/errors.ts';
import { canonicalJson } from './canonical-json.ts';

/**
 * Answers a save from a stale version. The answer to the save that made the current state may have been lost: when
 * what was asked for is there, it is the answer (RFC 9110, 13.1.1).
 * @throws AppError `stale_version` with the current state where it differs
 */
export function savedAlready<T extends object>(current: T, asked: Partial<T>, detail: string): T {
  const there = Object.fromEntries(Object.entries(current).filter(([key]) => Object.hasOwn(asked, key)));
  if (canonicalJson(there) === canonicalJson(asked)) return current;
  throw new AppError('stale_version', detail, { members: { current } });
}
