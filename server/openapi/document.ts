import { z } from 'zod';
import { problem } from '#shared/schemas/problem.ts';
import { lucia } from '#server/auth/lucia.ts';
import { PROBLEMS, type ProblemCode } from '#server/errors.ts';
import type { Endpoint } from '#server/http/endpoint.ts';
import type { Upload } from '#server/http/upload.ts';
import { componentSchemas, inlineSchema, reference, type JsonSchema } from './components.ts';
import { problemsOf } from './problems-of.ts';

interface Parameter {
  name: string;
  in: 'path' | 'query' | 'header';
  required: boolean;
  description?: string;
  schema: JsonSchema;
}

interface Answer {
  description: string;
  content?: Record<string, { schema: JsonSchema }>;
}

interface Operation {
  tags: string[];
  summary: string;
  security?: Record<string, string[]>[];
  parameters: Parameter[];
  requestBody?: { required: true; content: Record<string, { schema: JsonSchema }> };
  responses: Record<string, Answer>;
}

export interface OpenApiDocument {
  openapi: '3.1.0';
  info: { title: string; version: string; description: string };
  servers: { url: string }[];
  components: { securitySchemes: object; schemas: Record<string, JsonSchema> };
  paths: Record<string, Record<string, Operation>>;
}

/** OpenAPI 3.1, from the very declarations and schemas that serve the requests. */
export function openApiDocument(endpoints: readonly Endpoint[]): OpenApiDocument {
  const paths: OpenApiDocument['paths'] = {};
  for (const endpoint of endpoints) {
    const path = endpoint.path.replace(/:(\w+)/g, '{$1}');
    paths[path] = { ...paths[path], [endpoint.method]: operationOf(endpoint) };
  }
  return {
    openapi: '3.1.0',
    info: {
      title: 'Featherbeam',
      version: '1',
      description:
        'Mass, balance and loading of light wooden model gliders. Lengths in mm, masses in g, angles in degrees; x grows aft, y to starboard, z up.',
    },
    servers: [{ url: '/api' }],
    components: {
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: lucia.sessionCookieName } },
      schemas: componentSchemas(),
    },
    paths,
  };
}

function operationOf(endpoint: Endpoint): Operation {
  const { body } = endpoint.schemas;
  return {
    tags: [endpoint.tag],
    summary: endpoint.summary,
    ...(endpoint.access === 'signed-in' && { security: [{ session: [] }] }),
    parameters: parametersOf(endpoint),
    ...(body && { requestBody: { required: true, content: bodyOf(body, endpoint.upload) } }),
    responses: { [endpoint.answer.status]: answerOf(endpoint), ...refusalsOf(endpoint) },
  };
}

function bodyOf(body: z.ZodType, upload: Upload | undefined): Record<string, { schema: JsonSchema }> {
  if (!upload) return { 'application/json': { schema: reference(body) } };
  const { properties, ...form } = inlineSchema(z.toJSONSchema(body, { io: 'input' }));
  const file: JsonSchema = { type: 'string', contentMediaType: 'application/octet-stream' };
  const schema = { ...form, properties: { ...properties, [upload.field]: file }, required: [upload.field] };
  return { 'multipart/form-data': { schema } };
}

function parametersOf({ schemas, ifMatch, idempotent }: Endpoint): Parameter[] {
  const headers: Parameter[] = [];
  if (ifMatch) {
    const description = 'ETag of the version that was changed';
    headers.push({ name: 'If-Match', in: 'header', required: true, description, schema: { type: 'string' } });
  }
  if (idempotent) {
    const description = 'The same key makes the same row, however often it is sent';
    const schema: JsonSchema = { type: 'string', format: 'uuid' };
    headers.push({ name: 'Idempotency-Key', in: 'header', required: false, description, schema });
  }
  return [...fieldsOf(schemas.params, 'path'), ...fieldsOf(schemas.query, 'query'), ...headers];
}

function fieldsOf(schema: z.ZodType | undefined, place: 'path' | 'query'): Parameter[] {
  if (!(schema instanceof z.ZodObject)) return [];
  const fields: Record<string, z.ZodType> = schema.shape;
  return Object.entries(fields).map(([name, field]) => ({
    name,
    in: place,
    required: place === 'path',
    schema: inlineSchema(z.toJSONSchema(field, { io: 'input' })),
  }));
}

function answerOf({ answer }: Endpoint): Answer {
  if ('file' in answer) {
    const schema: JsonSchema = { type: 'string', contentMediaType: answer.file };
    return { description: 'A file', content: { [answer.file]: { schema } } };
  }
  if (!answer.schema) return { description: 'Done' };
  if ('download' in answer && answer.download === 'text/csv') {
    return { description: 'A file', content: { 'text/csv': { schema: { type: 'string' } } } };
  }
  return { description: 'Done', content: { 'application/json': { schema: reference(answer.schema) } } };
}

function refusalsOf(endpoint: Endpoint): Record<string, Answer> {
  const byStatus = new Map<number, ProblemCode[]>();
  for (const code of problemsOf(endpoint)) {
    const { status } = PROBLEMS[code];
    byStatus.set(status, [...(byStatus.get(status) ?? []), code]);
  }
  const content = { 'application/problem+json': { schema: reference(problem) } };
  return Object.fromEntries(
    [...byStatus].map(([status, codes]) => [status, { description: codes.join(', '), content }]),
  );
}
