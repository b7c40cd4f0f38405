import jwt from 'jsonwebtoken';
import { z } from 'zod';

import { SESSION_LIMITS } from './session-limits';

const ISSUER = 'tidegate';
const payloadSchema = z.object({ sid: z.uuid() });

const secondsOf = (time: Date) => Math.floor(time.getTime() / 1000);

/** Signs that a session was seen alive at `now`; good for ten minutes. */
export const signAccessToken = (sessionId: string, secret: string, now: Date): string =>
  jwt.sign({ sid: sessionId, iat: secondsOf(now), exp: secondsOf(now) + SESSION_LIMITS.access / 1000 }, secret, { algorithm: 'HS256', issuer: ISSUER });

/** @returns the id of the session, or null where the token is forged, expired or not one of ours */
export const verifyAccessToken = (token: string, secret: string, now: Date): string | null => {
  try {
    const payload = jwt.verify(token, secret, { algorithms: ['HS256'], issuer: ISSUER, clockTimestamp: secondsOf(now) });
    return payloadSchema.parse(payload).sid;
  } catch {
    return null;
  }
};
