import { material, materialInput, materialList, materialUses } from '#shared/schemas/material.ts';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';
import {
  createMaterial,
  deleteMaterial,
  getMaterial,
  getMaterialUses,
  listMaterials,
  saveMaterial,
} from '#server/services/materials.ts';
import { idParams } from './inputs.ts';

const tag = 'Materials';

export const materialEndpoints: Endpoint[] = [
  endpoint({
    method: 'get',
    path: '/materials',
    tag,
    summary: 'Everybody’s materials and your own',
    access: 'anyone',
    answer: { status: 200, schema: materialList },
    handle: async ({ actor }) => ({ body: await listMaterials(actor) }),
  }),
  endpoint({
    method: 'post',
    path: '/materials',
    tag,
    summary: 'Add a material: your own, or as an admin everybody’s',
    access: 'signed-in',
    body: materialInput,
    answer: { status: 201, schema: material, etag: true },
    problems: ['forbidden'],
    handle: async ({ actor, body }) => {
      const made = await createMaterial(actor, body);
      return { body: made, version: made.version, location: `/api/materials/${made.id}` };
    },
  }),
  endpoint({
    method: 'get',
    path: '/materials/:id',
    tag,
    summary: 'A material',
    access: 'anyone',
    params: idParams,
    answer: { status: 200, schema: material, etag: true },
    handle: async ({ actor, params }) => {
      const found = await getMaterial(actor, params.id);
      return { body: found, version: found.version };
    },
  }),
  endpoint({
    method: 'put',
    path: '/materials/:id',
    tag,
    summary: 'Change a material; a stale version is answered with the current one as `current`',
    access: 'signed-in',
    ifMatch: true,
    params: idParams,
    body: materialInput,
    answer: { status: 200, schema: material, etag: true },
    handle: async ({ actor, params, ifMatch, body }) => {
      const saved = await saveMaterial(actor, params.id, ifMatch, body);
      return { body: saved, version: saved.version };
    },
  }),
  endpoint({
    method: 'delete',
    path: '/materials/:id',
    tag,
    summary: 'Delete a material that no glider uses; else `uses` says which do',
    access: 'signed-in',
    params: idParams,
    answer: { status: 204 },
    problems: ['material_in_use'],
    handle: async ({ actor, params }) => {
      await deleteMaterial(actor, params.id);
      return {};
    },
  }),
  endpoint({
    method: 'get',
    path: '/materials/:id/uses',
    tag,
    summary: 'Which gliders use a material',
    access: 'signed-in',
    params: idParams,
    answer: { status: 200, schema: materialUses },
    handle: async ({ actor, params }) => ({ body: await getMaterialUses(actor, params.id) }),
  }),
];
