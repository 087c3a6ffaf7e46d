import { createHash } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { session as sessionSchema } from '#shared/schemas/session.ts';
import { Session } from '#server/models/session.ts';
import { User } from '#server/models/user.ts';
import { tidy } from '#server/services/housekeeping.ts';
import { useApp } from '../support/app.ts';
import { makePerson, makeUser, PASSWORD } from '../support/people.ts';
import { expectProblem, refusedFields } from '../support/problems.ts';

const app = useApp();

const signIn = (email: string, password: string) =>
  app.visitor().post('/api/session').send({ email, password });
const cookieOf = (res: { headers: Record<string, unknown> }) => String(res.headers['set-cookie']);
const sessionIdOf = (cookie: string) => /featherbeam_session=([^;]*)/.exec(cookie)?.[1] ?? '';

describe('POST /api/session', () => {
  it('signs in with the address in any case, and keeps only the hash of the session’s id', async () => {
    const user = await makeUser();
    const res = await signIn(` ${user.email.toUpperCase()} `, PASSWORD).expect(200);
    expect(sessionSchema.parse(res.body).user).toEqual({
      id: user.id,
      name: user.name,
      email: user.email,
      role: 'user',
    });
    const id = sessionIdOf(cookieOf(res));
    const row = await Session.findOne({ where: { userId: user.id }, rejectOnEmpty: true });
    expect(row.idHash).toBe(createHash('sha256').update(id).digest('hex'));
    expect(JSON.stringify(row)).not.toContain(id);
  });

  it('sends a cookie out of reach of scripts and other sites, over TLS only except on loopback', async () => {
    const user = await makeUser();
    const local = cookieOf(await signIn(user.email, PASSWORD).expect(200));
    expect(local).toMatch(/; HttpOnly/);
    expect(local).toMatch(/; SameSite=Lax/);
    expect(local).toMatch(/; Path=\//);
    expect(local).toMatch(/Max-Age=2592000/);
    expect(local).not.toMatch(/; Secure/);
    const away = cookieOf(await signIn(user.email, PASSWORD).set('Host', 'wings.example').expect(200));
    expect(away).toMatch(/; Secure/);
  });

  it('gives the same answer for a wrong password as for nobody’s address', async () => {
    const user = await makeUser();
    const wrong = await signIn(user.email, 'not this one');
    const nobody = await signIn('nobody@larkmoor.example', 'not this one');
    expect(expectProblem(wrong, 'wrong_credentials')).toEqual(expectProblem(nobody, 'wrong_credentials'));
    expect(wrong.headers['set-cookie']).toBeUndefined();
  });

  it('ends the session that the browser had before', async () => {
    const { user, agent } = await makePerson(app);
    const res = await agent.post('/api/session').send({ email: user.email, password: PASSWORD }).expect(200);
    const sessions = await Session.findAll({ where: { userId: user.id } });
    expect(sessions.map(({ idHash }) => idHash)).toEqual([
      createHash('sha256')
        .update(sessionIdOf(cookieOf(res)))
        .digest('hex'),
    ]);
  });

  it('refuses every wrong field at once', async () => {
    expect(refusedFields(await signIn('at larkmoor', ''))).toEqual(['#/email', '#/password']);
    const res = await app.visitor().post('/api/session').send({ email: 7 });
    expect(refusedFields(res)).toEqual(['#/email', '#/password']);
  });
});

describe('GET /api/session', () => {
  it('tells a user who they are and a visitor that they are nobody', async () => {
    const { user, agent } = await makePerson(app, { role: 'admin' });
    expect((await agent.get('/api/session').expect(200)).body).toEqual({
      user: { id: user.id, name: user.name, email: user.email, role: 'admin' },
      preferences: { units: {}, theme: 'system' },
    });
    expect((await app.visitor().get('/api/session').expect(200)).body).toEqual({ user: null });
  });

  it('takes a session that has run out for none, clears its cookie and removes it', async () => {
    const { user, agent } = await makePerson(app);
    await Session.update({ expiresAt: new Date(Date.now() - 1) }, { where: { userId: user.id } });
    const res = await agent.get('/api/session').expect(200);
    expect(res.body).toEqual({ user: null });
    expect(cookieOf(res)).toMatch(/featherbeam_session=; Max-Age=0/);
    expect(await Session.count({ where: { userId: user.id } })).toBe(0);
  });

  it('prolongs a session in its second half, and the cookie with it', async () => {
    const { user, agent } = await makePerson(app);
    const days = 86_400_000;
    await Session.update({ expiresAt: new Date(Date.now() + 10 * days) }, { where: { userId: user.id } });
    expect(cookieOf(await agent.get('/api/session').expect(200))).toMatch(/Max-Age=2592000/);
    const row = await Session.findOne({ where: { userId: user.id }, rejectOnEmpty: true });
    expect(row.expiresAt.getTime()).toBeGreaterThan(Date.now() + 29 * days);
  });

  it('takes the hash out of the database for no session', async () => {
    const { user } = await makePerson(app);
    const { idHash } = await Session.findOne({ where: { userId: user.id }, rejectOnEmpty: true });
    const res = await app.visitor().get('/api/session').set('Cookie', `featherbeam_session=${idHash}`);
    expect(res.body).toEqual({ user: null });
  });
});

describe('DELETE /api/session', () => {
  it('ends the session here and nowhere else, and is content where there is none', async () => {
    const [here, other] = [await makePerson(app), await makePerson(app)];
    const res = await here.agent.delete('/api/session').expect(204);
    expect(cookieOf(res)).toMatch(/featherbeam_session=; Max-Age=0/);
    expectProblem(await here.agent.get('/api/gliders'), 'signed_out');
    await other.agent.get('/api/gliders').expect(200);
    await app.visitor().delete('/api/session').expect(204);
  });
});

describe('tidying', () => {
  it('removes sessions that have run out and no others', async () => {
    const [old, fresh] = [await makePerson(app), await makePerson(app)];
    await Session.update({ expiresAt: new Date(Date.now() - 1) }, { where: { userId: old.user.id } });
    await tidy();
    expect(await Session.count({ where: { userId: old.user.id } })).toBe(0);
    expect(await Session.count({ where: { userId: fresh.user.id } })).toBe(1);
    expect(await User.count({ where: { id: old.user.id } })).toBe(1);
  });
});
