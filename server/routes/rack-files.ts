import { z } from 'zod';
import { LIMITS } from '#shared/schemas/limits.ts';
import { importForm, importInput, importPreview, importResult } from '#shared/schemas/rack.ts';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';
import { rackCsv } from '#server/presenters/rack-csv.ts';
import { importPieces, previewImport } from '#server/services/rack-imports.ts';
import { listForExport } from '#server/services/rack-lists.ts';
import { exportQuery } from './rack-inputs.ts';

const tag = 'Rack';

/** Before the pieces in the list of endpoints, for `export` is no id. */
export const rackFileEndpoints: Endpoint[] = [
  endpoint({
    method: 'get',
    path: '/rack/export',
    tag,
    summary: 'Your rack for a spreadsheet, in mm and g; it can be taken in again',
    access: 'signed-in',
    query: exportQuery,
    answer: { status: 200, schema: z.string(), download: 'text/csv' },
    handle: async ({ actor, query }) => ({
      body: rackCsv(await listForExport(actor, query.state)),
      fileName: 'Rack.csv',
    }),
  }),
  endpoint({
    method: 'post',
    path: '/rack/import-previews',
    tag,
    summary: 'What a table of stock would bring in, every bad line with its reasons; nothing is stored',
    access: 'signed-in',
    limits: ['uploads'],
    upload: { field: 'file', maxBytes: LIMITS.csvBytes.max },
    body: importForm,
    answer: { status: 200, schema: importPreview },
    handle: async ({ actor, file }) => ({ body: await previewImport(actor, file) }),
  }),
  endpoint({
    method: 'post',
    path: '/rack/imports',
    tag,
    summary: 'Take pieces in, all of them or none, under the next numbers',
    access: 'signed-in',
    idempotent: true,
    body: importInput,
    answer: { status: 201, schema: importResult },
    handle: async ({ actor, body, idempotencyKey }) => ({
      body: await importPieces(actor, body.rows, idempotencyKey),
    }),
  }),
];
