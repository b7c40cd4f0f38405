import type { RequestHandler, Response } from 'express';

import { type ClientFiles, resolveClientFile } from './client-files';

/** The export names these by their content, so a name never gets other bytes. */
const HASHED = /^(_expo\/static|assets)\//;
const YEAR = 'public, max-age=31536000, immutable';

const encodings = [
  { name: 'br', suffix: '.br' },
  { name: 'gzip', suffix: '.gz' },
] as const;

const sendFile = (response: Response, root: string, file: string): Promise<void> =>
  new Promise((resolve, reject) => {
    response.sendFile(file, { root, dotfiles: 'allow', cacheControl: false }, (error) => (error && !response.headersSent ? reject(error) : resolve()));
  });

/** Answers every address outside the API from the exported client, compressed beforehand where such a file lies beside it. */
export const serveClient =
  (client: ClientFiles): RequestHandler =>
  async (request, response, next) => {
    if (request.method !== 'GET' && request.method !== 'HEAD') return next();
    const found = resolveClientFile(client, decodeURIComponent(request.path));
    if (!found) {
      response.status(404).type('text/plain').send('There is no such file.');
      return;
    }
    const { file, status } = found;
    response.status(status).set('Cache-Control', HASHED.test(file) ? YEAR : 'no-cache').type(file.slice(file.lastIndexOf('.')));
    const encoding = encodings.find(({ name, suffix }) => client.files.has(file + suffix) && request.acceptsEncodings(name));
    response.vary('Accept-Encoding');
    if (encoding) response.set('Content-Encoding', encoding.name);
    await sendFile(response, client.root, file + (encoding?.suffix ?? ''));
  };
