import {
  BaseError,
  ConnectionAcquireTimeoutError,
  ConnectionError,
  ForeignKeyConstraintError,
  UniqueConstraintError,
} from 'sequelize';

/** What PostgreSQL said, as far as it is safe to look at: SQLSTATE and the constraint's name. */
export interface Failure {
  sqlState: string | undefined;
  constraint: string | undefined;
}

const text = (value: unknown) => (typeof value === 'string' ? value : undefined);

export function failureOf(error: unknown): Failure {
  const parent: unknown = error instanceof BaseError && 'parent' in error ? error.parent : error;
  if (!(parent instanceof Error)) return { sqlState: undefined, constraint: undefined };
  return {
    sqlState: 'code' in parent ? text(parent.code) : undefined,
    constraint: 'constraint' in parent ? text(parent.constraint) : undefined,
  };
}

export function isUniqueViolation(error: unknown, constraint: string): boolean {
  return error instanceof UniqueConstraintError && failureOf(error).constraint === constraint;
}

export function isForeignKeyViolation(error: unknown, constraint: string): boolean {
  return error instanceof ForeignKeyConstraintError && failureOf(error).constraint === constraint;
}

/**
 * Whether the database is away or too busy, so that the same request may succeed a little later: connection
 * lost (class 08), being shut down (57P0x), too many connections (53300), deadlock or lock wait (40P01, 55P03).
 */
export function isUnavailable(error: unknown): boolean {
  if (error instanceof ConnectionError || error instanceof ConnectionAcquireTimeoutError) return true;
  const { sqlState } = failureOf(error);
  if (
    sqlState !== undefined &&
    /^(08|57P0|53300|40P01|40001|55P03|57014|ECONN|EPIPE|ETIMEDOUT)/.test(sqlState)
  ) {
    return true;
  }
  // The driver gives no code when the socket closes in the middle of a query, or before the next on the same client.
  return error instanceof Error && /connection (terminated|ended|error)|not queryable/i.test(error.message);
}
