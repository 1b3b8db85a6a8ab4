import { resolve } from 'node:path';

const DEFAULT_PORT = 4321;
const DEFAULT_BUILD = resolve(import.meta.dirname, '../../../dist');

/**
 * @typedef {object} Settings
 * @property {number} port
 * @property {URL} origin the one address people use, whatever a request's Host says
 * @property {boolean} isLocal whether that address is this machine's own
 * @property {boolean} trustProxy whether every request comes through our own reverse proxy
 * @property {string} build the folder that `astro build` wrote
 */

/** What the server is told by its environment. @param {NodeJS.ProcessEnv} env @returns {Settings} */
export function readSettings(env) {
  const port = Number(env.PORT ?? DEFAULT_PORT);
  if (!Number.isInteger(port) || port < 0 || port > 65_535) {
    throw new Error(`PORT must be a port number, not "${env.PORT}"`);
  }
  const origin = readOrigin(env.ORIGIN ?? `http://127.0.0.1:${port}`);
  return {
    port,
    origin,
    isLocal: isLoopback(origin),
    trustProxy: env.TRUST_PROXY === '1',
    build: resolve(env.ELLWISE_BUILD ?? DEFAULT_BUILD),
  };
}

/** @param {string} text */
function readOrigin(text) {
  const url = URL.canParse(text) ? new URL(text) : undefined;
  if (url && /^https?:$/.test(url.protocol) && url.href === `${url.origin}/`) return url;
  throw new Error(`ORIGIN must be like https://ellwise.example, not "${text}"`);
}

/** @param {URL} url */
export const isLoopback = ({ hostname }) => /^(localhost|127(\.\d+){3}|\[::1\])$/.test(hostname);
