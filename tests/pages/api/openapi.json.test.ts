import { describe, expect, it } from 'vitest';
import { GET, operations } from '../../../src/pages/api/openapi.json';
import { callRoute } from '../../support/callRoute';

interface OpenApiOperation {
  operationId: string;
  summary: string;
  parameters: { name: string; in: string; required: boolean; schema: object }[];
  requestBody?: { content: Record<string, { schema: object; example: unknown }> };
  responses: Record<string, { description: string }>;
}

const { json: document, text } = await callRoute(GET);
const described: [string, OpenApiOperation][] = Object.entries(
  document.paths as Record<string, Record<string, OpenApiOperation>>,
).flatMap(([path, methods]) =>
  Object.entries(methods).map(([method, operation]): [string, OpenApiOperation] => [
    `${method.toUpperCase()} ${path}`,
    operation,
  ]),
);

describe('GET /api/openapi.json', () => {
  it('is an OpenAPI 3.1 document', () => {
    expect(document).toMatchObject({
      openapi: '3.1.1',
      info: { title: 'Ellwise', version: '1' },
      components: { schemas: { Error: { type: 'object' } } },
    });
  });

  it('describes every route there is', () => {
    const names = operations.map(({ method, path }) => `${method} ${path}`);
    expect(names).toContain('POST /api/account/register');
    expect(described.map(([name]) => name).sort()).toEqual(names.sort());
  });

  it('gives every operation an id of its own', () => {
    const ids = described.map(([, { operationId }]) => operationId);
    expect(new Set(ids).size).toBe(ids.length);
    for (const id of ids) expect(id).toMatch(/^[a-z][A-Za-z0-9]+$/);
  });

  it('refers only to what it holds', () => {
    const refs = [...text.matchAll(/"\$ref": "([^"]+)"/g)].map(([, ref]) => ref);
    expect(new Set(refs)).toEqual(new Set(['#/components/schemas/Error']));
  });

  it.each(described)('%s is described whole', (name, operation) => {
    expect(operation.summary).not.toBe('');
    const inPath = [...name.matchAll(/\{(\w+)\}/g)].map(([, parameter]) => parameter);
    const declared = operation.parameters.filter((parameter) => parameter.in === 'path');
    expect(declared.map((parameter) => parameter.name).sort()).toEqual(inPath.sort());
    for (const { schema } of operation.parameters) expect(schema).not.toEqual({});
    if (operation.requestBody) {
      const json = operation.requestBody.content['application/json'];
      expect(json?.schema).toHaveProperty('type');
      expect(json?.example).toBeDefined();
    }
    const statuses = Object.keys(operation.responses);
    expect(statuses.some((status) => /^20[014]$/.test(status))).toBe(true);
    expect(statuses).toContain('500');
  });
});

describe('the example of', () => {
  it.each(
    operations.map((operation) => [`${operation.method} ${operation.path}`, operation] as const),
  )('%s passes its own schemas', (_, { spec }) => {
    for (const part of ['params', 'query', 'body'] as const) {
      if (spec[part] && (part !== 'query' || spec.example.query)) {
        expect(() => spec[part]?.parse(spec.example[part])).not.toThrow();
      } else if (!spec[part]) {
        expect(spec.example[part]).toBeUndefined();
      }
    }
  });
});
