import type { FieldProblem } from '#shared/schemas/problem.ts';

/** Every code that an answer may carry, with its status and title. Codes are stable; sentences may change. */
export const PROBLEMS = {
  invalid_input: { status: 400, title: 'The input is wrong' },
  malformed_json: { status: 400, title: 'The body is not JSON' },
  malformed_form: { status: 400, title: 'The form cannot be read' },
  signed_out: { status: 401, title: 'Not signed in' },
  wrong_credentials: { status: 401, title: 'Wrong address or password' },
  forbidden: { status: 403, title: 'Not allowed' },
  not_found: { status: 404, title: 'Not found' },
  email_taken: { status: 409, title: 'The address has an account already' },
  already_member: { status: 409, title: 'A member already' },
  email_unverified: { status: 403, title: 'The address is not confirmed' },
  link_dead: { status: 410, title: 'The link no longer works' },
  shared_gliders: { status: 409, title: 'Gliders have other members' },
  last_secretary: { status: 409, title: 'The club would have no secretary' },
  edition_in_use: { status: 409, title: 'The edition is in use' },
  edition_exists: { status: 409, title: 'There is such an edition already' },
  wrong_password: { status: 403, title: 'Wrong password' },
  corrected_already: { status: 409, title: 'Corrected already' },
  signed_already: { status: 409, title: 'Another record was signed under this id' },
  material_in_use: { status: 409, title: 'The material is in use' },
  piece_in_use: { status: 409, title: 'The piece is in use' },
  key_reused: { status: 409, title: 'The idempotency key was used for something else' },
  stale_version: { status: 412, title: 'Changed in the meantime' },
  too_large: { status: 413, title: 'The body is too large' },
  unsupported_type: { status: 415, title: 'The body is not of a known type' },
  if_match_required: { status: 428, title: 'The version is missing' },
  rate_limited: { status: 429, title: 'Too many requests' },
  internal: { status: 500, title: 'The server failed' },
  unavailable: { status: 503, title: 'Not available just now' },
} as const satisfies Record<string, { status: number; title: string }>;

export type ProblemCode = keyof typeof PROBLEMS;

export interface ProblemExtras {
  /** all wrong fields at once */
  errors?: FieldProblem[];
  /** further members of the answer, such as the current state for `stale_version` */
  members?: Record<string, unknown>;
  headers?: Record<string, string>;
}

/** A refusal that is part of the service: it becomes problem details and is not logged as a failure. */
export class AppError extends Error {
  readonly code: ProblemCode;
  readonly extras: ProblemExtras;

  constructor(code: ProblemCode, detail: string, extras: ProblemExtras = {}) {
    super(detail);
    this.code = code;
    this.extras = extras;
  }
}

/** Also for somebody else's row: that it exists is nobody's business. */
export const notFound = (noun: Noun) => new AppError('not_found', `That ${noun} does not exist.`);

export type Noun =
  | 'glider'
  | 'piece'
  | 'sheet'
  | 'material'
  | 'saved state'
  | 'photo'
  | 'member'
  | 'invitation'
  | 'session'
  | 'weighing'
  | 'record'
  | 'club'
  | 'edition';

export const nothingHere = () => new AppError('not_found', 'There is nothing at this address.');

export const signedOut = () => new AppError('signed_out', 'Sign in first.');

export const forbidden = (detail: string) => new AppError('forbidden', detail);

export const invalidInput = (errors: FieldProblem[]) =>
  new AppError(
    'invalid_input',
    errors.length === 1 ? 'One field is wrong.' : `${errors.length} fields are wrong.`,
    { errors },
  );

export const unavailable = (detail: string) =>
  new AppError('unavailable', detail, { headers: { 'Retry-After': '5' } });
