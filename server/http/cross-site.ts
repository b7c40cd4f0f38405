import type { Request } from 'express';

import { ProblemError } from './problem-error';

const SAFE_METHODS = new Set(['GET', 'HEAD', 'OPTIONS']);

const sameOrigin = (request: Request): boolean => {
  const site = request.get('sec-fetch-site');
  if (site !== undefined) return site === 'same-origin';
  const origin = request.get('origin');
  // Neither header: not a browser. It may sign in, but whatever carries cookies must say where it comes from.
  if (origin === undefined) return request.get('cookie') === undefined;
  return URL.canParse(origin) && new URL(origin).host === request.get('host');
};

/**
 * Refuses a request that another site made a browser send with its cookies.
 * A bearer token is never added by a browser on its own, so it needs no such proof.
 */
export const refuseCrossSite = (request: Request): void => {
  if (SAFE_METHODS.has(request.method) || request.get('authorization') !== undefined || sameOrigin(request)) return;
  throw new ProblemError('cross-site', 'Reload the page and try again from there.');
};
