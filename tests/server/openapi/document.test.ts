import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { PROBLEMS } from '#server/errors.ts';
import { ENDPOINTS } from '#server/routes/endpoints.ts';
import { useApp } from '../support/app.ts';

const app = useApp();

const documentShape = z.object({
  openapi: z.literal('3.1.0'),
  info: z.object({ title: z.string(), version: z.string() }),
  components: z.object({ schemas: z.record(z.string(), z.looseObject({ type: z.string() })) }),
  paths: z.record(
    z.string(),
    z.record(
      z.string(),
      z.object({
        summary: z.string(),
        parameters: z.array(z.object({ name: z.string(), in: z.string(), required: z.boolean() })),
        requestBody: z.object({ content: z.record(z.string(), z.unknown()) }).optional(),
        responses: z.record(z.string(), z.object({ description: z.string() })),
      }),
    ),
  ),
});

async function readDocument() {
  return documentShape.parse((await app.visitor().get('/api/openapi.json').expect(200)).body);
}

describe('GET /api/openapi.json', () => {
  it('describes every endpoint that there is, with its answer and its refusals', async () => {
    const { paths } = await readDocument();
    const described = Object.entries(paths).flatMap(([path, methods]) =>
      Object.keys(methods).map((method) => `${method} ${path}`),
    );
    expect(described.toSorted()).toEqual(
      ENDPOINTS.map(({ method, path }) => `${method} ${path.replace(/:(\w+)/g, '{$1}')}`).toSorted(),
    );
    const save = paths['/gliders/{id}']?.['put'];
    expect(Object.keys(save?.responses ?? {})).toEqual([
      '200',
      '400',
      '401',
      '403',
      '404',
      '412',
      '413',
      '415',
      '428',
      '500',
      '503',
    ]);
    expect(save?.parameters.map(({ name, required }) => [name, required])).toEqual([
      ['id', true],
      ['If-Match', true],
    ]);
  });

  it('points to nothing that it does not contain', async () => {
    const document = await readDocument();
    const text = JSON.stringify((await app.visitor().get('/api/openapi.json')).body);
    const targets = [...text.matchAll(/"\$ref":"#\/components\/schemas\/([^"]+)"/g)].map(
      ([, name]) => name ?? '',
    );
    expect(targets.length).toBeGreaterThan(20);
    for (const target of targets) expect(Object.keys(document.components.schemas)).toContain(target);
    expect(text).not.toContain('$defs');
  });

  it('gives the plan’s limits as the schema has them', async () => {
    const { components } = await readDocument();
    expect(components.schemas['Plan']).toMatchObject({
      required: ['version', 'name', 'materials', 'surfaces', 'items', 'solids'],
      additionalProperties: false,
      properties: { surfaces: { maxItems: 20 } },
    });
  });
});

describe('GET /api/docs', () => {
  it('is a page without scripts that names every endpoint and every refusal', async () => {
    const res = await app.visitor().get('/api/docs').expect(200);
    expect(res.headers['content-type']).toBe('text/html; charset=utf-8');
    expect(res.text).not.toMatch(/<script|\son\w+=|https?:/i);
    for (const { path } of ENDPOINTS) expect(res.text).toContain(`/api${path}`);
    for (const code of Object.keys(PROBLEMS)) expect(res.text).toContain(`id="${code}"`);
  });
});
