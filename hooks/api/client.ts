import { API } from '@/shared/contracts/routes';

import { decodeProblem, OfflineError } from './api-error';
import { connection } from './connection';

interface RequestOptions {
  method?: 'GET' | 'POST' | 'PUT' | 'DELETE';
  body?: unknown;
  signal?: AbortSignal | undefined;
}

/** Told apart from a failed network: the person or a newer request called it off. */
const isAbort = (error: unknown) => typeof error === 'object' && error !== null && 'name' in error && error.name === 'AbortError';

const readJson = async (response: Response): Promise<unknown> => {
  try {
    return await response.json();
  } catch {
    return null;
  }
};

/**
 * One request to the API on the page's own origin. The answer is our own server's and is trusted to fit `Answer`.
 * @throws ApiError when the server refuses, OfflineError when no answer comes
 */
export const request = async <Answer>(path: string, { method = 'GET', body, signal }: RequestOptions = {}): Promise<Answer> => {
  let response: Response;
  try {
    response = await fetch(path, {
      method,
      credentials: 'same-origin',
      headers: { accept: 'application/json', ...(body === undefined ? {} : { 'content-type': 'application/json' }) },
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
      ...(signal ? { signal } : {}),
    });
  } catch (error) {
    if (isAbort(error)) throw error;
    connection.lost();
    throw new OfflineError('no answer from the server', { cause: error });
  }
  connection.answered();
  if (!response.ok) throw decodeProblem(response.status, await readJson(response));
  return (response.status === 204 ? undefined : await response.json()) as Answer;
};

/** Asks whether the server is there; the connection store hears the answer. */
export const askHealth = () => request<unknown>(API.health).catch(() => undefined);
