import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import sharp from 'sharp';
import { describe, expect, it } from 'vitest';
import { stockPiece } from '#shared/schemas/stock-piece.ts';
import { GliderMember } from '#server/models/glider-member.ts';
import { listPiecesOfUser } from '#server/services/rack.ts';
import { useApp } from '../support/app.ts';
import { makePerson, PASSWORD, type Person } from '../support/people.ts';
import { picture, smallPicture } from '../support/photos.ts';
import { expectProblem, refusedFields } from '../support/problems.ts';
import { addMember, makeGlider } from '../support/rows.ts';
import { makePiece, pieceRow } from '../support/stock.ts';

const app = useApp();

const get = async ({ agent }: Person, id: string) =>
  stockPiece.parse((await agent.get(`/api/rack/${id}`).expect(200)).body);
const reserve = ({ agent }: Person, id: string, gliderId: string) =>
  agent.put(`/api/rack/${id}/reservation`).send({ gliderId });
const free = ({ agent }: Person, id: string) => agent.delete(`/api/rack/${id}/reservation`);

describe('PUT /api/rack/:id/reservation', () => {
  it('reserves a piece for a glider that the asker builds, once however often it is asked', async () => {
    const [person, owner] = [await makePerson(app), await makePerson(app)];
    const glider = await makeGlider({ owner: owner.user });
    await addMember(glider, person.user, 'builder');
    const piece = await makePiece(person.user);
    const res = await reserve(person, piece.id, glider.id).expect(200);
    expect(res.headers['etag']).toBe('"2"');
    expect(res.body).toMatchObject({ state: 'reserved', reservedFor: { id: glider.id, name: glider.name } });
    expect((await reserve(person, piece.id, glider.id).expect(200)).body.version).toBe(2);
  });

  it('hands a piece over from one glider to another', async () => {
    const person = await makePerson(app);
    const [one, other] = [await makeGlider({ owner: person.user }), await makeGlider({ owner: person.user })];
    const piece = await makePiece(person.user);
    await reserve(person, piece.id, one.id).expect(200);
    expect((await reserve(person, piece.id, other.id).expect(200)).body.reservedFor.id).toBe(other.id);
  });

  it('refuses a glider that the asker does not see, or may not change, and a piece that is spent', async () => {
    const [person, owner] = [await makePerson(app), await makePerson(app)];
    const glider = await makeGlider({ owner: owner.user });
    const piece = await makePiece(person.user);
    expect(refusedFields(await reserve(person, piece.id, glider.id))).toEqual(['#/gliderId']);
    await addMember(glider, person.user, 'reader');
    expectProblem(await reserve(person, piece.id, glider.id), 'forbidden');
    const own = await makeGlider({ owner: person.user });
    await person.agent.post(`/api/rack/${piece.id}/use`).send({ gliderId: null, leftovers: [] }).expect(200);
    expectProblem(await reserve(person, piece.id, own.id), 'piece_in_use');
  });

  it('does not tell the name of a glider that the owner of the piece does not see any more', async () => {
    const [person, owner] = [await makePerson(app), await makePerson(app)];
    const glider = await makeGlider({ owner: owner.user });
    await addMember(glider, person.user, 'builder');
    const piece = await makePiece(person.user);
    await reserve(person, piece.id, glider.id).expect(200);
    await GliderMember.destroy({ where: { gliderId: glider.id, userId: person.user.id } });
    expect(await get(person, piece.id)).toMatchObject({ state: 'reserved', reservedFor: null });
    const gone = await person.agent.delete(`/api/rack/${piece.id}`).set('If-Match', '"2"');
    expect(expectProblem(gone, 'piece_in_use').detail).not.toContain(glider.name);
    expect((await free(person, piece.id).expect(200)).body.state).toBe('free');
  });
});

describe('DELETE /api/rack/:id/reservation', () => {
  it('frees a piece, and leaves a free one as it is', async () => {
    const person = await makePerson(app);
    const glider = await makeGlider({ owner: person.user });
    const piece = await makePiece(person.user);
    await reserve(person, piece.id, glider.id).expect(200);
    expect((await free(person, piece.id).expect(200)).body).toMatchObject({
      state: 'free',
      reservedFor: null,
      version: 3,
    });
    expect((await free(person, piece.id).expect(200)).body.version).toBe(3);
  });

  it('takes back what was split by mistake, once nothing that was cut from it is left', async () => {
    const person = await makePerson(app);
    const piece = await makePiece(person.user);
    const body = { along: 'length', wanted: [300], kerf: 1 };
    const { pieces } = (await person.agent.post(`/api/rack/${piece.id}/split`).send(body).expect(200)).body;
    expect(expectProblem(await free(person, piece.id), 'piece_in_use').detail).toBe(
      'Pieces 2 and 3 are cut from piece 1. Delete them first.',
    );
    for (const { id } of pieces) {
      await person.agent.delete(`/api/rack/${id}`).set('If-Match', '"1"').expect(204);
    }
    expect((await free(person, piece.id).expect(200)).body).toMatchObject({ state: 'free', mass: 17.7 });
  });
});

describe('the photo of a piece', () => {
  const put = ({ agent }: Person, id: string, bytes: Buffer) =>
    agent.put(`/api/rack/${id}/photo`).attach('file', bytes, 'IMG_0001.jpg');
  const read = async ({ agent }: Person, id: string, query: object): Promise<Buffer> =>
    (await agent.get(`/api/rack/${id}/photo`).query(query).buffer(true).expect(200)).body;
  const filesOf = (file: string | null) =>
    readdirSync(join(app.files, 'photos')).filter((name) => file !== null && name.startsWith(file));

  it('is kept upright and without metadata, in two sizes, and leaves the version', async () => {
    const person = await makePerson(app);
    const piece = await makePiece(person.user);
    const sent = await picture(800, 600)
      .withExif({ IFD0: { Make: 'Plate camera' } })
      .withMetadata({ orientation: 6 })
      .jpeg()
      .toBuffer();
    const res = await put(person, piece.id, sent).expect(200);
    expect(res.body).toMatchObject({ hasPhoto: true, version: 1 });
    const [full, thumb] = [await read(person, piece.id, {}), await read(person, piece.id, { size: 'thumb' })];
    const sizeOf = async (bytes: Buffer) => {
      const { width, height, exif } = await sharp(bytes).metadata();
      return [width, height, exif];
    };
    expect(await sizeOf(full)).toEqual([600, 800, undefined]);
    expect(await sizeOf(thumb)).toEqual([240, 320, undefined]);
  });

  it('is replaced, deleted, and goes with the piece, its files too', async () => {
    const person = await makePerson(app);
    const piece = await makePiece(person.user);
    await put(person, piece.id, await smallPicture()).expect(200);
    const first = (await pieceRow(piece.id)).photoFile;
    await put(person, piece.id, await smallPicture()).expect(200);
    const second = (await pieceRow(piece.id)).photoFile;
    expect([filesOf(first).length, filesOf(second).length]).toEqual([0, 2]);
    const gone = await person.agent.delete(`/api/rack/${piece.id}/photo`).expect(200);
    expect([gone.body.hasPhoto, filesOf(second).length]).toEqual([false, 0]);
    expectProblem(await person.agent.get(`/api/rack/${piece.id}/photo`), 'not_found');
    await put(person, piece.id, await smallPicture()).expect(200);
    const third = (await pieceRow(piece.id)).photoFile;
    await person.agent.delete(`/api/rack/${piece.id}`).set('If-Match', '"1"').expect(204);
    expect(filesOf(third)).toEqual([]);
  });

  it('is refused where it is no picture, by its field', async () => {
    const person = await makePerson(app);
    const piece = await makePiece(person.user);
    expectProblem(await put(person, piece.id, Buffer.from('<svg/>')), 'unsupported_type');
    const broken = Buffer.concat([Buffer.from([0xff, 0xd8, 0xff, 0xe0]), Buffer.alloc(2_000, 7)]);
    expect(refusedFields(await put(person, piece.id, broken))).toEqual(['#/file']);
    expect(
      refusedFields(await person.agent.get(`/api/rack/${piece.id}/photo`).query({ size: 'huge' })),
    ).toEqual(['#/size']);
    expect((await get(person, piece.id)).hasPhoto).toBe(false);
  });
});

describe('the pieces of a user', () => {
  it('are listed whole, those that are spent included', async () => {
    const person = await makePerson(app);
    const pieces = [await makePiece(person.user), await makePiece(person.user)];
    await makePiece((await makePerson(app)).user);
    await person.agent
      .post(`/api/rack/${pieces[0]!.id}/use`)
      .send({ gliderId: null, leftovers: [] })
      .expect(200);
    const listed = await listPiecesOfUser(person.user.id);
    expect(listed.map(({ number, state }) => [number, state])).toEqual([
      [1, 'used'],
      [2, 'free'],
    ]);
  });

  it('go with the account, and what others had reserved for its gliders is free again', async () => {
    const [person, leaver] = [await makePerson(app), await makePerson(app)];
    const glider = await makeGlider({ owner: leaver.user });
    await addMember(glider, person.user, 'builder');
    const [held, lost] = [await makePiece(person.user), await makePiece(leaver.user)];
    await reserve(person, held.id, glider.id).expect(200);
    await reserve(leaver, lost.id, glider.id).expect(200);
    await GliderMember.destroy({ where: { gliderId: glider.id, userId: person.user.id } });
    await leaver.agent.post('/api/account/deletion').send({ password: PASSWORD }).expect(200);
    expect(await listPiecesOfUser(leaver.user.id)).toEqual([]);
    expect(await get(person, held.id)).toMatchObject({ state: 'free', reservedFor: null });
  });
});
