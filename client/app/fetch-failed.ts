/** Whether a page's file could not be fetched; browsers word it each in their own way. */
export function fetchFailed(error: unknown): boolean {
  return error instanceof TypeError && /import|module|fetch/i.test(error.message);
}
