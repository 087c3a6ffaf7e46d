import { z } from 'zod';

/** One wrong field: a JSON pointer into the request's body (RFC 6901, fragment form) and what is wrong. */
export const fieldProblem = z.strictObject({ pointer: z.string(), detail: z.string() });

/** Problem details, RFC 9457, media type `application/problem+json`, with a stable `code`. */
export const problem = z.looseObject({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  code: z.string(),
  detail: z.string(),
  /** all wrong fields at once, for `invalid_input` */
  errors: z.array(fieldProblem).optional(),
});
export type Problem = z.infer<typeof problem>;
export type FieldProblem = z.infer<typeof fieldProblem>;

/**
 * JSON pointer of a path.
 * @example pointerOf(['plan', 'surfaces', 0]) // → '#/plan/surfaces/0'
 */
export function pointerOf(path: readonly PropertyKey[]): string {
  return ['#', ...path.map((step) => String(step).replaceAll('~', '~0').replaceAll('/', '~1'))].join('/');
}
