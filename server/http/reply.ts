import type { Response } from 'express';
import type { Cookie } from 'lucia';
import type { z } from 'zod';
import { setSessionCookie } from './session-cookie.ts';

/** How an endpoint answers when all is well. */
export type AnswerKind<R extends z.ZodType> =
  | { status: 200 | 201; schema: R; etag?: true }
  | { status: 200; schema: R; download: 'text/csv' | 'application/json' }
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
}

/** What a handler answers; its body is of the declared schema's type, and absent where none is declared. */
export type Reply<T> = ReplyHead & ([T] extends [undefined] ? { body?: undefined } : { body: T });

export function sendReply(
  res: Response,
  answer: AnswerKind<z.ZodType>,
  reply: ReplyHead & { body?: unknown },
): void {
  if (reply.version !== undefined) res.set('ETag', `"${reply.version}"`);
  if (reply.location !== undefined) res.location(reply.location);
  if (reply.cookie) setSessionCookie(res, reply.cookie);
  res.status(answer.status);
  if (answer.status === 204) {
    res.end();
  } else if ('download' in answer) {
    const { body } = reply;
    res.attachment(reply.fileName).type(answer.download);
    res.send(typeof body === 'string' ? body : JSON.stringify(body, null, 2));
  } else {
    res.json(reply.body);
  }
}
