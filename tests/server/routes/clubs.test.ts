import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { club, clubGliderList, clubInvitation, clubList, clubMemberList } from '#shared/schemas/club.ts';
import { ClubInvitation } from '#server/models/club-invitation.ts';
import { useApp } from '../support/app.ts';
import { joinClub, makeClub } from '../support/clubs.ts';
import { mailedToken, mailsTo } from '../support/mails.ts';
import { makePerson, PASSWORD, type Person } from '../support/people.ts';
import { expectProblem, refusedFields } from '../support/problems.ts';
import { makeGlider, smallPlan } from '../support/rows.ts';

const app = useApp();

const found = ({ agent }: Person, name = 'Tarn Side Flyers') =>
  agent.post('/api/clubs').send({ name, place: '' });
const members = async ({ agent }: Person, id: string) =>
  clubMemberList.parse((await agent.get(`/api/clubs/${id}/members`).expect(200)).body).members;
const invite = ({ agent }: Person, id: string, email: string, role = 'member') =>
  agent.post(`/api/clubs/${id}/invitations`).send({ email, role });
const accept = ({ agent }: Person, token: string) =>
  agent.post('/api/club-invitations/accept').send({ token });
const roleTo = ({ agent }: Person, id: string, userId: string, role: string) =>
  agent.put(`/api/clubs/${id}/members/${userId}`).send({ role });

async function clubOf(role: 'secretary' | 'director' | 'member') {
  const [secretary, person] = [await makePerson(app, { name: 'Maren' }), await makePerson(app)];
  const row = await makeClub(secretary.user);
  await joinClub(row, person.user, role);
  return { secretary, person, id: row.id };
}

describe('a club', () => {
  it('is founded once for a key, and kept by who founds it', async () => {
    const person = await makePerson(app);
    const key = randomUUID();
    const send = () => found(person).set('Idempotency-Key', key).expect(201);
    const [first, second] = [await send(), await send()];
    expect(club.parse(first.body)).toMatchObject({ name: 'Tarn Side Flyers', role: 'secretary', members: 1 });
    expect(second.body.id).toBe(first.body.id);
    const { body } = await person.agent.get('/api/clubs').expect(200);
    expect(clubList.parse(body).clubs).toEqual([first.body]);
  });

  it('changes name and place from its version, and tells who comes late', async () => {
    const person = await makePerson(app);
    const { id } = (await found(person)).body;
    const put = (version: number, name: string) =>
      person.agent.put(`/api/clubs/${id}`).set('If-Match', `"${version}"`).send({ name, place: 'Low Fell' });
    expect((await put(1, 'Fell Flyers').expect(200)).body).toMatchObject({ name: 'Fell Flyers', version: 2 });
    await put(1, 'Fell Flyers').expect(200);
    const late = expectProblem(await put(1, 'Moor Flyers'), 'stale_version');
    expect(late['current']).toMatchObject({ name: 'Fell Flyers', version: 2 });
  });

  it.each([{ name: '' }, { name: '   ' }, { name: 'x'.repeat(121) }, { place: 'x'.repeat(121) }])(
    'is refused with %j, by the field',
    async (wrong) => {
      const { agent } = await makePerson(app);
      const sent = await agent.post('/api/clubs').send({ name: 'Fell Flyers', place: '', ...wrong });
      expect(refusedFields(sent)).toEqual([`#/${Object.keys(wrong)[0]}`]);
    },
  );

  it.each(['<script>alert(1)</script>', '=cmd|calc', '\u202Erevo', "'; DROP TABLE clubs; --"])(
    'is called whatever somebody types: %j',
    async (name) => {
      const person = await makePerson(app);
      const { id } = (await found(person, name).expect(201)).body;
      expect((await person.agent.get(`/api/clubs/${id}`)).body.name).toBe(name);
    },
  );
});

describe('members of a club', () => {
  it('come by a mailed invitation, once, with the role that it says', async () => {
    const secretary = await makePerson(app, { name: 'Maren' });
    const guest = await makePerson(app, { name: 'Rowan' });
    const { id } = (await found(secretary)).body;
    const sent = await invite(secretary, id, guest.user.email, 'director').expect(201);
    expect(clubInvitation.parse(sent.body)).toMatchObject({ role: 'director', invitedBy: 'Maren' });
    expect((await mailsTo(guest.user.email))[0]?.subject).toBe('Maren invites you to Tarn Side Flyers');
    const token = await mailedToken(guest.user.email, 'club-invitations');
    const preview = await app.visitor().post('/api/club-invitations/preview').send({ token }).expect(200);
    expect(preview.body).toMatchObject({ clubName: 'Tarn Side Flyers', role: 'director' });
    expect((await accept(guest, token).expect(200)).body).toEqual({ clubId: id, role: 'director' });
    expectProblem(await accept(guest, token), 'link_dead');
    expect(await members(guest, id)).toMatchObject([
      { name: 'Maren', role: 'secretary', email: null },
      { name: 'Rowan', role: 'director', you: true, email: guest.user.email },
    ]);
    expectProblem(await invite(secretary, id, guest.user.email), 'already_member');
  });

  it('are invited by nobody whose own address is not confirmed', async () => {
    const secretary = await makePerson(app, { verified: false });
    const { id } = (await found(secretary)).body;
    expectProblem(await invite(secretary, id, 'finch@larkmoor.example'), 'email_unverified');
  });

  it('are not made by a link that was withdrawn, declined or has run out', async () => {
    const secretary = await makePerson(app);
    const guest = await makePerson(app);
    const { id: clubId } = (await found(secretary)).body;
    const dead = async (end: (id: string, token: string) => Promise<unknown>) => {
      const email = `guest.${randomUUID()}@larkmoor.example`;
      const { id } = (await invite(secretary, clubId, email).expect(201)).body;
      const token = await mailedToken(email, 'club-invitations');
      await end(id, token);
      expectProblem(await accept(guest, token), 'link_dead');
    };
    await dead((id) => secretary.agent.delete(`/api/club-invitations/${id}`).expect(204));
    await dead((_, token) => app.visitor().post('/api/club-invitations/decline').send({ token }).expect(204));
    await dead((id) => ClubInvitation.update({ expiresAt: new Date(Date.now() - 1) }, { where: { id } }));
    expect(await members(secretary, clubId)).toHaveLength(1);
  });

  it('always have a secretary among them', async () => {
    const { secretary, person, id } = await clubOf('member');
    const { id: self } = secretary.user;
    expectProblem(await secretary.agent.delete(`/api/clubs/${id}/membership`), 'last_secretary');
    expectProblem(await roleTo(secretary, id, self, 'member'), 'last_secretary');
    const deletion = secretary.agent.post('/api/account/deletion').send({ password: PASSWORD });
    expectProblem(await deletion, 'last_secretary');
    await roleTo(secretary, id, person.user.id, 'secretary').expect(200);
    await roleTo(secretary, id, self, 'member').expect(200);
    expectProblem(await roleTo(secretary, id, self, 'secretary'), 'forbidden');
    await secretary.agent.delete(`/api/clubs/${id}/membership`).expect(204);
    expectProblem(await secretary.agent.get(`/api/clubs/${id}`), 'not_found');
    // Who is alone may go, too.
    await person.agent.post('/api/account/deletion').send({ password: PASSWORD }).expect(200);
  });

  it('keep one secretary also when two of them go at once', async () => {
    const { secretary, person, id } = await clubOf('secretary');
    const third = await makePerson(app);
    await joinClub({ id }, third.user, 'member');
    const go = ({ agent }: Person) => agent.delete(`/api/clubs/${id}/membership`);
    const answers = await Promise.all([go(secretary), go(person)]);
    expect(answers.map(({ status }) => status).toSorted((a, b) => a - b)).toEqual([204, 409]);
    expect((await members(third, id)).filter(({ role }) => role === 'secretary')).toHaveLength(1);
  });
});

describe('a glider shown to a club', () => {
  it('is read there by every member, changed by none, and gone when it is taken back or its owner goes', async () => {
    const { secretary, person, id } = await clubOf('member');
    const glider = await makeGlider({ owner: person.user });
    const path = `/api/gliders/${glider.id}`;
    expectProblem(await secretary.agent.get(path), 'not_found');
    const show = () => person.agent.put(`/api/clubs/${id}/gliders/${glider.id}`).expect(204);
    await show();
    await show();
    const list = async () =>
      clubGliderList.parse((await secretary.agent.get(`/api/clubs/${id}/gliders`).expect(200)).body).gliders;
    expect(await list()).toMatchObject([{ gliderId: glider.id, name: 'Test', yours: false }]);
    expect((await secretary.agent.get(path).expect(200)).body.role).toBe('reader');
    const put = secretary.agent.put(path).set('If-Match', '"1"').send({ plan: smallPlan() });
    expectProblem(await put, 'forbidden');
    expectProblem(await secretary.agent.delete(`${path}/membership`), 'not_found');
    await person.agent.delete(`/api/clubs/${id}/gliders/${glider.id}`).expect(204);
    expectProblem(await secretary.agent.get(path), 'not_found');
    await show();
    await person.agent.delete(`/api/clubs/${id}/membership`).expect(204);
    expect(await list()).toEqual([]);
  });
});
