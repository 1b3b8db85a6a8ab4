import { createServer } from 'node:net';
import { RunError } from './say.mjs';

export const LOOPBACK = '127.0.0.1';
const PORTS_TRIED = 200;

/** @param {number} port @returns {Promise<boolean>} */
export function isFree(port) {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', () => resolve(false));
    probe.listen({ port, host: LOOPBACK, exclusive: true }, () => probe.close(() => resolve(true)));
  });
}

/** The first free loopback port from the given one upwards. @param {number} from */
export async function nextFreePort(from) {
  for (let port = from; port < from + PORTS_TRIED && port <= 65_535; port += 1) {
    if (await isFree(port)) return port;
  }
  throw new RunError(`No free port on ${LOOPBACK} from ${from} upwards.`);
}
