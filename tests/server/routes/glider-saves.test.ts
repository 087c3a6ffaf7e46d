import { describe, expect, it } from 'vitest';
import { gliderSaveList } from '#shared/schemas/glider-save.ts';
import { glider as gliderSchema } from '#shared/schemas/glider.ts';
import { GliderMaterial } from '#server/models/glider-material.ts';
import { GliderSave } from '#server/models/glider-save.ts';
import { Glider } from '#server/models/glider.ts';
import { useApp } from '../support/app.ts';
import { changes, countRows } from '../support/counts.ts';
import { makePerson, type Person } from '../support/people.ts';
import { expectProblem, refusedFields } from '../support/problems.ts';
import { addMember, makeGlider, makeMaterial, planWith, smallPlan } from '../support/rows.ts';

const app = useApp();

const put = ({ agent }: Person, id: string, version: string | undefined, plan: object) => {
  const call = agent.put(`/api/gliders/${id}`);
  return (version === undefined ? call : call.set('If-Match', version)).send({ plan });
};
const heavier = (mass: number) =>
  smallPlan({ items: [{ id: 'nose', name: 'Nose weight', group: 'ballast', mass, at: [-120, 0, 0] }] });

describe('PUT /api/gliders/:id', () => {
  it('saves the plan, counts the version up, renews the figures and logs the save', async () => {
    const owner = await makePerson(app, { name: 'Odile' });
    const glider = await makeGlider({ owner: owner.user });
    const plan = heavier(30);
    const before = await countRows();

    const res = await put(owner, glider.id, '"1"', plan).expect(200);

    expect(gliderSchema.parse(res.body)).toMatchObject({ version: 2, plan, updatedBy: 'Odile' });
    expect(res.headers['etag']).toBe('"2"');
    expect(changes(before, await countRows())).toEqual({ glider_saves: 1 });
    const row = await Glider.findByPk(glider.id, { rejectOnEmpty: true });
    expect(row).toMatchObject({ version: 2, plan });
    expect(row.mass).toBeCloseTo(glider.mass + 10, 9);
    expect(row.updatedAt.getTime()).toBeGreaterThanOrEqual(glider.updatedAt.getTime());
    const log = await GliderSave.findOne({ where: { gliderId: glider.id, version: 2 }, rejectOnEmpty: true });
    expect(log).toMatchObject({ plan, savedBy: owner.user.id, mass: row.mass });
  });

  it('refuses a save from a stale version, hands back what is there and changes nothing', async () => {
    const [owner, builder] = [await makePerson(app), await makePerson(app, { name: 'Maren' })];
    const glider = await makeGlider({ owner: owner.user });
    await addMember(glider, builder.user, 'builder');
    await put(builder, glider.id, '"1"', heavier(25)).expect(200);
    const before = await countRows();

    const refusal = expectProblem(await put(owner, glider.id, '"1"', heavier(40)), 'stale_version');

    const current = gliderSchema.parse(refusal['current']);
    expect(current).toMatchObject({ version: 2, plan: heavier(25), updatedBy: 'Maren', role: 'owner' });
    expect(changes(before, await countRows())).toEqual({});
    await put(owner, glider.id, '"2"', heavier(40)).expect(200);
  });

  it('lets one of two saves at the same moment through', async () => {
    const owner = await makePerson(app);
    const glider = await makeGlider({ owner: owner.user });
    const answers = await Promise.all(
      [21, 22, 23].map((mass) => put(owner, glider.id, '"1"', heavier(mass))),
    );
    expect(answers.map(({ status }) => status).toSorted((a, b) => a - b)).toEqual([200, 412, 412]);
    const row = await Glider.findByPk(glider.id, { rejectOnEmpty: true });
    expect(row.version).toBe(2);
    expect(row.plan).toEqual(answers.find(({ status }) => status === 200)?.body.plan);
  });

  it('answers a save sent twice, because its answer was lost, as saved once', async () => {
    const owner = await makePerson(app);
    const glider = await makeGlider({ owner: owner.user });
    const first = await put(owner, glider.id, '"1"', heavier(33)).expect(200);
    const again = await put(owner, glider.id, '"1"', heavier(33)).expect(200);
    expect(again.body).toEqual(first.body);
    expect(await GliderSave.count({ where: { gliderId: glider.id } })).toBe(2);
  });

  it('asks for the version, and takes * for none', async () => {
    const owner = await makePerson(app);
    const glider = await makeGlider({ owner: owner.user });
    for (const header of [undefined, '*', '']) {
      expectProblem(await put(owner, glider.id, header, heavier(9)), 'if_match_required');
    }
    expectProblem(await put(owner, glider.id, '"yesterday"', heavier(9)), 'stale_version');
    expect((await Glider.findByPk(glider.id))?.version).toBe(1);
    await put(owner, glider.id, 'W/"1"', heavier(9)).expect(200);
  });

  it('keeps the saved plan when the new one is wrong', async () => {
    const owner = await makePerson(app);
    const glider = await makeGlider({ owner: owner.user });
    const before = await countRows();
    const res = await put(owner, glider.id, '"1"', { ...smallPlan(), items: [{ mass: 'ten' }] });
    expect(refusedFields(res)).toEqual(
      ['at', 'group', 'id', 'mass', 'name'].map((field) => `#/plan/items/0/${field}`),
    );
    expect(changes(before, await countRows())).toEqual({});
    expect((await Glider.findByPk(glider.id))?.plan).toEqual(smallPlan());
  });

  it('joins the glider to the materials of its plan, and parts it from those that left', async () => {
    const owner = await makePerson(app);
    const glider = await makeGlider({ owner: owner.user });
    const [first, second] = [await makeMaterial(), await makeMaterial({ owner: owner.user })];
    const joined = async () => {
      const rows = await GliderMaterial.findAll({ where: { gliderId: glider.id } });
      return rows.map(({ materialId }) => materialId);
    };
    await put(owner, glider.id, '"1"', planWith(first)).expect(200);
    expect(await joined()).toEqual([first.id]);
    await put(owner, glider.id, '"2"', planWith(second)).expect(200);
    expect(await joined()).toEqual([second.id]);
    await put(owner, glider.id, '"3"', smallPlan()).expect(200);
    expect(await joined()).toEqual([]);
  });

  it('does not let a guessed key tie up somebody else’s private material', async () => {
    const [owner, other] = [await makePerson(app), await makePerson(app)];
    const glider = await makeGlider({ owner: owner.user });
    const secret = await makeMaterial({ owner: other.user });
    await put(owner, glider.id, '"1"', planWith(secret)).expect(200);
    expect(await GliderMaterial.count({ where: { materialId: secret.id } })).toBe(0);
  });

  it('keeps a builder’s private material tied when the owner saves afterwards', async () => {
    const [owner, builder] = [await makePerson(app), await makePerson(app)];
    const glider = await makeGlider({ owner: owner.user });
    await addMember(glider, builder.user, 'builder');
    const wood = await makeMaterial({ owner: builder.user });
    await put(builder, glider.id, '"1"', planWith(wood)).expect(200);
    await put(owner, glider.id, '"2"', planWith(wood, { name: 'Renamed' })).expect(200);
    expect(await GliderMaterial.count({ where: { materialId: wood.id } })).toBe(1);
  });
});

describe('GET /api/gliders/:id/saves', () => {
  it('tells who saved what and when, newest first, over pages', async () => {
    const [owner, builder] = [await makePerson(app, { name: 'Ann' }), await makePerson(app, { name: 'Ben' })];
    const glider = await makeGlider({ owner: owner.user });
    await addMember(glider, builder.user, 'builder');
    await put(builder, glider.id, '"1"', heavier(25)).expect(200);
    await put(owner, glider.id, '"2"', heavier(26)).expect(200);

    const page = async (query: object) => {
      const res = await owner.agent.get(`/api/gliders/${glider.id}/saves`).query(query).expect(200);
      return gliderSaveList.parse(res.body);
    };
    const first = await page({ limit: '2' });
    expect(first.saves.map(({ version, savedBy }) => [version, savedBy])).toEqual([
      [3, 'Ann'],
      [2, 'Ben'],
    ]);
    const last = await page({ limit: '2', cursor: first.nextCursor });
    expect(last.saves.map(({ version, figures }) => [version, figures.mass])).toEqual([[1, glider.mass]]);
    expect(last.nextCursor).toBeNull();
  });

  it('refuses a cursor of another list', async () => {
    const owner = await makePerson(app);
    const glider = await makeGlider({ owner: owner.user });
    const cursor = Buffer.from('["x"]').toString('base64url');
    expect(refusedFields(await owner.agent.get(`/api/gliders/${glider.id}/saves`).query({ cursor }))).toEqual(
      ['#/cursor'],
    );
  });
});
