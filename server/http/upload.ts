import type { Request, Response } from 'express';
import multer, { MulterError } from 'multer';
import { AppError, invalidInput } from '#server/errors.ts';

/** A form with one file beside its fields. */
export interface Upload {
  /** name of the file's field */
  field: string;
  maxBytes: number;
}

/**
 * Reads a form into memory; its fields become the request's body.
 * @throws AppError `too_large`, `unsupported_type`, `malformed_form`, or `invalid_input` for a file that is missing
 */
export async function readUpload(req: Request, res: Response, { field, maxBytes }: Upload): Promise<Buffer> {
  if (!req.is('multipart/form-data')) {
    throw new AppError('unsupported_type', 'Send the form as multipart/form-data.');
  }
  const limits = {
    fileSize: maxBytes,
    fields: 8,
    fieldSize: 8_000,
    fieldNameSize: 100,
    parts: 10,
    headerPairs: 32,
  };
  const read = multer({ limits }).single(field);
  await new Promise<void>((resolve, reject) => {
    read(req, res, (error: unknown) => (error ? reject(asRefusal(error, maxBytes)) : resolve()));
  });
  // Fields of a form have no prototype; schemas want a plain object.
  req.body = { ...req.body };
  if (!req.file) throw invalidInput([{ pointer: `#/${field}`, detail: 'Is missing.' }]);
  return req.file.buffer;
}

function asRefusal(error: unknown, maxBytes: number): unknown {
  if (!(error instanceof MulterError)) return new AppError('malformed_form', 'The form cannot be read.');
  if (error.code === 'LIMIT_FILE_SIZE') {
    return new AppError('too_large', `A file may have at most ${maxBytes / 1_000_000} MB.`);
  }
  if (error.code === 'LIMIT_UNEXPECTED_FILE' && error.field !== undefined) {
    return invalidInput([{ pointer: `#/${error.field}`, detail: 'Is no file of this form.' }]);
  }
  return new AppError('too_large', 'The form has too many or too long fields.');
}
