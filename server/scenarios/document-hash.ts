import { createHash } from 'node:crypto';

const sortKeys = (_key: string, value: unknown): unknown =>
  typeof value === 'object' && value !== null && !Array.isArray(value)
    ? Object.fromEntries(Object.entries(value).sort(([a], [b]) => (a < b ? -1 : 1)))
    : value;

/** SHA-256 over the JSON with its keys in order, so that the same content gives the same hash however it was sent. */
export const documentHash = (document: unknown): string => createHash('sha256').update(JSON.stringify(document, sortKeys)).digest('hex');
