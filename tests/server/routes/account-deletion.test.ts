import { describe, expect, it } from 'vitest';
import { accountDeletion } from '#shared/schemas/account.ts';
import { Glider } from '#server/models/glider.ts';
import { Session } from '#server/models/session.ts';
import { User } from '#server/models/user.ts';
import { useApp } from '../support/app.ts';
import { weighingBody } from '../support/built.ts';
import { makePerson, PASSWORD, type Person } from '../support/people.ts';
import { makePhoto } from '../support/photos.ts';
import { expectProblem } from '../support/problems.ts';
import { addMember, makeGlider, smallPlan } from '../support/rows.ts';
import { makeSheet } from '../support/sheets.ts';

const app = useApp();

const remove = ({ agent }: Person, password = PASSWORD) =>
  agent.post('/api/account/deletion').send({ password });

describe('the deletion of an account', () => {
  it('takes own gliders, leaves others’, and ends every session', async () => {
    const person = await makePerson(app);
    const own = await makeGlider({ owner: person.user });
    await makeSheet(own, person.user);
    const other = await makeGlider();
    await addMember(other, person.user, 'builder');
    const res = await remove(person).expect(200);
    expect(accountDeletion.parse(res.body)).toEqual({
      deleted: [{ id: own.id, name: 'Test' }],
      left: [{ id: other.id, name: 'Test' }],
    });
    expect(await Glider.findByPk(own.id)).toBeNull();
    expect(await Session.count({ where: { userId: person.user.id } })).toBe(0);
    expectProblem(await person.agent.get('/api/account'), 'signed_out');
    const { email } = person.user;
    expectProblem(
      await app.visitor().post('/api/session').send({ email, password: PASSWORD }),
      'wrong_credentials',
    );
    const again = { name: 'Again', email, password: 'spruce over the ridge' };
    await app.visitor().post('/api/users').send(again).expect(201);
  });

  it('leaves the log of others’ gliders true, without the person’s name or address', async () => {
    const owner = await makePerson(app);
    const glider = await makeGlider({ owner: owner.user });
    const builder = await makePerson(app, { name: 'Rowan Quick' });
    await addMember(glider, builder.user, 'builder');
    const put = builder.agent.put(`/api/gliders/${glider.id}`).set('If-Match', '"1"');
    await put.send({ plan: smallPlan({ name: 'Changed' }) }).expect(200);
    await builder.agent.post(`/api/gliders/${glider.id}/weighings`).send(weighingBody()).expect(201);
    await remove(builder).expect(200);
    const log = await owner.agent.get(`/api/gliders/${glider.id}/saves`).expect(200);
    expect(log.text).toContain('Former member');
    expect(log.text).not.toContain('Rowan Quick');
    const husk = await User.findByPk(builder.user.id, { rejectOnEmpty: true });
    expect(husk.email).toMatch(/@deleted\.invalid$/);
    expect(JSON.stringify(husk)).not.toContain('Rowan');
  });

  it('waits until gliders with other members are handed over, and names them', async () => {
    const owner = await makePerson(app);
    const [shared, alone] = [
      await makeGlider({ owner: owner.user }),
      await makeGlider({ owner: owner.user }),
    ];
    await addMember(shared, (await makePerson(app)).user, 'reader');
    const refused = expectProblem(await remove(owner), 'shared_gliders');
    expect(refused['gliders']).toEqual([{ id: shared.id, name: 'Test' }]);
    expect(await Glider.count({ where: { id: [shared.id, alone.id] } })).toBe(2);
  });

  it('needs the password', async () => {
    const person = await makePerson(app);
    expectProblem(await remove(person, 'not the password'), 'wrong_password');
    await person.agent.get('/api/account').expect(200);
  });
});

describe('everything of an account as a file', () => {
  it('is JSON with gliders, their states, sheets, photos and weighings, and of others’ gliders the names', async () => {
    const person = await makePerson(app);
    const own = await makeGlider({ owner: person.user });
    await makeSheet(own, person.user, 'Before covering');
    await makePhoto(own, person.user);
    await person.agent.post(`/api/gliders/${own.id}/weighings`).send(weighingBody()).expect(201);
    const other = await makeGlider({ plan: smallPlan({ name: 'Theirs' }) });
    await addMember(other, person.user, 'reader');
    const res = await person.agent.get('/api/account/export').expect(200);
    expect(res.headers['content-disposition']).toContain('featherbeam account.json');
    const file = JSON.parse(res.text);
    expect(file.account.email).toBe(person.user.email);
    const byId = new Map(file.gliders.map((glider: { id: string }) => [glider.id, glider]));
    expect(byId.get(own.id)).toMatchObject({
      plan: smallPlan(),
      saves: [{ version: 1 }],
      sheets: [{ note: 'Before covering' }],
      photos: [{ jpegBase64: expect.any(String) }],
      weighings: [{ title: 'Ribs, port' }],
    });
    expect(byId.get(other.id)).toEqual({ id: other.id, name: 'Theirs', role: 'reader' });
    expect(res.text).not.toContain('argon2');
  });
});
