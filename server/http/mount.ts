import type { Express, Request, RequestHandler, Response } from 'express';

import type { Services } from '../services';
import type { Identity } from '../sessions/identity';
import { identify } from './identify';
import { refuseCrossSite } from './cross-site';
import { readJsonBody } from './json-body';
import { ProblemError } from './problem-error';
import type { Call, GuardedRoute, Reply, Route } from './route';
import { validate } from './validate';

const authorize = (route: GuardedRoute, identity: Identity): void => {
  if (!route.who.some((role) => identity.roles.includes(role)))
    throw new ProblemError('not-allowed', `This needs the role ${route.who.join(' or ')}. An admin of your team can grant it.`);
  if (route.sessionOnly && identity.by.kind !== 'session')
    throw new ProblemError('not-allowed', 'Sign in with e-mail and password for this; a token may not do it.');
};

const parse = async (route: Route, request: Request, response: Response): Promise<Pick<Call<unknown, unknown, unknown>, 'params' | 'query' | 'body'>> => {
  if (route.body) await readJsonBody(request, response);
  return {
    params: route.params && validate(route.params, request.params),
    query: route.query && validate(route.query, request.query),
    body: route.body && validate(route.body, request.body),
  };
};

const hangUpSignal = (response: Response): AbortSignal => {
  const controller = new AbortController();
  response.once('close', () => {
    if (!response.writableFinished) controller.abort();
  });
  return controller.signal;
};

const send = (response: Response, reply: Reply): void => {
  if (reply.location !== undefined) response.location(reply.location);
  response.status(reply.status);
  if (reply.body === undefined) response.end();
  else response.json(reply.body);
};

/** The recipe of every route: same site, who is it, may they, what did they send, do it. */
const answer = async (route: Route, services: Services, request: Request, response: Response, signal: AbortSignal): Promise<Reply> => {
  refuseCrossSite(request);
  if (route.who === 'anyone') return route.handle({ ...(await parse(route, request, response)), request, response, signal }, services);
  const identity = await identify(request, response, services);
  authorize(route, identity);
  return route.handle({ ...(await parse(route, request, response)), request, response, signal, identity }, services);
};

const serve =
  (route: Route, services: Services): RequestHandler =>
  async (request, response) => {
    const signal = hangUpSignal(response);
    try {
      send(response, await answer(route, services, request, response, signal));
    } catch (error) {
      // Nobody listens any more, and what was cancelled for that reason is no fault.
      if (!signal.aborted) throw error;
    }
  };

export const mountRoutes = (app: Express, routes: readonly Route[], services: Services): void => {
  for (const route of routes) app[route.method](route.path, serve(route, services));
};
