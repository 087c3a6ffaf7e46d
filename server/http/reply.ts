import type { Response } from 'express';
import type { Cookie } from 'lucia';
import type { z } from 'zod';
import { sendFile, type FileReply } from './file-reply.ts';
import { sendText } from './packed.ts';
import { setSessionCookie } from './session-cookie.ts';

/** How an endpoint answers when all is well. */
export type AnswerKind<R extends z.ZodType> =
  | { status: 200 | 201; schema: R; etag?: true }
  | { status: 200; schema: R; download: 'text/csv' | 'application/json' }
  | { status: 200; schema?: undefined; file: 'image/jpeg' | 'application/json' }
  | { status: 204; schema?: undefined };

interface ReplyHead {
  /** becomes the ETag */
  version?: number;
  /** address of what was made */
  location?: string;
  /** of a download */
  fileName?: string;
  /** the session that begins or ends with this answer */
  cookie?: Cookie;
  /** where the answer is a file */
  file?: FileReply;
}

/** What a handler answers; its body is of the declared schema's type, and absent where none is declared. */
export type Reply<T> = ReplyHead & ([T] extends [undefined] ? { body?: undefined } : { body: T });

export async function sendReply(
  res: Response,
  answer: AnswerKind<z.ZodType>,
  reply: ReplyHead & { body?: unknown },
): Promise<void> {
  if (reply.version !== undefined) res.set('ETag', `"${reply.version}"`);
  if (reply.location !== undefined) res.location(reply.location);
  if (reply.cookie) setSessionCookie(res, reply.cookie);
  res.status(answer.status);
  if ('file' in answer && reply.file) {
    await sendFile(res, answer.file, reply.file);
  } else if ('download' in answer) {
    const { body } = reply;
    res.attachment(reply.fileName);
    await sendText(res, answer.download, typeof body === 'string' ? body : JSON.stringify(body, null, 2));
  } else if (answer.schema) {
    await sendText(res, 'application/json', JSON.stringify(reply.body));
  } else {
    res.end();
  }
}
