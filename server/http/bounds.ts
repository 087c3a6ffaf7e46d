import { LIMITS } from '#shared/schemas/limits.ts';
import { pointerOf, type FieldProblem } from '#shared/schemas/problem.ts';

/** No schema goes deeper, and no list in one is longer. */
const DEEPEST = 16;
const LONGEST = LIMITS.parts.max;

/** Enough to mend any honest input; a hostile one must not be answered with more than it sent. */
export const MOST_PROBLEMS = 1_000;

/** NUL and half a surrogate pair: JSON can write them, PostgreSQL's text cannot hold them. */
const UNSTORABLE = /\0|\p{Surrogate}/u;

/** Whether PostgreSQL can hold a text. */
export const isStorable = (text: string) => !UNSTORABLE.test(text);

/**
 * What no body may be, whatever its schema: too deep, too long a list, or holding characters that cannot be
 * kept. Looked at first and in one pass, so that a hostile body costs no more than its reading.
 */
export function boundsProblems(body: unknown): FieldProblem[] {
  const problems: FieldProblem[] = [];
  const visit = (value: unknown, path: (string | number)[]): void => {
    if (problems.length > MOST_PROBLEMS) return;
    const refuse = (detail: string) => problems.push({ pointer: pointerOf(path), detail });
    if (typeof value === 'string') {
      if (UNSTORABLE.test(value)) refuse('Has a character that is not text.');
      return;
    }
    if (typeof value !== 'object' || value === null) return;
    if (path.length >= DEEPEST) {
      refuse(`Must not be nested deeper than ${DEEPEST} levels.`);
      return;
    }
    const entries = Array.isArray(value) ? value.entries() : Object.entries(value);
    const count = Array.isArray(value) ? value.length : Object.keys(value).length;
    if (count > LONGEST) {
      refuse(`Must have at most ${LONGEST} entries, not ${count}.`);
      return;
    }
    for (const [key, child] of entries) {
      if (typeof key === 'string' && UNSTORABLE.test(key))
        refuse('Has a name with a character that is not text.');
      path.push(key);
      visit(child, path);
      path.pop();
    }
  };
  visit(body, []);
  return problems;
}
