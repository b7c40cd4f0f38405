import type { Request, Response } from 'express';

import type { Services } from '../services';
import type { Identity } from '../sessions/identity';
import { clearSessionCookies, readSessionCookies, setSessionCookies } from '../sessions/session-cookies';
import { ProblemError } from './problem-error';

const bearerOf = (request: Request): string | null => /^Bearer ([\w-]{1,200})$/i.exec(request.get('authorization') ?? '')?.[1] ?? null;

/** Who sends this, by bearer token or by cookies; renews the cookies on the way where they are due. */
export const identify = async (request: Request, response: Response, services: Services): Promise<Identity> => {
  if (request.get('authorization') !== undefined) {
    const bearer = bearerOf(request);
    const identity = bearer === null ? null : await services.tokens.identify(bearer);
    if (!identity) throw new ProblemError('not-signed-in', 'The bearer token is unknown, expired or revoked.');
    return identity;
  }
  const cookies = readSessionCookies(request);
  const resumed = await services.sessions.resume(cookies);
  if (!resumed) {
    if (cookies.access !== null || cookies.refresh !== null) clearSessionCookies(response);
    throw new ProblemError('not-signed-in', 'Sign in to go on.');
  }
  if (resumed.renewed) setSessionCookies(response, resumed.renewed);
  return resumed.identity;
};
