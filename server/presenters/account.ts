import type { AccountDto, AccountSessionDto } from '#shared/schemas/account.ts';
import type { SessionDto } from '#shared/schemas/session.ts';
import type { Session } from '#server/models/session.ts';
import type { User } from '#server/models/user.ts';
import { presentUser } from './user.ts';

interface Around {
  owned: number;
  shared: number;
  /** address that was mailed a link */
  awaited: string | null;
}

export function presentAccount(user: User, { owned, shared, awaited }: Around): AccountDto {
  return {
    ...presentUser(user),
    verified: user.verifiedAt !== null,
    pendingEmail: awaited === user.email ? null : awaited,
    ...user.preferences,
    createdAt: user.createdAt.toISOString(),
    gliders: { owned, shared },
  };
}

export function presentAccountSession(row: Session, currentHash: string | null): AccountSessionDto {
  return {
    id: row.id,
    device: row.device === '' ? 'Unknown browser' : row.device,
    current: row.idHash === currentHash,
    createdAt: row.createdAt.toISOString(),
    lastUsedAt: row.lastUsedAt.toISOString(),
  };
}

/** Who is signed in, and how they want to see everything. */
export function presentSession(user: User): SessionDto {
  return { user: presentUser(user), preferences: user.preferences };
}
