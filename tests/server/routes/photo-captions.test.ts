import { describe, expect, it } from 'vitest';
import { photo as photoSchema } from '#shared/schemas/photo.ts';
import { GliderPhoto } from '#server/models/glider-photo.ts';
import { useApp } from '../support/app.ts';
import { makePerson } from '../support/people.ts';
import { makePhoto } from '../support/photos.ts';
import { makeGlider } from '../support/rows.ts';

const app = useApp();

describe('PUT /api/photos/:id', () => {
  it('changes the caption and nothing else', async () => {
    const owner = await makePerson(app);
    const glider = await makeGlider({ owner: owner.user });
    const photo = await makePhoto(glider, owner.user, 'old');
    const res = await owner.agent.put(`/api/photos/${photo.id}`).send({ caption: 'new' }).expect(200);
    expect(photoSchema.parse(res.body).caption).toBe('new');
    const row = await GliderPhoto.findByPk(photo.id, { rejectOnEmpty: true });
    expect(row.get()).toEqual({ ...photo.get(), caption: 'new' });
  });
});
