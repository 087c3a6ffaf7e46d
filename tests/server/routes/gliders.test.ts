import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { estimate } from '#shared/core/estimate.ts';
import { glider as gliderSchema, gliderList } from '#shared/schemas/glider.ts';
import { GliderSave } from '#server/models/glider-save.ts';
import { Glider } from '#server/models/glider.ts';
import { useApp } from '../support/app.ts';
import { changes, countRows } from '../support/counts.ts';
import { makePerson } from '../support/people.ts';
import { expectProblem, refusedFields } from '../support/problems.ts';
import { addMember, makeGlider, makeMaterial, planWith, smallPlan } from '../support/rows.ts';

const app = useApp();

describe('POST /api/gliders', () => {
  it('keeps the plan with its figures, its owner, its first save and its materials', async () => {
    const { user, agent } = await makePerson(app, { name: 'Ines' });
    const material = await makeMaterial();
    const plan = planWith(material, { name: 'Redshank' });
    const before = await countRows();

    const res = await agent.post('/api/gliders').send({ plan }).expect(201);
    const made = gliderSchema.parse(res.body);

    expect(made).toMatchObject({ name: 'Redshank', role: 'owner', version: 1, updatedBy: 'Ines', plan });
    expect(made.can).toMatchObject({ edit: true, saveSheet: true, delete: true, leave: false });
    expect(res.headers).toMatchObject({ etag: '"1"', location: `/api/gliders/${made.id}` });
    expect(changes(before, await countRows())).toEqual({
      gliders: 1,
      glider_members: 1,
      glider_saves: 1,
      glider_materials: 1,
    });
    const row = await Glider.findByPk(made.id, { rejectOnEmpty: true });
    const { totals, balance, loading } = estimate(plan);
    expect(row).toMatchObject({
      ownerId: user.id,
      plan,
      mass: totals.mass,
      percentMac: balance.percentMac,
      wingLoading: loading.wing,
      outline: [
        [0, 0],
        [0, 500],
        [200, 500],
        [200, 0],
      ],
    });
  });

  it('makes one glider for one key, also when both requests come at once', async () => {
    const { agent } = await makePerson(app);
    const key = randomUUID();
    const send = () => agent.post('/api/gliders').set('Idempotency-Key', key).send({ plan: smallPlan() });
    const before = await countRows();
    const answers = await Promise.all([send(), send(), send()]);
    const later = await send();
    expect([...answers, later].map(({ status }) => status)).toEqual([201, 201, 201, 201]);
    expect(new Set([...answers, later].map(({ body }) => body.id)).size).toBe(1);
    expect(changes(before, await countRows())).toMatchObject({
      gliders: 1,
      glider_saves: 1,
      idempotency_keys: 1,
    });
  });

  it('makes a glider each for two users with the same key', async () => {
    const [one, two] = [await makePerson(app), await makePerson(app)];
    const key = randomUUID();
    const ids = await Promise.all(
      [one, two].map(async ({ agent }) => {
        const call = agent.post('/api/gliders').set('Idempotency-Key', key).send({ plan: smallPlan() });
        return (await call.expect(201)).body.id;
      }),
    );
    expect(new Set(ids).size).toBe(2);
  });

  it('refuses a key that made something else, and one that is no UUID', async () => {
    const { user, agent } = await makePerson(app);
    const glider = await makeGlider({ owner: user });
    const key = randomUUID();
    await agent
      .post(`/api/gliders/${glider.id}/sheets`)
      .set('Idempotency-Key', key)
      .send({ note: '' })
      .expect(201);
    const before = await countRows();
    const reused = agent.post('/api/gliders').set('Idempotency-Key', key).send({ plan: smallPlan() });
    expectProblem(await reused, 'key_reused');
    const odd = agent.post('/api/gliders').set('Idempotency-Key', 'again').send({ plan: smallPlan() });
    expect(refusedFields(await odd)).toEqual(['#/Idempotency-Key']);
    expect(changes(before, await countRows())).toEqual({});
  });

  it('keeps nothing of a plan that is wrong', async () => {
    const { agent } = await makePerson(app);
    const before = await countRows();
    const call = agent.post('/api/gliders').send({ plan: { ...smallPlan(), name: '', version: 2 } });
    expect(refusedFields(await call)).toEqual(['#/plan/name', '#/plan/version']);
    expect(changes(before, await countRows())).toEqual({});
  });
});

describe('GET /api/gliders', () => {
  it('lists own and shared gliders with role and figures, newest change first, and nobody else’s', async () => {
    const [ines, rowan] = [await makePerson(app, { name: 'Ines' }), await makePerson(app)];
    await makeGlider();
    const own = await makeGlider({ owner: rowan.user, plan: smallPlan({ name: 'Knot' }) });
    const shared = await makeGlider({ owner: ines.user, plan: smallPlan({ name: 'Ruff' }) });
    await addMember(shared, rowan.user, 'pilot');

    const res = await rowan.agent.get('/api/gliders').expect(200);
    const { gliders, nextCursor } = gliderList.parse(res.body);

    expect(gliders.map(({ name, role, ownerName }) => [name, role, ownerName])).toEqual([
      ['Ruff', 'pilot', 'Ines'],
      ['Knot', 'owner', rowan.user.name],
    ]);
    expect(gliders[1]?.figures).toEqual({
      mass: own.mass,
      percentMac: own.percentMac,
      wingLoading: own.wingLoading,
    });
    expect(nextCursor).toBeNull();
  });

  it('shows every glider once over all pages, in one order, also when two changed in the same moment', async () => {
    const { user, agent } = await makePerson(app);
    const gliders = [];
    for (let i = 0; i < 5; i += 1) gliders.push(await makeGlider({ owner: user }));
    await Glider.update({ updatedAt: new Date() }, { where: { ownerId: user.id } });

    const seen: string[] = [];
    let cursor: string | null = '';
    while (cursor !== null) {
      const res = await agent.get('/api/gliders').query({ limit: '2', ...(cursor && { cursor }) });
      const page = gliderList.parse(res.body);
      seen.push(...page.gliders.map(({ id }) => id));
      cursor = page.nextCursor;
    }
    expect(seen).toEqual(
      gliders
        .map(({ id }) => id)
        .toSorted()
        .toReversed(),
    );
  });

  it('searches by any part of the name, and takes % and _ for what they are', async () => {
    const { user, agent } = await makePerson(app);
    for (const name of ['Curlew 50%', 'Curlew 500', 'Snipe_2']) {
      await makeGlider({ owner: user, plan: smallPlan({ name }) });
    }
    const find = async (search: string) => {
      const res = await agent.get('/api/gliders').query({ search }).expect(200);
      return gliderList
        .parse(res.body)
        .gliders.map(({ name }) => name)
        .toSorted();
    };
    expect(await find('curlew')).toEqual(['Curlew 50%', 'Curlew 500']);
    expect(await find('50%')).toEqual(['Curlew 50%']);
    expect(await find('e_')).toEqual(['Snipe_2']);
    expect(await find('   ')).toHaveLength(3);
  });

  it('refuses a wrong limit, a foreign cursor and an unknown question, all limits of a page at once', async () => {
    const { agent } = await makePerson(app);
    const refused = async (query: object) => refusedFields(await agent.get('/api/gliders').query(query));
    expect(await refused({ limit: '0', colour: 'red' })).toEqual(['#/colour', '#/limit']);
    expect(await refused({ limit: '' })).toEqual(['#/limit']);
    expect(await refused({ limit: '101' })).toEqual(['#/limit']);
    expect(await refused({ cursor: 'bm90IG91cnM' })).toEqual(['#/cursor']);
  });
});

describe('GET /api/gliders/:id', () => {
  it('answers the plan exactly as it was saved', async () => {
    const { agent } = await makePerson(app);
    const plan = smallPlan({ name: '  Widgeon ', target: { percentMac: 0.1 + 0.2, tolerance: 1e-7 } });
    const { id } = (await agent.post('/api/gliders').send({ plan }).expect(201)).body;
    const res = await agent.get(`/api/gliders/${id}`).expect(200);
    expect(gliderSchema.parse(res.body).plan).toEqual({ ...plan, name: 'Widgeon' });
    expect(res.headers['etag']).toBe('"1"');
    expect(res.headers['cache-control']).toBe('no-store');
  });
});

describe('DELETE /api/gliders/:id', () => {
  it('removes a glider with its saves, sheets and members, and nothing of any other', async () => {
    const { user, agent } = await makePerson(app);
    const other = await makeGlider({ owner: user });
    const glider = await makeGlider({ owner: user, plan: planWith(await makeMaterial()) });
    await addMember(glider, (await makePerson(app)).user, 'reader');
    await agent.post(`/api/gliders/${glider.id}/sheets`).send({ note: '' }).expect(201);
    const before = await countRows();

    await agent.delete(`/api/gliders/${glider.id}`).expect(204);

    expect(changes(before, await countRows())).toEqual({
      gliders: -1,
      glider_members: -2,
      glider_materials: -1,
      glider_saves: -1,
      sheets: -1,
    });
    expect(await GliderSave.count({ where: { gliderId: other.id } })).toBe(1);
    expectProblem(await agent.get(`/api/gliders/${glider.id}`), 'not_found');
  });
});
