import express, { type Request, type Response } from 'express';

import { ProblemError } from './problem-error';

const SIZE_LIMIT = '256kb';
/** A scenario nests nine deep; far deeper text only costs the parser and whoever walks the result. */
export const DEPTH_LIMIT = 32;

const [QUOTE, BACKSLASH, OPEN_BRACE, CLOSE_BRACE, OPEN_BRACKET, CLOSE_BRACKET] = [...'"\\{}[]'].map((sign) => sign.charCodeAt(0));

const nestsTooDeep = (text: Buffer): boolean => {
  let depth = 0;
  let quoted = false;
  for (let index = 0; index < text.length; index += 1) {
    const byte = text[index];
    if (quoted) {
      if (byte === BACKSLASH) index += 1;
      else if (byte === QUOTE) quoted = false;
    } else if (byte === QUOTE) quoted = true;
    else if (byte === OPEN_BRACE || byte === OPEN_BRACKET) {
      depth += 1;
      if (depth > DEPTH_LIMIT) return true;
    } else if (byte === CLOSE_BRACE || byte === CLOSE_BRACKET) depth -= 1;
  }
  return false;
};

const parse = express.json({
  limit: SIZE_LIMIT,
  inflate: false,
  verify: (_request, _response, text) => {
    if (nestsTooDeep(text)) throw new ProblemError('malformed-body', `The body nests deeper than ${DEPTH_LIMIT} levels.`);
  },
});

/** Neither fits into PostgreSQL: U+0000, and half of a surrogate pair. */
const UNSTORABLE = /\0|\p{Surrogate}/u;

/** @returns the path of the first text that cannot be stored, or null */
const findUnstorable = (value: unknown, path = ''): string | null => {
  if (typeof value === 'string') return UNSTORABLE.test(value) ? path : null;
  if (typeof value !== 'object' || value === null) return null;
  for (const [key, inner] of Object.entries(value)) {
    const found = UNSTORABLE.test(key) ? path : findUnstorable(inner, path ? `${path}.${key}` : key);
    if (found !== null) return found;
  }
  return null;
};

const refuseUnstorable = (body: unknown): void => {
  const path = findUnstorable(body);
  if (path === null) return;
  const message = 'holds the character U+0000 or half of a surrogate pair';
  throw new ProblemError('invalid-input', `${path || 'The body'}: ${message}`, { issues: [{ path, message }] });
};

/** Reads the body into `request.body`, only once the caller is known to be allowed to send one. */
export const readJsonBody = async (request: Request, response: Response): Promise<void> => {
  if (request.headers['content-type'] !== undefined && !request.is('application/json'))
    throw new ProblemError('unsupported-media', 'Send application/json.');
  await new Promise<void>((resolve, reject) => parse(request, response, (error?: unknown) => (error ? reject(error) : resolve())));
  refuseUnstorable(request.body);
};
