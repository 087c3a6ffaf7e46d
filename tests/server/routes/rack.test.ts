import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { LIMITS } from '#shared/schemas/limits.ts';
import { stockPiece, type StockPieceInput } from '#shared/schemas/stock-piece.ts';
import { useApp } from '../support/app.ts';
import { changes, countRows } from '../support/counts.ts';
import { makePerson, type Person } from '../support/people.ts';
import { expectProblem, refusedFields } from '../support/problems.ts';
import { makeGlider } from '../support/rows.ts';
import { fillRack, makePiece, pieceRow, SHEET, TUBE } from '../support/stock.ts';

const app = useApp();

const post = ({ agent }: Person, body: object, key: string = randomUUID()) =>
  agent.post('/api/rack').set('Idempotency-Key', key).send(body);
const get = async ({ agent }: Person, id: string) =>
  stockPiece.parse((await agent.get(`/api/rack/${id}`).expect(200)).body);
const put = ({ agent }: Person, id: string, version: number, body: object) =>
  agent.put(`/api/rack/${id}`).set('If-Match', `"${version}"`).send(body);
const remove = ({ agent }: Person, id: string, version: number) =>
  agent.delete(`/api/rack/${id}`).set('If-Match', `"${version}"`);

describe('POST /api/rack', () => {
  it('puts a weighed piece on the rack, with its density and the next number', async () => {
    const person = await makePerson(app);
    const before = await countRows();
    const res = await post(person, SHEET).expect(201);
    const made = stockPiece.parse(res.body);
    expect(made).toMatchObject({ ...SHEET, number: 1, state: 'free', weighed: true, version: 1 });
    // 17.7 g on 914.4 × 101.6 × 1.5875 mm, by hand.
    expect(made.density).toBeCloseTo(120.01, 2);
    expect([res.headers['etag'], res.headers['location']]).toEqual(['"1"', `/api/rack/${made.id}`]);
    expect(changes(before, await countRows())).toEqual({
      stock_pieces: 1,
      rack_counters: 1,
      idempotency_keys: 1,
    });
    expect(stockPiece.parse((await post(person, SHEET).expect(201)).body).number).toBe(2);
  });

  it('keeps a piece that was not weighed without mass and density, and a tube by its wall', async () => {
    const person = await makePerson(app);
    const plain = (await post(person, { ...SHEET, mass: null, resolution: null }).expect(201)).body;
    expect(plain).toMatchObject({ mass: null, density: null, weighed: false });
    const tube = stockPiece.parse((await post(person, TUBE).expect(201)).body);
    // π · 0.5 · (6 − 0.5) · 1000 = 8639.4 mm³
    expect(tube.density).toBeCloseTo(1516.31, 2);
  });

  it('makes one piece for one key, however often it is sent', async () => {
    const person = await makePerson(app);
    const key = randomUUID();
    const answers = await Promise.all([1, 2, 3].map(() => post(person, SHEET, key)));
    expect(new Set(answers.map(({ body }) => body.id)).size).toBe(1);
    expect(stockPiece.parse((await post(person, SHEET).expect(201)).body).number).toBe(2);
  });

  it('gives every one of twenty pieces made at once a number of its own, without a gap', async () => {
    const person = await makePerson(app);
    const answers = await Promise.all(Array.from({ length: 20 }, () => post(person, SHEET)));
    const numbers = answers.map(({ body }) => stockPiece.parse(body).number);
    expect(numbers.toSorted((a, b) => a - b)).toEqual(Array.from({ length: 20 }, (_, i) => i + 1));
  });

  it('never gives a number again, also not the last one', async () => {
    const person = await makePerson(app);
    const made = stockPiece.parse((await post(person, SHEET).expect(201)).body);
    await remove(person, made.id, 1).expect(204);
    expect((await post(person, SHEET).expect(201)).body.number).toBe(2);
  });

  it('counts for each user alone', async () => {
    const [one, other] = [await makePerson(app), await makePerson(app)];
    await post(one, SHEET).expect(201);
    expect((await post(other, SHEET).expect(201)).body.number).toBe(1);
  });

  it('refuses what is wrong, every field at once', async () => {
    const person = await makePerson(app);
    const before = await countRows();
    const wrong = { ...SHEET, length: 0, width: 'four', mass: -1, grainCut: 'D', grade: 'x'.repeat(121) };
    expect(refusedFields(await post(person, wrong))).toEqual(
      ['grade', 'grainCut', 'length', 'mass', 'width'].map((field) => `#/${field}`),
    );
    const tubes: [Partial<StockPieceInput>, string][] = [
      [{ wall: 1 }, '#/wall'],
      [{ ...TUBE, wall: null }, '#/wall'],
      [{ ...TUBE, wall: 4 }, '#/wall'],
      [{ ...TUBE, thickness: 5 }, '#/thickness'],
      [{ mass: null }, '#/resolution'],
      [{ mass: 17_700 }, '#/mass'],
    ];
    for (const [change, field] of tubes) {
      expect(refusedFields(await post(person, { ...SHEET, ...change }))).toEqual([field]);
    }
    expect(changes(before, await countRows())).toEqual({});
  });

  it('refuses one piece more than a rack holds, and takes it once another is gone', async () => {
    const person = await makePerson(app);
    await fillRack(app, person.user, LIMITS.rack.max);
    const before = await countRows();
    expect(refusedFields(await post(person, SHEET))).toEqual(['#']);
    expect(changes(before, await countRows())).toEqual({});
    await app.sequelize.query('DELETE FROM stock_pieces WHERE user_id = ? AND number = 7', {
      replacements: [person.user.id],
    });
    expect((await post(person, SHEET).expect(201)).body.number).toBe(LIMITS.rack.max + 1);
  });
});

describe('PUT /api/rack/:id', () => {
  it('saves what was changed and counts the version up', async () => {
    const person = await makePerson(app);
    const { id } = await makePiece(person.user);
    const changed = { ...SHEET, mass: 18.1, note: 'Mineral streak at one end', grainCut: 'B' } as const;
    const res = await put(person, id, 1, changed).expect(200);
    expect(res.headers['etag']).toBe('"2"');
    expect(await get(person, id)).toMatchObject({ ...changed, version: 2, number: 1 });
  });

  it('refuses a stale version with what is there, and answers a save sent twice as saved once', async () => {
    const person = await makePerson(app);
    const { id } = await makePiece(person.user);
    const answers = await Promise.all([18, 19, 20].map((mass) => put(person, id, 1, { ...SHEET, mass })));
    expect(answers.map(({ status }) => status).toSorted((a, b) => a - b)).toEqual([200, 412, 412]);
    const refusal = expectProblem(
      answers.find(({ status }) => status === 412)!,
      'stale_version',
    );
    const current = await get(person, id);
    expect(refusal['current']).toEqual(current);
    const again = await put(person, id, 1, { ...SHEET, mass: current.mass }).expect(200);
    expect(again.body).toEqual(current);
  });

  it('counts a mass that was worked out as weighed once another is given, or the scale’s step', async () => {
    const person = await makePerson(app);
    const [one, other] = [await makePiece(person.user), await makePiece(person.user)];
    await app.sequelize.query(
      'UPDATE stock_pieces SET weighed = false, resolution_g = NULL WHERE user_id = ?',
      {
        replacements: [person.user.id],
      },
    );
    const asItIs = { ...SHEET, resolution: null };
    expect((await put(person, one.id, 1, { ...asItIs, note: 'Dry' }).expect(200)).body.weighed).toBe(false);
    expect((await put(person, one.id, 2, { ...asItIs, mass: 17.6 }).expect(200)).body.weighed).toBe(true);
    expect((await put(person, other.id, 1, SHEET).expect(200)).body.weighed).toBe(true);
    const unweighed = { ...asItIs, mass: null };
    expect((await put(person, other.id, 2, unweighed).expect(200)).body).toMatchObject({
      weighed: false,
      density: null,
    });
  });
});

describe('DELETE /api/rack/:id', () => {
  it('deletes a free piece, and refuses from a stale version', async () => {
    const person = await makePerson(app);
    const { id } = await makePiece(person.user);
    await put(person, id, 1, { ...SHEET, mass: 18 }).expect(200);
    const refusal = expectProblem(await remove(person, id, 1), 'stale_version');
    expect(refusal['current']).toEqual(await get(person, id));
    expectProblem(await person.agent.delete(`/api/rack/${id}`), 'if_match_required');
    await remove(person, id, 2).expect(204);
    expectProblem(await remove(person, id, 2), 'not_found');
  });

  it('refuses one that a glider holds, naming the glider, and deletes what was used for none', async () => {
    const person = await makePerson(app);
    const glider = await makeGlider({ owner: person.user });
    const { id, number } = await makePiece(person.user);
    await person.agent.put(`/api/rack/${id}/reservation`).send({ gliderId: glider.id }).expect(200);
    const refusal = expectProblem(await remove(person, id, 2), 'piece_in_use');
    expect(refusal).toMatchObject({
      detail: `Piece ${number} is reserved for ${glider.name}; free it first.`,
      pieces: [{ id, number }],
    });
    await person.agent.post(`/api/rack/${id}/use`).send({ gliderId: glider.id, leftovers: [] }).expect(200);
    expectProblem(await remove(person, id, 3), 'piece_in_use');
    const spent = await makePiece(person.user);
    await person.agent.post(`/api/rack/${spent.id}/use`).send({ gliderId: null, leftovers: [] }).expect(200);
    await remove(person, spent.id, 2).expect(204);
  });
});

describe('deleting a glider', () => {
  it('leaves nothing held for it, also where wood is put to it at the same moment', async () => {
    const person = await makePerson(app);
    const glider = await makeGlider({ owner: person.user });
    const pieces = await Promise.all(Array.from({ length: 12 }, () => makePiece(person.user)));
    const reserve = ({ id }: { id: string }) =>
      person.agent.put(`/api/rack/${id}/reservation`).send({ gliderId: glider.id });
    for (const piece of pieces.slice(0, 4)) await reserve(piece).expect(200);
    const [gone, ...answers] = await Promise.all([
      person.agent.delete(`/api/gliders/${glider.id}`),
      ...pieces.slice(4).map(reserve),
    ]);
    expect(gone.status).toBe(204);
    expect(answers.filter(({ status }) => status !== 200 && status !== 400)).toEqual([]);
    for (const { id } of pieces) expect((await get(person, id)).state).toBe('free');
  });

  it('frees what it holds and leaves what was built into it used, in nothing', async () => {
    const person = await makePerson(app);
    const glider = await makeGlider({ owner: person.user });
    const [held, used, free] = await Promise.all([1, 2, 3].map(() => makePiece(person.user)));
    await person.agent.put(`/api/rack/${held!.id}/reservation`).send({ gliderId: glider.id }).expect(200);
    const use = { gliderId: glider.id, leftovers: [] };
    await person.agent.post(`/api/rack/${used!.id}/use`).send(use).expect(200);
    await person.agent.delete(`/api/gliders/${glider.id}`).expect(204);
    expect(await get(person, held!.id)).toMatchObject({ state: 'free', reservedFor: null, version: 3 });
    expect(await get(person, used!.id)).toMatchObject({ state: 'used', usedIn: null });
    expect((await pieceRow(free!.id)).version).toBe(1);
  });
});
