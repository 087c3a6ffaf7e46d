import { Router, type RequestHandler } from 'express';
import { nothingHere } from '#server/errors.ts';
import { jsonBody } from '#server/middleware/json-body.ts';
import type { Endpoint } from '#server/http/endpoint.ts';
import type { LimitName } from '#server/middleware/rate-limits.ts';
import { sameOrigin } from '#server/middleware/same-origin.ts';
import { descriptionRoutes } from './description.ts';
import { ENDPOINTS } from './endpoints.ts';

/** The router of `/api`, made from the list of endpoints. */
export function apiRouter(limits: Record<LimitName, RequestHandler>): Router {
  const router = Router();
  router.use((_req, res, next) => {
    res.set('Cache-Control', 'no-store');
    next();
  });
  const serve = (endpoint: Endpoint) => {
    const limiters = (endpoint.limits ?? []).map((name) => limits[name]);
    router[endpoint.method](endpoint.path, ...limiters, endpoint.serve);
  };
  router.use(sameOrigin);
  for (const endpoint of ENDPOINTS.filter(({ upload }) => upload)) serve(endpoint);
  router.use(jsonBody);
  for (const endpoint of ENDPOINTS.filter(({ upload }) => !upload)) serve(endpoint);
  router.use(descriptionRoutes(ENDPOINTS));
  router.use((_req, _res, next) => next(nothingHere()));
  return router;
}
