import type { ErrorRequestHandler } from 'express';
import { LIMITS } from '#shared/schemas/limits.ts';
import { failureOf, isUnavailable } from '#server/db/failure.ts';
import { AppError, nothingHere, PROBLEMS, unavailable } from '#server/errors.ts';
import { sendProblem } from '#server/http/problem.ts';

/** Turns whatever was thrown into problem details. Only what nobody expected is logged as an error. */
export const errorHandler: ErrorRequestHandler = async (error: unknown, req, res, next) => {
  if (res.headersSent) {
    next(error);
    return;
  }
  const answer = asAppError(error);
  if (PROBLEMS[answer.code].status >= 500) req.log.error({ err: error }, answer.message);
  await sendProblem(res, answer);
};

function asAppError(error: unknown): AppError {
  if (error instanceof AppError) return error;
  const refusal = bodyError(error) ?? addressError(error);
  if (refusal) return refusal;
  if (isFullDisk(error)) return unavailable('The disk for stored files is full.');
  if (failureOf(error).sqlState === '53100') return unavailable('The disk of the database is full.');
  if (isUnavailable(error)) return unavailable('The database does not answer just now. Try again.');
  return new AppError('internal', 'Something went wrong here. It has been noted.');
}

const isFullDisk = (error: unknown) =>
  error instanceof Error && 'code' in error && (error.code === 'ENOSPC' || error.code === 'EDQUOT');

/** What reading a body throws, told by its `type`. */
function bodyError(error: unknown): AppError | undefined {
  if (!(error instanceof Error) || !('type' in error)) return undefined;
  switch (error.type) {
    case 'entity.parse.failed':
      return new AppError('malformed_json', 'The body is not well-formed JSON.');
    case 'entity.too.large':
      return new AppError('too_large', `A body may have at most ${LIMITS.bodyBytes.max / 1_000_000} MB.`);
    case 'charset.unsupported':
    case 'encoding.unsupported':
      return new AppError('unsupported_type', 'Send the body as UTF-8 JSON.');
    case 'request.aborted':
    case 'request.size.invalid':
      return new AppError('malformed_json', 'The body ended too early.');
    default:
      return undefined;
  }
}

/** The router's own refusals: a missing file, an address that cannot be decoded. */
function addressError(error: unknown): AppError | undefined {
  const status = error instanceof Error && 'status' in error ? error.status : undefined;
  return typeof status === 'number' && status >= 400 && status < 500 ? nothingHere() : undefined;
}
