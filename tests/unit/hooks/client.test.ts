import { ApiError, OfflineError } from '@/hooks/api/api-error';
import { request } from '@/hooks/api/client';
import { connection } from '@/hooks/api/connection';
import { errorSentence } from '@/hooks/api/error-sentence';
import { ERROR_CODES } from '@/shared/error-codes';

type Answer = () => Promise<Response>;
const realFetch = globalThis.fetch;
const answerWith = (answer: Answer) => {
  globalThis.fetch = answer as typeof fetch;
};
const problem = (status: number, body: unknown): Answer => async () => new Response(JSON.stringify(body), { status, headers: { 'content-type': 'application/problem+json' } });

afterEach(() => {
  globalThis.fetch = realFetch;
  connection.answered();
});

describe('a request to the API', () => {
  it('gives the answer', async () => {
    answerWith(async () => Response.json({ parts: [] }));
    await expect(request('/api/parts')).resolves.toEqual({ parts: [] });
  });

  it('has no answer to give after a deletion', async () => {
    answerWith(async () => new Response(null, { status: 204 }));
    await expect(request('/api/scenarios/x', { method: 'DELETE' })).resolves.toBeUndefined();
  });

  it('tells a refusal with its code, fields and the record in conflict', async () => {
    answerWith(problem(409, { code: 'version-conflict', instance: 'urn:uuid:1', conflict: { version: 4 } }));
    const error = await request('/api/scenarios/x').catch((thrown: unknown) => thrown);
    expect(error).toBeInstanceOf(ApiError);
    expect(error).toMatchObject({ code: 'version-conflict', details: { status: 409, conflict: { version: 4 } } });
  });

  it('counts an answer that is no problem of ours as an internal one', async () => {
    answerWith(async () => new Response('<html>Bad gateway</html>', { status: 502 }));
    await expect(request('/api/parts')).rejects.toMatchObject({ code: 'internal' });
  });

  it('tells a lost connection apart from a refusal, and notices when it is back', async () => {
    answerWith(() => Promise.reject(new TypeError('Failed to fetch')));
    await expect(request('/api/parts')).rejects.toBeInstanceOf(OfflineError);
    expect(connection.lostSince()).not.toBeNull();
    answerWith(problem(404, { code: 'not-found', instance: 'urn:uuid:1' }));
    await expect(request('/api/parts')).rejects.toMatchObject({ code: 'not-found' });
    expect(connection.lostSince()).toBeNull();
  });

  it('does not take a request that was called off for a lost connection', async () => {
    answerWith(() => Promise.reject(new DOMException('aborted', 'AbortError')));
    await expect(request('/api/parts')).rejects.toMatchObject({ name: 'AbortError' });
    expect(connection.lostSince()).toBeNull();
  });
});

describe('the sentence for an error', () => {
  it.each(ERROR_CODES)('says for %s what happened and what to do', (code) => {
    const sentence = errorSentence(new ApiError(code, { status: 400 }));
    expect(sentence).toMatch(/^[A-Z].{20,}\.$/);
    expect(sentence).not.toContain(code);
  });

  it('quotes the number of an internal error', () => {
    expect(errorSentence(new ApiError('internal', { status: 500, instance: 'urn:uuid:7' }))).toContain('urn:uuid:7');
  });

  it('says that the connection is lost', () => {
    expect(errorSentence(new OfflineError('x'))).toMatch(/connection/);
  });
});
