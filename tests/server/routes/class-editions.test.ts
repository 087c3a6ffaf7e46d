import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { classEdition, classEditionList, gliderAim } from '#shared/schemas/class-edition.ts';
import { useApp } from '../support/app.ts';
import { editionBody, joinClub, makeClub, makeEdition } from '../support/clubs.ts';
import { makePerson } from '../support/people.ts';
import { expectProblem, refusedFields } from '../support/problems.ts';
import { addMember, makeGlider } from '../support/rows.ts';

const app = useApp();

async function secretaryOfOne() {
  const secretary = await makePerson(app);
  return { ...secretary, club: await makeClub(secretary.user) };
}
const [limit] = editionBody().limits;

describe('an edition of a class', () => {
  it('is added by a secretary for the club alone, and only once', async () => {
    const { agent, club } = await secretaryOfOne();
    const member = await makePerson(app);
    await joinClub(club, member.user, 'member');
    const stranger = await makePerson(app);
    const add = () => agent.post(`/api/clubs/${club.id}/class-editions`).send(editionBody());
    const { body } = await add().expect(201);
    expect(classEdition.parse(body)).toMatchObject({ clubId: club.id, inUse: false, can: { edit: true } });
    expectProblem(await add(), 'edition_exists');
    const seen = async (who: typeof member) =>
      classEditionList
        .parse((await who.agent.get('/api/class-editions').expect(200)).body)
        .editions.find(({ id }) => id === body.id);
    expect(await seen(member)).toMatchObject({ can: { edit: false } });
    expect(await seen(stranger)).toBeUndefined();
  });

  it('is made once for a key', async () => {
    const { agent, club } = await secretaryOfOne();
    const key = randomUUID();
    const add = () =>
      agent
        .post(`/api/clubs/${club.id}/class-editions`)
        .set('Idempotency-Key', key)
        .send(editionBody())
        .expect(201);
    expect((await add()).body.id).toBe((await add()).body.id);
  });

  it.each([
    [{ limits: [{ ...limit, value: '0' }] }, '#/limits/0/value'],
    [{ limits: [{ ...limit, value: '4e2' }] }, '#/limits/0/value'],
    [{ limits: [{ ...limit, value: '-410' }] }, '#/limits/0/value'],
    [{ limits: [{ ...limit, unit: 'mm' }] }, '#/limits/0/unit'],
    [{ limits: Array.from({ length: 41 }, () => limit) }, '#/limits'],
    [{ key: 'tarn 1' }, '#/key'],
    [{ edition: ' ' }, '#/edition'],
  ])('is refused with %j', async (wrong, field) => {
    const { agent, club } = await secretaryOfOne();
    const sent = agent.post(`/api/clubs/${club.id}/class-editions`).send({ ...editionBody(), ...wrong });
    expect(refusedFields(await sent)).toEqual([field]);
  });

  it('changes and goes while nothing uses it, and never again once a glider was aimed at it', async () => {
    const { agent, user, club } = await secretaryOfOne();
    const { id } = await makeEdition(club);
    const path = `/api/class-editions/${id}`;
    const put = (version: number, note: string) =>
      agent.put(path).set('If-Match', `"${version}"`).send(editionBody({ note }));
    expect((await put(1, 'Checked').expect(200)).body).toMatchObject({ note: 'Checked', version: 2 });
    expectProblem(await put(1, 'Late'), 'stale_version');
    const glider = await makeGlider({ owner: user });
    await agent.put(`/api/gliders/${glider.id}/aim`).send({ editionId: id }).expect(200);
    expectProblem(await put(2, 'Changed'), 'edition_in_use');
    await agent.delete(`/api/gliders/${glider.id}/aim`).expect(204);
    expectProblem(await put(2, 'Changed'), 'edition_in_use');
    expectProblem(await agent.delete(path), 'edition_in_use');
    const failure = app.sequelize.query("UPDATE class_editions SET note = 'x' WHERE id = ?", {
      replacements: [id],
    });
    await expect(failure).rejects.toThrow('an edition in use never changes');
    expect((await agent.get(path).expect(200)).body).toMatchObject({ note: 'Checked', inUse: true });
    await agent.delete(`/api/class-editions/${(await makeEdition(club)).id}`).expect(204);
  });
});

describe('the aim of a glider', () => {
  it('is told to everybody who may read the glider, whichever club the edition is of', async () => {
    const { agent, user, club } = await secretaryOfOne();
    const glider = await makeGlider({ owner: user });
    const reader = await makePerson(app);
    await addMember(glider, reader.user, 'reader');
    const path = `/api/gliders/${glider.id}/aim`;
    expect((await reader.agent.get(path).expect(200)).body).toEqual({ edition: null });
    const { id } = await makeEdition(club);
    await agent.put(path).send({ editionId: id }).expect(200);
    const { body } = await reader.agent.get(path).expect(200);
    expect(gliderAim.parse(body).edition).toMatchObject({ id, inUse: true, can: { edit: false } });
    const other = await makeEdition(null);
    await agent.put(path).send({ editionId: other.id }).expect(200);
    expect((await agent.get(path)).body.edition.id).toBe(other.id);
  });

  it('is no edition of a club that one is not in', async () => {
    const { club } = await secretaryOfOne();
    const { agent, user } = await makePerson(app);
    const glider = await makeGlider({ owner: user });
    const { id } = await makeEdition(club);
    for (const editionId of [id, randomUUID()]) {
      expectProblem(await agent.put(`/api/gliders/${glider.id}/aim`).send({ editionId }), 'not_found');
    }
  });
});
