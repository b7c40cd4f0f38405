import type { CookieOptions, Request, Response } from 'express';

import { SESSION_LIMITS } from './session-limits';

/** The prefix makes browsers insist on Secure, Path=/ and no Domain; they accept Secure on loopback without TLS. */
const ACCESS_COOKIE = '__Host-tidegate-access';
const REFRESH_COOKIE = '__Host-tidegate-refresh';
const OPTIONS: CookieOptions = { httpOnly: true, secure: true, sameSite: 'strict', path: '/' };

export interface SessionCookies {
  access: string | null;
  refresh: string | null;
}

/** `refresh` is null where only the access token is new. */
export interface IssuedTokens {
  access: string;
  refresh: string | null;
}

const textOf = (value: unknown) => (typeof value === 'string' && value !== '' ? value : null);

export const readSessionCookies = (request: Request): SessionCookies => {
  const cookies: Record<string, unknown> = request.cookies;
  return { access: textOf(cookies[ACCESS_COOKIE]), refresh: textOf(cookies[REFRESH_COOKIE]) };
};

export const setSessionCookies = (response: Response, tokens: IssuedTokens): void => {
  response.cookie(ACCESS_COOKIE, tokens.access, { ...OPTIONS, maxAge: SESSION_LIMITS.access });
  if (tokens.refresh !== null) response.cookie(REFRESH_COOKIE, tokens.refresh, { ...OPTIONS, maxAge: SESSION_LIMITS.absolute });
};

export const clearSessionCookies = (response: Response): void => {
  response.clearCookie(ACCESS_COOKIE, OPTIONS);
  response.clearCookie(REFRESH_COOKIE, OPTIONS);
};
