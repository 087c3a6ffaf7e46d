import { LIMITS } from '#shared/schemas/limits.ts';
import {
  importForm,
  reservationInput,
  splitInput,
  splitResult,
  useInput,
  useResult,
} from '#shared/schemas/rack.ts';
import { stockPiece } from '#shared/schemas/stock-piece.ts';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';
import { splitPiece, buildPieceIn } from '#server/services/stock-cutting.ts';
import { freePiece, reservePiece } from '#server/services/stock-gliders.ts';
import { deletePiecePhoto, putPiecePhoto, readPiecePhoto } from '#server/services/stock-photos.ts';
import { idParams } from './inputs.ts';
import { photoQuery } from './rack-inputs.ts';

const tag = 'Rack';

export const stockPieceEndpoints: Endpoint[] = [
  endpoint({
    method: 'post',
    path: '/rack/:id/split',
    tag,
    summary: 'Cut a piece up; masses go by volume, and what is left becomes a piece too',
    access: 'signed-in',
    params: idParams,
    body: splitInput,
    answer: { status: 200, schema: splitResult },
    problems: ['piece_in_use'],
    handle: async ({ actor, params, body }) => ({ body: await splitPiece(actor, params.id, body) }),
  }),
  endpoint({
    method: 'post',
    path: '/rack/:id/use',
    tag,
    summary: 'Build a piece in, and put what is left of it back on the rack',
    access: 'signed-in',
    params: idParams,
    body: useInput,
    answer: { status: 200, schema: useResult },
    problems: ['piece_in_use'],
    handle: async ({ actor, params, body }) => ({ body: await buildPieceIn(actor, params.id, body) }),
  }),
  endpoint({
    method: 'put',
    path: '/rack/:id/reservation',
    tag,
    summary: 'Reserve a piece for a glider that you build',
    access: 'signed-in',
    params: idParams,
    body: reservationInput,
    answer: { status: 200, schema: stockPiece, etag: true },
    problems: ['piece_in_use'],
    handle: async ({ actor, params, body }) => {
      const piece = await reservePiece(actor, params.id, body.gliderId);
      return { body: piece, version: piece.version };
    },
  }),
  endpoint({
    method: 'delete',
    path: '/rack/:id/reservation',
    tag,
    summary: 'Put a piece back on the rack as free, also one marked as used or split by mistake',
    access: 'signed-in',
    params: idParams,
    answer: { status: 200, schema: stockPiece, etag: true },
    problems: ['piece_in_use'],
    handle: async ({ actor, params }) => {
      const piece = await freePiece(actor, params.id);
      return { body: piece, version: piece.version };
    },
  }),
  endpoint({
    method: 'put',
    path: '/rack/:id/photo',
    tag,
    summary: 'Give a piece its photo, in place of the one that it has',
    access: 'signed-in',
    limits: ['uploads'],
    upload: { field: 'file', maxBytes: LIMITS.photoBytes.max },
    params: idParams,
    body: importForm,
    answer: { status: 200, schema: stockPiece, etag: true },
    handle: async ({ actor, params, file }) => {
      const piece = await putPiecePhoto(actor, params.id, file);
      return { body: piece, version: piece.version };
    },
  }),
  endpoint({
    method: 'get',
    path: '/rack/:id/photo',
    tag,
    summary: 'The photo of a piece',
    access: 'signed-in',
    params: idParams,
    query: photoQuery,
    answer: { status: 200, file: 'image/jpeg' },
    handle: async ({ actor, params, query }) => ({
      file: await readPiecePhoto(actor, params.id, query.size === 'thumb' ? 'thumbnail' : 'image'),
    }),
  }),
  endpoint({
    method: 'delete',
    path: '/rack/:id/photo',
    tag,
    summary: 'Delete the photo of a piece with its files',
    access: 'signed-in',
    params: idParams,
    answer: { status: 200, schema: stockPiece, etag: true },
    handle: async ({ actor, params }) => {
      const piece = await deletePiecePhoto(actor, params.id);
      return { body: piece, version: piece.version };
    },
  }),
];
