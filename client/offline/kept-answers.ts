/** Where the API's answers are kept for a day without a connection. */
export const KEPT_ANSWERS = 'featherbeam-answers';

/**
 * Questions whose last answer is better than none: who is signed in, and what was looked at. Pictures, files to take
 * away and links that hold a secret are not kept.
 */
const KEPT = /^\/api\/(session|gliders|materials|rack|clubs|class-editions|sheets)(\/[\w-]+)*$/;
const NEVER = /\/(export|photos|labels|link|files?)(\/|$)/;

/**
 * Whether the answer of an address is kept.
 * @example isKept('/api/gliders/5f/weighings') // → true
 * @example isKept('/api/account/export') // → false
 */
export function isKept(pathname: string): boolean {
  return KEPT.test(pathname) && !NEVER.test(pathname);
}

/** Whether an answer says that nobody is signed in. */
export async function signsOut(address: string, response: Response): Promise<boolean> {
  if (response.status === 401) return true;
  if (new URL(address).pathname !== '/api/session' || !response.ok) return false;
  const body: unknown = await response.json().catch(() => undefined);
  return typeof body === 'object' && body !== null && 'user' in body && body.user === null;
}
