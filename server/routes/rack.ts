import { rackList } from '#shared/schemas/rack.ts';
import { stockPiece, stockPieceInput } from '#shared/schemas/stock-piece.ts';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';
import { listRack } from '#server/services/rack-lists.ts';
import { createPiece, deletePiece, getPiece, savePiece } from '#server/services/rack.ts';
import { idParams } from './inputs.ts';
import { rackQuery } from './rack-inputs.ts';

const tag = 'Rack';

export const rackEndpoints: Endpoint[] = [
  endpoint({
    method: 'get',
    path: '/rack',
    tag,
    summary: 'Your sheets and sticks, in the order asked for; what was not weighed comes last',
    access: 'signed-in',
    query: rackQuery,
    answer: { status: 200, schema: rackList },
    handle: async ({ actor, query }) => ({ body: await listRack(actor, query) }),
  }),
  endpoint({
    method: 'post',
    path: '/rack',
    tag,
    summary: 'Put a piece on your rack under the next number',
    access: 'signed-in',
    idempotent: true,
    body: stockPieceInput,
    answer: { status: 201, schema: stockPiece, etag: true },
    handle: async ({ actor, body, idempotencyKey }) => {
      const made = await createPiece(actor, body, idempotencyKey);
      return { body: made, version: made.version, location: `/api/rack/${made.id}` };
    },
  }),
  endpoint({
    method: 'get',
    path: '/rack/:id',
    tag,
    summary: 'A piece of your rack',
    access: 'signed-in',
    params: idParams,
    answer: { status: 200, schema: stockPiece, etag: true },
    handle: async ({ actor, params }) => {
      const found = await getPiece(actor, params.id);
      return { body: found, version: found.version };
    },
  }),
  endpoint({
    method: 'put',
    path: '/rack/:id',
    tag,
    summary: 'Save a piece; a stale version is answered with the current piece as `current`',
    access: 'signed-in',
    ifMatch: true,
    params: idParams,
    body: stockPieceInput,
    answer: { status: 200, schema: stockPiece, etag: true },
    handle: async ({ actor, params, ifMatch, body }) => {
      const saved = await savePiece(actor, params.id, ifMatch, body);
      return { body: saved, version: saved.version };
    },
  }),
  endpoint({
    method: 'delete',
    path: '/rack/:id',
    tag,
    summary: 'Delete a piece for good; one that a glider holds is refused',
    access: 'signed-in',
    ifMatch: true,
    params: idParams,
    answer: { status: 204 },
    problems: ['piece_in_use'],
    handle: async ({ actor, params, ifMatch }) => {
      await deletePiece(actor, params.id, ifMatch);
      return {};
    },
  }),
];
