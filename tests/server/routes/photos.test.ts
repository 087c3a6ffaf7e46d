import { randomUUID } from 'node:crypto';
import { existsSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { QueryTypes } from 'sequelize';
import sharp from 'sharp';
import { describe, expect, it, vi } from 'vitest';
import { photo as photoSchema, photoList } from '#shared/schemas/photo.ts';
import type { GliderPhoto } from '#server/models/glider-photo.ts';
import { removeUnusedFiles } from '#server/services/stored-files.ts';
import { surroundings } from '#server/surroundings.ts';
import { useApp } from '../support/app.ts';
import { changes, countRows } from '../support/counts.ts';
import { makePerson, type Person } from '../support/people.ts';
import { bomb, makePhoto, picture, smallPicture } from '../support/photos.ts';
import { expectProblem, refusedFields } from '../support/problems.ts';
import { makeGlider } from '../support/rows.ts';

const app = useApp();

async function ownerOfOne() {
  const owner = await makePerson(app);
  return { owner, glider: await makeGlider({ owner: owner.user }) };
}

const post = ({ agent }: Person, id: string, bytes: Buffer, caption = '', key: string = randomUUID()) =>
  agent
    .post(`/api/gliders/${id}/photos`)
    .set('Idempotency-Key', key)
    .field({ caption })
    .attach('photo', bytes, 'IMG_0001.jpg');

const fetchBytes = async ({ agent }: Person, path: string): Promise<Buffer> =>
  (await agent.get(path).buffer(true).expect(200)).body;

const storedFiles = () =>
  existsSync(join(app.files, 'photos')) ? readdirSync(join(app.files, 'photos')) : [];
const filesOf = ({ file }: GliderPhoto) => storedFiles().filter((name) => name.startsWith(file));

/** A camera's picture lying on its side, with the place where it was taken. */
const cameraPicture = () =>
  picture(3_000, 2_000)
    .withExif({
      IFD0: { Make: 'Plate camera' },
      IFD3: { GPSLatitudeRef: 'N', GPSLatitude: '50/1 30/1 0/1' },
    })
    .withMetadata({ orientation: 6 })
    .jpeg()
    .toBuffer();

describe('POST /api/gliders/:id/photos', () => {
  it('keeps a photo upright, within bounds and without any metadata, with a small copy', async () => {
    const { owner, glider } = await ownerOfOne();
    const sent = await cameraPicture();
    expect(sent.includes('Plate camera')).toBe(true);
    const before = await countRows();

    const made = photoSchema.parse(
      (await post(owner, glider.id, sent, ' Ribs on the board ').expect(201)).body,
    );

    expect(made).toMatchObject({
      caption: 'Ribs on the board',
      addedBy: owner.user.name,
      width: 1_600,
      height: 2_400,
    });
    expect(changes(before, await countRows())).toEqual({ glider_photos: 1, idempotency_keys: 1 });
    const image = await fetchBytes(owner, `/api/photos/${made.id}/image`);
    const { format, width, height, exif, icc, xmp, orientation } = await sharp(image).metadata();
    expect({ format, width, height }).toEqual({ format: 'jpeg', width: 1_600, height: 2_400 });
    expect([exif, icc, xmp, orientation]).toEqual([undefined, undefined, undefined, undefined]);
    expect(image.includes('Plate camera')).toBe(false);
    const small = await sharp(await fetchBytes(owner, `/api/photos/${made.id}/thumbnail`)).metadata();
    expect([small.width, small.height]).toEqual([213, 320]);
  });

  it.each(['png', 'webp', 'avif'] as const)('takes %s, see-through places as white', async (format) => {
    const { owner, glider } = await ownerOfOne();
    const clear = sharp({
      create: { width: 20, height: 10, channels: 4, background: { r: 0, g: 0, b: 0, alpha: 0 } },
    });
    const made = (await post(owner, glider.id, await clear.toFormat(format).toBuffer()).expect(201)).body;
    const image = await fetchBytes(owner, `/api/photos/${made.id}/image`);
    const { channels } = await sharp(image).stats();
    expect(channels.map(({ min }) => min)).toEqual([255, 255, 255]);
  });

  it('keeps nothing of what hides behind a picture', async () => {
    const { owner, glider } = await ownerOfOne();
    const script = '<script>alert(1)</script>';
    const polyglot = Buffer.concat([await smallPicture(), Buffer.from(`<html>${script}</html>`)]);
    const made = (await post(owner, glider.id, polyglot).expect(201)).body;
    for (const size of ['image', 'thumbnail']) {
      expect((await fetchBytes(owner, `/api/photos/${made.id}/${size}`)).includes('script')).toBe(false);
    }
  });

  it.each([
    ['a vector picture', Buffer.from('<svg xmlns="http://www.w3.org/2000/svg" width="9" height="9"/>')],
    ['a page called a picture', Buffer.from('<!doctype html><img src=x>')],
    ['a document', Buffer.from('%PDF-1.7\n')],
    ['a HEIC picture', Buffer.from('\0\0\0\x18ftypheic\0\0\0\0mif1heic', 'latin1')],
    ['an empty file', Buffer.alloc(0)],
  ])('refuses %s by its content', async (_, bytes) => {
    const { owner, glider } = await ownerOfOne();
    const before = await countRows();
    expectProblem(await post(owner, glider.id, bytes), 'unsupported_type');
    expect(changes(before, await countRows())).toEqual({});
  });

  it('refuses what begins like a picture and is none, one that is cut off, and one of too many pixels', async () => {
    const { owner, glider } = await ownerOfOne();
    const before = [await countRows(), storedFiles().length] as const;
    const whole = await picture(800, 800).png().toBuffer();
    const garbage = Buffer.concat([Buffer.from([0xff, 0xd8, 0xff, 0xe0]), Buffer.alloc(2_000, 7)]);
    const large = bomb(20_000);
    expect(large.length).toBeLessThan(100_000);
    for (const bytes of [garbage, whole.subarray(0, whole.length / 2), large]) {
      expect(refusedFields(await post(owner, glider.id, bytes))).toEqual(['#/photo']);
    }
    expect([changes(before[0], await countRows()), storedFiles().length]).toEqual([{}, before[1]]);
  });

  it('refuses more than ten megabytes, a form without the file, and fields that it does not know', async () => {
    const { owner, glider } = await ownerOfOne();
    const path = `/api/gliders/${glider.id}/photos`;
    expectProblem(await post(owner, glider.id, Buffer.alloc(10_000_001, 1)), 'too_large');
    expect(refusedFields(await owner.agent.post(path).field({ caption: 'x' }))).toEqual(['#/photo']);
    const twice = owner.agent
      .post(path)
      .attach('photo', await smallPicture(), 'a')
      .attach('plan', Buffer.from('x'), 'b');
    expect(refusedFields(await twice)).toEqual(['#/plan']);
    const odd = post(owner, glider.id, await smallPicture(), 'x'.repeat(501)).field({ favourite: '1' });
    expect(refusedFields(await odd)).toEqual(['#/caption', '#/favourite']);
    expectProblem(await owner.agent.post(path).send({ caption: 'x' }), 'unsupported_type');
    const torn = owner.agent.post(path).type('multipart/form-data; boundary=x').send('--x\r\nContent-Disp');
    expectProblem(await torn, 'malformed_form');
  });

  it('takes a picture of as many pixels as telephones make', async () => {
    const { owner, glider } = await ownerOfOne();
    const made = (await post(owner, glider.id, bomb(9_000)).expect(201)).body;
    expect([made.width, made.height]).toEqual([2_400, 2_400]);
  });

  it('keeps one photo for one key, and at most a hundred of a glider', async () => {
    const { owner, glider } = await ownerOfOne();
    const key = randomUUID();
    const bytes = await smallPicture();
    const answers = [
      await post(owner, glider.id, bytes, 'a', key),
      await post(owner, glider.id, bytes, 'a', key),
    ];
    expect(answers[1]?.body).toEqual(answers[0]?.body);
    await app.sequelize.query(
      `INSERT INTO glider_photos (id, owner_id, glider_id, file, caption, width_px, height_px, added_by)
       SELECT gen_random_uuid(), :owner, :glider, gen_random_uuid(), '', 1, 1, :owner FROM generate_series(1, 99)`,
      { replacements: { owner: owner.user.id, glider: glider.id } },
    );
    const before = await countRows();
    expect(refusedFields(await post(owner, glider.id, bytes))).toEqual(['#']);
    // The files that were written for nothing are on the list of those to be removed.
    expect(changes(before, await countRows())).toEqual({ unused_files: 2 });
  });

  it('says that the disk is full, keeps nothing and removes what was written', async () => {
    const { owner, glider } = await ownerOfOne();
    const full = Object.assign(new Error('ENOSPC: no space left on device'), { code: 'ENOSPC' });
    const { write } = surroundings().files;
    vi.spyOn(surroundings().files, 'write').mockImplementation((key, bytes) =>
      key.endsWith('.small.jpg') ? Promise.reject(full) : write(key, bytes),
    );
    const before = [await countRows(), storedFiles()] as const;
    const refusal = expectProblem(await post(owner, glider.id, await smallPicture()), 'unavailable');
    expect(refusal.detail).toBe('The disk for stored files is full.');
    expect(changes(before[0], await countRows())).toEqual({ unused_files: 2 });
    const newFiles = () => storedFiles().filter((name) => !before[1].includes(name));
    expect(newFiles()).toHaveLength(1);
    // Well past: times are kept to the millisecond, so that this moment may be rounded into the next.
    await app.sequelize.query("UPDATE unused_files SET remove_after = now() - interval '1 minute'");
    await removeUnusedFiles();
    expect(newFiles()).toEqual([]);
  });
});

describe('GET /api/gliders/:id/photos', () => {
  it('lists a glider’s photos, newest first, and none of another', async () => {
    const { owner, glider } = await ownerOfOne();
    await makePhoto(await makeGlider({ owner: owner.user }), owner.user, 'other');
    await makePhoto(glider, owner.user, 'first');
    await makePhoto(glider, owner.user, 'second');
    const { photos } = photoList.parse(
      (await owner.agent.get(`/api/gliders/${glider.id}/photos`).expect(200)).body,
    );
    expect(photos.map(({ caption }) => caption)).toEqual(['second', 'first']);
  });
});

describe('GET /api/photos/:id/image', () => {
  it('is private, asks anew each time, answers 304 to its tag, and lets nothing in it run', async () => {
    const { owner, glider } = await ownerOfOne();
    const photo = await makePhoto(glider, owner.user);
    const res = await owner.agent.get(`/api/photos/${photo.id}/image`).expect(200);
    expect(res.headers).toMatchObject({
      'content-type': 'image/jpeg',
      'cache-control': 'private, no-cache',
      'content-security-policy': "default-src 'none'; sandbox",
      'x-content-type-options': 'nosniff',
      'cross-origin-resource-policy': 'same-origin',
    });
    const tag = res.headers['etag'] ?? '';
    const again = owner.agent.get(`/api/photos/${photo.id}/image`).set('If-None-Match', tag);
    expect((await again.expect(304)).text).toBe('');
    const stranger = await makePerson(app);
    expectProblem(
      await stranger.agent.get(`/api/photos/${photo.id}/image`).set('If-None-Match', tag),
      'not_found',
    );
  });
});

describe('DELETE /api/photos/:id', () => {
  it('removes the photo with its files, and no other', async () => {
    const { owner, glider } = await ownerOfOne();
    const [one, other] = [await makePhoto(glider, owner.user), await makePhoto(glider, owner.user)];
    expect(filesOf(one)).toHaveLength(2);
    await owner.agent.delete(`/api/photos/${one.id}`).expect(204);
    expect([filesOf(one).length, filesOf(other).length]).toEqual([0, 2]);
    expectProblem(await owner.agent.get(`/api/photos/${one.id}/image`), 'not_found');
  });

  it('removes the files of a glider that is deleted, also if they could not be removed at once', async () => {
    const { owner, glider } = await ownerOfOne();
    const photo = await makePhoto(glider, owner.user);
    vi.spyOn(surroundings().files, 'remove').mockRejectedValueOnce(new Error('The disk is away.'));
    await owner.agent.delete(`/api/gliders/${glider.id}`).expect(204);
    expect(filesOf(photo)).not.toHaveLength(0);
    await removeUnusedFiles();
    expect(filesOf(photo)).toHaveLength(0);
    const left = await app.sequelize.query('SELECT FROM unused_files WHERE strpos(key, ?) > 0', {
      type: QueryTypes.SELECT,
      replacements: [photo.file],
    });
    expect(left).toEqual([]);
  });
});
