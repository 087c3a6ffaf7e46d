import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import {
  invitation,
  invitationList,
  memberList,
  readLinkState,
  sharedGlider,
} from '#shared/schemas/sharing.ts';
import { Invitation } from '#server/models/invitation.ts';
import { GliderSave } from '#server/models/glider-save.ts';
import { Sheet } from '#server/models/sheet.ts';
import { useApp } from '../support/app.ts';
import { mailedToken, mailsTo } from '../support/mails.ts';
import { makePerson, type Person } from '../support/people.ts';
import { expectProblem, refusedFields } from '../support/problems.ts';
import { addMember, makeGlider, smallPlan } from '../support/rows.ts';
import { makeSheet } from '../support/sheets.ts';

const app = useApp();

async function ownerOfOne() {
  const owner = await makePerson(app, { name: 'Odile' });
  return { owner, glider: await makeGlider({ owner: owner.user }) };
}
const invite = ({ agent }: Person, gliderId: string, email: string, role = 'builder') =>
  agent.post(`/api/gliders/${gliderId}/invitations`).send({ email, role });
const accept = ({ agent }: Person, token: string) => agent.post('/api/invitations/accept').send({ token });
const members = async ({ agent }: Person, gliderId: string) =>
  memberList.parse((await agent.get(`/api/gliders/${gliderId}/members`).expect(200)).body).members;
const address = () => `guest.${randomUUID()}@larkmoor.example`;

describe('an invitation', () => {
  it('is mailed, looked at, accepted once, and makes a member', async () => {
    const { owner, glider } = await ownerOfOne();
    const guest = await makePerson(app, { name: 'Rowan' });
    const sent = await invite(owner, glider.id, guest.user.email).expect(201);
    expect(invitation.parse(sent.body)).toMatchObject({ role: 'builder', invitedBy: 'Odile' });
    expect((await mailsTo(guest.user.email))[0]?.subject).toBe('Odile invites you to the glider Test');
    const token = await mailedToken(guest.user.email, 'invitations');
    const preview = await app.visitor().post('/api/invitations/preview').send({ token }).expect(200);
    expect(preview.body).toMatchObject({ gliderName: 'Test', invitedBy: 'Odile', role: 'builder' });
    expect((await accept(guest, token).expect(200)).body).toEqual({ gliderId: glider.id, role: 'builder' });
    expectProblem(await accept(guest, token), 'link_dead');
    expect(await members(owner, glider.id)).toMatchObject([
      { name: 'Odile', role: 'owner', you: true },
      { name: 'Rowan', role: 'builder', email: guest.user.email, you: false },
    ]);
    await guest.agent
      .put(`/api/gliders/${glider.id}`)
      .set('If-Match', '"1"')
      .send({ plan: smallPlan() })
      .expect(200);
  });

  it('to an address again sends another link in place of the first', async () => {
    const { owner, glider } = await ownerOfOne();
    const email = address();
    await invite(owner, glider.id, email).expect(201);
    const first = await mailedToken(email, 'invitations');
    await invite(owner, glider.id, email, 'reader').expect(201);
    expectProblem(await app.visitor().post('/api/invitations/preview').send({ token: first }), 'link_dead');
    const { body } = await owner.agent.get(`/api/gliders/${glider.id}/invitations`).expect(200);
    expect(invitationList.parse(body).invitations).toMatchObject([{ email, role: 'reader' }]);
  });

  it('is withdrawn, declined or runs out, and its link is dead', async () => {
    const { owner, glider } = await ownerOfOne();
    const guest = await makePerson(app);
    const dead = async (end: (id: string, token: string) => Promise<unknown>) => {
      const email = address();
      const { id } = (await invite(owner, glider.id, email).expect(201)).body;
      const token = await mailedToken(email, 'invitations');
      await end(id, token);
      expectProblem(await accept(guest, token), 'link_dead');
    };
    await dead((id) => owner.agent.delete(`/api/invitations/${id}`).expect(204));
    await dead((_, token) => app.visitor().post('/api/invitations/decline').send({ token }).expect(204));
    await dead((id) => Invitation.update({ expiresAt: new Date(Date.now() - 1) }, { where: { id } }));
    expect(await members(owner, glider.id)).toHaveLength(1);
  });

  it('needs the inviter’s address confirmed, and nobody who is a member already', async () => {
    const unsure = await makePerson(app, { verified: false });
    const own = await makeGlider({ owner: unsure.user });
    expectProblem(await invite(unsure, own.id, address()), 'email_unverified');
    const { owner, glider } = await ownerOfOne();
    expectProblem(await invite(owner, glider.id, owner.user.email), 'already_member');
    expect(refusedFields(await invite(owner, glider.id, 'nobody', 'owner'))).toEqual(['#/email', '#/role']);
  });

  it('lifts a member’s role and never lowers it', async () => {
    const { owner, glider } = await ownerOfOne();
    const guest = await makePerson(app);
    const email = address();
    await invite(owner, glider.id, email, 'reader').expect(201);
    await addMember(glider, guest.user, 'pilot');
    const token = await mailedToken(email, 'invitations');
    expect((await accept(guest, token).expect(200)).body).toMatchObject({ role: 'pilot' });
  });
});

describe('members', () => {
  it('change their role and go as the owner says; addresses are for the owner’s eyes', async () => {
    const { owner, glider } = await ownerOfOne();
    const [one, two] = [await makePerson(app), await makePerson(app)];
    await addMember(glider, one.user, 'reader');
    await addMember(glider, two.user, 'pilot');
    const at = (person: Person) => `/api/gliders/${glider.id}/members/${person.user.id}`;
    const seen = await members(one, glider.id);
    expect(seen.filter(({ email }) => email !== null)).toMatchObject([{ you: true }]);
    expect((await owner.agent.put(at(one)).send({ role: 'builder' }).expect(200)).body).toMatchObject({
      role: 'builder',
    });
    await owner.agent.delete(at(two)).expect(204);
    expectProblem(await two.agent.get(`/api/gliders/${glider.id}`), 'not_found');
    expectProblem(await owner.agent.delete(at(two)), 'not_found');
    expectProblem(await owner.agent.delete(at(owner)), 'not_found');
    expectProblem(await owner.agent.put(at(owner)).send({ role: 'reader' }), 'not_found');
  });

  it('leave by themselves; an owner has to hand over first', async () => {
    const { owner, glider } = await ownerOfOne();
    const pilot = await makePerson(app);
    await addMember(glider, pilot.user, 'pilot');
    await pilot.agent.delete(`/api/gliders/${glider.id}/membership`).expect(204);
    expectProblem(await pilot.agent.get(`/api/gliders/${glider.id}`), 'not_found');
    expectProblem(await owner.agent.delete(`/api/gliders/${glider.id}/membership`), 'forbidden');
  });
});

describe('handing over', () => {
  it('moves the glider with all its rows, frozen ones too, and makes the old owner a builder', async () => {
    const { owner, glider } = await ownerOfOne();
    await makeSheet(glider, owner.user);
    const next = await makePerson(app);
    await addMember(glider, next.user, 'reader');
    const send = (userId: string) => owner.agent.post(`/api/gliders/${glider.id}/ownership`).send({ userId });
    expectProblem(await send(randomUUID()), 'not_found');
    expectProblem(await send(owner.user.id), 'already_member');
    expect((await send(next.user.id).expect(200)).body).toMatchObject({ role: 'builder' });
    const ownerId = next.user.id;
    expect(await Sheet.findOne({ where: { gliderId: glider.id } })).toMatchObject({ ownerId });
    expect(await GliderSave.findOne({ where: { gliderId: glider.id } })).toMatchObject({ ownerId });
    expectProblem(await send(owner.user.id), 'forbidden');
    await next.agent.delete(`/api/gliders/${glider.id}`).set('If-Match', '"1"').expect(204);
  });

  it('leaves frozen rows frozen', async () => {
    const { owner, glider } = await ownerOfOne();
    const sheet = await makeSheet(glider, owner.user);
    const stranger = await makePerson(app);
    await expect(Sheet.update({ note: 'x' }, { where: { id: sheet.id } })).rejects.toThrow(/unchanging/);
    await expect(Sheet.update({ ownerId: stranger.user.id }, { where: { id: sheet.id } })).rejects.toThrow(
      /unchanging|foreign key/,
    );
  });
});

describe('the read-only link', () => {
  const at = (gliderId: string) => `/api/gliders/${gliderId}/link`;

  it('shows the saved plan to whoever has it, without names or addresses, until it is switched off', async () => {
    const { owner, glider } = await ownerOfOne();
    expect((await owner.agent.get(at(glider.id)).expect(200)).body).toEqual({ link: null });
    const on = readLinkState.parse((await owner.agent.post(at(glider.id)).expect(200)).body);
    expect((await owner.agent.post(at(glider.id)).expect(200)).body).toEqual(on);
    const shared = `/api/shared/${on.link?.token}`;
    const seen = await app.visitor().get(shared).expect(200);
    expect(sharedGlider.parse(seen.body)).toMatchObject({ name: 'Test', plan: smallPlan() });
    expect(seen.text).not.toContain(owner.user.email);
    expect(seen.text).not.toContain('Odile');
    await owner.agent.delete(at(glider.id)).expect(204);
    expectProblem(await app.visitor().get(shared), 'not_found');
    const again = readLinkState.parse((await owner.agent.post(at(glider.id)).expect(200)).body);
    expect(again.link?.token).not.toBe(on.link?.token);
  });
});
