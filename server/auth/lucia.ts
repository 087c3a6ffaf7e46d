import { Lucia, TimeSpan } from 'lucia';
import type { UserDto } from '#shared/schemas/session.ts';
import { sessionAdapter } from './session-adapter.ts';

/** What a session carries beside whose it is. */
export interface SessionAttributes {
  device: string;
  lastUsedAt: Date;
}

type UserAttributes = Pick<UserDto, 'name' | 'email' | 'role'>;

/** Sessions of thirty days, prolonged when used in their second half. The cookie is sent by `http/session-cookie`. */
export const lucia = new Lucia<SessionAttributes, UserAttributes>(sessionAdapter, {
  sessionExpiresIn: new TimeSpan(30, 'd'),
  sessionCookie: { name: 'featherbeam_session' },
  getSessionAttributes: ({ device, lastUsedAt }) => ({ device, lastUsedAt }),
  getUserAttributes: ({ name, email, role }) => ({ name, email, role }),
});

declare module 'lucia' {
  interface Register {
    Lucia: typeof lucia;
    DatabaseSessionAttributes: SessionAttributes;
    DatabaseUserAttributes: UserAttributes;
  }
}
