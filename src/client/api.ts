import type { Parsed, Schema, Unparsed } from '../schemas/schema';

interface ErrorBody {
  code: string;
  message: string;
  fields?: Record<string, string>;
  current?: unknown;
}

/** An answer that was not a success; `fields` says what to show beside which field. */
export class ApiError extends Error {
  readonly status: number;
  readonly code: string;
  readonly fields: Readonly<Record<string, string>>;
  /** The row as it is now, when a save came too late. */
  readonly current: unknown;

  constructor(status: number, { code, message, fields = {}, current }: ErrorBody) {
    super(message);
    this.name = 'ApiError';
    this.status = status;
    this.code = code;
    this.fields = fields;
    this.current = current;
  }
}

interface CallOptions {
  signal?: AbortSignal;
  headers?: Record<string, string>;
}

/** A call with a body is typed by the schema its form uses: what the route will parse. */
type WithBody = <R extends Schema, B extends Schema = Schema>(
  path: string,
  body: Unparsed<B>,
  response: R,
  options?: CallOptions,
) => Promise<Parsed<R>>;

export function get<R extends Schema>(
  path: string,
  response: R,
  options?: CallOptions,
): Promise<Parsed<R>> {
  return call('GET', path, undefined, response, options);
}

const withBody =
  (method: string): WithBody =>
  (path, body, response, options) =>
    call(method, path, body, response, options);

export const post = withBody('POST');
export const put = withBody('PUT');

/** DELETE, which carries no body; `remove` because `delete` is a word of the language. */
export function remove<R extends Schema>(
  path: string,
  response: R,
  options?: CallOptions,
): Promise<Parsed<R>> {
  return call('DELETE', path, undefined, response, options);
}

async function call<R extends Schema>(
  method: string,
  path: string,
  body: unknown,
  response: R,
  { signal, headers }: CallOptions = {},
): Promise<Parsed<R>> {
  const answer = await send(path, {
    method,
    signal,
    headers: { ...(body !== undefined && { 'content-type': 'application/json' }), ...headers },
    body: body === undefined ? undefined : JSON.stringify(body),
  });
  if (!answer.ok) throw new ApiError(answer.status, await errorBody(answer));
  return response.parse(answer.status === 204 ? undefined : await answer.json());
}

async function send(path: string, init: RequestInit): Promise<Response> {
  try {
    return await fetch(path, init);
  } catch (error) {
    if (init.signal?.aborted) throw error;
    throw new ApiError(0, {
      code: 'offline',
      message: 'The server could not be reached. What you typed is kept; try again.',
    });
  }
}

/** A proxy in between may answer something other than our JSON. */
async function errorBody(answer: Response): Promise<ErrorBody> {
  const fallback = {
    code: 'internal',
    message: `The server answered ${answer.status}. Try again.`,
  };
  try {
    const { error } = await answer.json();
    return typeof error?.code === 'string' && typeof error.message === 'string' ? error : fallback;
  } catch {
    return fallback;
  }
}
