import { Lucia, TimeSpan } from 'lucia';
import type { UserDto } from '#shared/schemas/session.ts';
import { sessionAdapter } from './session-adapter.ts';

type UserAttributes = Pick<UserDto, 'name' | 'email' | 'role'>;

/** Sessions of thirty days, prolonged when used in their second half. The cookie is sent by `http/session-cookie`. */
export const lucia = new Lucia<Record<never, never>, UserAttributes>(sessionAdapter, {
  sessionExpiresIn: new TimeSpan(30, 'd'),
  sessionCookie: { name: 'featherbeam_session' },
  getUserAttributes: ({ name, email, role }) => ({ name, email, role }),
});

declare module 'lucia' {
  interface Register {
    Lucia: typeof lucia;
    DatabaseUserAttributes: UserAttributes;
  }
}
