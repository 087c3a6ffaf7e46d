import { Router } from 'express';
import type { Endpoint } from '#server/http/endpoint.ts';
import { sendText } from '#server/http/packed.ts';
import { openApiDocument } from '#server/openapi/document.ts';
import { openApiPage } from '#server/openapi/page.ts';

/** The API's description of itself, for programs and for people; made once. */
export function descriptionRoutes(endpoints: readonly Endpoint[]): Router {
  const router = Router();
  const document = JSON.stringify(openApiDocument(endpoints));
  const page = openApiPage(endpoints);
  router.get('/openapi.json', (_req, res) => sendText(res, 'application/json', document));
  router.get('/docs', (_req, res) => sendText(res, 'text/html', page));
  return router;
}
