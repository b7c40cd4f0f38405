import { createHash } from 'node:crypto';
import { mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { brotliDecompressSync } from 'node:zlib';

import { compressClient } from '../../server/http/compress-client';
import { ApiServer } from '../support/api-server';

const INLINE = 'globalThis.started = true;';
const SCRIPT = `/* the client */ ${'console.log("hello");'.repeat(200)}`;
const HASHED = '_expo/static/js/web/entry-0123456789abcdef.js';

const lay = (root: string, files: Record<string, string>) => {
  for (const [path, text] of Object.entries(files)) {
    mkdirSync(join(root, dirname(path)), { recursive: true });
    writeFileSync(join(root, path), text);
  }
};

let root: string;
let server: ApiServer;
beforeAll(async () => {
  root = mkdtempSync(join(tmpdir(), 'tidegate-client-'));
  lay(root, {
    'index.html': `<html><head><script type="module">${INLINE}</script><script src="/${HASHED}" defer></script></head><body>start</body></html>`,
    'sign-in.html': 'sign in',
    'scenarios/index.html': 'list',
    'scenarios/[scenarioId].html': 'one',
    '+not-found.html': 'nothing',
    [HASHED]: SCRIPT,
    'favicon.ico': 'icon',
  });
  server = await ApiServer.start({ staticDir: root });
});
afterAll(async () => {
  await server.stop();
  rmSync(root, { recursive: true });
});

const get = (path: string, headers: Record<string, string> = {}) => server.send('get', path, null).set(headers);

test.each([
  ['/', 200, 'start'],
  ['/sign-in', 200, 'sign in'],
  ['/scenarios', 200, 'list'],
  ['/scenarios/', 200, 'list'],
  ['/scenarios/0b6e3f8e-51b7-4a53-8c19-2a7d54c0e101?from=mail', 200, 'one'],
  ['/nowhere/at/all', 404, 'nothing'],
])('the address %s can be opened directly', async (path, status, text) => {
  const answer = await get(path).expect(status);
  expect(answer.text).toContain(text);
  expect(answer.headers['content-type']).toMatch(/^text\/html/);
  expect(answer.headers['cache-control']).toBe('no-cache');
});

test.each(['/..%2f..%2fetc%2fpasswd', '/%2e%2e/package.json', '/%00', '/%c3%28'])('the address %s leads nowhere', async (path) => {
  const answer = await get(path);
  expect(answer.status).toBe(404);
});

test('files named by their content are kept for good, others are asked for again', async () => {
  expect((await get(`/${HASHED}`).expect(200)).headers['cache-control']).toContain('immutable');
  expect((await get('/favicon.ico').expect(200)).headers['cache-control']).toBe('no-cache');
});

test('scripts go out compressed: at once, and tighter after the first minute', async () => {
  const encoding = async (accept: string) => (await get(`/${HASHED}`, { 'Accept-Encoding': accept }).expect(200)).headers['content-encoding'];
  expect(await encoding('gzip')).toBe('gzip');
  await compressClient(server.composed.client!);
  expect(await encoding('br')).toBe('br');
  expect(await encoding('gzip')).toBe('gzip');
  expect(brotliDecompressSync(readFileSync(join(root, `${HASHED}.br`))).toString()).toBe(SCRIPT);
  const unpacked = await get(`/${HASHED}`, { 'Accept-Encoding': 'br' });
  expect(unpacked.text).toBe(SCRIPT);
  expect(unpacked.headers['content-type']).toMatch(/javascript/);
});

test('only the scripts of the export run, and nothing is loaded from elsewhere', async () => {
  const answer = await get('/').expect(200);
  const policy = String(answer.headers['content-security-policy']);
  const hash = createHash('sha256').update(INLINE).digest('base64');
  expect(policy).toContain(`script-src 'self' 'sha256-${hash}'`);
  expect(policy).toMatch(/default-src 'none'.*frame-ancestors 'none'/);
  expect(policy).not.toMatch(/script-src[^;]*unsafe|https?:|\*/);
});

test.each(['/', '/api/health', '/api/nothing', '/api/docs'])('the answer to %s carries the protective headers', async (path) => {
  const { headers } = await get(path);
  expect(headers).toMatchObject({
    'strict-transport-security': expect.stringMatching(/max-age=\d{8}/),
    'x-content-type-options': 'nosniff',
    'x-frame-options': 'DENY',
    'referrer-policy': 'no-referrer',
    'cross-origin-opener-policy': 'same-origin',
    'x-request-id': expect.stringMatching(/^[\da-f-]{36}$/),
  });
  expect(headers).not.toHaveProperty('x-powered-by');
});

test('answers of the API are never kept', async () => {
  expect((await get('/api/health').expect(200)).headers['cache-control']).toBe('no-store');
});

test('an unknown address of the API is a problem with the id of the answer', async () => {
  const answer = await get('/api/nothing?secret=1').expect(404);
  expect(answer.headers['content-type']).toMatch(/^application\/problem\+json/);
  expect(answer.body).toMatchObject({ code: 'not-found', status: 404, instance: `urn:uuid:${String(answer.headers['x-request-id'])}` });
  expect(answer.text).not.toContain('secret');
  await get('/api').expect(404);
});

test('a route that exists does not take another method', async () => {
  const designer = await server.signIn(server.people.designer);
  await server.send('post', '/api/parts', designer, {}).expect(404);
});
