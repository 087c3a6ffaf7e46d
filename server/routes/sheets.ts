import { z } from 'zod';
import { unitsOf } from '#shared/format/units.ts';
import { sheet, sheetInput, sheetList } from '#shared/schemas/sheet.ts';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';
import { sheetCsv, sheetFileName } from '#server/presenters/sheet-csv.ts';
import { preferencesOf } from '#server/services/account.ts';
import { createSheet, getSheet, listSheets } from '#server/services/sheets.ts';
import { idParams, pageQuery } from './inputs.ts';

const tag = 'Sheets';

export const sheetEndpoints: Endpoint[] = [
  endpoint({
    method: 'get',
    path: '/gliders/:id/sheets',
    tag,
    summary: 'Balance sheets of a glider, newest first',
    access: 'signed-in',
    params: idParams,
    query: pageQuery,
    answer: { status: 200, schema: sheetList },
    handle: async ({ actor, params, query }) => ({ body: await listSheets(actor, params.id, query) }),
  }),
  endpoint({
    method: 'post',
    path: '/gliders/:id/sheets',
    tag,
    summary: 'Freeze the saved plan and its result as a numbered balance sheet',
    access: 'signed-in',
    idempotent: true,
    params: idParams,
    body: sheetInput,
    answer: { status: 201, schema: sheet },
    handle: async ({ actor, params, body, idempotencyKey }) => {
      const made = await createSheet(actor, params.id, body.note, idempotencyKey);
      return { body: made, location: `/api/sheets/${made.id}` };
    },
  }),
  endpoint({
    method: 'get',
    path: '/sheets/:id',
    tag,
    summary: 'A balance sheet',
    access: 'signed-in',
    params: idParams,
    answer: { status: 200, schema: sheet },
    handle: async ({ actor, params }) => ({ body: await getSheet(actor, params.id) }),
  }),
  endpoint({
    method: 'get',
    path: '/sheets/:id/csv',
    tag,
    summary: 'A balance sheet for a spreadsheet, in the units of who asks',
    access: 'signed-in',
    params: idParams,
    answer: { status: 200, schema: z.string(), download: 'text/csv' },
    handle: async ({ actor, params }) => {
      const found = await getSheet(actor, params.id);
      const { units } = await preferencesOf(actor);
      return { body: sheetCsv(found, unitsOf(units)), fileName: sheetFileName(found, 'csv') };
    },
  }),
  endpoint({
    method: 'get',
    path: '/sheets/:id/json',
    tag,
    summary: 'A balance sheet as a file that can be checked against its SHA-256',
    access: 'signed-in',
    params: idParams,
    answer: { status: 200, schema: sheet, download: 'application/json' },
    handle: async ({ actor, params }) => {
      const found = await getSheet(actor, params.id);
      return { body: found, fileName: sheetFileName(found, 'json') };
    },
  }),
];
