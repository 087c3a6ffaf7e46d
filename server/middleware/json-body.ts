import express, { type RequestHandler } from 'express';
import { LIMITS } from '#shared/schemas/limits.ts';
import { AppError } from '#server/errors.ts';

const hasBody = (headers: { 'content-length'?: string; 'transfer-encoding'?: string }) =>
  headers['transfer-encoding'] !== undefined || Number(headers['content-length'] ?? 0) > 0;

const onlyJson: RequestHandler = (req, _res, next) => {
  if (hasBody(req.headers) && !req.is('application/json')) {
    next(new AppError('unsupported_type', 'Send the body as application/json.'));
  } else {
    next();
  }
};

/** Reads JSON bodies up to the limit; what goes wrong is worded by the error handler. */
export const jsonBody: RequestHandler[] = [onlyJson, express.json({ limit: LIMITS.bodyBytes.max })];
