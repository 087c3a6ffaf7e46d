import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { LIMITS } from '#shared/schemas/limits.ts';
import { importPreview, importResult, rackList } from '#shared/schemas/rack.ts';
import { tidy } from '#server/services/housekeeping.ts';
import { useApp } from '../support/app.ts';
import { changes, countRows } from '../support/counts.ts';
import { makePerson, type Person } from '../support/people.ts';
import { expectProblem, refusedFields } from '../support/problems.ts';
import { makeMaterial } from '../support/rows.ts';
import { fillRack, makePiece, SHEET, STICK, TUBE } from '../support/stock.ts';

const app = useApp();

const preview = ({ agent }: Person, text: string | Buffer) =>
  agent.post('/api/rack/import-previews').attach('file', Buffer.from(text), 'wood.csv');
const take = ({ agent }: Person, rows: object[], key: string = randomUUID()) =>
  agent.post('/api/rack/imports').set('Idempotency-Key', key).send({ rows });
const piecesOf = async ({ agent }: Person) =>
  rackList.parse((await agent.get('/api/rack').query({ limit: '100' }).expect(200)).body).pieces;

describe('POST /api/rack/import-previews', () => {
  it('shows what a file would bring in and what is wrong with it, and stores nothing', async () => {
    const person = await makePerson(app);
    const material = await makeMaterial({ owner: person.user, name: 'Kühlbalsa' });
    const before = await countRows();
    const file =
      'Material;Length (in);Width (in);Thickness (in);Mass (g)\nkuhlbalsa;36;4;1/16;17,7\nBalsa;long;4;1/16;1\n';
    const found = importPreview.parse((await preview(person, file).expect(200)).body);
    expect(found.rows).toHaveLength(1);
    expect(found.rows[0]?.piece.material).toEqual({
      key: material.key,
      name: 'kuhlbalsa',
      category: 'wood',
    });
    expect(found.bad).toEqual([
      {
        line: 3,
        text: 'Balsa;long;4;1/16;1',
        problems: [{ column: 'Length (in)', detail: 'Is no number.' }],
      },
    ]);
    expect(changes(before, await countRows())).toEqual({});
  });

  it('refuses a file that is no table of stock, too large, or not there', async () => {
    const person = await makePerson(app);
    expect(refusedFields(await preview(person, 'a,b\n1,2\n'))).toEqual(['#/file']);
    expect(refusedFields(await preview(person, Buffer.from([0xff, 0xd8, 0xff, 0xe0, 1, 2, 3])))).toEqual([
      '#/file',
    ]);
    expectProblem(await preview(person, 'x'.repeat(LIMITS.csvBytes.max + 1)), 'too_large');
    const empty = person.agent.post('/api/rack/import-previews').field({ a: '1' });
    expect(refusedFields(await empty)).toEqual(['#/file']);
    expectProblem(await person.agent.post('/api/rack/import-previews').send({}), 'unsupported_type');
  });
});

describe('POST /api/rack/imports', () => {
  it('takes every row in, numbered in their order', async () => {
    const person = await makePerson(app);
    await makePiece(person.user);
    const before = await countRows();
    const res = await take(person, [SHEET, STICK, TUBE]).expect(201);
    expect(importResult.parse(res.body)).toEqual({ count: 3, firstNumber: 2, lastNumber: 4 });
    expect(changes(before, await countRows())).toEqual({
      stock_pieces: 3,
      rack_imports: 1,
      idempotency_keys: 1,
    });
    const [, ...taken] = await piecesOf(person);
    expect(taken.map(({ number, kind }) => [number, kind])).toEqual([
      [2, 'sheet'],
      [3, 'stick'],
      [4, 'tube'],
    ]);
  });

  it('takes in once for one key, also when that was sent twice at once or pieces are gone since', async () => {
    const person = await makePerson(app);
    const key = randomUUID();
    const answers = await Promise.all([take(person, [SHEET, STICK], key), take(person, [SHEET, STICK], key)]);
    expect(answers.map(({ status }) => status)).toEqual([201, 201]);
    expect(answers[1]?.body).toEqual(answers[0]?.body);
    const [first] = await piecesOf(person);
    await person.agent.delete(`/api/rack/${first?.id}`).set('If-Match', '"1"').expect(204);
    expect((await take(person, [SHEET, STICK], key).expect(201)).body).toEqual(answers[0]?.body);
    expectProblem(await take(person, [SHEET], key), 'key_reused');
    expect(await piecesOf(person)).toHaveLength(1);
  });

  it('takes in nothing where one row is wrong, and says which', async () => {
    const person = await makePerson(app);
    const before = await countRows();
    const res = await take(person, [SHEET, { ...SHEET, length: -1 }, { ...STICK, wall: 2 }]);
    expect(refusedFields(res)).toEqual(['#/rows/1/length', '#/rows/2/wall']);
    expect(refusedFields(await take(person, []))).toEqual(['#/rows']);
    const many = Array.from({ length: LIMITS.rackImport.max + 1 }, () => SHEET);
    expect(refusedFields(await take(person, many))).toEqual(['#/rows']);
    expect(changes(before, await countRows())).toEqual({});
  });

  it('takes in two thousand at once, and nothing where the rack would hold too many', async () => {
    const person = await makePerson(app);
    const many = Array.from({ length: LIMITS.rackImport.max }, () => SHEET);
    expect((await take(person, many).expect(201)).body).toEqual({
      count: 2_000,
      firstNumber: 1,
      lastNumber: 2_000,
    });
    const full = await makePerson(app);
    await fillRack(app, full.user, LIMITS.rack.max - 1);
    const before = await countRows();
    expect(refusedFields(await take(full, [SHEET, SHEET]))).toEqual(['#']);
    expect(changes(before, await countRows())).toEqual({});
    await take(full, [SHEET]).expect(201);
  });
});

describe('an import', () => {
  it('is forgotten together with the key that names it, and its pieces stay', async () => {
    const person = await makePerson(app);
    const key = randomUUID();
    await take(person, [SHEET], key).expect(201);
    const imports = async () => (await countRows()).get('rack_imports') ?? 0;
    const before = await imports();
    await tidy();
    expect(await imports()).toBe(before);
    await tidy(new Date(Date.now() + 31 * 24 * 3_600_000));
    expect(await imports()).toBe(0);
    expect((await take(person, [SHEET], key).expect(201)).body.firstNumber).toBe(2);
    expect(await piecesOf(person)).toHaveLength(2);
  });
});

describe('GET /api/rack/export', () => {
  it('writes a table that brings in the same pieces, hostile names and all', async () => {
    const [person, other] = [await makePerson(app), await makePerson(app)];
    const formula = '=HYPERLINK("https://x.example","click")';
    const inputs = [
      SHEET,
      STICK,
      TUBE,
      { ...SHEET, mass: null, resolution: null, material: { key: null, name: formula, category: 'wood' } },
      { ...SHEET, grade: "'=1+1", note: 'one;two,three\n"four"\t+5', length: 1e-7, mass: 1e-11 },
      { ...SHEET, width: 3.5 * 25.4, note: '−2 ＝ Köln 日本 🪶' },
    ] as const;
    await take(person, [...inputs]).expect(201);
    const file = await person.agent.get('/api/rack/export').expect(200);
    expect(file.headers).toMatchObject({
      'content-type': 'text/csv; charset=utf-8',
      'content-disposition': 'attachment; filename=Rack.csv',
    });
    expect(file.text).toContain(`"'=HYPERLINK(""https://x.example"",""click"")"`);
    const found = importPreview.parse((await preview(other, file.text).expect(200)).body);
    expect(found.bad).toEqual([]);
    await take(
      other,
      found.rows.map(({ piece }) => piece),
    ).expect(201);
    const bare = (pieces: Awaited<ReturnType<typeof piecesOf>>) =>
      pieces.map(({ id: _, createdAt: __, updatedAt: ___, ...piece }) => piece);
    expect(bare(await piecesOf(other))).toEqual(bare(await piecesOf(person)));
  });

  it('leaves out what is spent unless that is asked for', async () => {
    const person = await makePerson(app);
    const spent = await makePiece(person.user, { note: 'spent' });
    await makePiece(person.user, { note: 'here' });
    await person.agent.post(`/api/rack/${spent.id}/use`).send({ gliderId: null, leftovers: [] }).expect(200);
    const linesOf = async (query: object) =>
      (await person.agent.get('/api/rack/export').query(query).expect(200)).text
        .trimEnd()
        .split('\r\n')
        .slice(1);
    expect(await linesOf({})).toEqual([expect.stringContaining('here')]);
    expect(await linesOf({ state: 'used' })).toEqual([expect.stringContaining('spent')]);
    expect(await linesOf({ state: 'split' })).toEqual([]);
  });
});
