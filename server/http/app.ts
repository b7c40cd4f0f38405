import compression from 'compression';
import cookieParser from 'cookie-parser';
import express, { type Express, type RequestHandler } from 'express';
import { randomUUID } from 'node:crypto';
import type { Logger } from 'pino';
import { pinoHttp } from 'pino-http';

import type { Services } from '../services';
import type { ClientFiles } from './client-files';
import { mountRoutes } from './mount';
import { mountOpenApi } from './openapi-routes';
import { answerNotFound, answerProblems } from './problem-answer';
import { ROUTE_TABLE } from './route-table';
import { securityHeaders } from './security-headers';
import { serveClient } from './serve-client';

const logRequests = (log: Logger): RequestHandler =>
  pinoHttp({
    logger: log,
    genReqId: (_request, response) => {
      const id = randomUUID();
      response.setHeader('X-Request-Id', id);
      return id;
    },
    // Headers carry cookies and tokens, and addresses may carry search words: neither belongs in a log.
    serializers: {
      req: (request: { id: string; method: string; url: string }) => ({ id: request.id, method: request.method, path: request.url.split('?')[0] }),
      res: (response: { statusCode: number }) => ({ status: response.statusCode }),
    },
    customLogLevel: (_request, response) => (response.statusCode >= 500 ? 'error' : 'info'),
  });

const neverCache: RequestHandler = (_request, response, next) => {
  response.set('Cache-Control', 'no-store');
  next();
};

export interface AppParts {
  services: Services;
  log: Logger;
  /** Null where only the API is served. */
  client: ClientFiles | null;
}

export const createApp = ({ services, log, client }: AppParts): Express => {
  const app = express();
  app.disable('x-powered-by');
  app.disable('etag');
  app.set('query parser', 'simple');
  app.use(logRequests(log), securityHeaders(client?.scriptHashes ?? []), compression());
  app.use('/api', neverCache, cookieParser());
  mountRoutes(app, ROUTE_TABLE, services);
  mountOpenApi(app, ROUTE_TABLE);
  app.all('/api{/*path}', answerNotFound);
  if (client) app.get('/{*path}', serveClient(client));
  app.use(answerNotFound, answerProblems);
  return app;
};
