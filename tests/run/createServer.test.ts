import { once } from 'node:events';
import type { IncomingMessage, ServerResponse } from 'node:http';
import { connect, type AddressInfo, type Socket } from 'node:net';
import { afterEach, describe, expect, it } from 'vitest';
import { createServer } from '../../src/server/entry/createServer.mjs';
import { BODY_MAX_BYTES } from '../../src/server/entry/refuse.mjs';
import { readSettings } from '../../src/server/entry/settings.mjs';
import { expectConsoleError } from '../support/consoleErrors.ts';

type Handler = (req: IncomingMessage, res: ServerResponse) => unknown;

const echo: Handler = async (req, res) => {
  let byteCount = 0;
  for await (const chunk of req) byteCount += (chunk as Buffer).length;
  res.writeHead(200, { 'content-type': 'application/json' });
  res.end(JSON.stringify({ headers: req.headers, byteCount }));
};

interface Served {
  port: number;
  drain(): Promise<void>;
}

const served: Served[] = [];

afterEach(async () => {
  for (const { drain } of served.splice(0)) await drain();
});

interface ServeOptions {
  env?: Record<string, string>;
  handler?: Handler;
  pingDatabase?: () => Promise<unknown>;
  timeouts?: object;
}

async function serve({ env = {}, handler = echo, ...options }: ServeOptions = {}) {
  const { server, drain } = createServer({
    handler,
    settings: readSettings({ ORIGIN: 'https://ellwise.example', ...env }),
    pingDatabase: async () => undefined,
    ...options,
  });
  server.listen(0, '127.0.0.1');
  await once(server, 'listening');
  const it = { port: (server.address() as AddressInfo).port, drain };
  served.push(it);
  return it;
}

const get = ({ port }: Served, path = '/', init: RequestInit = {}) =>
  fetch(`http://127.0.0.1:${port}${path}`, { redirect: 'manual', ...init });

/** Sends text as it stands and resolves with all that comes back until the server hangs up. */
async function raw({ port }: Served, text: string, onConnect?: (socket: Socket) => void) {
  const socket = connect(port, '127.0.0.1');
  let answer = '';
  socket.setEncoding('utf8').on('data', (data) => (answer += String(data)));
  socket.write(text);
  onConnect?.(socket);
  await once(socket, 'close');
  return answer;
}

describe('request bodies', () => {
  const post = (site: Served, byteCount: number) =>
    get(site, '/api/x', { method: 'POST', body: 'x'.repeat(byteCount) });

  it('pass up to the limit, to the byte', async () => {
    const answer = await post(await serve(), BODY_MAX_BYTES);
    expect(await answer.json()).toMatchObject({ byteCount: BODY_MAX_BYTES });
  });

  it('are refused above it, saying how much is allowed', async () => {
    const answer = await post(await serve(), BODY_MAX_BYTES + 1);
    expect(answer.status).toBe(413);
    expect(await answer.json()).toEqual({
      error: { code: 'too-large', message: 'The body may hold at most 256 KiB.' },
    });
  });

  it('of 10 MB are refused with an answer that arrives', async () => {
    expect((await post(await serve(), 10_000_000)).status).toBe(413);
  });

  it('are refused before they are sent when the client asks first', async () => {
    const length = BODY_MAX_BYTES + 1;
    const head = `POST / HTTP/1.1\r\nHost: x\r\nContent-Length: ${length}\r\nExpect: 100-continue\r\nConnection: close\r\n\r\n`;
    const answer = await raw(await serve(), head);
    expect(answer).toMatch(/^HTTP\/1\.1 413/);
  });

  it('are asked for when a client that asks first may send them', async () => {
    const head =
      'POST / HTTP/1.1\r\nHost: x\r\nContent-Length: 2\r\nExpect: 100-continue\r\nConnection: close\r\n\r\n';
    const answer = await raw(await serve(), head, (socket) =>
      socket.once('data', () => socket.write('ok')),
    );
    expect(answer).toMatch(/^HTTP\/1\.1 100 Continue\r\n\r\nHTTP\/1\.1 200/);
  });

  it('in chunks without a length are refused', async () => {
    const chunked =
      'POST / HTTP/1.1\r\nHost: x\r\nTransfer-Encoding: chunked\r\n\r\n2\r\nok\r\n0\r\n\r\n';
    expect(await raw(await serve(), chunked)).toMatch(/^HTTP\/1\.1 411/);
  });
});

describe('slow clients', () => {
  const timeouts = { connectionsCheckingInterval: 20 };

  it('that do not finish their headers are hung up on', async () => {
    const site = await serve({ timeouts: { ...timeouts, headersTimeout: 50 } });
    expect(await raw(site, 'GET / HTTP/1.1\r\nHost: x\r\n')).toMatch(/^HTTP\/1\.1 408/);
  });

  it('that do not finish their body are hung up on', async () => {
    const site = await serve({
      timeouts: { ...timeouts, headersTimeout: 50, requestTimeout: 60 },
      handler: (req) => req.resume().on('error', () => undefined),
    });
    const head = 'POST / HTTP/1.1\r\nHost: x\r\nContent-Length: 5\r\n\r\nab';
    expect(await raw(site, head)).toMatch(/^HTTP\/1\.1 408/);
  });
});

describe('host, protocol and address', () => {
  const seen = async (env: Record<string, string>, headers: Record<string, string>) => {
    const answer = await get(await serve({ env }), '/', { headers });
    return ((await answer.json()) as { headers: Record<string, string> }).headers;
  };
  const forged = {
    'X-Forwarded-Host': 'evil.example',
    'X-Forwarded-Proto': 'ftp',
    'X-Forwarded-Port': '99',
    Forwarded: 'for=6.6.6.6',
    'X-Real-IP': '6.6.6.6',
    'X-Forwarded-For': '6.6.6.6, 198.51.100.7',
  };

  it('are those of the configuration, whatever a request claims', async () => {
    const headers = await seen({}, forged);
    expect(headers).toMatchObject({ host: 'ellwise.example', 'x-forwarded-proto': 'https' });
    for (const name of ['x-forwarded-host', 'x-forwarded-port', 'forwarded', 'x-real-ip']) {
      expect(headers).not.toHaveProperty(name);
    }
    expect(headers).not.toHaveProperty('x-forwarded-for');
  });

  it('take from a trusted proxy the last hop only', async () => {
    const headers = await seen({ TRUST_PROXY: '1' }, forged);
    expect(headers['x-forwarded-for']).toBe('198.51.100.7');
    expect(headers).not.toHaveProperty('x-forwarded-host');
  });

  it('take nothing from a proxy that names no address', async () => {
    const headers = await seen({ TRUST_PROXY: '1' }, { 'X-Forwarded-For': '6.6.6.6, unknown' });
    expect(headers).not.toHaveProperty('x-forwarded-for');
  });
});

describe('on this machine', () => {
  const env = { ORIGIN: 'http://127.0.0.1:4321' };

  it('a page asked for by another name is found at its own address', async () => {
    const answer = await get(await serve({ env }), '/a?b=c');
    expect(answer.status).toBe(308);
    expect(answer.headers.get('location')).toBe('http://127.0.0.1:4321/a?b=c');
  });

  it('a change asked for by another name is refused', async () => {
    const answer = await get(await serve({ env }), '/a', { method: 'POST', body: 'x' });
    expect(answer.status).toBe(421);
  });

  it('no address in a path leads away', async () => {
    const answer = await get(await serve({ env }), '//evil.example/');
    expect(answer.headers.get('location')).toBe('http://127.0.0.1:4321//evil.example/');
  });
});

describe('answers', () => {
  it('carry the security headers, refusals and health included', async () => {
    const site = await serve();
    const answers = await Promise.all([
      get(site),
      get(site, '/healthz'),
      get(site, '/', { method: 'POST', body: 'x'.repeat(BODY_MAX_BYTES + 1) }),
    ]);
    for (const { headers } of answers) {
      expect(headers.get('x-content-type-options')).toBe('nosniff');
      expect(headers.get('content-security-policy')).toContain("frame-ancestors 'none'");
      expect(headers.get('referrer-policy')).toBe('strict-origin-when-cross-origin');
      expect(headers.get('permissions-policy')).toContain('camera=()');
      expect(headers.get('strict-transport-security')).toBe('max-age=31536000');
    }
  });

  it('do not ask for https where there is none', async () => {
    const site = await serve({ env: { ORIGIN: 'http://ellwise.example' } });
    expect((await get(site)).headers.has('strict-transport-security')).toBe(false);
  });

  it('let a page run the scripts that it names itself, and keep the rest of the policy', async () => {
    const pagePolicy = "script-src 'self' 'sha256-abc='; style-src 'self' 'sha256-def=';";
    const handler: Handler = (_req, res) => {
      res.writeHead(200, { 'content-security-policy': pagePolicy });
      res.end();
    };
    const policy = (await get(await serve({ handler }))).headers.get('content-security-policy');
    expect(policy).toContain("script-src 'self' 'sha256-abc=';");
    expect(policy).toContain("style-src 'self' 'unsafe-inline';");
    expect(policy).toContain("frame-ancestors 'none'");
  });

  it('keep their own caching, and are private without', async () => {
    const handler: Handler = (req, res) => {
      if (req.url === '/_astro/a.js') res.setHeader('Cache-Control', 'public, immutable');
      res.end('x');
    };
    const site = await serve({ handler });
    expect((await get(site, '/_astro/a.js')).headers.get('cache-control')).toBe(
      'public, immutable',
    );
    expect((await get(site, '/a')).headers.get('cache-control')).toBe('private, no-cache');
  });

  it('keep every cookie', async () => {
    const handler: Handler = (_req, res) => {
      res.writeHead(200, { 'set-cookie': ['a=1', 'b=2'] });
      res.end();
    };
    expect((await get(await serve({ handler }))).headers.getSetCookie()).toEqual(['a=1', 'b=2']);
  });

  it('are JSON without detail when the handler fails', async () => {
    expectConsoleError(/boom/);
    const handler = async () => {
      throw new Error('boom');
    };
    const answer = await get(await serve({ handler }), '/api/x');
    expect(answer.status).toBe(500);
    expect(await answer.text()).not.toContain('boom');
  });
});

describe('health', () => {
  const pingDatabase = () => Promise.reject(new Error('down'));

  it('is answered without the database', async () => {
    const answer = await get(await serve({ pingDatabase }), '/healthz');
    expect([answer.status, await answer.text()]).toEqual([200, 'ok']);
  });

  it('with the database is another address', async () => {
    expect((await get(await serve({ pingDatabase }), '/readyz')).status).toBe(503);
    expect((await get(await serve(), '/readyz')).status).toBe(200);
  });

  it('can be asked under any name', async () => {
    const site = await serve({ env: { ORIGIN: 'http://127.0.0.1:4321' } });
    expect((await get(site, '/healthz')).status).toBe(200);
  });
});

describe('draining', () => {
  it('answers what is in hand, then takes nothing more', async () => {
    let release = () => undefined as void;
    const held = new Promise<void>((resolve) => (release = resolve));
    let arrived = () => undefined as void;
    const inHand = new Promise<void>((resolve) => (arrived = resolve));
    const site = await serve({
      handler: async (_req, res) => {
        arrived();
        await held;
        res.end('done');
      },
    });
    const answering = get(site);
    await inHand;
    const drained = served.pop()!.drain();
    await expect(get(site)).rejects.toThrow();
    release();
    expect(await (await answering).text()).toBe('done');
    await drained;
  });
});
