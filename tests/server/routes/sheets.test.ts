import { createHash, randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { estimate } from '#shared/core/estimate.ts';
import { CALCULATOR_VERSION } from '#shared/core/version.ts';
import { sheet as sheetSchema, sheetList } from '#shared/schemas/sheet.ts';
import { Sheet } from '#server/models/sheet.ts';
import { useApp } from '../support/app.ts';
import { changes, countRows } from '../support/counts.ts';
import { makePerson, type Person } from '../support/people.ts';
import { refusedFields } from '../support/problems.ts';
import { makeGlider, smallPlan } from '../support/rows.ts';
import { makeSheet } from '../support/sheets.ts';

const app = useApp();

const save = ({ agent }: Person, gliderId: string, note = '') =>
  agent.post(`/api/gliders/${gliderId}/sheets`).send({ note });

describe('POST /api/gliders/:id/sheets', () => {
  it('freezes the saved plan with its result under a number that counts up per glider', async () => {
    const owner = await makePerson(app, { name: 'Tobias' });
    const [glider, other] = [
      await makeGlider({ owner: owner.user }),
      await makeGlider({ owner: owner.user }),
    ];
    const before = await countRows();

    const first = await save(owner, glider.id, ' Before covering ').expect(201);
    const second = sheetSchema.parse((await save(owner, glider.id).expect(201)).body);
    const elsewhere = sheetSchema.parse((await save(owner, other.id).expect(201)).body);

    const sheet = sheetSchema.parse(first.body);
    expect(sheet).toMatchObject({
      gliderId: glider.id,
      gliderName: 'Test',
      note: 'Before covering',
      savedBy: 'Tobias',
      calculator: CALCULATOR_VERSION,
      plan: smallPlan(),
    });
    expect(sheet.result).toEqual(JSON.parse(JSON.stringify(estimate(smallPlan()))));
    expect([sheet.number, second.number, elsewhere.number]).toEqual([1, 2, 1]);
    expect(first.headers['location']).toBe(`/api/sheets/${sheet.id}`);
    expect(changes(before, await countRows())).toEqual({ sheets: 3 });
    expect(await Sheet.findByPk(sheet.id)).toMatchObject({ mass: glider.mass, savedBy: owner.user.id });
  });

  it('gives no number twice to sheets saved at the same moment', async () => {
    const owner = await makePerson(app);
    const glider = await makeGlider({ owner: owner.user });
    const answers = await Promise.all([1, 2, 3, 4].map(() => save(owner, glider.id)));
    expect(new Set(answers.map(({ body }) => body.number))).toEqual(new Set([1, 2, 3, 4]));
  });

  it('makes one sheet for one key', async () => {
    const owner = await makePerson(app);
    const glider = await makeGlider({ owner: owner.user });
    const key = randomUUID();
    const send = () => save(owner, glider.id).set('Idempotency-Key', key);
    const [one, two] = [await send().expect(201), await send().expect(201)];
    expect(two.body).toEqual(one.body);
    expect(await Sheet.count({ where: { gliderId: glider.id } })).toBe(1);
  });

  it('refuses a note that is missing or too long and keeps nothing', async () => {
    const owner = await makePerson(app);
    const glider = await makeGlider({ owner: owner.user });
    const before = await countRows();
    expect(refusedFields(await save(owner, glider.id, 'x'.repeat(2_001)))).toEqual(['#/note']);
    const call = owner.agent.post(`/api/gliders/${glider.id}/sheets`).send({});
    expect(refusedFields(await call)).toEqual(['#/note']);
    expect(changes(before, await countRows())).toEqual({});
  });
});

describe('a saved sheet', () => {
  it('stays as it was when the glider is saved again', async () => {
    const owner = await makePerson(app);
    const glider = await makeGlider({ owner: owner.user });
    const before = (await save(owner, glider.id).expect(201)).body;
    await owner.agent
      .put(`/api/gliders/${glider.id}`)
      .set('If-Match', '"1"')
      .send({ plan: smallPlan({ name: 'Renamed', items: [] }) })
      .expect(200);
    expect((await owner.agent.get(`/api/sheets/${before.id}`).expect(200)).body).toEqual(before);
  });

  it('carries the SHA-256 of its plan, result and calculator in canonical JSON', async () => {
    const owner = await makePerson(app);
    const sheet = await makeSheet(await makeGlider({ owner: owner.user }), owner.user);
    const res = await owner.agent.get(`/api/sheets/${sheet.id}/json`).expect(200);
    const file = sheetSchema.parse(JSON.parse(res.text));
    // Sorting by a replacer's list of keys: another way to canonical JSON than the server's own.
    const { calculator, plan, result } = file;
    const keys = new Set<string>();
    JSON.stringify({ calculator, plan, result }, (key, value: unknown) => (keys.add(key), value));
    const canonical = JSON.stringify({ calculator, plan, result }, [...keys].toSorted());
    expect(createHash('sha256').update(canonical).digest('hex')).toBe(file.sha256);
  });
});

describe('GET /api/gliders/:id/sheets', () => {
  it('lists headline figures, newest first, over pages', async () => {
    const owner = await makePerson(app);
    const glider = await makeGlider({ owner: owner.user });
    for (const note of ['one', 'two', 'three']) await makeSheet(glider, owner.user, note);
    const page = async (query: object) => {
      const res = await owner.agent.get(`/api/gliders/${glider.id}/sheets`).query(query).expect(200);
      return sheetList.parse(res.body);
    };
    const first = await page({ limit: '2' });
    expect(first.sheets.map(({ number, note, mass }) => [number, note, mass])).toEqual([
      [3, 'three', glider.mass],
      [2, 'two', glider.mass],
    ]);
    const last = await page({ limit: '2', cursor: first.nextCursor });
    expect(last.sheets.map(({ number }) => number)).toEqual([1]);
    expect(last.nextCursor).toBeNull();
  });
});

describe('the table of a sheet', () => {
  it('is in the units that its reader has chosen, whoever saved it', async () => {
    const owner = await makePerson(app);
    const sheet = await makeSheet(await makeGlider({ owner: owner.user }), owner.user);
    const head = async () =>
      (await owner.agent.get(`/api/sheets/${sheet.id}/csv`).expect(200)).text.split('\n')[0];
    expect(await head()).toContain('Mass g');
    await owner.agent
      .patch('/api/account')
      .send({ units: { mass: 'oz', length: 'in' } })
      .expect(200);
    expect(await head()).toContain('Mass oz');
    expect(await head()).toContain('Arm in');
  });
});

describe('downloads of a sheet', () => {
  it('come as files named after the glider and the number', async () => {
    const owner = await makePerson(app);
    const glider = await makeGlider({ owner: owner.user, plan: smallPlan({ name: 'Häher / "eins"' }) });
    const sheet = await makeSheet(glider, owner.user);
    const csv = await owner.agent.get(`/api/sheets/${sheet.id}/csv`).expect(200);
    expect(csv.headers['content-type']).toBe('text/csv; charset=utf-8');
    expect(csv.headers['content-disposition']).toMatch(/^attachment; /);
    expect(csv.headers['content-disposition']).toContain(
      "filename*=UTF-8''H%C3%A4her%20eins%2C%20sheet%201.csv",
    );
    const json = await owner.agent.get(`/api/sheets/${sheet.id}/json`).expect(200);
    expect(json.headers['content-type']).toMatch(/^application\/json/);
    expect(json.headers['content-disposition']).toContain('sheet%201.json');
    expect(sheetSchema.parse(JSON.parse(json.text))).toEqual(
      sheetSchema.parse((await owner.agent.get(`/api/sheets/${sheet.id}`)).body),
    );
  });
});
