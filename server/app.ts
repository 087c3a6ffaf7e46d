import express, { type Express } from 'express';
import type { Logger } from 'pino';
import type { Sequelize } from 'sequelize';
import { nothingHere } from './errors.ts';
import { initModels } from './models/index.ts';
import { clientFiles, readClient } from './middleware/client-files.ts';
import { errorHandler } from './middleware/error-handler.ts';
import { createLimits } from './middleware/rate-limits.ts';
import { requestLog } from './middleware/request-log.ts';
import { securityHeaders } from './middleware/security-headers.ts';
import { bindSurroundings, type Surroundings } from './surroundings.ts';
import { apiRouter } from './routes/router.ts';

export interface AppSettings {
  sequelize: Sequelize;
  logger: Logger;
  /** folder of the built client */
  clientDir: string;
  /** multiplies every rate limit */
  rateLimitScale: number;
  /** reverse proxies in front whose word on the caller's address is taken */
  proxies: number;
  surroundings: Surroundings;
}

/** The whole web application, neither connected nor listening yet. */
export function createApp({
  sequelize,
  logger,
  clientDir,
  rateLimitScale,
  proxies,
  surroundings,
}: AppSettings): Express {
  initModels(sequelize);
  bindSurroundings(surroundings);
  const client = readClient(clientDir);
  const app = express();
  app.disable('x-powered-by');
  // An ETag here is a version that a write can name; Express would add hashes of its own.
  app.disable('etag');
  app.set('trust proxy', proxies);
  app.set('query parser', 'simple');
  app.use(requestLog(logger));
  app.use(securityHeaders(client.scriptHashes));
  app.use('/api', apiRouter(createLimits(sequelize, rateLimitScale)));
  app.use(clientFiles(client));
  app.use((_req, _res, next) => next(nothingHere()));
  app.use(errorHandler);
  return app;
}
