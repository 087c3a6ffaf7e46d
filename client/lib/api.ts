import type { z } from 'zod';
import type { FieldProblem, Problem } from '#shared/schemas/problem.ts';

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
  method?: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  /** JSON, or a form with a file */
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
  return checked(await requestJson(path, options), schema);
}

/** Asks the API for an answer that is checked elsewhere. */
export async function requestJson(path: string, options: RequestOptions = {}): Promise<unknown> {
  return json(await send(path, options));
}

/** Asks the API for a file. */
export async function requestFile(path: string, options: RequestOptions = {}): Promise<Blob> {
  return (await send(path, options)).blob();
}

/** An answer that is what was agreed. @throws UnexpectedAnswer */
export function checked<T extends z.ZodType>(answer: unknown, schema: T): z.output<T> {
  const parsed = schema.safeParse(answer);
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
  // A form names its own parts and their border.
  if (body instanceof FormData) init.body = body;
  else if (body !== undefined) {
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
  const answer = await json(response).catch(() => null);
  // Fetched with the first refusal: a page that is not refused anything does without schemas.
  const { problem } = await import('#shared/schemas/problem.ts');
  const parsed = problem.safeParse(answer);
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
