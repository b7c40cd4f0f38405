import { createHash, randomBytes } from 'node:crypto';

/** 256 random bits, so that a plain hash is enough to keep it by. */
export const createOpaqueToken = (): string => randomBytes(32).toString('base64url');

export const hashOpaqueToken = (token: string): string => createHash('sha256').update(token).digest('hex');
