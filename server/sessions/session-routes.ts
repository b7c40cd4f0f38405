import { API } from '../../shared/contracts/routes';
import { ROLES, sessionSchema, signInSchema } from '../../shared/contracts/session';
import { guardedRoute, publicRoute, type Route } from '../http/route';
import { presentSession } from './identity';
import { clearSessionCookies, readSessionCookies, setSessionCookies } from './session-cookies';

export const sessionRoutes: readonly Route[] = [
  publicRoute({
    method: 'post',
    path: API.session,
    name: 'signIn',
    tag: 'Session',
    summary: 'Sign in',
    description: 'Sets the session cookies. A session that the request came with is ended.',
    who: 'anyone',
    body: signInSchema,
    answer: { status: 201, description: 'Signed in', schema: sessionSchema },
    problems: ['wrong-credentials', 'too-many-attempts'],
    handle: async ({ body, request, response }, services) => {
      const { identity, tokens } = await services.signIn.signIn(body, request.ip ?? '');
      const before = await services.sessions.resume(readSessionCookies(request));
      if (before?.identity.by.kind === 'session') await services.sessions.end(before.identity.by.sessionId, 'replaced');
      setSessionCookies(response, tokens);
      return { status: 201, body: presentSession(identity) };
    },
  }),
  guardedRoute({
    method: 'get',
    path: API.session,
    name: 'readSession',
    tag: 'Session',
    summary: 'Who is signed in',
    who: ROLES,
    answer: { status: 200, description: 'The person, their roles and their team', schema: sessionSchema },
    handle: async ({ identity }) => ({ status: 200, body: presentSession(identity) }),
  }),
  guardedRoute({
    method: 'delete',
    path: API.session,
    name: 'signOut',
    tag: 'Session',
    summary: 'Sign out',
    who: ROLES,
    sessionOnly: true,
    answer: { status: 204, description: 'The session is over', schema: null },
    handle: async ({ identity, response }, services) => {
      if (identity.by.kind === 'session') await services.sessions.end(identity.by.sessionId, 'signed-out');
      clearSessionCookies(response);
      return { status: 204 };
    },
  }),
];
