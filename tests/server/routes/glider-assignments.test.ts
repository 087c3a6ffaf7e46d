import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { gliderAssignment } from '#shared/schemas/assignment.ts';
import { useApp } from '../support/app.ts';
import { changes, countRows } from '../support/counts.ts';
import { makePerson, type Person } from '../support/people.ts';
import { expectProblem, refusedFields } from '../support/problems.ts';
import { addMember, makeGlider } from '../support/rows.ts';
import { assignmentOf, makePiece, pieceRow } from '../support/stock.ts';

const app = useApp();

const get = async ({ agent }: Person, id: string) =>
  gliderAssignment.parse((await agent.get(`/api/gliders/${id}/assignment`).expect(200)).body);
const put = ({ agent }: Person, id: string, version: number, body: object) =>
  agent.put(`/api/gliders/${id}/assignment`).set('If-Match', `"${version}"`).send(body);

async function crew() {
  const [owner, builder] = [
    await makePerson(app, { name: 'Odile' }),
    await makePerson(app, { name: 'Maren' }),
  ];
  const glider = await makeGlider({ owner: owner.user });
  await addMember(glider, builder.user, 'builder');
  return { owner, builder, glider };
}

describe('GET /api/gliders/:id/assignment', () => {
  it('places nothing, in version 1 and for the plan as saved, while nobody has kept one', async () => {
    const { owner, glider } = await crew();
    expect(await get(owner, glider.id)).toMatchObject({
      entries: [],
      pieces: [],
      gliderVersion: glider.version,
      version: 1,
      updatedAt: null,
      updatedBy: null,
    });
  });

  it('shows every member what a piece is and whose, but not what its owner noted on it', async () => {
    const { owner, builder, glider } = await crew();
    const piece = await makePiece(owner.user, { note: 'From the attic', grade: 'light' });
    await put(owner, glider.id, 1, assignmentOf(piece.id)).expect(200);
    const seen = await get(builder, glider.id);
    expect(seen.pieces).toEqual([
      expect.objectContaining({
        id: piece.id,
        number: 1,
        ownerName: 'Odile',
        own: false,
        density: piece.density,
        state: 'reserved',
        held: true,
      }),
    ]);
    expect(JSON.stringify(seen)).not.toContain('attic');
    expect((await get(owner, glider.id)).pieces[0]?.own).toBe(true);
  });

  it('says where an owner has taken a piece back, and leaves out one that is gone', async () => {
    const { owner, glider } = await crew();
    const [one, other] = [await makePiece(owner.user), await makePiece(owner.user)];
    await put(owner, glider.id, 1, assignmentOf(one.id, other.id)).expect(200);
    for (const { id } of [one, other]) await owner.agent.delete(`/api/rack/${id}/reservation`).expect(200);
    await owner.agent.delete(`/api/rack/${other.id}`).set('If-Match', '"3"').expect(204);
    const seen = await get(owner, glider.id);
    expect(seen.pieces.map(({ id, held, state }) => [id, held, state])).toEqual([[one.id, false, 'free']]);
    expect(seen.entries.map(({ pieceId }) => pieceId)).toEqual([one.id, other.id]);
  });
});

describe('PUT /api/gliders/:id/assignment', () => {
  it('keeps the entries, reserves the free pieces that they name and frees those named no more', async () => {
    const { owner, glider } = await crew();
    const [a, b, byHand] = [
      await makePiece(owner.user),
      await makePiece(owner.user),
      await makePiece(owner.user),
    ];
    await owner.agent.put(`/api/rack/${byHand.id}/reservation`).send({ gliderId: glider.id }).expect(200);

    const first = assignmentOf(a.id, a.id, null);
    const res = await put(owner, glider.id, 1, first).expect(200);
    expect(res.headers['etag']).toBe('"2"');
    expect(gliderAssignment.parse(res.body)).toMatchObject({ ...first, version: 2, updatedBy: 'Odile' });
    expect(await pieceRow(a.id)).toMatchObject({ state: 'reserved', gliderId: glider.id, version: 2 });

    await put(owner, glider.id, 2, assignmentOf(b.id)).expect(200);
    expect(await pieceRow(a.id)).toMatchObject({ state: 'free', gliderId: null, version: 3 });
    expect(await pieceRow(b.id)).toMatchObject({ state: 'reserved', gliderId: glider.id });
    expect(await pieceRow(byHand.id)).toMatchObject({ state: 'reserved', gliderId: glider.id, version: 2 });
  });

  it('lets a builder bring his own pieces, and keep those that the owner put there', async () => {
    const { owner, builder, glider } = await crew();
    const [hers, his] = [await makePiece(owner.user), await makePiece(builder.user)];
    await put(owner, glider.id, 1, assignmentOf(hers.id)).expect(200);
    await put(builder, glider.id, 2, assignmentOf(hers.id, his.id)).expect(200);
    const { pieces } = await get(owner, glider.id);
    expect(Object.fromEntries(pieces.map(({ ownerName, own }) => [ownerName, own]))).toEqual({
      Maren: false,
      Odile: true,
    });
  });

  it('refuses pieces that are nobody’s, somebody else’s, or not at hand, pointing at each, and changes nothing', async () => {
    const { owner, builder, glider } = await crew();
    const other = await makeGlider({ owner: owner.user });
    const [mine, foreign, elsewhere, cut] = [
      await makePiece(owner.user),
      await makePiece(builder.user),
      await makePiece(owner.user),
      await makePiece(owner.user),
    ];
    await owner.agent.put(`/api/rack/${elsewhere.id}/reservation`).send({ gliderId: other.id }).expect(200);
    const split = { along: 'length', wanted: [100], kerf: 1 };
    await owner.agent.post(`/api/rack/${cut.id}/split`).send(split).expect(200);
    const before = await countRows();
    const wrong = assignmentOf(mine.id, foreign.id, null, randomUUID(), elsewhere.id, cut.id);
    const res = await put(owner, glider.id, 1, wrong);
    expect(refusedFields(res)).toEqual([1, 3, 4, 5].map((i) => `#/entries/${i}/pieceId`));
    const problem = expectProblem(res, 'invalid_input');
    expect(problem.errors?.[0]?.detail).toBe(problem.errors?.[1]?.detail);
    expect(problem.errors?.[2]?.detail).toContain(`is reserved for ${other.name}`);
    expect(changes(before, await countRows())).toEqual({});
    expect((await pieceRow(mine.id)).state).toBe('free');
  });

  it('lets one of two gliders have a piece that both name at once', async () => {
    const { owner, glider } = await crew();
    const other = await makeGlider({ owner: owner.user });
    const piece = await makePiece(owner.user);
    const answers = await Promise.all(
      [glider, other].map(({ id }) => put(owner, id, 1, assignmentOf(piece.id))),
    );
    expect(answers.map(({ status }) => status).toSorted((a, b) => a - b)).toEqual([200, 400]);
  });

  it('refuses a stale version with what is there, and answers a save sent twice as saved once', async () => {
    const { owner, builder, glider } = await crew();
    const piece = await makePiece(owner.user);
    const first = await put(owner, glider.id, 1, assignmentOf(piece.id)).expect(200);
    const refusal = expectProblem(await put(builder, glider.id, 1, assignmentOf(null)), 'stale_version');
    expect(gliderAssignment.parse(refusal['current']).version).toBe(2);
    expect((await put(owner, glider.id, 1, assignmentOf(piece.id)).expect(200)).body).toEqual(first.body);
  });

  it('refuses a plan that was never saved, and what is wrong by its field', async () => {
    const { owner, glider } = await crew();
    const future = { ...assignmentOf(), gliderVersion: 2 };
    expect(refusedFields(await put(owner, glider.id, 1, future))).toEqual(['#/gliderVersion']);
    const [entry] = assignmentOf(null).entries;
    const wrong = { ...assignmentOf(), entries: [{ ...entry, n: -1, side: 'left', at: [1] }] };
    expect(refusedFields(await put(owner, glider.id, 1, wrong))).toEqual(
      ['at', 'n', 'side'].map((field) => `#/entries/0/${field}`),
    );
  });

  it('goes over to the new owner with the glider, and the pieces stay whose they are', async () => {
    const { owner, builder, glider } = await crew();
    const piece = await makePiece(owner.user);
    await put(owner, glider.id, 1, assignmentOf(piece.id)).expect(200);
    const heir = { userId: builder.user.id };
    await owner.agent.post(`/api/gliders/${glider.id}/ownership`).send(heir).expect(200);
    const seen = await get(builder, glider.id);
    expect(seen).toMatchObject({ version: 2, pieces: [{ id: piece.id, own: false, held: true }] });
    await put(builder, glider.id, 2, assignmentOf(piece.id, null)).expect(200);
    expect((await get(owner, glider.id)).pieces[0]?.own).toBe(true);
  });
});
