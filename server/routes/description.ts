import { Router } from 'express';
import type { Endpoint } from '#server/http/endpoint.ts';
import { openApiDocument } from '#server/openapi/document.ts';
import { openApiPage } from '#server/openapi/page.ts';

/** The API's description of itself, for programs and for people; made once. */
export function descriptionRoutes(endpoints: readonly Endpoint[]): Router {
  const router = Router();
  const document = openApiDocument(endpoints);
  const page = openApiPage(endpoints);
  router.get('/openapi.json', (_req, res) => {
    res.json(document);
  });
  router.get('/docs', (_req, res) => {
    res.type('html').send(page);
  });
  return router;
}
