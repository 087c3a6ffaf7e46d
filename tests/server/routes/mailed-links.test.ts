import { describe, expect, it } from 'vitest';
import { hashToken } from '#server/auth/tokens.ts';
import { MailedLink } from '#server/models/mailed-link.ts';
import { User } from '#server/models/user.ts';
import { tidy } from '#server/services/housekeeping.ts';
import { useApp } from '../support/app.ts';
import { changes, countRows } from '../support/counts.ts';
import { mailedToken, mailsTo } from '../support/mails.ts';
import { makePerson, makeUser, PASSWORD } from '../support/people.ts';
import { expectProblem, refusedFields } from '../support/problems.ts';
import { NO_TOKEN } from '../support/requests.ts';

const app = useApp();

const NEXT = 'nine lime laminations';
const forget = (email: string) => app.visitor().post('/api/password-resets').send({ email });
const reset = (token: string, password = NEXT) =>
  app.visitor().put('/api/password-resets').send({ token, password });
const signIn = (email: string, password: string) =>
  app.visitor().post('/api/session').send({ email, password });

describe('a forgotten password', () => {
  it('is set anew by a link that works once, confirms the address and signs every browser out', async () => {
    const { user, agent } = await makePerson(app, { verified: false });
    await forget(` ${user.email.toUpperCase()} `).expect(204);
    const token = await mailedToken(user.email, 'reset-password');
    await reset(token).expect(204);
    await signIn(user.email, NEXT).expect(200);
    expectProblem(await signIn(user.email, PASSWORD), 'wrong_credentials');
    expectProblem(await agent.get('/api/gliders'), 'signed_out');
    expectProblem(await reset(token, 'another good long one'), 'link_dead');
    expect((await User.findByPk(user.id))?.verifiedAt).not.toBeNull();
  });

  it('answers for nobody’s address as for somebody’s, in no less time, and mails nothing', async () => {
    const user = await makeUser();
    const before = await countRows();
    const timed = async (email: string) => {
      const start = performance.now();
      const res = await forget(email);
      return { status: res.status, text: res.text, ms: performance.now() - start };
    };
    const nobody = await timed('nobody.at.all@larkmoor.example');
    expect(changes(before, await countRows())).toEqual({});
    const somebody = await timed(user.email);
    expect([nobody.status, nobody.text]).toEqual([somebody.status, somebody.text]);
    expect(Math.min(nobody.ms, somebody.ms)).toBeGreaterThan(295);
  });

  it('keeps only the hash of a link, and an older link no longer works', async () => {
    const { email } = await makeUser();
    await forget(email).expect(204);
    const first = await mailedToken(email, 'reset-password');
    expect(await MailedLink.findByPk(hashToken(first))).not.toBeNull();
    await forget(email).expect(204);
    expectProblem(await reset(first), 'link_dead');
    await reset(await mailedToken(email, 'reset-password')).expect(204);
  });

  it('runs out after an hour, and is swept up', async () => {
    const { email } = await makeUser();
    await forget(email).expect(204);
    const token = await mailedToken(email, 'reset-password');
    const link = await MailedLink.findByPk(hashToken(token), { rejectOnEmpty: true });
    expect(link.expiresAt.getTime() - Date.now()).toBeLessThanOrEqual(3_600_000);
    await link.update({ expiresAt: new Date(Date.now() - 1) });
    expectProblem(await reset(token), 'link_dead');
    await tidy();
    expect(await MailedLink.findByPk(hashToken(token))).toBeNull();
  });

  it('leaves the link as it was where the new password is too common or too short', async () => {
    const { email } = await makeUser();
    await forget(email).expect(204);
    const token = await mailedToken(email, 'reset-password');
    expect(refusedFields(await reset(token, 'Password1234'))).toEqual(['#/password']);
    expect(refusedFields(await reset(token, 'short'))).toEqual(['#/password']);
    await reset(token).expect(204);
  });

  it('takes a link of one kind for none of another, and no guess for a link', async () => {
    const email = `wren.${process.pid}.link@larkmoor.example`;
    await app.visitor().post('/api/users').send({ name: 'Wren', email, password: PASSWORD }).expect(201);
    const verify = await mailedToken(email, 'verify-email');
    expectProblem(await reset(verify), 'link_dead');
    expectProblem(await reset(NO_TOKEN), 'link_dead');
    expect(refusedFields(await reset('7'))).toEqual(['#/token']);
    await app.visitor().post('/api/email-verifications').send({ token: verify }).expect(200);
  });

  it('lets one of two at the same moment set the password', async () => {
    const { email } = await makeUser();
    await forget(email).expect(204);
    const token = await mailedToken(email, 'reset-password');
    const answers = await Promise.all([reset(token), reset(token, 'another good long one')]);
    expect(new Set(answers.map(({ status }) => status))).toEqual(new Set([204, 410]));
  });
});

describe('mails', () => {
  it('say who and what in text and in HTML alike, and let nothing that was typed run in either', async () => {
    const name = '<b>Ada</b>\r\nBcc: all@larkmoor.example';
    const email = `ada.${process.pid}.mail@larkmoor.example`;
    await app.visitor().post('/api/users').send({ name, email, password: PASSWORD }).expect(201);
    const [mail] = await mailsTo(email);
    expect(mail?.text).toContain('<b>Ada</b>');
    expect(mail?.html).toContain('&lt;b&gt;Ada&lt;/b&gt;');
    expect(mail?.html).not.toContain('<b>');
    expect(mail?.subject).not.toMatch(/[\r\n]/);
  });

  it('are shown only where nobody else can reach them', async () => {
    const { email } = await makeUser();
    await forget(email).expect(204);
    const shown = await app.visitor().get('/api/dev/mails').expect(200);
    expect(JSON.stringify(shown.body)).toContain(email);
  });
});
