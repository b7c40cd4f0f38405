import { createServer } from 'node:net';

import { Halt } from './say.mjs';

const HOST = '127.0.0.1';

/** Whether nobody listens on this port of the loopback. */
export const isFree = (port) =>
  new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', () => resolve(false));
    probe.listen({ port, host: HOST, exclusive: true }, () => probe.close(() => resolve(true)));
  });

/** @returns the wanted port, or the next free one above it */
export const freePort = async (wanted) => {
  for (let port = wanted; port < wanted + 200 && port <= 65_535; port += 1) {
    if (await isFree(port)) return port;
  }
  throw new Halt(`No free port between ${wanted} and ${wanted + 199} on ${HOST}. Stop a program that holds one.`);
};
