import { statfsSync } from 'node:fs';
import { createServer } from 'node:net';
import { dirname } from 'node:path';
import { HouseError } from './messages.mjs';

/** @param {number} port 0 for any free one @param {string} [host] @returns {Promise<number>} the port that could be had */
function listenOnce(port, host = '127.0.0.1') {
  return new Promise((done, failed) => {
    const server = createServer();
    server.once('error', failed);
    server.listen({ port, host, exclusive: true }, () => {
      const address = server.address();
      server.close(() => done(typeof address === 'object' && address ? address.port : port));
    });
  });
}

export const freePort = () => listenOnce(0);

/** @param {string | undefined} text @param {number} standard */
export function portFrom(text, standard) {
  if (text === undefined || text === '') return standard;
  const port = Number(text);
  if (/^\d+$/.test(text) && port >= 1 && port <= 65_535) return port;
  throw new HouseError(`PORT must be a whole number from 1 to 65535, not “${text}”.`);
}

/** @param {number} port @param {string} host */
export async function requireFree(port, host) {
  try {
    await listenOnce(port, host);
  } catch (error) {
    const { code } = /** @type {NodeJS.ErrnoException} */ (error);
    if (code === 'EACCES')
      throw new HouseError(`Port ${port} may only be used by root: choose one above 1023, e.g. PORT=4310.`);
    if (code === 'EADDRNOTAVAIL' || code === 'ENOTFOUND')
      throw new HouseError(`HOST ${host} is no address of this machine.`);
    if (code !== 'EADDRINUSE') throw error;
    throw new HouseError(
      `Port ${port} is taken by another program: stop that one, or choose a port, e.g. PORT=${port + 10} npm start.`,
    );
  }
}

/** Where a person on this machine finds the server. @param {string} host @param {number} port */
export function addressOf(host, port) {
  const reachable =
    { '0.0.0.0': '127.0.0.1', '::': '[::1]' }[host] ?? (host.includes(':') ? `[${host}]` : host);
  return `http://${reachable}:${port}`;
}

/** @param {string} folder need not exist yet @param {number} megabytes */
export function requireSpace(folder, megabytes) {
  const free = freeMegabytes(folder);
  if (free < megabytes) {
    throw new HouseError(
      `Only ${Math.floor(free)} MB are free on the disk of ${folder}; at least ${megabytes} MB are needed.`,
    );
  }
}

/** @param {string} folder @returns {number} */
function freeMegabytes(folder) {
  try {
    const { bavail, bsize } = statfsSync(folder);
    return (bavail * bsize) / 2 ** 20;
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code !== 'ENOENT') throw error;
    return freeMegabytes(dirname(folder));
  }
}
