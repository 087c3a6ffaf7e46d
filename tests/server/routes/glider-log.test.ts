import { describe, expect, it } from 'vitest';
import { estimate } from '#shared/core/estimate.ts';
import { gliderSave, gliderSaveList, gliderState, type GliderSaveDto } from '#shared/schemas/glider-save.ts';
import { glider as gliderSchema } from '#shared/schemas/glider.ts';
import type { PlanDto } from '#shared/schemas/plan.ts';
import { useApp } from '../support/app.ts';
import { changes, countRows } from '../support/counts.ts';
import { makePerson, type Person } from '../support/people.ts';
import { expectProblem, refusedFields } from '../support/problems.ts';
import { makeGlider, makeMaterial, planWith, smallPlan } from '../support/rows.ts';

const app = useApp();

const nose = (mass: number) =>
  smallPlan({ items: [{ id: 'nose', name: 'Nose weight', group: 'ballast', mass, at: [-120, 0, 0] }] });

async function savedTwice(plan: PlanDto): Promise<{ owner: Person; id: string }> {
  const owner = await makePerson(app);
  const glider = await makeGlider({ owner: owner.user });
  await owner.agent.put(`/api/gliders/${glider.id}`).set('If-Match', '"1"').send({ plan }).expect(200);
  return { owner, id: glider.id };
}

async function logOf({ agent }: Person, id: string): Promise<GliderSaveDto[]> {
  return gliderSaveList.parse((await agent.get(`/api/gliders/${id}/saves`).expect(200)).body).saves;
}

describe('a row of the log', () => {
  it('tells what changed, and by how much the model grew and its balance moved', async () => {
    const { owner, id } = await savedTwice(nose(26));
    const [second, first] = await logOf(owner, id);
    const [before, after] = [estimate(smallPlan()), estimate(nose(26))];
    expect(first).toMatchObject({ version: 1, changes: null, name: null, restoredFrom: null });
    expect(second?.changes?.list).toEqual([
      { path: 'items/nose', name: 'Nose weight', field: 'mass', from: 20, to: 26, unit: 'g' },
    ]);
    expect(second?.changes?.more).toBe(0);
    expect(second?.changes?.massBy).toBeCloseTo(6, 9);
    expect(second?.changes?.balanceBy).toBeCloseTo(after.balance.x! - before.balance.x!, 9);
    expect(second?.changes?.balanceBy).toBeLessThan(-1);
  });

  it('keeps a hundred differences and says how many more there were', async () => {
    const items = Array.from({ length: 130 }, (_, i) => ({
      id: `shot-${i}`,
      name: `Shot ${i}`,
      group: 'ballast',
      mass: 1,
      at: [0, 0, 0] as [number, number, number],
    }));
    const { owner, id } = await savedTwice(smallPlan({ items }));
    const changed = (await logOf(owner, id))[0]?.changes;
    expect(changed?.list).toHaveLength(100);
    // 130 added and the nose weight removed.
    expect(changed?.more).toBe(31);
  });

  it('moves no balance where there was none', async () => {
    const owner = await makePerson(app);
    const empty = smallPlan({ surfaces: [], items: [] });
    const glider = await makeGlider({ owner: owner.user, plan: empty });
    await owner.agent
      .put(`/api/gliders/${glider.id}`)
      .set('If-Match', '"1"')
      .send({ plan: nose(5) })
      .expect(200);
    expect((await logOf(owner, glider.id))[0]?.changes?.balanceBy).toBeNull();
  });
});

describe('GET /api/gliders/:id/saves/:version', () => {
  it('answers a state exactly as it was saved, after later saves too', async () => {
    const { owner, id } = await savedTwice(nose(26));
    const state = async (version: number) =>
      gliderState.parse((await owner.agent.get(`/api/gliders/${id}/saves/${version}`).expect(200)).body);
    expect(await state(1)).toMatchObject({
      version: 1,
      savedBy: owner.user.name,
      plan: smallPlan(),
      figures: { mass: estimate(smallPlan()).totals.mass },
    });
    expect(await state(2)).toMatchObject({ version: 2, plan: nose(26) });
  });

  it('knows no version that never was, and takes numbers only', async () => {
    const { owner, id } = await savedTwice(nose(26));
    expectProblem(await owner.agent.get(`/api/gliders/${id}/saves/3`), 'not_found');
    expect(refusedFields(await owner.agent.get(`/api/gliders/${id}/saves/last`))).toEqual(['#/version']);
  });
});

describe('POST /api/gliders/:id/saves/:version/restore', () => {
  const restore = ({ agent }: Person, id: string, version: number, ifMatch: string) =>
    agent.post(`/api/gliders/${id}/saves/${version}/restore`).set('If-Match', ifMatch);

  it('saves the older plan anew with its materials, and leaves every state before it in the log', async () => {
    const owner = await makePerson(app);
    const plan = planWith(await makeMaterial());
    const glider = await makeGlider({ owner: owner.user, plan });
    await owner.agent
      .put(`/api/gliders/${glider.id}`)
      .set('If-Match', '"1"')
      .send({ plan: nose(9) })
      .expect(200);
    const before = await countRows();

    const res = await restore(owner, glider.id, 1, '"2"').expect(200);

    expect(gliderSchema.parse(res.body)).toMatchObject({ version: 3, plan });
    expect(res.headers['etag']).toBe('"3"');
    expect(changes(before, await countRows())).toEqual({ glider_saves: 1, glider_materials: 1 });
    const log = await logOf(owner, glider.id);
    expect(log.map(({ version, restoredFrom }) => [version, restoredFrom])).toEqual([
      [3, 1],
      [2, null],
      [1, null],
    ]);
    expect(log[0]?.changes?.massBy).toBeCloseTo(11, 9);
  });

  it('refuses from a stale version with the current state, and a version that never was', async () => {
    const { owner, id } = await savedTwice(nose(26));
    const before = await countRows();
    const refusal = expectProblem(await restore(owner, id, 1, '"1"'), 'stale_version');
    expect(gliderSchema.parse(refusal['current'])).toMatchObject({ version: 2, plan: nose(26) });
    expectProblem(await restore(owner, id, 7, '"2"'), 'not_found');
    expect(changes(before, await countRows())).toEqual({});
  });

  it('answers one sent twice, because its answer was lost, as done once', async () => {
    const { owner, id } = await savedTwice(nose(26));
    const first = await restore(owner, id, 1, '"2"').expect(200);
    const again = await restore(owner, id, 1, '"2"').expect(200);
    expect(again.body).toEqual(first.body);
    expect(await logOf(owner, id)).toHaveLength(3);
  });
});

describe('PUT /api/gliders/:id/saves/:version/name', () => {
  it('names a state, renames it and takes the name away, and changes nothing else', async () => {
    const { owner, id } = await savedTwice(nose(26));
    const before = await countRows();
    const put = async (name: string) => {
      const res = await owner.agent.put(`/api/gliders/${id}/saves/1/name`).send({ name }).expect(200);
      return gliderSave.parse(res.body).name;
    };
    expect(await put('  Before covering ')).toBe('Before covering');
    expect(await put('Uncovered')).toBe('Uncovered');
    expect((await logOf(owner, id)).map(({ name }) => name)).toEqual([null, 'Uncovered']);
    expect(changes(before, await countRows())).toEqual({ glider_save_names: 1 });
    expect(await put('')).toBeNull();
    expect(changes(before, await countRows())).toEqual({});
  });

  it('refuses a name that is too long, and a version that never was', async () => {
    const { owner, id } = await savedTwice(nose(26));
    const put = (version: number, name: string) =>
      owner.agent.put(`/api/gliders/${id}/saves/${version}/name`).send({ name });
    expect(refusedFields(await put(1, 'x'.repeat(121)))).toEqual(['#/name']);
    expectProblem(await put(8, 'Later'), 'not_found');
  });
});
