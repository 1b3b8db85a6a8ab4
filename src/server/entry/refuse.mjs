/** The largest request body. A route that takes files gets a limit of its own when there is one. */
export const BODY_MAX_BYTES = 256 * 1024;

/** Of a refused body, this much is read and thrown away so that the answer arrives. */
const DISCARD_MAX_BYTES = 32 * 1024 * 1024;

/**
 * @typedef {{ status: number, code: string, message: string, headers?: Record<string, string> }} Refusal
 */

/**
 * Why a request never reaches a page, or undefined.
 * @param {import('node:http').IncomingMessage} req
 * @param {import('./settings.mjs').Settings} settings
 * @returns {Refusal | undefined}
 */
export function refusalOf(req, settings) {
  return misdirected(req, settings) ?? badBody(req);
}

/**
 * On one's own machine a page may be asked for by another name than the one cookies and forms are
 * bound to (localhost), or by a foreign name made to point here, which must not get to read pages.
 * Behind a proxy the names are the proxy's business.
 * @param {import('node:http').IncomingMessage} req
 * @param {import('./settings.mjs').Settings} settings
 * @returns {Refusal | undefined}
 */
function misdirected({ headers, method, url }, { isLocal, trustProxy, origin }) {
  if (!isLocal || trustProxy || headers.host === origin.host) return undefined;
  const message = `This server is at ${origin.origin}.`;
  if ((method === 'GET' || method === 'HEAD') && url?.startsWith('/')) {
    return { status: 308, code: 'moved', message, headers: { location: origin.origin + url } };
  }
  return { status: 421, code: 'misdirected', message };
}

/** @param {import('node:http').IncomingMessage} req @returns {Refusal | undefined} */
function badBody({ headers }) {
  if (headers['transfer-encoding'] !== undefined) {
    const message = 'Send the body with a Content-Length, not in chunks.';
    return { status: 411, code: 'length-required', message, headers: { connection: 'close' } };
  }
  const bodyBytes = Number(headers['content-length'] ?? 0);
  if (bodyBytes <= BODY_MAX_BYTES) return undefined;
  return {
    status: 413,
    code: 'too-large',
    message: `The body may hold at most ${BODY_MAX_BYTES / 1024} KiB.`,
    headers: bodyBytes > DISCARD_MAX_BYTES ? { connection: 'close' } : {},
  };
}

/** Answers as the API does. @param {import('node:http').ServerResponse} res @param {Refusal} refusal */
export function refuse(res, { status, code, message, headers }) {
  res.writeHead(status, {
    'content-type': 'application/json',
    'cache-control': 'no-store',
    ...headers,
  });
  res.end(JSON.stringify({ error: { code, message } }));
}
