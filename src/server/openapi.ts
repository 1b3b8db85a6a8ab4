import { jsonSchemaOf, type Schema } from '../schemas/schema';
import { STATUS_OF_CODE, type ErrorCode } from './errors';
import type { Route, RouteSpec } from './handle';

const METHODS = ['GET', 'POST', 'PUT', 'PATCH', 'DELETE'] as const;
type Method = (typeof METHODS)[number];
type Json = Record<string, unknown>;

/** A module of src/pages/api with the address it answers. */
export interface RouteModule {
  /** As Astro names the file: `/api/admin/people/[id]/roles`. */
  address: string;
  exports: Record<string, unknown>;
}

export interface Operation {
  method: Method;
  /** As OpenAPI writes it: `/api/admin/people/{id}/roles`. */
  path: string;
  spec: RouteSpec;
}

/** Every method of every address that `handle` made. */
export function operationsOf(modules: readonly RouteModule[]): Operation[] {
  return modules.flatMap(({ address, exports }) =>
    METHODS.flatMap((method) => {
      const route = exports[method] as Route | undefined;
      if (!route?.spec) return [];
      return [{ method, path: address.replace(/\[(\w+)\]/g, '{$1}'), spec: route.spec }];
    }),
  );
}

/** The OpenAPI 3.1 document of the operations, from the schemas they parse with. */
export function buildOpenApi(operations: readonly Operation[]): Json {
  const paths: Record<string, Json> = {};
  for (const operation of operations) {
    const path = (paths[operation.path] ??= {});
    path[operation.method.toLowerCase()] = describe(operation);
  }
  return {
    openapi: '3.1.1',
    info: {
      title: 'Ellwise',
      version: '1',
      description:
        'Lengths of yarn in metres, of fabric in millimetres, masses in grams, money in minor units of an ISO 4217 currency. ' +
        'Sign in at /sign-in: the session is a cookie. Calls that change something carry the Origin of this site.',
    },
    paths,
    components: {
      securitySchemes: {
        session: { type: 'apiKey', in: 'cookie', name: 'authjs.session-token' },
      },
      schemas: { Error: ERROR_SCHEMA },
    },
  };
}

const ERROR_SCHEMA: Json = {
  type: 'object',
  properties: {
    error: {
      type: 'object',
      properties: {
        code: { type: 'string', enum: Object.keys(STATUS_OF_CODE) },
        message: { type: 'string' },
        fields: {
          type: 'object',
          description: 'A message for each field that did not pass, by its path.',
          additionalProperties: { type: 'string' },
        },
        current: { description: 'The row as it is now, when a save came too late.' },
      },
      required: ['code', 'message'],
    },
  },
  required: ['error'],
};

function describe({ method, path, spec }: Operation): Json {
  const body = spec.body && {
    required: true,
    content: {
      'application/json': {
        schema: jsonSchemaOf(spec.body),
        example: spec.example.body,
      },
    },
  };
  return {
    operationId: operationIdOf(method, path),
    summary: spec.summary,
    ...(spec.description && { description: spec.description }),
    tags: [path.split('/')[2]],
    security: spec.who === 'anyone' ? [] : [{ session: [] }],
    parameters: [
      ...parametersOf('path', spec.params, spec.example.params),
      ...parametersOf('query', spec.query, spec.example.query),
    ],
    ...(body && { requestBody: body }),
    responses: { ...success(spec), ...failures(method, spec) },
  };
}

/** `PUT /api/admin/people/{id}/roles` is `putAdminPeopleByIdRoles`. */
function operationIdOf(method: Method, path: string): string {
  const words = path
    .replace(/^\/api\//, '')
    .replace(/\{(\w+)\}/g, 'by-$1')
    .split(/[^A-Za-z0-9]+/)
    .filter(Boolean);
  const capitalised = words.map((word) => word[0]!.toUpperCase() + word.slice(1));
  return method.toLowerCase() + capitalised.join('');
}

function parametersOf(
  place: 'path' | 'query',
  schema: Schema | undefined,
  example: unknown,
): Json[] {
  if (!schema) return [];
  const { properties = {}, required = [] } = jsonSchemaOf(schema) as {
    properties?: Record<string, Json>;
    required?: string[];
  };
  const examples = (example ?? {}) as Json;
  return Object.entries(properties).map(([name, property]) => ({
    name,
    in: place,
    required: place === 'path' || required.includes(name),
    schema: property,
    ...(name in examples && { example: examples[name] }),
  }));
}

function success({ status = 200, mediaType = 'application/json', response }: RouteSpec): Json {
  if (status === 204) return { 204: { description: 'Done.' } };
  const schema = jsonSchemaOf(response);
  return { [status]: { description: 'Done.', content: { [mediaType]: { schema } } } };
}

/** What can go wrong by the kind of route it is, with the codes it names itself. */
function failures(method: Method, spec: RouteSpec): Json {
  const codes = new Set<ErrorCode>(['internal', ...(spec.errors ?? [])]);
  const add = (...more: ErrorCode[]) => more.forEach((code) => codes.add(code));
  if (method !== 'GET') add('foreign-origin');
  if (spec.body) add('invalid', 'malformed', 'too-large', 'unsupported');
  if (spec.params || spec.query) add('invalid');
  if (spec.who !== 'anyone') add('unauthenticated');
  if (Array.isArray(spec.who)) add('forbidden');
  if (spec.limit || !spec.stateless) add('too-many');

  const byStatus: Record<number, ErrorCode[]> = {};
  for (const code of codes) (byStatus[STATUS_OF_CODE[code]] ??= []).push(code);
  return Object.fromEntries(
    Object.entries(byStatus).map(([status, names]) => [
      status,
      {
        description: `Code ${names.join(' or ')}.`,
        content: { 'application/json': { schema: { $ref: '#/components/schemas/Error' } } },
      },
    ]),
  );
}
