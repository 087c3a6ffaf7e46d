import type { Request, RequestHandler, Response } from 'express';
import type { z } from 'zod';
import type { UserDto } from '#shared/schemas/session.ts';
import type { ProblemCode } from '#server/errors.ts';
import { readIdempotencyKey, readIfMatch } from './conditions.ts';
import { parseInputs } from './input.ts';
import type { LimitName } from '#server/middleware/rate-limits.ts';
import { sendReply, type AnswerKind, type Reply } from './reply.ts';
import { actorOf, signedInActorOf } from './actor.ts';
import { readUpload, type Upload } from './upload.ts';

/**
 * Who may call: `public` never looks at the session, `anyone` is told who asks, `signed-in` answers 401 to
 * visitors. What the asker may do with a row is for `policies/` to say.
 */
export type Access = 'public' | 'anyone' | 'signed-in';

type Actor<A extends Access> = A extends 'signed-in'
  ? UserDto
  : A extends 'anyone'
    ? UserDto | null
    : undefined;

/** What a handler works with: everything is checked and typed. */
export interface Call<A extends Access, P, Q, B> {
  actor: Actor<A>;
  params: P;
  query: Q;
  body: B;
  /** version named by `If-Match`; 428 has been answered where an endpoint needs it and it was missing */
  ifMatch: number;
  idempotencyKey: string | undefined;
  /** what an endpoint with an upload was sent */
  file: Buffer;
  req: Request;
}

/** What the documentation says of an endpoint; the same declaration serves the requests. */
export interface Description {
  method: 'get' | 'post' | 'put' | 'patch' | 'delete';
  /** under `/api`, parameters as `:name` */
  path: string;
  tag: string;
  summary: string;
  access: Access;
  limits?: readonly LimitName[];
  ifMatch?: true;
  idempotent?: true;
  /** the body is a form with this file, and not JSON */
  upload?: Upload;
  answer: AnswerKind<z.ZodType>;
  /** refusals beyond those that go without saying */
  problems?: readonly ProblemCode[];
}

export interface Schemas<P extends z.ZodType, Q extends z.ZodType, B extends z.ZodType> {
  params?: P;
  query?: Q;
  body?: B;
}

export interface Endpoint extends Description {
  schemas: Schemas<z.ZodType, z.ZodType, z.ZodType>;
  serve: RequestHandler;
}

type Nothing = z.ZodUndefined;

const NO_FILE = Buffer.alloc(0);

/**
 * Declares an endpoint: one list of these makes both the routes and their documentation, so that neither can
 * say what the other does not.
 */
export function endpoint<
  A extends Access,
  P extends z.ZodType = Nothing,
  Q extends z.ZodType = Nothing,
  B extends z.ZodType = Nothing,
  R extends z.ZodType = Nothing,
>(
  description: Description & { access: A; answer: AnswerKind<R> } & Schemas<P, Q, B> & {
      handle: (
        call: Call<A, z.output<P>, z.output<Q>, z.output<B>>,
      ) => Promise<Reply<z.output<R>>> | Reply<z.output<R>>;
    },
): Endpoint {
  const { params, query, body, handle, ...rest } = description;
  const schemas = { ...(params && { params }), ...(query && { query }), ...(body && { body }) };
  return {
    ...rest,
    schemas,
    serve: async (req: Request, res: Response) => {
      const actor = await actorFor(description.access, req, res);
      const file = description.upload ? await readUpload(req, res, description.upload) : NO_FILE;
      const inputs = parseInputs<P, Q, B>(schemas, req);
      const reply = await handle({
        // The condition on `access` that picks the actor's type is the one that picked its value.
        actor: actor as Actor<A>,
        ...inputs,
        ifMatch: description.ifMatch ? readIfMatch(req) : Number.NaN,
        idempotencyKey: description.idempotent ? readIdempotencyKey(req) : undefined,
        file,
        req,
      });
      await sendReply(res, description.answer, reply);
    },
  };
}

function actorFor(access: Access, req: Request, res: Response): Promise<UserDto | null | undefined> {
  if (access === 'public') return Promise.resolve(undefined);
  return access === 'anyone' ? actorOf(req, res) : signedInActorOf(req, res);
}
