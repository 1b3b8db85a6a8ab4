import { randomUUID } from 'node:crypto';
import type { APIContext, APIRoute } from 'astro';
import { DEFAULT_PREFERENCES, type Preferences } from '../../src/schemas/preferences';
import type { CurrentUser } from '../../src/schemas/user';
import { noteClientAddress } from '../../src/server/clientAddress';

export const ORIGIN = 'http://ellwise.test';

interface RouteCall {
  method?: string;
  /** Who is signed in; without one, nobody. */
  user?: CurrentUser | null;
  preferences?: Preferences;
  params?: Record<string, string>;
  /** Sent as JSON, unless it is text or bytes already. */
  body?: unknown;
  /** Beside or instead of those a browser sends; null leaves one out. */
  headers?: Record<string, string | null>;
  /** Path and query, where the route looks at them. */
  url?: string;
  /** Limits count by it: each call comes from somewhere else unless a test says otherwise. */
  clientAddress?: string;
  /** Reads the session from the cookie, as the running server does. */
  withSession?: boolean;
}

interface RouteAnswer {
  status: number;
  // eslint-disable-next-line @typescript-eslint/no-explicit-any -- a test reads what it expects
  json: any;
  text: string;
  headers: Headers;
  /** Cookies set, by name; a cleared one is ''. */
  cookies: Record<string, string>;
}

/** Calls an API route as the server would, with a made-up context. */
export async function callRoute(route: APIRoute, call: RouteCall = {}): Promise<RouteAnswer> {
  const { method = 'GET', user = null, preferences = DEFAULT_PREFERENCES, params = {} } = call;
  const url = new URL(call.url ?? '/api/test', ORIGIN);
  const clientAddress = call.clientAddress ?? randomUUID();
  const request = new Request(url, { method, ...bodyInit(call.body), headers: headersOf(call) });
  noteClientAddress(request, clientAddress);

  const cookies: Record<string, string> = {};
  const sent = new Map(
    (request.headers.get('cookie') ?? '')
      .split('; ')
      .map((pair): [string, string] => [pair.split('=')[0]!, pair.slice(pair.indexOf('=') + 1)]),
  );
  const context = {
    request,
    url,
    params,
    clientAddress,
    locals: call.withSession ? {} : { user, preferences },
    cookies: {
      get: (name: string) => (sent.has(name) ? { value: sent.get(name) } : undefined),
      set: (name: string, value: string) => void (cookies[name] = value),
      delete: (name: string) => void (cookies[name] = ''),
    },
  } as unknown as APIContext;

  const response = await route(context);
  const text = await response.text();
  const isJson = response.headers.get('content-type')?.startsWith('application/json');
  return {
    status: response.status,
    json: isJson ? JSON.parse(text) : undefined,
    text,
    headers: response.headers,
    cookies,
  };
}

function bodyInit(body: unknown): RequestInit & { duplex?: 'half' } {
  if (body === undefined) return {};
  if (body instanceof ReadableStream) return { body, duplex: 'half' };
  if (typeof body === 'string' || body instanceof Uint8Array) return { body: body as BodyInit };
  return { body: JSON.stringify(body) };
}

function headersOf({ method = 'GET', body, headers = {} }: RouteCall): Headers {
  const all: Record<string, string | null> = {
    ...(method !== 'GET' && { origin: ORIGIN }),
    ...(body !== undefined && { 'content-type': 'application/json' }),
    ...headers,
  };
  return new Headers(
    Object.entries(all).filter((entry): entry is [string, string] => entry[1] !== null),
  );
}
