import { describe, expect, it } from 'vitest';
import { LIMITS } from '#shared/schemas/limits.ts';
import { gliderTrials, type TrialsInput } from '#shared/schemas/trials.ts';
import { useApp } from '../support/app.ts';
import { changes, countRows } from '../support/counts.ts';
import { makePerson, type Person } from '../support/people.ts';
import { expectProblem, refusedFields } from '../support/problems.ts';
import { addMember, makeGlider } from '../support/rows.ts';

const app = useApp();

const LIGHT = {
  key: 'balsa-light',
  material: { name: 'Balsa, light', category: 'wood', density: 112, cv: 0.08 },
} as const;
const listOf = (...names: string[]): TrialsInput => ({
  trials: names.map((name) => ({ name, materials: { ribs: LIGHT, 'wing/spar': LIGHT } })),
  terms: { arm: -120, minimumMass: 300 },
});

const get = async ({ agent }: Person, id: string) =>
  gliderTrials.parse((await agent.get(`/api/gliders/${id}/trials`).expect(200)).body);
const put = ({ agent }: Person, id: string, version: number, body: object) =>
  agent.put(`/api/gliders/${id}/trials`).set('If-Match', `"${version}"`).send(body);

async function ownerOfOne() {
  const owner = await makePerson(app, { name: 'Odile' });
  return { owner, glider: await makeGlider({ owner: owner.user }) };
}

describe('GET /api/gliders/:id/trials', () => {
  it('is an empty list of version 1 while nobody has kept any', async () => {
    const { owner, glider } = await ownerOfOne();
    const res = await owner.agent.get(`/api/gliders/${glider.id}/trials`).expect(200);
    expect(res.headers['etag']).toBe('"1"');
    expect(gliderTrials.parse(res.body)).toEqual({
      trials: [],
      terms: { arm: null, minimumMass: null },
      version: 1,
      updatedAt: null,
      updatedBy: null,
    });
  });

  it('shows a reader what the builder has kept', async () => {
    const { owner, glider } = await ownerOfOne();
    const reader = await makePerson(app);
    await addMember(glider, reader.user, 'reader');
    await put(owner, glider.id, 1, listOf('All light')).expect(200);
    expect(await get(reader, glider.id)).toMatchObject({
      ...listOf('All light'),
      version: 2,
      updatedBy: 'Odile',
    });
  });
});

describe('PUT /api/gliders/:id/trials', () => {
  it('keeps the list in its order and counts the version up', async () => {
    const { owner, glider } = await ownerOfOne();
    const before = await countRows();
    const res = await put(owner, glider.id, 1, listOf('Light', 'As drawn', 'Hard spar')).expect(200);
    expect(res.headers['etag']).toBe('"2"');
    expect(changes(before, await countRows())).toEqual({ glider_trials: 1 });
    await put(owner, glider.id, 2, listOf('Hard spar', 'Light')).expect(200);
    expect(changes(before, await countRows())).toEqual({ glider_trials: 1 });
    const kept = await get(owner, glider.id);
    expect(kept).toMatchObject({ ...listOf('Hard spar', 'Light'), version: 3 });
  });

  it('refuses a stale version and hands back what is there, also of the very first', async () => {
    const { owner, glider } = await ownerOfOne();
    const answers = await Promise.all(['a', 'b', 'c'].map((name) => put(owner, glider.id, 1, listOf(name))));
    expect(answers.map(({ status }) => status).toSorted((a, b) => a - b)).toEqual([200, 412, 412]);
    const refused = answers.find(({ status }) => status === 412)!;
    const current = gliderTrials.parse(expectProblem(refused, 'stale_version')['current']);
    expect(current).toEqual(await get(owner, glider.id));
    expect(current.trials).toEqual(answers.find(({ status }) => status === 200)?.body.trials);
  });

  it('answers a save sent twice, because its answer was lost, as saved once', async () => {
    const { owner, glider } = await ownerOfOne();
    const first = await put(owner, glider.id, 1, listOf('Light')).expect(200);
    const again = await put(owner, glider.id, 1, listOf('Light')).expect(200);
    expect(again.body).toEqual(first.body);
  });

  it('refuses what is wrong by its field, and keeps what was there', async () => {
    const { owner, glider } = await ownerOfOne();
    await put(owner, glider.id, 1, listOf('Light')).expect(200);
    const many = listOf(...Array.from({ length: LIMITS.trials.max + 1 }, (_, n) => `Trial ${n}`));
    expect(refusedFields(await put(owner, glider.id, 2, many))).toEqual(['#/trials']);
    const wrong = {
      trials: [{ name: '', materials: { '': LIGHT } }],
      terms: { arm: 'nose', minimumMass: 0 },
    };
    const fields = ['#/terms/arm', '#/terms/minimumMass', '#/trials/0/materials/', '#/trials/0/name'];
    expect(refusedFields(await put(owner, glider.id, 2, wrong))).toEqual(fields);
    expect(await get(owner, glider.id)).toMatchObject(listOf('Light'));
  });

  it('goes with the glider', async () => {
    const { owner, glider } = await ownerOfOne();
    await put(owner, glider.id, 1, listOf('Light')).expect(200);
    const before = await countRows();
    await owner.agent.delete(`/api/gliders/${glider.id}`).expect(204);
    expect(changes(before, await countRows())).toMatchObject({ gliders: -1, glider_trials: -1 });
  });
});
