import type { Sequelize } from 'sequelize';
import type { Request, RequestHandler } from 'express';
import { ipKeyGenerator, rateLimit } from 'express-rate-limit';
import { userIdOf } from '#server/auth/user-id.ts';
import { AppError } from '#server/errors.ts';
import { DatabaseCounters } from './database-counters.ts';

interface Limit {
  hits: number;
  minutes: number;
  by: 'address' | 'account' | 'user';
  /** counted in the database, so that all copies of the server count together */
  shared: boolean;
  /** only refusals count */
  failuresOnly?: true;
}

/**
 * How often one address, one account (the e-mail address in the body) or one signed-in user may ask. Wrong passwords
 * are counted against address and account: many accounts from one address, and one account from many.
 */
export const RATE_LIMITS = {
  estimates: { hits: 1_200, minutes: 1, by: 'address', shared: false },
  signInByAddress: { hits: 50, minutes: 15, by: 'address', shared: true, failuresOnly: true },
  signInByAccount: { hits: 10, minutes: 15, by: 'account', shared: true, failuresOnly: true },
  signUps: { hits: 20, minutes: 60, by: 'address', shared: true },
  /** whatever sends a mail to an address that somebody typed */
  mailsByUser: { hits: 30, minutes: 60, by: 'user', shared: true },
  mailsByAddress: { hits: 20, minutes: 60, by: 'address', shared: true },
  mailsByAccount: { hits: 5, minutes: 60, by: 'account', shared: true },
  /** guesses at mailed links and at the account's own password */
  linkGuesses: { hits: 60, minutes: 15, by: 'address', shared: true, failuresOnly: true },
  passwordGuesses: { hits: 10, minutes: 15, by: 'user', shared: true, failuresOnly: true },
  uploads: { hits: 120, minutes: 60, by: 'user', shared: true },
} as const satisfies Record<string, Limit>;

export type LimitName = keyof typeof RATE_LIMITS;

/** The middleware of every limit. `scale` multiplies how much is allowed. */
export function createLimits(sequelize: Sequelize, scale: number): Record<LimitName, RequestHandler> {
  const make = (name: LimitName): RequestHandler => {
    const limit: Limit = RATE_LIMITS[name];
    return rateLimit({
      windowMs: limit.minutes * 60_000,
      limit: Math.max(1, Math.floor(limit.hits * scale)),
      standardHeaders: 'draft-8',
      legacyHeaders: false,
      identifier: name,
      skipSuccessfulRequests: limit.failuresOnly === true,
      keyGenerator: KEYS[limit.by],
      ...(limit.shared && { store: new DatabaseCounters(sequelize, name) }),
      handler: (_req, _res, next) => {
        next(new AppError('rate_limited', `Too many requests. Wait ${waitFor(limit)} and try again.`));
      },
    });
  };
  const names = Object.keys(RATE_LIMITS) as LimitName[];
  return Object.fromEntries(names.map((name) => [name, make(name)])) as Record<LimitName, RequestHandler>;
}

const waitFor = ({ minutes }: Limit) => (minutes === 1 ? 'a minute' : `up to ${minutes} minutes`);

const addressOf = (req: Request) => ipKeyGenerator(req.ip ?? 'unknown');

function accountOf(req: Request): string {
  const body: unknown = req.body;
  const email = typeof body === 'object' && body !== null && 'email' in body ? body.email : undefined;
  return typeof email === 'string' ? email.trim().toLowerCase().slice(0, 254) : 'none';
}

/** Somebody who is not signed in is counted by address. */
const userOf = async (req: Request) => (await userIdOf(req.get('Cookie'))) ?? addressOf(req);

const KEYS = { address: addressOf, account: accountOf, user: userOf };
