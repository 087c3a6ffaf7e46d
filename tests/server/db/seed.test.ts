import { readFileSync } from 'node:fs';
import { QueryTypes } from 'sequelize';
import { describe, expect, it } from 'vitest';
import { balsaGrade } from '#shared/core/grades.ts';
import { gliderList } from '#shared/schemas/glider.ts';
import { rackList } from '#shared/schemas/rack.ts';
import { materialList } from '#shared/schemas/material.ts';
import { seedDemo } from '#server/db/seed-demo.ts';
import { seedClasses } from '#server/db/seed-classes.ts';
import { readClassEditions, readDemoRack, readPeople, readSeedMaterials } from '#server/db/seed-files.ts';
import { seedMaterials } from '#server/db/seed-materials.ts';
import { ClassEdition } from '#server/models/class-edition.ts';
import { Material } from '#server/models/material.ts';
import { User } from '#server/models/user.ts';
import { useApp } from '../support/app.ts';
import { countRows } from '../support/counts.ts';
import { ownDatabase } from '../support/database.ts';
import { signInAs } from '../support/people.ts';
import { MATERIAL } from '../support/rows.ts';

const app = useApp({}, () => ownDatabase('seed', 'migrated'));

async function everything(): Promise<string> {
  const tables = [
    'materials',
    'material_seeds',
    'users',
    'gliders',
    'glider_members',
    'glider_saves',
    'sheets',
    'stock_pieces',
    'clubs',
    'club_members',
    'class_editions',
  ];
  const rows = await Promise.all(
    tables.map((table) =>
      app.sequelize.query(`SELECT * FROM ${table} ORDER BY 1, 2`, { type: QueryTypes.SELECT }),
    ),
  );
  return JSON.stringify(rows);
}

// One story: each test goes on from where the one before it ended.
describe('seeding', () => {
  it('fills everybody’s table with every row of the file', async () => {
    const rows = await readSeedMaterials();
    expect(rows.length).toBeGreaterThanOrEqual(45);
    expect(await seedMaterials()).toEqual({ added: rows.length, renewed: 0 });
    const { materials } = materialList.parse((await app.visitor().get('/api/materials')).body);
    expect(materials.map(({ key }) => key).toSorted()).toEqual(rows.map(({ key }) => key).toSorted());
  });

  it('fills everybody’s limits of classes, renews what nothing uses and leaves the rest', async () => {
    const editions = await readClassEditions();
    expect(await seedClasses()).toEqual({ added: editions.length, renewed: 0 });
    const [used, unused] = await ClassEdition.findAll({ limit: 2, order: ['key'] });
    if (!used || !unused) throw new Error('no editions');
    await used.update({ note: 'Older words', usedAt: new Date() });
    await unused.update({ note: 'Older words' });
    expect(await seedClasses()).toEqual({ added: 0, renewed: 1 });
    expect((await used.reload()).note).toBe('Older words');
    expect((await unused.reload()).note).not.toBe('Older words');
  });

  it('adds the demo, in which everybody can sign in and finds their gliders with figures and sheets', async () => {
    expect(await seedDemo()).toBe(true);
    const { people, gliders } = await readPeople();
    for (const { key, email, password, role } of people) {
      const agent = app.visitor();
      const res = await agent.post('/api/session').send({ email, password }).expect(200);
      expect(res.body.user.role).toBe(role);
      const list = gliderList.parse((await agent.get('/api/gliders').expect(200)).body);
      const theirs = gliders.filter(
        ({ owner, members }) => owner === key || members.some(({ person }) => person === key),
      );
      expect(list.gliders).toHaveLength(theirs.length);
      for (const { figures, outline } of list.gliders) {
        expect(figures.percentMac).toBeGreaterThan(0);
        expect(outline.length).toBeGreaterThan(3);
      }
    }
    const counts = await countRows();
    expect(counts.get('gliders')).toBe(gliders.length);
    expect(counts.get('sheets')).toBe(gliders.reduce((sum, { sheets }) => sum + sheets.length, 0));
    expect(counts.get('glider_materials')).toBeGreaterThan(0);
  });

  it('makes everybody of the demo a member of its club, with a glider shown to it and gliders aimed at classes', async () => {
    const { club, people } = await readPeople();
    const counts = await countRows();
    expect(counts.get('club_members')).toBe(people.length);
    expect(counts.get('club_invitations')).toBe(club.invited.length);
    expect(counts.get('club_gliders')).toBe(1);
    expect(counts.get('glider_aims')).toBe(2);
    const { email } = people.find(({ inClub }) => inClub === 'director')!;
    const director = await signInAs(app, await User.findOne({ where: { email }, rejectOnEmpty: true }));
    const { body } = await director.agent.get('/api/clubs').expect(200);
    expect(body.clubs).toMatchObject([{ name: club.name, role: 'director', members: people.length }]);
  });

  it('fills the builder’s rack with wood of densities that there are, some of it put to gliders', async () => {
    const { owner, pieces } = await readDemoRack();
    const { people } = await readPeople();
    const { email } = people.find(({ key }) => key === owner)!;
    const builder = await signInAs(app, await User.findOne({ where: { email }, rejectOnEmpty: true }));
    const listOf = async (state: string) =>
      rackList.parse((await builder.agent.get('/api/rack').query({ state, limit: '100' }).expect(200)).body)
        .pieces;
    const [onRack, reserved] = [await listOf('onRack'), await listOf('reserved')];
    expect(new Set(reserved.map(({ reservedFor }) => reservedFor?.name))).toEqual(new Set(['Whimbrel']));
    expect(reserved).toHaveLength(pieces.filter(({ reservedFor }) => reservedFor).length);
    const [used, split] = [await listOf('used'), await listOf('split')];
    expect([used.map(({ usedIn }) => usedIn?.name), split.length]).toEqual([['Dunlin'], 1]);
    const cut = onRack.filter(({ parent }) => parent !== null);
    expect(cut.map(({ weighed }) => weighed)).toEqual([false, false, false, false]);
    const materials = new Map((await readSeedMaterials()).map((material) => [material.key, material]));
    for (const { material, density, number, grade } of [...onRack, ...used, ...split]) {
      const row = materials.get(material.key ?? '');
      expect(row?.name, `piece ${number}`).toBe(material.name);
      if (density === null) continue;
      if (row?.density) expect(Math.abs(density / row.density - 1), `piece ${number}`).toBeLessThan(0.2);
      if (material.key?.startsWith('balsa')) expect(balsaGrade(density), `piece ${number}`).toBe(grade);
    }
  });

  it('changes nothing the second time', async () => {
    const before = await everything();
    expect(await seedMaterials()).toEqual({ added: 0, renewed: 0 });
    expect(await seedClasses()).toEqual({ added: 0, renewed: 0 });
    expect(await seedDemo()).toBe(false);
    expect(await everything()).toBe(before);
  });

  it('leaves what an admin edited or deleted as it is, also when the file has changed since', async () => {
    const admin = await signInAs(app, await User.findOne({ where: { role: 'admin' }, rejectOnEmpty: true }));
    const unused = (await Material.findAll({ order: ['key'] })).filter(
      ({ category }) => category === 'metal',
    );
    const [edited, deleted, untouched] = unused;
    if (!edited || !deleted || !untouched) throw new Error('The file has too few metals for this test.');
    const input = { ...MATERIAL, name: 'As the admin wants it', shared: true };
    await admin.agent.put(`/api/materials/${edited.id}`).set('If-Match', '"1"').send(input).expect(200);
    await admin.agent.delete(`/api/materials/${deleted.id}`).expect(204);
    await app.sequelize.query(`UPDATE material_seeds SET digest = 'of an older file'`);
    const nameInFile = untouched.name;
    await Material.update({ name: 'Older name' }, { where: { id: untouched.id } });

    const { added, renewed } = await seedMaterials();

    expect(added).toBe(0);
    expect(renewed).toBe((await readSeedMaterials()).length - 2);
    expect((await edited.reload()).name).toBe('As the admin wants it');
    expect(await Material.findByPk(deleted.id)).toBeNull();
    expect(await untouched.reload()).toMatchObject({ name: nameInFile, version: 2 });
    expect(await seedMaterials()).toEqual({ added: 0, renewed: 0 });
  });

  it('reads from files whose every row has a source', () => {
    const file = new URL('../../../data/materials.json', import.meta.url);
    const { materials } = JSON.parse(readFileSync(file, 'utf8'));
    for (const { key, source } of materials) expect(source, key).not.toBe('');
  });
});
