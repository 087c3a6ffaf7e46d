import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { account, accountSessionList } from '#shared/schemas/account.ts';
import { session as sessionSchema } from '#shared/schemas/session.ts';
import { Session } from '#server/models/session.ts';
import { User } from '#server/models/user.ts';
import { useApp } from '../support/app.ts';
import { mailedToken, mailsTo } from '../support/mails.ts';
import { makePerson, PASSWORD, signInAs, type Person } from '../support/people.ts';
import { expectProblem, refusedFields } from '../support/problems.ts';
import { addMember, makeGlider } from '../support/rows.ts';

const app = useApp();

const getAccount = async ({ agent }: Person) =>
  account.parse((await agent.get('/api/account').expect(200)).body);
const freshAddress = () => `swift.${randomUUID()}@larkmoor.example`;
const signIn = (email: string, password: string) =>
  app.visitor().post('/api/session').send({ email, password });

describe('the account', () => {
  it('tells its gliders, own and shared, and its choices, which follow to the next session', async () => {
    const person = await makePerson(app, { name: 'Ada' });
    await makeGlider({ owner: person.user });
    await addMember(await makeGlider(), person.user, 'reader');
    const changed = await person.agent
      .patch('/api/account')
      .send({ name: ' Ada Q ', units: { mass: 'oz' }, theme: 'dark' })
      .expect(200);
    expect(account.parse(changed.body)).toMatchObject({
      name: 'Ada Q',
      verified: true,
      pendingEmail: null,
      units: { mass: 'oz' },
      theme: 'dark',
      gliders: { owned: 1, shared: 1 },
    });
    const { preferences } = sessionSchema.parse((await signIn(person.user.email, PASSWORD)).body);
    expect(preferences).toEqual({ units: { mass: 'oz' }, theme: 'dark' });
  });

  it('keeps what a change does not name, and refuses a change that names nothing or something unknown', async () => {
    const person = await makePerson(app);
    await person.agent
      .patch('/api/account')
      .send({ units: { mass: 'oz' } })
      .expect(200);
    await person.agent.patch('/api/account').send({ theme: 'light' }).expect(200);
    expect(await getAccount(person)).toMatchObject({ units: { mass: 'oz' }, theme: 'light' });
    expect(refusedFields(await person.agent.patch('/api/account').send({}))).toEqual(['#']);
    const wrong = await person.agent.patch('/api/account').send({ units: { mass: 'stone' }, role: 'admin' });
    expect(refusedFields(wrong)).toEqual(['#/role', '#/units/mass']);
    expect((await User.findByPk(person.user.id))?.role).toBe('user');
  });
});

describe('a change of address', () => {
  const change = ({ agent }: Person, email: string, password = PASSWORD) =>
    agent.post('/api/account/email').send({ email, password });

  it('happens when the link mailed to the new address is followed, and the old address is told', async () => {
    const person = await makePerson(app);
    const [old, next] = [person.user.email, freshAddress()];
    expect((await change(person, next).expect(200)).body).toMatchObject({ email: old, pendingEmail: next });
    expect((await mailsTo(old))[0]?.text).toContain(next);
    const token = await mailedToken(next, 'verify-email');
    const confirmed = await app.visitor().post('/api/email-verifications').send({ token }).expect(200);
    expect(confirmed.body).toEqual({ email: next });
    expect(await getAccount(person)).toMatchObject({ email: next, verified: true, pendingEmail: null });
    await signIn(next, PASSWORD).expect(200);
    expectProblem(await signIn(old, PASSWORD), 'wrong_credentials');
    expectProblem(await app.visitor().post('/api/email-verifications').send({ token }), 'link_dead');
  });

  it('needs the password and an address that nobody has', async () => {
    const [person, other] = [await makePerson(app), await makePerson(app)];
    expectProblem(await change(person, freshAddress(), 'not the password'), 'wrong_password');
    expectProblem(await change(person, other.user.email), 'email_taken');
    expect(await getAccount(person)).toMatchObject({ pendingEmail: null });
  });

  it('is refused at the link where somebody took the address in the meantime', async () => {
    const person = await makePerson(app);
    const next = freshAddress();
    await change(person, next).expect(200);
    const token = await mailedToken(next, 'verify-email');
    await app
      .visitor()
      .post('/api/users')
      .send({ name: 'Quick', email: next, password: 'spruce over the ridge' });
    expectProblem(await app.visitor().post('/api/email-verifications').send({ token }), 'email_taken');
    expect((await User.findByPk(person.user.id))?.email).toBe(person.user.email);
  });

  it('mails the link again, and the one before no longer works', async () => {
    const email = freshAddress();
    const agent = app.visitor();
    await agent
      .post('/api/users')
      .send({ name: 'New', email, password: 'spruce over the ridge' })
      .expect(201);
    const first = await mailedToken(email, 'verify-email');
    await agent.post('/api/account/verification').expect(204);
    const second = await mailedToken(email, 'verify-email');
    expect(second).not.toBe(first);
    expectProblem(await agent.post('/api/email-verifications').send({ token: first }), 'link_dead');
    await agent.post('/api/email-verifications').send({ token: second }).expect(200);
  });
});

describe('the password', () => {
  it('is changed by who knows it, signs every other browser out and tells by mail', async () => {
    const here = await makePerson(app);
    const elsewhere = await signInAs(app, here.user);
    const next = 'nine lime laminations';
    const put = (current: string, password = next) =>
      here.agent.put('/api/account/password').send({ current, password });
    expectProblem(await put('not the password'), 'wrong_password');
    expect(refusedFields(await put(PASSWORD, 'Password1234'))).toEqual(['#/password']);
    await elsewhere.agent.get('/api/account').expect(200);
    await put(PASSWORD).expect(204);
    await here.agent.get('/api/account').expect(200);
    expectProblem(await elsewhere.agent.get('/api/account'), 'signed_out');
    expectProblem(await signIn(here.user.email, PASSWORD), 'wrong_credentials');
    await signIn(here.user.email, next).expect(200);
    expect((await mailsTo(here.user.email))[0]?.subject).toBe('Your password was changed');
  });
});

describe('sessions', () => {
  const list = async ({ agent }: Person) =>
    accountSessionList.parse((await agent.get('/api/account/sessions').expect(200)).body).sessions;

  it('are told by device and last use, the own one marked, and end one by one or all others', async () => {
    const person = await makePerson(app);
    const agent = 'Mozilla/5.0 (X11; Linux x86_64; rv:140.0) Gecko/20100101 Firefox/140.0';
    for (const _ of [1, 2]) {
      const { email } = person.user;
      await app
        .visitor()
        .post('/api/session')
        .set('User-Agent', agent)
        .send({ email, password: PASSWORD })
        .expect(200);
    }
    const sessions = await list(person);
    expect(sessions.filter(({ current }) => current)).toHaveLength(1);
    const others = sessions.filter(({ device }) => device === 'Firefox on Linux');
    expect(others).toHaveLength(2);
    await person.agent.delete(`/api/account/sessions/${others[0]?.id}`).expect(204);
    expect(await list(person)).toHaveLength(2);
    await person.agent.delete('/api/account/sessions').expect(204);
    expect(await list(person)).toMatchObject([{ current: true }]);
  });

  it('show nothing that would sign anybody in', async () => {
    const person = await makePerson(app);
    const { idHash } = await Session.findOne({ where: { userId: person.user.id }, rejectOnEmpty: true });
    const res = await person.agent.get('/api/account/sessions').expect(200);
    expect(res.text).not.toContain(idHash);
    expect(res.text).not.toMatch(/[\w-]{40,}/);
  });

  it('note their last use to the hour', async () => {
    const person = await makePerson(app);
    const where = { userId: person.user.id };
    await Session.update({ lastUsedAt: new Date(Date.now() - 2 * 3_600_000) }, { where });
    await person.agent.get('/api/account').expect(200);
    const row = await Session.findOne({ where, rejectOnEmpty: true });
    expect(Date.now() - row.lastUsedAt.getTime()).toBeLessThan(60_000);
  });
});
