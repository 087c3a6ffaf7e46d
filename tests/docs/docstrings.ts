/** The comment right before an exported function or constant; empty where there is none. */
export function docstringOf(text: string, name: string): string {
  const before = new RegExp(
    String.raw`/\*\*((?:(?!\*/)[^])*)\*/\s*export\s+(?:async\s+)?(?:function\*?|const)\s+${name}\b`,
  );
  return before.exec(text)?.[1] ?? '';
}

/** What a docstring says before its first tag, as running words. */
export function wordsOf(docstring: string): string {
  const [said = ''] = docstring.replace(/^\s*\* ?/gm, '').split(/(?:^|\s)@(?=[a-z])/);
  return said.replace(/\s+/g, ' ').trim();
}

/** Whether one of a docstring's examples calls the function. */
export function showsCallOf(docstring: string, name: string): boolean {
  const call = new RegExp(String.raw`@example\s.*\b${name}\(.*// → \S`);
  return docstring.split('\n').some((line) => call.test(line));
}

/** Whether a value is a function that may be called without `new`. */
export function isCallable(value: unknown): boolean {
  return typeof value === 'function' && !/^class\b/.test(Function.prototype.toString.call(value));
}
