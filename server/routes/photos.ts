import { LIMITS } from '#shared/schemas/limits.ts';
import { photo, photoForm, photoInput, photoList } from '#shared/schemas/photo.ts';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';
import { addPhoto, captionPhoto, deletePhoto, listPhotos, readPhoto } from '#server/services/photos.ts';
import { idParams } from './inputs.ts';

const tag = 'Photos';

export const photoEndpoints: Endpoint[] = [
  endpoint({
    method: 'get',
    path: '/gliders/:id/photos',
    tag,
    summary: 'Photos of a glider, newest first',
    access: 'signed-in',
    params: idParams,
    answer: { status: 200, schema: photoList },
    handle: async ({ actor, params }) => ({ body: await listPhotos(actor, params.id) }),
  }),
  endpoint({
    method: 'post',
    path: '/gliders/:id/photos',
    tag,
    summary: 'Add a photo; it is encoded anew, without its metadata',
    access: 'signed-in',
    limits: ['uploads'],
    idempotent: true,
    upload: { field: 'photo', maxBytes: LIMITS.photoBytes.max },
    params: idParams,
    body: photoForm,
    answer: { status: 201, schema: photo },
    handle: async ({ actor, params, body, file, idempotencyKey }) => {
      const made = { gliderId: params.id, bytes: file, caption: body.caption, key: idempotencyKey };
      return { body: await addPhoto(actor, made) };
    },
  }),
  endpoint({
    method: 'get',
    path: '/photos/:id/image',
    tag,
    summary: 'The picture, at most 2400 pixels wide and high',
    access: 'signed-in',
    params: idParams,
    answer: { status: 200, file: 'image/jpeg' },
    handle: async ({ actor, params }) => ({ file: await readPhoto(actor, params.id, 'image') }),
  }),
  endpoint({
    method: 'get',
    path: '/photos/:id/thumbnail',
    tag,
    summary: 'The picture, at most 320 pixels wide and high',
    access: 'signed-in',
    params: idParams,
    answer: { status: 200, file: 'image/jpeg' },
    handle: async ({ actor, params }) => ({ file: await readPhoto(actor, params.id, 'thumbnail') }),
  }),
  endpoint({
    method: 'put',
    path: '/photos/:id',
    tag,
    summary: 'Change the caption of a photo',
    access: 'signed-in',
    params: idParams,
    body: photoInput,
    answer: { status: 200, schema: photo },
    handle: async ({ actor, params, body }) => ({
      body: await captionPhoto(actor, params.id, body.caption),
    }),
  }),
  endpoint({
    method: 'delete',
    path: '/photos/:id',
    tag,
    summary: 'Delete a photo with its files',
    access: 'signed-in',
    params: idParams,
    answer: { status: 204 },
    handle: async ({ actor, params }) => {
      await deletePhoto(actor, params.id);
      return {};
    },
  }),
];
