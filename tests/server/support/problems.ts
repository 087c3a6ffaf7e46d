import type { Response } from 'supertest';
import { expect } from 'vitest';
import { problem, type Problem } from '#shared/schemas/problem.ts';
import { PROBLEMS, type ProblemCode } from '#server/errors.ts';

/** The answer is this refusal, in the form of problem details; returns it for a closer look. */
export function expectProblem(res: Response, code: ProblemCode): Problem {
  expect(res.headers['content-type']).toMatch(/^application\/problem\+json/);
  const body = problem.parse(JSON.parse(res.text));
  expect(body).toMatchObject({ code, status: PROBLEMS[code].status });
  expect(res.status).toBe(PROBLEMS[code].status);
  return body;
}

/** Pointers of all fields that were refused. */
export function refusedFields(res: Response): string[] {
  return (expectProblem(res, 'invalid_input').errors ?? []).map(({ pointer }) => pointer).toSorted();
}
