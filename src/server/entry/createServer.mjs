import { createServer as createHttpServer } from 'node:http';
import { pinRequest } from './pinRequest.mjs';
import { refusalOf, refuse } from './refuse.mjs';
import { secureResponse, securityHeaders } from './securityHeaders.mjs';

const HEADERS_TIMEOUT_MS = 10_000;
const REQUEST_TIMEOUT_MS = 30_000;
const KEEP_ALIVE_TIMEOUT_MS = 5_000;
const SOCKET_IDLE_TIMEOUT_MS = 60_000;
const TIMEOUT_CHECK_MS = 1_000;
const DRAIN_TIMEOUT_MS = 10_000;
const TIDY_INTERVAL_MS = 100;

/** @typedef {(req: import('node:http').IncomingMessage, res: import('node:http').ServerResponse) => unknown} Handler */

/**
 * The HTTP server around Astro's handler: limits, headers and an orderly end.
 * @param {object} options
 * @param {Handler} options.handler
 * @param {import('./settings.mjs').Settings} options.settings
 * @param {() => Promise<unknown>} options.pingDatabase rejects when the database does not answer
 * @param {import('node:http').ServerOptions} [options.timeouts]
 */
export function createServer({ handler, settings, pingDatabase, timeouts }) {
  const headers = securityHeaders(settings);
  let isDraining = false;

  /** @type {Handler} */
  const answer = async (req, res) => {
    secureResponse(res, headers);
    if (isDraining) res.setHeader('connection', 'close');
    if (req.url === '/healthz') return sayHealth(res, true);
    if (req.url === '/readyz') return sayHealth(res, await settles(pingDatabase));
    const refusal = refusalOf(req, settings);
    if (refusal) return refuse(res, refusal);
    if (req.headers.expect) res.writeContinue();
    pinRequest(req, settings);
    return handler(req, res);
  };

  const guarded = (req, res) => {
    Promise.resolve(answer(req, res)).catch((error) => {
      console.error(`${req.method} ${req.url}`, error);
      if (res.headersSent) return res.destroy();
      const message = 'Something failed on our side.';
      return refuse(res, { status: 500, code: 'internal', message });
    });
  };

  const server = createHttpServer(
    {
      headersTimeout: HEADERS_TIMEOUT_MS,
      requestTimeout: REQUEST_TIMEOUT_MS,
      keepAliveTimeout: KEEP_ALIVE_TIMEOUT_MS,
      connectionsCheckingInterval: TIMEOUT_CHECK_MS,
      ...timeouts,
    },
    guarded,
  );
  server.timeout = SOCKET_IDLE_TIMEOUT_MS;
  // Otherwise Node asks for the body before its length has been looked at.
  server.on('checkContinue', guarded);

  /** Stops taking requests and resolves once those in hand are answered. @returns {Promise<void>} */
  const drain = () => {
    isDraining = true;
    // Connections that become idle only now would be kept open for a next request.
    const tidying = setInterval(() => server.closeIdleConnections(), TIDY_INTERVAL_MS);
    const impatience = setTimeout(() => server.closeAllConnections(), DRAIN_TIMEOUT_MS);
    return new Promise((resolve) => {
      server.close(() => {
        clearInterval(tidying);
        clearTimeout(impatience);
        resolve();
      });
    });
  };
  return { server, drain };
}

/** @param {import('node:http').ServerResponse} res @param {boolean} isWell */
function sayHealth(res, isWell) {
  res.writeHead(isWell ? 200 : 503, { 'content-type': 'text/plain', 'cache-control': 'no-store' });
  res.end(isWell ? 'ok' : 'the database does not answer');
}

/** @param {() => Promise<unknown>} work */
const settles = (work) =>
  work().then(
    () => true,
    () => false,
  );
