/** A failure that the reader can act on: its message is one sentence and is printed without a stack. */
export class HouseError extends Error {}

/** @param {string} line */
export const say = (line) => console.log(line);

const SPACE = /ENOSPC|EDQUOT|No space left on device|disk quota exceeded|Check free disk space/i;
const REGISTRY =
  /ENOTFOUND|EAI_AGAIN|ECONNREFUSED|ECONNRESET|ETIMEDOUT|ENETUNREACH|EHOSTUNREACH|ERR_SOCKET_TIMEOUT|network (request|timeout)/;

/** @type {typeof import('./messages.d.mts').explain} */
export function explain(output, step) {
  if (SPACE.test(output)) return `The disk is full: free some space and run the same command again.`;
  if (step === 'packages' && REGISTRY.test(output)) {
    return 'The npm registry cannot be reached: check the connection (or npm’s proxy setting) and run the same command again.';
  }
  if (
    step === 'debian' &&
    /Temporary failure resolving|Could not resolve|Could not connect|Failed to fetch/.test(output)
  ) {
    return 'Debian’s package archive cannot be reached: check the connection and run the same command again.';
  }
  return null;
}

/**
 * What to print of any failure: a sentence where the cause is known, else the whole error for a developer.
 * @param {unknown} error
 */
export function wording(error) {
  if (error instanceof HouseError) return error.message;
  const text = error instanceof Error ? (error.stack ?? error.message) : String(error);
  const sentence = explain(text);
  if (sentence) return sentence;
  const { code, path } = /** @type {NodeJS.ErrnoException} */ (error ?? {});
  if ((code === 'EACCES' || code === 'EPERM') && path)
    return `${path} cannot be read or written by this user.`;
  return text;
}
