import {
  classEdition,
  classEditionInput,
  classEditionList,
  gliderAim,
  gliderAimInput,
} from '#shared/schemas/class-edition.ts';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';
import {
  addClassEdition,
  changeClassEdition,
  deleteClassEdition,
  getClassEdition,
  listClassEditions,
} from '#server/services/class-editions.ts';
import { aimGlider, getGliderAim, unaimGlider } from '#server/services/glider-aims.ts';
import { idParams } from './inputs.ts';

const tag = 'Classes';

export const classEditionEndpoints: Endpoint[] = [
  endpoint({
    method: 'get',
    path: '/class-editions',
    tag,
    summary: 'Editions of classes: everybody’s and those of your clubs',
    access: 'signed-in',
    answer: { status: 200, schema: classEditionList },
    handle: async ({ actor }) => ({ body: await listClassEditions(actor) }),
  }),
  endpoint({
    method: 'post',
    path: '/class-editions',
    tag,
    summary: 'Add an edition to everybody’s table',
    access: 'signed-in',
    idempotent: true,
    body: classEditionInput,
    answer: { status: 201, schema: classEdition, etag: true },
    problems: ['edition_exists'],
    handle: async ({ actor, body, idempotencyKey }) => {
      const found = await addClassEdition(actor, null, body, idempotencyKey);
      return { body: found, version: found.version, location: `/api/class-editions/${found.id}` };
    },
  }),
  endpoint({
    method: 'post',
    path: '/clubs/:id/class-editions',
    tag,
    summary: 'Add an edition of a club’s own',
    access: 'signed-in',
    idempotent: true,
    params: idParams,
    body: classEditionInput,
    answer: { status: 201, schema: classEdition, etag: true },
    problems: ['edition_exists'],
    handle: async ({ actor, params, body, idempotencyKey }) => {
      const found = await addClassEdition(actor, params.id, body, idempotencyKey);
      return { body: found, version: found.version, location: `/api/class-editions/${found.id}` };
    },
  }),
  endpoint({
    method: 'get',
    path: '/class-editions/:id',
    tag,
    summary: 'An edition of a class with its limits',
    access: 'signed-in',
    params: idParams,
    answer: { status: 200, schema: classEdition, etag: true },
    handle: async ({ actor, params }) => {
      const found = await getClassEdition(actor, params.id);
      return { body: found, version: found.version };
    },
  }),
  endpoint({
    method: 'put',
    path: '/class-editions/:id',
    tag,
    summary: 'Change an edition that nothing uses',
    access: 'signed-in',
    ifMatch: true,
    params: idParams,
    body: classEditionInput,
    answer: { status: 200, schema: classEdition, etag: true },
    problems: ['edition_in_use', 'edition_exists'],
    handle: async ({ actor, params, ifMatch, body }) => {
      const found = await changeClassEdition(actor, params.id, ifMatch, body);
      return { body: found, version: found.version };
    },
  }),
  endpoint({
    method: 'delete',
    path: '/class-editions/:id',
    tag,
    summary: 'Delete an edition that nothing uses',
    access: 'signed-in',
    params: idParams,
    answer: { status: 204 },
    problems: ['edition_in_use'],
    handle: async ({ actor, params }) => {
      await deleteClassEdition(actor, params.id);
      return {};
    },
  }),
  endpoint({
    method: 'get',
    path: '/gliders/:id/aim',
    tag,
    summary: 'The edition of a class that a glider is built for; null for none',
    access: 'signed-in',
    params: idParams,
    answer: { status: 200, schema: gliderAim },
    handle: async ({ actor, params }) => ({ body: await getGliderAim(actor, params.id) }),
  }),
  endpoint({
    method: 'put',
    path: '/gliders/:id/aim',
    tag,
    summary: 'Aim a glider at an edition of a class; that edition never changes again',
    access: 'signed-in',
    params: idParams,
    body: gliderAimInput,
    answer: { status: 200, schema: gliderAim },
    handle: async ({ actor, params, body }) => ({ body: await aimGlider(actor, params.id, body.editionId) }),
  }),
  endpoint({
    method: 'delete',
    path: '/gliders/:id/aim',
    tag,
    summary: 'Build a glider for no class in particular',
    access: 'signed-in',
    params: idParams,
    answer: { status: 204 },
    handle: async ({ actor, params }) => {
      await unaimGlider(actor, params.id);
      return {};
    },
  }),
];
