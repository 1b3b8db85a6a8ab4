import type { APIContext, APIRoute, AstroCookies } from 'astro';
import type { Transaction } from 'sequelize';
import { sequelize } from '../../db/models';
import type { Preferences } from '../schemas/preferences';
import type { Role } from '../schemas/roles';
import type { Parsed, Schema, Unparsed } from '../schemas/schema';
import type { CurrentUser } from '../schemas/user';
import { errorResponse } from './errorResponse';
import { AppError, type ErrorCode } from './errors';
import { requireOwnOrigin } from './origin';
import { parseParts } from './parseParts';
import { limitCall, type CallLimit } from './rateLimit';
import { readJson } from './readJson';
import { readCaller } from './session';

export type Who = 'anyone' | 'signed-in' | readonly Role[];

interface RunContext<W extends Who, P extends Schema, Q extends Schema, B extends Schema> {
  user: W extends 'anyone' ? CurrentUser | null : CurrentUser;
  preferences: Preferences;
  params: Parsed<P>;
  query: Parsed<Q>;
  body: Parsed<B>;
  /** Of mutating routes only: asking for it in a reading or stateless route throws. */
  readonly transaction: Transaction;
  request: Request;
  url: URL;
  cookies: AstroCookies;
  now: Date;
}

/**
 * A value of the response schema, or a Response of its own such as CSV, or a function to call after
 * the commit, for what must wait for it such as mail; its value is then the answer.
 */
type Answer<Value> = Value | Response | (() => Promise<Value>);

export interface RouteSpec<
  W extends Who = Who,
  P extends Schema = Schema,
  Q extends Schema = Schema,
  B extends Schema = Schema,
  R extends Schema = Schema,
> {
  summary: string;
  description?: string;
  who: W;
  params?: P;
  query?: Q;
  body?: B;
  response: R;
  status?: 200 | 201 | 204;
  /** Of a route that answers a Response of its own; else JSON. */
  mediaType?: string;
  /** Codes this route answers beyond those every route of its kind can. */
  errors?: readonly ErrorCode[];
  example: { params?: Unparsed<P>; query?: Unparsed<Q>; body?: Unparsed<B> };
  limit?: CallLimit;
  /** No session, transaction, database or default limit: pure calculation. */
  stateless?: boolean;
  run(context: RunContext<W, P, Q, B>): Promise<Answer<Unparsed<R>>> | Answer<Unparsed<R>>;
}

export type Route = APIRoute & { spec: RouteSpec };

const READING_METHODS = ['GET', 'HEAD'];

/** Makes an API route of a spec: checks, limits, session, validation, transaction, JSON errors. */
export function handle<
  const W extends Who,
  P extends Schema = Schema,
  Q extends Schema = Schema,
  B extends Schema = Schema,
  R extends Schema = Schema,
>(spec: RouteSpec<W, P, Q, B, R>): Route {
  const erased = spec as unknown as RouteSpec;
  const route: APIRoute = async (context) => {
    try {
      return await answer(erased, context);
    } catch (error) {
      return errorResponse(error, context.request);
    }
  };
  return Object.assign(route, { spec: erased });
}

async function answer(spec: RouteSpec, context: APIContext): Promise<Response> {
  const { request, url, cookies } = context;
  const mutates = !READING_METHODS.includes(request.method);
  if (mutates) requireOwnOrigin(request, url, { optional: spec.stateless === true });

  const caller = spec.stateless ? null : await readCaller(context);
  const limit = spec.limit ?? (spec.stateless ? null : mutates ? 'write' : 'read');
  if (limit) await limitCall(limit, caller?.user?.id ?? context.clientAddress);
  if (spec.who !== 'anyone') requireRole(spec.who, caller?.user ?? null);

  const body = mutates && spec.body ? await readJson(request) : undefined;
  const parts = parseParts(spec, { params: context.params, url, body });
  const call = { ...parts, ...caller, request, url, cookies, now: new Date() };

  if (!mutates || spec.stateless) {
    return toResponse(spec, await spec.run(withTransaction(call, null)));
  }
  const result = await sequelize.transaction(async (transaction) =>
    spec.run(withTransaction(call, transaction)),
  );
  return toResponse(spec, typeof result === 'function' ? await result() : result);
}

function requireRole(who: 'signed-in' | readonly Role[], user: CurrentUser | null): void {
  if (!user) throw new AppError('unauthenticated', 'Sign in to do this.');
  if (who !== 'signed-in' && !who.some((role) => user.roles.includes(role))) {
    throw new AppError('forbidden', `Only a person who works as ${who.join(' or ')} may do this.`);
  }
}

/** A getter, so that using a transaction where there is none fails at once and by name. */
function withTransaction(
  call: object,
  transaction: Transaction | null,
): RunContext<Who, Schema, Schema, Schema> {
  return Object.defineProperty({ ...call }, 'transaction', {
    get() {
      if (!transaction) throw new Error('this part of a route runs outside any transaction');
      return transaction;
    },
  }) as RunContext<Who, Schema, Schema, Schema>;
}

function toResponse(spec: RouteSpec, result: unknown): Response {
  if (result instanceof Response) return result;
  const status = spec.status ?? 200;
  const headers = { 'cache-control': 'no-store' };
  if (status === 204) return new Response(null, { status, headers });
  // Parsing drops whatever the schema does not name, so that nothing leaks; pure answers skip it.
  const value = spec.stateless ? result : spec.response.parse(result);
  return Response.json(value, { status, headers });
}
