import type { Express } from 'express';

import { API } from '../../shared/contracts/routes';
import { openApiDocument } from './openapi';
import { openApiPage } from './openapi-page';
import type { Route } from './route';

/** The description of the API, for programs and for people. It holds no data, so anyone may read it. */
export const mountOpenApi = (app: Express, routes: readonly Route[]): void => {
  const document = openApiDocument(routes);
  const page = openApiPage(document, routes);
  app.get(API.openapi, (_request, response) => void response.json(document));
  app.get(API.docs, (_request, response) => void response.type('html').send(page));
};
