import { describe, expect, it } from 'vitest';
import { material as materialSchema, materialList, materialUses } from '#shared/schemas/material.ts';
import { Material } from '#server/models/material.ts';
import { useApp } from '../support/app.ts';
import { changes, countRows } from '../support/counts.ts';
import { makePerson } from '../support/people.ts';
import { expectProblem, refusedFields } from '../support/problems.ts';
import { addMember, makeGlider, makeMaterial, MATERIAL, planWith, smallPlan } from '../support/rows.ts';

const app = useApp();

describe('GET /api/materials', () => {
  it('shows a visitor everybody’s materials and nobody’s own, with nothing to edit', async () => {
    const shared = await makeMaterial();
    const own = await makeMaterial({ owner: (await makePerson(app)).user });
    const { materials } = materialList.parse((await app.visitor().get('/api/materials').expect(200)).body);
    expect(materials.find(({ id }) => id === shared.id)).toMatchObject({
      shared: true,
      can: { edit: false, delete: false },
    });
    expect(materials.map(({ id }) => id)).not.toContain(own.id);
  });

  it('shows a user the own rows beside everybody’s, and how many gliders use each', async () => {
    const { user, agent } = await makePerson(app);
    const [own, shared] = [await makeMaterial({ owner: user }), await makeMaterial()];
    await makeGlider({ owner: user, plan: planWith(own) });
    await makeGlider({ plan: planWith(shared) });
    await makeGlider({ plan: planWith(shared) });
    const { materials } = materialList.parse((await agent.get('/api/materials').expect(200)).body);
    const seen = (id: string) => materials.find((row) => row.id === id);
    expect(seen(own.id)).toMatchObject({ shared: false, usedBy: 1, can: { edit: true, delete: true } });
    expect(seen(shared.id)).toMatchObject({ shared: true, usedBy: 2, can: { edit: false, delete: false } });
  });
});

describe('POST /api/materials', () => {
  it('adds a row that only its keeper sees', async () => {
    const [keeper, other] = [await makePerson(app), await makePerson(app)];
    const before = await countRows();
    const res = await keeper.agent
      .post('/api/materials')
      .send({ ...MATERIAL, name: 'Fichte, leicht' })
      .expect(201);
    const made = materialSchema.parse(res.body);
    expect(made).toMatchObject({ ...MATERIAL, name: 'Fichte, leicht', version: 1, usedBy: 0 });
    expect(made.key).toMatch(/^fichte-leicht-[0-9a-f]{8}$/);
    expect(res.headers).toMatchObject({ etag: '"1"', location: `/api/materials/${made.id}` });
    expect(changes(before, await countRows())).toEqual({ materials: 1 });
    await keeper.agent.get(`/api/materials/${made.id}`).expect(200);
    expectProblem(await other.agent.get(`/api/materials/${made.id}`), 'not_found');
    expectProblem(await app.visitor().get(`/api/materials/${made.id}`), 'not_found');
  });

  it('adds to everybody’s table for an admin only, under a key that is taken by nothing else', async () => {
    const [user, admin] = [await makePerson(app), await makePerson(app, { role: 'admin' })];
    const input = { ...MATERIAL, name: `Yew ${process.pid}`, shared: true };
    const before = await countRows();
    expectProblem(await user.agent.post('/api/materials').send(input), 'forbidden');
    expect(changes(before, await countRows())).toEqual({});
    const keys = [];
    for (let i = 0; i < 2; i += 1) {
      keys.push((await admin.agent.post('/api/materials').send(input).expect(201)).body.key);
    }
    expect(keys[0]).toBe(`yew-${process.pid}`);
    expect(keys[1]).toMatch(new RegExp(`^yew-${process.pid}-[0-9a-f]{8}$`));
  });

  it('refuses every wrong field at once and keeps nothing', async () => {
    const { agent } = await makePerson(app);
    const before = await countRows();
    const input = { ...MATERIAL, name: ' ', category: 'stone', density: -1, cv: 'little', source: '' };
    expect(refusedFields(await agent.post('/api/materials').send(input))).toEqual([
      '#/category',
      '#/cv',
      '#/density',
      '#/name',
      '#/source',
    ]);
    const unsold = { ...MATERIAL, density: null };
    expect(refusedFields(await agent.post('/api/materials').send(unsold))).toEqual(['#/density']);
    expect(changes(before, await countRows())).toEqual({});
  });
});

describe('PUT /api/materials/:id', () => {
  const put = (
    agent: Awaited<ReturnType<typeof makePerson>>['agent'],
    id: string,
    version: number,
    input: object,
  ) => agent.put(`/api/materials/${id}`).set('If-Match', `"${version}"`).send(input);

  it('changes the row and counts its version up; plans keep the copy that they hold', async () => {
    const { user, agent } = await makePerson(app);
    const row = await makeMaterial({ owner: user });
    const glider = await makeGlider({ owner: user, plan: planWith(row) });
    const before = await countRows();
    const res = await put(agent, row.id, 1, { ...MATERIAL, density: 450 }).expect(200);
    expect(materialSchema.parse(res.body)).toMatchObject({
      density: 450,
      version: 2,
      key: row.key,
      usedBy: 1,
    });
    expect(res.headers['etag']).toBe('"2"');
    expect(await Material.findByPk(row.id)).toMatchObject({ density: 450, ownerId: user.id });
    expect((await glider.reload()).plan.materials[row.key]?.density).toBe(420);
    expect(changes(before, await countRows())).toEqual({});
  });

  it('refuses a stale version with what is there now, and a missing one', async () => {
    const { user, agent } = await makePerson(app);
    const row = await makeMaterial({ owner: user });
    await put(agent, row.id, 1, { ...MATERIAL, density: 450 }).expect(200);
    const refusal = expectProblem(await put(agent, row.id, 1, MATERIAL), 'stale_version');
    expect(materialSchema.parse(refusal['current'])).toMatchObject({ density: 450, version: 2 });
    expectProblem(await agent.put(`/api/materials/${row.id}`).send(MATERIAL), 'if_match_required');
    expect((await row.reload()).density).toBe(450);
  });

  it('lets an admin change everybody’s rows and a user not', async () => {
    const [user, admin] = [await makePerson(app), await makePerson(app, { role: 'admin' })];
    const row = await makeMaterial();
    expectProblem(await put(user.agent, row.id, 1, { ...MATERIAL, shared: true }), 'forbidden');
    await put(admin.agent, row.id, 1, { ...MATERIAL, shared: true, name: 'Lime' }).expect(200);
    expect(await row.reload()).toMatchObject({ name: 'Lime', ownerId: null, version: 2 });
  });

  it('lets an admin share an own row, nobody else, and nobody take a shared one back', async () => {
    const [user, admin] = [await makePerson(app), await makePerson(app, { role: 'admin' })];
    const [usersRow, adminsRow] = [
      await makeMaterial({ owner: user.user }),
      await makeMaterial({ owner: admin.user }),
    ];
    expectProblem(await put(user.agent, usersRow.id, 1, { ...MATERIAL, shared: true }), 'forbidden');
    expect(
      (await put(admin.agent, adminsRow.id, 1, { ...MATERIAL, shared: true }).expect(200)).body.shared,
    ).toBe(true);
    expect(refusedFields(await put(admin.agent, adminsRow.id, 2, MATERIAL))).toEqual(['#/shared']);
    expect(await adminsRow.reload()).toMatchObject({ ownerId: null, version: 2 });
    expect(await usersRow.reload()).toMatchObject({ ownerId: user.user.id, version: 1 });
  });
});

describe('DELETE /api/materials/:id', () => {
  it('removes a row that no glider uses, and nothing else', async () => {
    const { user, agent } = await makePerson(app);
    const row = await makeMaterial({ owner: user });
    const before = await countRows();
    await agent.delete(`/api/materials/${row.id}`).expect(204);
    expect(changes(before, await countRows())).toEqual({ materials: -1 });
  });

  it('refuses while it is used and says where, naming only what the asker may see', async () => {
    const { user, agent } = await makePerson(app, { role: 'admin' });
    const row = await makeMaterial();
    const mine = await makeGlider({ owner: user, plan: planWith(row, { name: 'Merlin' }) });
    const shared = await makeGlider({ plan: planWith(row, { name: 'Hobby' }) });
    await addMember(shared, user, 'reader');
    await makeGlider({ plan: planWith(row, { name: 'Secret' }) });
    const before = await countRows();

    const refusal = expectProblem(await agent.delete(`/api/materials/${row.id}`), 'material_in_use');

    const uses = materialUses.parse(refusal['uses']);
    expect(uses).toEqual({
      gliders: [
        { id: shared.id, name: 'Hobby' },
        { id: mine.id, name: 'Merlin' },
      ],
      others: 1,
    });
    expect(refusal.detail).toBe('It is used in Hobby, Merlin, and a glider of somebody else.');
    expect(changes(before, await countRows())).toEqual({});
    expect(materialUses.parse((await agent.get(`/api/materials/${row.id}/uses`).expect(200)).body)).toEqual(
      uses,
    );
  });

  it('keeps everybody’s rows from a user', async () => {
    const { agent } = await makePerson(app);
    const row = await makeMaterial();
    expectProblem(await agent.delete(`/api/materials/${row.id}`), 'forbidden');
    expect(await Material.count({ where: { id: row.id } })).toBe(1);
  });

  it('lets either the deletion or a save that uses it through, never both', async () => {
    const { user, agent } = await makePerson(app);
    const row = await makeMaterial({ owner: user });
    const glider = await makeGlider({ owner: user, plan: smallPlan() });
    const [deleted, saved] = await Promise.all([
      agent.delete(`/api/materials/${row.id}`),
      agent
        .put(`/api/gliders/${glider.id}`)
        .set('If-Match', '"1"')
        .send({ plan: planWith(row) }),
    ]);
    expect(saved.status).toBe(200);
    const { body } = await agent.get('/api/materials');
    const left = materialList.parse(body).materials.find(({ id }) => id === row.id);
    expect([deleted.status, left?.usedBy]).toEqual(deleted.status === 204 ? [204, undefined] : [409, 1]);
  });
});
