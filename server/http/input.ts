import type { Request } from 'express';
import type { z } from 'zod';
import { pointerOf, type FieldProblem } from '#shared/schemas/problem.ts';
import { invalidInput } from '#server/errors.ts';
import { boundsProblems, MOST_PROBLEMS } from './bounds.ts';
import { wordIssue } from './issue-wording.ts';
import type { Schemas } from './endpoint.ts';

interface Inputs<P extends z.ZodType, Q extends z.ZodType, B extends z.ZodType> {
  params: z.output<P>;
  query: z.output<Q>;
  body: z.output<B>;
}

/**
 * Checks path, query and body against their schemas. What has no schema is not looked at.
 * @throws AppError `invalid_input` with every wrong field at once
 */
export function parseInputs<P extends z.ZodType, Q extends z.ZodType, B extends z.ZodType>(
  schemas: Schemas<P, Q, B>,
  req: Request,
): Inputs<P, Q, B> {
  const problems: FieldProblem[] = [];
  const parsed = {
    params: parse(schemas.params, req.params, problems),
    query: parse(schemas.query, req.query, problems),
    body: parseBody(schemas.body, req.body, problems),
  };
  if (problems.length > 0) throw invalidInput(shortened(problems));
  // With no problem left, every part is what its schema makes of it.
  return parsed as Inputs<P, Q, B>;
}

function parse(schema: z.ZodType | undefined, value: unknown, problems: FieldProblem[]): unknown {
  if (!schema) return undefined;
  const result = schema.safeParse(value, { error: wordIssue });
  if (result.success) return result.data;
  problems.push(...result.error.issues.flatMap(problemsOf));
  return undefined;
}

function parseBody(schema: z.ZodType | undefined, body: unknown, problems: FieldProblem[]): unknown {
  if (!schema) return undefined;
  const outOfBounds = boundsProblems(body);
  problems.push(...outOfBounds);
  // Beyond the bounds the fields themselves are not worth the time.
  return outOfBounds.length > 0 ? undefined : parse(schema, body ?? {}, problems);
}

function problemsOf(issue: z.core.$ZodIssue): FieldProblem[] {
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map((key) => ({
      pointer: pointerOf([...issue.path, key]),
      detail: 'There is no such field.',
    }));
  }
  return [{ pointer: pointerOf(issue.path), detail: issue.message }];
}

function shortened(problems: FieldProblem[]): FieldProblem[] {
  if (problems.length <= MOST_PROBLEMS) return problems;
  const rest = problems.length - MOST_PROBLEMS;
  return [...problems.slice(0, MOST_PROBLEMS), { pointer: '#', detail: `${rest} more fields are wrong.` }];
}
