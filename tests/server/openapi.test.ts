import { describe, expect, it } from 'vitest';
import * as z from 'zod';
import { handle } from '../../src/server/handle';
import { planSchema } from '../../src/schemas/plan';
import { jsonSchemaOf } from '../../src/schemas/schema';
import { buildOpenApi, operationsOf } from '../../src/server/openapi';

const PUT = handle({
  summary: 'Set roles',
  who: ['administrator'],
  params: z.object({ id: z.uuid() }),
  query: z.object({ page: z.string().default('1') }),
  body: z.object({ name: z.string().trim(), massG: z.number().optional() }),
  response: z.object({ id: z.uuid() }),
  errors: ['conflict'],
  example: { params: { id: '5f0c2a54-7c1e-4c52-9a39-5b2f0f6f0b11' }, body: { name: 'Odile' } },
  run: ({ params }) => params,
});
const modules = [{ address: '/api/admin/people/[id]/roles', exports: { PUT, prerender: false } }];
const document = buildOpenApi(operationsOf(modules)) as never as {
  paths: Record<string, Record<string, Record<string, unknown>>>;
};
const operation = document.paths['/api/admin/people/{id}/roles']?.put ?? {};

describe('buildOpenApi', () => {
  it('names an operation after its method and address', () => {
    expect(operation.operationId).toBe('putAdminPeopleByIdRoles');
  });

  it('makes parameters of params and query', () => {
    expect(operation.parameters).toEqual([
      {
        name: 'id',
        in: 'path',
        required: true,
        schema: expect.objectContaining({ type: 'string', format: 'uuid' }),
        example: '5f0c2a54-7c1e-4c52-9a39-5b2f0f6f0b11',
      },
      { name: 'page', in: 'query', required: false, schema: { type: 'string', default: '1' } },
    ]);
  });

  it('makes a request body of what the schema takes in, with an example', () => {
    expect(operation.requestBody).toMatchObject({
      required: true,
      content: {
        'application/json': {
          schema: { type: 'object', required: ['name'] },
          example: { name: 'Odile' },
        },
      },
    });
  });

  it('lists every status that such a route can answer', () => {
    const responses = operation.responses as Record<string, { description: string }>;
    expect(
      Object.fromEntries(
        Object.entries(responses).map(([status, { description }]) => [status, description]),
      ),
    ).toEqual({
      200: 'Done.',
      400: 'Code invalid or malformed.',
      401: 'Code unauthenticated.',
      403: 'Code foreign-origin or forbidden.',
      409: 'Code conflict.',
      413: 'Code too-large.',
      415: 'Code unsupported.',
      429: 'Code too-many.',
      500: 'Code internal.',
    });
  });

  it('says that a quantity with a unit is a number, in answers as in requests', () => {
    expect(jsonSchemaOf(planSchema)).toMatchObject({
      properties: {
        yarn: { properties: { putUp: { properties: { lengthM: { type: 'number' } } } } },
      },
    });
  });
});
