import { Decimal } from 'decimal.js';
import { describe, expect, it } from 'vitest';
import { LIMITS } from '#shared/schemas/limits.ts';
import { splitResult, useResult } from '#shared/schemas/rack.ts';
import { stockPiece } from '#shared/schemas/stock-piece.ts';
import { useApp } from '../support/app.ts';
import { changes, countRows } from '../support/counts.ts';
import { makePerson, type Person } from '../support/people.ts';
import { expectProblem, refusedFields } from '../support/problems.ts';
import { addMember, makeGlider } from '../support/rows.ts';
import { fillRack, makePiece, pieceRow, TUBE } from '../support/stock.ts';

const app = useApp();

const split = ({ agent }: Person, id: string, body: object) => agent.post(`/api/rack/${id}/split`).send(body);
const use = ({ agent }: Person, id: string, body: object) => agent.post(`/api/rack/${id}/use`).send(body);
const get = async ({ agent }: Person, id: string) =>
  stockPiece.parse((await agent.get(`/api/rack/${id}`).expect(200)).body);

describe('POST /api/rack/:id/split', () => {
  it('makes the pieces wanted and what is left, of the same density, whose masses add up exactly', async () => {
    const person = await makePerson(app);
    const whole = await makePiece(person.user, { mass: 17.7 });
    const before = await countRows();
    const body = { along: 'length', wanted: [300, 300], kerf: 0.8 };
    const { pieces, lost } = splitResult.parse((await split(person, whole.id, body).expect(200)).body);

    expect(pieces.map(({ length, width, number }) => [length, width, number])).toEqual([
      [300, 101.6, 2],
      [300, 101.6, 3],
      [312.8, 101.6, 4],
    ]);
    expect(Decimal.sum(lost!, ...pieces.map(({ mass }) => mass!)).toNumber()).toBe(17.7);
    // Two cuts of 0.8 mm out of 914.4 mm, by hand: 17.7 · 1.6 / 914.4 = 0.030971.
    expect(lost).toBeCloseTo(0.030971, 6);
    for (const piece of pieces) {
      expect(piece.density).toBeCloseTo(whole.density!, 6);
      expect(piece).toMatchObject({
        weighed: false,
        resolution: null,
        state: 'free',
        grainCut: whole.grainCut,
        material: whole.material,
        parent: { id: whole.id, number: 1 },
      });
    }
    expect(await get(person, whole.id)).toMatchObject({ state: 'split', mass: 17.7, version: 2 });
    expect(changes(before, await countRows())).toEqual({ stock_pieces: 3 });
  });

  it('cuts along the width too, and a piece that was not weighed', async () => {
    const person = await makePerson(app);
    const whole = await makePiece(person.user, { mass: null, resolution: null });
    const body = { along: 'width', wanted: [25.4], kerf: 0 };
    const { pieces, lost } = splitResult.parse((await split(person, whole.id, body).expect(200)).body);
    expect(lost).toBeNull();
    expect(pieces.map(({ width, length, mass, density }) => [width, length, mass, density])).toEqual([
      [25.4, 914.4, null, null],
      [76.2, 914.4, null, null],
    ]);
  });

  it('lets one of two that cut at the same moment through', async () => {
    const person = await makePerson(app);
    const whole = await makePiece(person.user);
    const before = await countRows();
    const body = { along: 'length', wanted: [300], kerf: 1 };
    const answers = await Promise.all([split(person, whole.id, body), split(person, whole.id, body)]);
    expect(answers.map(({ status }) => status).toSorted((a, b) => a - b)).toEqual([200, 409]);
    const refusal = expectProblem(
      answers.find(({ status }) => status === 409)!,
      'piece_in_use',
    );
    expect(refusal.detail).toBe('Piece 1 was split already.');
    expect(changes(before, await countRows())).toEqual({ stock_pieces: 2 });
  });

  it('keeps the pieces of what was reserved for a glider for it', async () => {
    const person = await makePerson(app);
    const glider = await makeGlider({ owner: person.user });
    const whole = await makePiece(person.user);
    await person.agent.put(`/api/rack/${whole.id}/reservation`).send({ gliderId: glider.id }).expect(200);
    const body = { along: 'length', wanted: [300], kerf: 1 };
    const { pieces } = splitResult.parse((await split(person, whole.id, body).expect(200)).body);
    const held = { state: 'reserved', reservedFor: { id: glider.id, name: glider.name } };
    expect(pieces).toEqual([expect.objectContaining(held), expect.objectContaining(held)]);
    expect((await pieceRow(whole.id)).gliderId).toBeNull();
  });

  it('refuses what does not fit, saying by how much, and a tube along its width', async () => {
    const person = await makePerson(app);
    const [whole, tube] = [await makePiece(person.user), await makePiece(person.user, TUBE)];
    const before = await countRows();
    const long = await split(person, whole.id, { along: 'length', wanted: [500, 420], kerf: 1 });
    expect(refusedFields(long)).toEqual(['#/wanted']);
    expect(expectProblem(long, 'invalid_input').errors?.[0]?.detail).toContain('6.6 mm too short');
    expect(refusedFields(await split(person, tube.id, { along: 'width', wanted: [2], kerf: 0 }))).toEqual([
      '#/along',
    ]);
    const wrong = { along: 'thickness', wanted: [], kerf: -1 };
    expect(refusedFields(await split(person, whole.id, wrong))).toEqual(['#/along', '#/kerf', '#/wanted']);
    expect(changes(before, await countRows())).toEqual({});
    expect((await get(person, whole.id)).state).toBe('free');
  });

  it('cuts nothing where the rack would hold too many', async () => {
    const person = await makePerson(app);
    await fillRack(app, person.user, LIMITS.rack.max - 1);
    const whole = await makePiece(person.user);
    const body = { along: 'length', wanted: [300], kerf: 1 };
    expect(refusedFields(await split(person, whole.id, body))).toEqual(['#']);
    expect((await get(person, whole.id)).state).toBe('free');
  });
});

describe('POST /api/rack/:id/use', () => {
  it('builds a piece into a glider and puts its leftovers back, masses by volume', async () => {
    const person = await makePerson(app);
    const glider = await makeGlider({ owner: person.user });
    const whole = await makePiece(person.user, { length: 1000, width: 100, thickness: 2, mass: 30 });
    const before = await countRows();
    const body = {
      gliderId: glider.id,
      leftovers: [
        { length: 250, width: 100 },
        { length: 750, width: 40 },
      ],
    };
    const { piece, leftovers } = useResult.parse((await use(person, whole.id, body).expect(200)).body);
    expect(piece).toMatchObject({ state: 'used', usedIn: { id: glider.id, name: glider.name }, mass: 30 });
    expect(leftovers.map(({ mass, thickness, weighed, state }) => [mass, thickness, weighed, state])).toEqual(
      [
        [7.5, 2, false, 'free'],
        [9, 2, false, 'free'],
      ],
    );
    expect(changes(before, await countRows())).toEqual({ stock_pieces: 2 });
  });

  it('uses a piece for no glider here, and one that is reserved for the glider named', async () => {
    const person = await makePerson(app);
    const glider = await makeGlider({ owner: person.user });
    const [free, held] = [await makePiece(person.user), await makePiece(person.user)];
    const nothing = { gliderId: null, leftovers: [] };
    expect((await use(person, free.id, nothing).expect(200)).body.piece).toMatchObject({ usedIn: null });
    await person.agent.put(`/api/rack/${held.id}/reservation`).send({ gliderId: glider.id }).expect(200);
    expectProblem(await use(person, held.id, nothing), 'piece_in_use');
    await use(person, held.id, { gliderId: glider.id, leftovers: [] }).expect(200);
    expectProblem(await use(person, held.id, { gliderId: glider.id, leftovers: [] }), 'piece_in_use');
  });

  it('refuses more leftovers than there was, and gliders that the asker does not see or may not change', async () => {
    const [person, other] = [await makePerson(app), await makePerson(app)];
    const glider = await makeGlider({ owner: other.user });
    const whole = await makePiece(person.user, { length: 1000, width: 100 });
    const leftovers = (...sizes: [number, number][]) => ({
      gliderId: null,
      leftovers: sizes.map(([length, width]) => ({ length, width })),
    });
    expect(refusedFields(await use(person, whole.id, leftovers([1001, 100], [1, 101])))).toEqual([
      '#/leftovers/0/length',
      '#/leftovers/1/width',
    ]);
    expect(refusedFields(await use(person, whole.id, leftovers([600, 100], [600, 80])))).toEqual([
      '#/leftovers',
    ]);
    const elsewhere = { gliderId: glider.id, leftovers: [] };
    expect(refusedFields(await use(person, whole.id, elsewhere))).toEqual(['#/gliderId']);
    await addMember(glider, person.user, 'pilot');
    expectProblem(await use(person, whole.id, elsewhere), 'forbidden');
    expect((await get(person, whole.id)).state).toBe('free');
    const tube = await makePiece(person.user, TUBE);
    expect(refusedFields(await use(person, tube.id, leftovers([300, 5])))).toEqual(['#/leftovers/0/width']);
    const rest = useResult.parse((await use(person, tube.id, leftovers([300, 6])).expect(200)).body);
    expect(rest.leftovers[0]).toMatchObject({ kind: 'tube', wall: 0.5, mass: 3.93 });
  });
});
