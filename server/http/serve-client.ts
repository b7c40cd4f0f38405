import type { RequestHandler, Response } from 'express';

import { COMPRESSED_SUFFIX } from './compress-client';
import { type ClientFiles, isNamedByContent, resolveClientFile } from './client-files';

const YEAR = 'public, max-age=31536000, immutable';

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
    response.status(status).set('Cache-Control', isNamedByContent(file) ? YEAR : 'no-cache').type(file.slice(file.lastIndexOf('.')));
    const compressed = file + COMPRESSED_SUFFIX;
    const sent = client.files.has(compressed) && request.acceptsEncodings('br') ? compressed : file;
    response.vary('Accept-Encoding');
    if (sent === compressed) response.set('Content-Encoding', 'br');
    await sendFile(response, client.root, sent);
  };
