import type { z } from 'zod';
import { problem as problemSchema, type FieldProblem, type Problem } from '#shared/schemas/problem.ts';

/** The server answered with problem details (RFC 9457). */
export class ApiError extends Error {
  override readonly name = 'ApiError';
  readonly problem: Problem;
  constructor(problem: Problem) {
    super(problem.detail || problem.title);
    this.problem = problem;
  }
  get status(): number {
    return this.problem.status;
  }
  get code(): string {
    return this.problem.code;
  }
  get fields(): readonly FieldProblem[] {
    return this.problem.errors ?? [];
  }
}

/** No answer came: no connection, or the server is away. */
export class NetworkError extends Error {
  override readonly name = 'NetworkError';
  constructor(cause: unknown) {
    super('The server cannot be reached.', { cause });
  }
}

/** An answer came that is not what was agreed, most likely from an older or newer version. */
export class UnexpectedAnswer extends Error {
  override readonly name = 'UnexpectedAnswer';
  constructor(cause?: unknown) {
    super('The server gave an answer that this page does not understand. Reload the page.', { cause });
  }
}

interface RequestOptions {
  method?: 'GET' | 'POST' | 'PUT' | 'DELETE';
  body?: unknown;
  headers?: Record<string, string>;
  signal?: AbortSignal | undefined;
}

/** Asks the API and checks the answer against its schema. */
export async function request<T extends z.ZodType>(
  path: string,
  schema: T,
  options: RequestOptions = {},
): Promise<z.output<T>> {
  const response = await send(path, options);
  const parsed = schema.safeParse(await json(response));
  if (!parsed.success) throw new UnexpectedAnswer(parsed.error);
  return parsed.data;
}

/** For answers without a body. */
export async function command(path: string, options: RequestOptions): Promise<void> {
  await send(path, options);
}

async function send(
  path: string,
  { method = 'GET', body, headers, signal }: RequestOptions,
): Promise<Response> {
  const init: RequestInit = {
    method,
    headers: { Accept: 'application/json', ...headers },
    credentials: 'same-origin',
  };
  if (signal) init.signal = signal;
  if (body !== undefined) {
    init.body = JSON.stringify(body);
    init.headers = { ...init.headers, 'Content-Type': 'application/json' };
  }
  let response: Response;
  try {
    response = await fetch(`/api${path}`, init);
  } catch (error) {
    if (signal?.aborted) throw error;
    throw new NetworkError(error);
  }
  if (!response.ok) throw await failure(response);
  return response;
}

async function failure(response: Response): Promise<Error> {
  const parsed = problemSchema.safeParse(await json(response).catch(() => null));
  if (parsed.success) return new ApiError(parsed.data);
  // A proxy without a server behind it answers so, and not in our words.
  if (response.status >= 502 && response.status <= 504) return new NetworkError(response.status);
  return new UnexpectedAnswer(response.status);
}

async function json(response: Response): Promise<unknown> {
  try {
    return (await response.json()) as unknown;
  } catch (error) {
    throw new UnexpectedAnswer(error);
  }
}

/** Errors that the same request may survive later. */
export function isPassing(error: unknown): boolean {
  return (
    error instanceof NetworkError ||
    (error instanceof ApiError && (error.status >= 500 || error.status === 429))
  );
}
