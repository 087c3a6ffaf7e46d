import type request from 'supertest';
import type { UserDto } from '#shared/schemas/session.ts';
import { hashPassword } from '#server/auth/password.ts';
import { lucia } from '#server/auth/lucia.ts';
import { User } from '#server/models/user.ts';
import type { TestApp } from './app.ts';

export const PASSWORD = 'seven rib stitches';

let count = 0;
let hash: Promise<string> | undefined;

/** A new user; every one of them has `PASSWORD`. */
export async function makeUser(
  changes: { name?: string; role?: UserDto['role']; verified?: boolean } = {},
): Promise<User> {
  count += 1;
  hash ??= hashPassword(PASSWORD);
  const unique = `${count}-${process.env['VITEST_POOL_ID'] ?? 0}-${process.hrtime.bigint()}`;
  return User.create({
    name: changes.name ?? `Pilot ${count}`,
    email: `pilot-${unique}@larkmoor.example`,
    role: changes.role ?? 'user',
    passwordHash: await hash,
    verifiedAt: changes.verified === false ? null : new Date(),
  });
}

export interface Person {
  user: User;
  /** sends requests with the person's session */
  agent: ReturnType<typeof request.agent>;
}

export async function signInAs(app: TestApp, user: User): Promise<Person> {
  const session = await lucia.createSession(user.id, { device: 'Test', lastUsedAt: new Date() });
  const agent = app.visitor();
  agent.set('Cookie', `${lucia.sessionCookieName}=${session.id}`);
  return { user, agent };
}

/** A new user who is signed in. */
export async function makePerson(
  app: TestApp,
  changes: Parameters<typeof makeUser>[0] = {},
): Promise<Person> {
  return signInAs(app, await makeUser(changes));
}
