import type { APIRoute } from 'astro';
import { buildOpenApi, operationsOf } from '../../server/openapi';

const files = import.meta.glob<Record<string, unknown>>(['./**/*.ts', '!./openapi.json.ts'], {
  eager: true,
});

const modules = Object.entries(files).map(([file, exports]) => ({
  address: file.replace(/^\./, '/api').replace(/(\/index)?\.ts$/, ''),
  exports,
}));

export const operations = operationsOf(modules);
const document = JSON.stringify(buildOpenApi(operations), null, 2);

export const GET: APIRoute = () =>
  new Response(document, { headers: { 'content-type': 'application/json' } });
