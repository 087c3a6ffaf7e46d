import { assignmentInput, gliderAssignment } from '#shared/schemas/assignment.ts';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';
import { getGliderAssignment, saveGliderAssignment } from '#server/services/glider-assignments.ts';
import { idParams } from './inputs.ts';

const tag = 'Wood';

export const gliderAssignmentEndpoints: Endpoint[] = [
  endpoint({
    method: 'get',
    path: '/gliders/:id/assignment',
    tag,
    summary: 'Which part of a glider is cut from which piece; version 1 and empty while nobody has kept one',
    access: 'signed-in',
    params: idParams,
    answer: { status: 200, schema: gliderAssignment, etag: true },
    handle: async ({ actor, params }) => {
      const found = await getGliderAssignment(actor, params.id);
      return { body: found, version: found.version };
    },
  }),
  endpoint({
    method: 'put',
    path: '/gliders/:id/assignment',
    tag,
    summary:
      'Keep the whole assignment; reserves your free pieces that it names and frees those named no more',
    access: 'signed-in',
    ifMatch: true,
    params: idParams,
    body: assignmentInput,
    answer: { status: 200, schema: gliderAssignment, etag: true },
    handle: async ({ actor, params, ifMatch, body }) => {
      const saved = await saveGliderAssignment(actor, params.id, ifMatch, body);
      return { body: saved, version: saved.version };
    },
  }),
];
