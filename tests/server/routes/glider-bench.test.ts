import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { gliderCopies, gliderList, gliderSummary } from '#shared/schemas/glider.ts';
import { GliderMaterial } from '#server/models/glider-material.ts';
import { Glider } from '#server/models/glider.ts';
import { useApp } from '../support/app.ts';
import { changes, countRows } from '../support/counts.ts';
import { makePerson, type Person } from '../support/people.ts';
import { expectProblem, refusedFields } from '../support/problems.ts';
import { addMember, makeGlider, makeMaterial, planWith, smallPlan } from '../support/rows.ts';

const app = useApp();

const lump = (name: string, mass: number) =>
  smallPlan({ name, surfaces: [], items: [{ id: 'a', name: 'A', group: 'g', mass, at: [0, 0, 0] }] });

/** Names over all pages of two. */
async function namesOf({ agent }: Person, query: object): Promise<string[]> {
  const names: string[] = [];
  let cursor: string | null = null;
  do {
    const asked = { limit: '2', ...query, ...(cursor !== null && { cursor }) };
    const page = gliderList.parse((await agent.get('/api/gliders').query(asked).expect(200)).body);
    names.push(...page.gliders.map(({ name }) => name));
    cursor = page.nextCursor;
  } while (cursor !== null);
  return names;
}

async function benchOf(...models: [string, number][]): Promise<Person> {
  const person = await makePerson(app);
  for (const [i, [name, mass]] of models.entries()) {
    const glider = await makeGlider({ owner: person.user, plan: lump(name, mass) });
    await glider.update({ updatedAt: new Date(Date.UTC(2026, 10, 1 + i)) });
  }
  return person;
}

describe('GET /api/gliders in order', () => {
  it.each([
    [{ sort: 'name' }, ['Ägir', 'avocet', 'Knot', 'knot 2', 'Ruff']],
    [{ sort: 'name', direction: 'down' }, ['Ruff', 'knot 2', 'Knot', 'avocet', 'Ägir']],
    [{ sort: 'mass' }, ['Ruff', 'Knot', 'Ägir', 'knot 2', 'avocet']],
    [{ sort: 'mass', direction: 'down' }, ['avocet', 'knot 2', 'Ägir', 'Knot', 'Ruff']],
    [{ sort: 'changed', direction: 'up' }, ['Knot', 'Ägir', 'avocet', 'Ruff', 'knot 2']],
    [{}, ['knot 2', 'Ruff', 'avocet', 'Ägir', 'Knot']],
  ])('of %j shows every glider once over all pages', async (query, names) => {
    const person = await benchOf(['Knot', 20], ['Ägir', 31.5], ['avocet', 400], ['Ruff', 3], ['knot 2', 90]);
    expect(await namesOf(person, query)).toEqual(names);
  });

  it('finds a name whatever its case and accents', async () => {
    const person = await benchOf(['Ägir', 1], ['Little Auk', 2], ['LITTLE ÅSA', 3]);
    expect(await namesOf(person, { search: 'agi' })).toEqual(['Ägir']);
    expect(await namesOf(person, { search: 'LÍTTLE', sort: 'name' })).toEqual(
      ['LITTLE ÅSA', 'Little Auk'].toSorted(),
    );
  });

  it('goes by the new name and mass as soon as they are saved', async () => {
    const person = await benchOf(['Knot', 20], ['Ruff', 30]);
    const ruff = await Glider.findOne({
      where: { ownerId: person.user.id, name: 'Ruff' },
      rejectOnEmpty: true,
    });
    const save = person.agent.put(`/api/gliders/${ruff.id}`).set('If-Match', '"1"');
    await save.send({ plan: lump('Auk', 5) }).expect(200);
    expect(await namesOf(person, { sort: 'name' })).toEqual(['Auk', 'Knot']);
    expect(await namesOf(person, { sort: 'mass' })).toEqual(['Auk', 'Knot']);
    expect(await namesOf(person, {})).toEqual(['Auk', 'Knot']);
  });

  it('refuses a cursor of another order, and an order that it does not know', async () => {
    const person = await benchOf(['Knot', 20], ['Ruff', 30]);
    const first = await person.agent.get('/api/gliders').query({ sort: 'name', limit: '1' });
    const cursor = first.body.nextCursor;
    const refused = async (query: object) =>
      refusedFields(await person.agent.get('/api/gliders').query(query));
    expect(await refused({ sort: 'mass', cursor })).toEqual(['#/cursor']);
    expect(await refused({ sort: 'name', direction: 'down', cursor })).toEqual(['#/cursor']);
    expect(await refused({ sort: 'colour', archived: 'maybe' })).toEqual(['#/archived', '#/sort']);
  });
});

describe('PUT /api/gliders/:id/archived', () => {
  it('takes a glider off the bench and back, for every member, and moves neither version nor change', async () => {
    const [owner, reader] = [await makePerson(app), await makePerson(app)];
    const glider = await makeGlider({ owner: owner.user, plan: lump('Knot', 20) });
    await addMember(glider, reader.user, 'reader');
    const put = async (archived: boolean) => {
      const res = await owner.agent.put(`/api/gliders/${glider.id}/archived`).send({ archived }).expect(200);
      return gliderSummary.parse(res.body);
    };
    const away = await put(true);
    expect(away).toMatchObject({ version: 1, updatedAt: glider.updatedAt.toISOString() });
    expect(new Date(away.archivedAt ?? '').getTime()).toBeGreaterThanOrEqual(glider.updatedAt.getTime());
    expect((await put(true)).archivedAt).toBe(away.archivedAt);
    for (const person of [owner, reader]) {
      expect(await namesOf(person, {})).toEqual([]);
      expect(await namesOf(person, { archived: 'only' })).toEqual(['Knot']);
    }
    expect((await put(false)).archivedAt).toBeNull();
    expect(await namesOf(reader, {})).toEqual(['Knot']);
  });
});

describe('POST /api/gliders/copies', () => {
  const copy = ({ agent }: Person, ids: string[], key = randomUUID()) =>
    agent.post('/api/gliders/copies').set('Idempotency-Key', key).send({ ids });

  it('makes own gliders of what one may read, in order, with their materials and figures', async () => {
    const [owner, reader] = [await makePerson(app), await makePerson(app)];
    const plan = planWith(await makeMaterial(), { name: 'Ruff' });
    const shared = await makeGlider({ owner: owner.user, plan });
    await addMember(shared, reader.user, 'reader');
    const own = await makeGlider({ owner: reader.user, plan: smallPlan({ name: 'x'.repeat(120) }) });
    const before = await countRows();

    const { gliders } = gliderCopies.parse((await copy(reader, [own.id, shared.id]).expect(201)).body);

    expect(gliders.map(({ name }) => name)).toEqual([`${'x'.repeat(114)}, copy`, 'Ruff, copy']);
    expect(gliders.map(({ role, version }) => [role, version])).toEqual([
      ['owner', 1],
      ['owner', 1],
    ]);
    expect(changes(before, await countRows())).toEqual({
      gliders: 2,
      glider_members: 2,
      glider_saves: 2,
      glider_materials: 1,
      idempotency_keys: 1,
    });
    const ruff = await Glider.findByPk(gliders[1]?.id ?? '', { rejectOnEmpty: true });
    expect(ruff).toMatchObject({
      plan: { ...plan, name: 'Ruff, copy' },
      mass: shared.mass,
      ownerId: reader.user.id,
    });
    expect(await GliderMaterial.count({ where: { gliderId: ruff.id } })).toBe(1);
  });

  it('makes them once for one key, and refuses the key for other gliders', async () => {
    const owner = await makePerson(app);
    const [one, two] = [await makeGlider({ owner: owner.user }), await makeGlider({ owner: owner.user })];
    const key = randomUUID();
    const answers = await Promise.all([1, 2, 3].map(() => copy(owner, [one.id, two.id], key).expect(201)));
    expect(answers[1]?.body).toEqual(answers[0]?.body);
    expect(await Glider.count({ where: { ownerId: owner.user.id } })).toBe(4);
    expectProblem(await copy(owner, [one.id], key), 'key_reused');
  });

  it('copies none where one is not to be seen', async () => {
    const owner = await makePerson(app);
    const [own, foreign] = [await makeGlider({ owner: owner.user }), await makeGlider()];
    const before = await countRows();
    expectProblem(await copy(owner, [own.id, foreign.id]), 'not_found');
    expect(changes(before, await countRows())).toEqual({});
  });

  it('refuses none, more than fifty, and one twice', async () => {
    const owner = await makePerson(app);
    const { id } = await makeGlider({ owner: owner.user });
    const many = Array.from({ length: 51 }, () => randomUUID());
    for (const ids of [[], many, [id, id]]) {
      expect(refusedFields(await copy(owner, ids))).toEqual(['#/ids']);
    }
  });
});
