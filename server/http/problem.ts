import type { Response } from 'express';
import type { Problem } from '#shared/schemas/problem.ts';
import { PROBLEMS, type AppError } from '#server/errors.ts';
import { sendText } from './packed.ts';

/** Problem details of RFC 9457; `type` leads to the code's line in the API's page. */
export function presentProblem(error: AppError): Problem {
  const { status, title } = PROBLEMS[error.code];
  return {
    type: `/api/docs#${error.code}`,
    title,
    status,
    code: error.code,
    detail: error.message,
    ...(error.extras.errors && { errors: error.extras.errors }),
    ...error.extras.members,
  };
}

export async function sendProblem(res: Response, error: AppError): Promise<void> {
  const body = presentProblem(error);
  res.status(body.status).set(error.extras.headers ?? {});
  await sendText(res, 'application/problem+json', JSON.stringify(body));
}
