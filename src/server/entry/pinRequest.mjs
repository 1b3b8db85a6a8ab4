import { isIP } from 'node:net';

/**
 * Makes a request say what is true: the host and protocol of the configured origin, and, as
 * forwarded address, at most the one our own proxy saw. Astro believes these headers.
 * @param {import('node:http').IncomingMessage} req
 * @param {import('./settings.mjs').Settings} settings
 */
export function pinRequest({ headers }, { origin, trustProxy }) {
  const forwardedFor = headers['x-forwarded-for'];
  for (const name of Object.keys(headers)) {
    if (name === 'forwarded' || name === 'x-real-ip' || name.startsWith('x-forwarded-')) {
      delete headers[name];
    }
  }
  headers.host = origin.host;
  headers['x-forwarded-proto'] = origin.protocol.slice(0, -1);
  const lastHop =
    String(forwardedFor ?? '')
      .split(',')
      .at(-1)
      ?.trim() ?? '';
  if (trustProxy && isIP(lastHop)) headers['x-forwarded-for'] = lastHop;
}
