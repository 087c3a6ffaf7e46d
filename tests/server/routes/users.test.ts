import { describe, expect, it } from 'vitest';
import { session as sessionSchema } from '#shared/schemas/session.ts';
import { User } from '#server/models/user.ts';
import { useApp } from '../support/app.ts';
import { changes, countRows } from '../support/counts.ts';
import { makeUser } from '../support/people.ts';
import { expectProblem, refusedFields } from '../support/problems.ts';

const app = useApp();

const PASSWORD = 'spruce over the ridge';
const signUp = (input: object) => app.visitor().post('/api/users').send(input);

describe('POST /api/users', () => {
  it('makes an account with an argon2id hash at OWASP’s parameters, and signs in', async () => {
    const visitor = app.visitor();
    const email = `Wren.${process.pid}@Larkmoor.example`;
    const before = await countRows();
    const res = await visitor
      .post('/api/users')
      .send({ name: ' Wren ', email, password: PASSWORD })
      .expect(201);
    const { user } = sessionSchema.parse(res.body);
    expect(user).toMatchObject({ name: 'Wren', email: email.toLowerCase(), role: 'user' });
    expect((await visitor.get('/api/session')).body).toEqual(res.body);
    expect(changes(before, await countRows())).toEqual({ users: 1, sessions: 1, mailed_links: 1, mails: 1 });
    const row = await User.findByPk(user?.id ?? '', { rejectOnEmpty: true });
    // OWASP Password Storage Cheat Sheet: argon2id, m = 19456 KiB, t = 2, p = 1.
    expect(row.passwordHash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
    expect(res.text).not.toContain('argon2');
  });

  it('takes long passphrases of any signs, and signs in with another spelling of the same letters', async () => {
    const email = `umlaut-${process.pid}@larkmoor.example`;
    await signUp({ name: 'U', email, password: 'über den Hügeln' }).expect(201);
    const decomposed = 'über den Hügeln'.normalize('NFD');
    await app.visitor().post('/api/session').send({ email, password: decomposed }).expect(200);
    const longest = {
      name: 'L',
      email: `long-${process.pid}@larkmoor.example`,
      password: 'xyz-'.repeat(31) + 'qrst',
    };
    await signUp({ ...longest, password: `${'a gull, '.repeat(15)}landed` }).expect(201);
  });

  it('refuses an address that has an account, in any case of letters', async () => {
    const { email } = await makeUser();
    const before = await countRows();
    const res = await signUp({ name: 'Twin', email: email.toUpperCase(), password: PASSWORD });
    expectProblem(res, 'email_taken');
    expect(res.headers['set-cookie']).toBeUndefined();
    expect(changes(before, await countRows())).toEqual({});
  });

  it('makes one account of two requests at the same moment', async () => {
    const input = { name: 'Both', email: `both-${process.pid}@larkmoor.example`, password: PASSWORD };
    const answers = await Promise.all([signUp(input), signUp(input)]);
    expect(answers.map(({ status }) => status).toSorted((a, b) => a - b)).toEqual([201, 409]);
  });

  it('refuses every wrong field at once, a common password among them, and makes nothing', async () => {
    const before = await countRows();
    const res = await signUp({ name: '', email: 'wren', password: 'Password1234', role: 'admin' });
    expect(refusedFields(res)).toEqual(['#/email', '#/name', '#/password', '#/role']);
    const short = await signUp({ name: 'W', email: 'w@larkmoor.example', password: 'ninechars' });
    expect(refusedFields(short)).toEqual(['#/password']);
    expect(changes(before, await countRows())).toEqual({});
  });
});
