import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { buildTerms, weighing as weighingSchema, weighingList } from '#shared/schemas/weighing.ts';
import { Weighing } from '#server/models/weighing.ts';
import { database } from '#server/services/transaction.ts';
import { useApp } from '../support/app.ts';
import { buildTermsBody, weighingBody } from '../support/built.ts';
import { changes, countRows } from '../support/counts.ts';
import { makePerson, type Person } from '../support/people.ts';
import { expectProblem, refusedFields } from '../support/problems.ts';
import { addMember, makeGlider } from '../support/rows.ts';

const app = useApp();

const add = ({ agent }: Person, gliderId: string, body: object = weighingBody()) =>
  agent.post(`/api/gliders/${gliderId}/weighings`).send(body);
const made = async (person: Person, gliderId: string, body?: object) =>
  weighingSchema.parse((await add(person, gliderId, body).expect(201)).body);
const list = async ({ agent }: Person, gliderId: string) =>
  weighingList.parse((await agent.get(`/api/gliders/${gliderId}/weighings`).expect(200)).body).weighings;

async function ownerOfOne() {
  const owner = await makePerson(app, { name: 'Odile' });
  return { owner, glider: await makeGlider({ owner: owner.user }) };
}

describe('POST /api/gliders/:id/weighings', () => {
  it('writes a weighing down with its mean, less the tare, and its uncertainty', async () => {
    const { owner, glider } = await ownerOfOne();
    const before = await countRows();
    const weighed = await made(owner, glider.id);
    expect(weighed).toMatchObject({ ...weighingBody(), number: 1, weighedBy: 'Odile', correctedBy: null });
    expect(weighed.mass).toBeCloseTo(5.05, 12);
    // Two readings 0.1 g apart: 0.05² of the mean; two steps of 0.1 g: 2·0.01/12.
    expect(weighed.u).toBeCloseTo(Math.sqrt(0.0025 + 0.02 / 12), 12);
    expect(changes(before, await countRows())).toEqual({ weighings: 1 });
    expect(await list(owner, glider.id)).toEqual([weighed]);
  });

  it('writes one down for one key, sent twice at the same moment', async () => {
    const { owner, glider } = await ownerOfOne();
    const key = randomUUID();
    const send = () => add(owner, glider.id).set('Idempotency-Key', key).expect(201);
    const [one, two] = await Promise.all([send(), send()]);
    expect(two.body).toEqual(one.body);
    expect(await list(owner, glider.id)).toHaveLength(1);
  });

  it('lets a later weighing take the place of an earlier one and keeps both', async () => {
    const { owner, glider } = await ownerOfOne();
    const first = await made(owner, glider.id);
    const body = weighingBody({ corrects: first.id, reason: 'Stand was on the scale', values: [5.1] });
    const second = await made(owner, glider.id, body);
    expect(await list(owner, glider.id)).toMatchObject([
      { id: first.id, values: first.values, correctedBy: second.id },
      { id: second.id, corrects: first.id, correctedBy: null },
    ]);
  });

  it('takes a weighing back without another, with a reason', async () => {
    const { owner, glider } = await ownerOfOne();
    const first = await made(owner, glider.id);
    const back = weighingBody({
      corrects: first.id,
      withdraws: true,
      values: [],
      tare: 0,
      reason: 'Wrong model',
    });
    expect(await made(owner, glider.id, back)).toMatchObject({ mass: null, u: null });
    expectProblem(
      await add(owner, glider.id, { ...back, corrects: (await list(owner, glider.id))[1]?.id }),
      'corrected_already',
    );
  });

  it('lets only one of two corrections of the same weighing stand', async () => {
    const { owner, glider } = await ownerOfOne();
    const first = await made(owner, glider.id);
    const body = weighingBody({ corrects: first.id, reason: 'Read wrong' });
    const answers = await Promise.all([add(owner, glider.id, body), add(owner, glider.id, body)]);
    expect(new Set(answers.map(({ status }) => status))).toEqual(new Set([201, 409]));
    expect(await list(owner, glider.id)).toHaveLength(2);
  });

  it('names every wrong field at once and keeps nothing', async () => {
    const { owner, glider } = await ownerOfOne();
    const before = await countRows();
    const wrong = weighingBody({ title: '', covers: [], values: [], resolution: 0, corrects: randomUUID() });
    expect(refusedFields(await add(owner, glider.id, wrong))).toEqual(
      expect.arrayContaining(['#/title', '#/covers', '#/resolution']),
    );
    expect(refusedFields(await add(owner, glider.id, weighingBody({ values: [] })))).toEqual(['#/values']);
    expect(refusedFields(await add(owner, glider.id, weighingBody({ tare: 9 })))).toEqual(['#/tare']);
    expect(refusedFields(await add(owner, glider.id, weighingBody({ withdraws: true })))).toEqual([
      '#/withdraws',
    ]);
    expect(refusedFields(await add(owner, glider.id, weighingBody({ corrects: randomUUID() })))).toEqual([
      '#/reason',
    ]);
    expect(changes(before, await countRows())).toEqual({});
  });

  it('refuses to correct a weighing of another glider, or to show another’s photo', async () => {
    const { owner, glider } = await ownerOfOne();
    const other = await makeGlider({ owner: owner.user });
    const elsewhere = await made(owner, other.id);
    const body = weighingBody({ corrects: elsewhere.id, reason: 'Not this one' });
    expect(refusedFields(await add(owner, glider.id, body))).toEqual(['#/corrects']);
    expect(refusedFields(await add(owner, glider.id, weighingBody({ photoId: randomUUID() })))).toEqual([
      '#/photoId',
    ]);
  });

  it('is open to the pilot and closed to the reader', async () => {
    const { glider } = await ownerOfOne();
    const [pilot, reader] = [await makePerson(app), await makePerson(app)];
    await addMember(glider, pilot.user, 'pilot');
    await addMember(glider, reader.user, 'reader');
    await add(pilot, glider.id).expect(201);
    expectProblem(await add(reader, glider.id), 'forbidden');
    expect(await list(reader, glider.id)).toHaveLength(1);
  });

  it('leaves a row that the database itself refuses to change', async () => {
    const { owner, glider } = await ownerOfOne();
    const { id } = await made(owner, glider.id);
    await expect(Weighing.update({ number: 7 }, { where: { id } })).rejects.toThrow(/unchanging/);
    await expect(database().query('DELETE FROM weighings WHERE id = $1', { bind: [id] })).rejects.toThrow(
      /unchanging/,
    );
  });

  it('goes with its glider', async () => {
    const { owner, glider } = await ownerOfOne();
    const first = await made(owner, glider.id);
    await made(owner, glider.id, weighingBody({ corrects: first.id, reason: 'Read wrong' }));
    await owner.agent.delete(`/api/gliders/${glider.id}`).set('If-Match', '"1"').expect(204);
    expect(await Weighing.count({ where: { gliderId: glider.id } })).toBe(0);
  });
});

describe('what a glider is built to', () => {
  const at = (gliderId: string) => `/api/gliders/${gliderId}/build-terms`;

  it('is empty at version 1 until it is kept, and counts up', async () => {
    const { owner, glider } = await ownerOfOne();
    const none = await owner.agent.get(at(glider.id)).expect(200);
    expect(buildTerms.parse(none.body)).toMatchObject({ target: null, pieces: [], version: 1 });
    const kept = await owner.agent
      .put(at(glider.id))
      .set('If-Match', '"1"')
      .send(buildTermsBody())
      .expect(200);
    expect(buildTerms.parse(kept.body)).toMatchObject({
      ...buildTermsBody(),
      version: 2,
      updatedBy: 'Odile',
    });
    expect(kept.headers['etag']).toBe('"2"');
  });

  it('answers a stale save with what is there, and its repetition with what it made', async () => {
    const { owner, glider } = await ownerOfOne();
    const put = (target: number) =>
      owner.agent.put(at(glider.id)).set('If-Match', '"1"').send(buildTermsBody({ target }));
    await put(120).expect(200);
    await put(120).expect(200);
    const stale = expectProblem(await put(130), 'stale_version');
    expect(stale).toMatchObject({ current: { target: 120, version: 2 } });
  });

  it('refuses a class window that is upside down', async () => {
    const { owner, glider } = await ownerOfOne();
    const body = buildTermsBody({ least: 120, most: 110 });
    const res = await owner.agent.put(at(glider.id)).set('If-Match', '"1"').send(body);
    expect(refusedFields(res)).toEqual(['#/most']);
  });
});
